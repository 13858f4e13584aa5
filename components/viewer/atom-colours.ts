/**
 * Colours of atoms, one table for the viewer, its flat projection and every plot that names a metal.
 * Carbon, hydrogen, nitrogen and oxygen follow the trade's custom in own shades. The 3d metals differ in
 * lightness as well as hue, so that they stay apart for colour-blind readers (tested for deuteranopia).
 */
const colours: Record<string, string> = {
  H: '#e9e4d8',
  B: '#d8a79a',
  C: '#4a4a4d',
  N: '#4166c4',
  O: '#c23b3b',
  F: '#a9cf9c',
  Si: '#b3a27c',
  P: '#d98a3d',
  S: '#d3b83a',
  Cl: '#b5c9a0',
  Se: '#b8862e',
  Br: '#8f4a35',
  I: '#5d3a7d',
  Sc: '#cdbfa1',
  Ti: '#8794a3',
  V: '#a18a2a',
  Cr: '#3f6b46',
  Mn: '#8d5fae',
  Fe: '#c0602a',
  Co: '#24407f',
  Ni: '#6fae5c',
  Cu: '#2f8c88',
  Zn: '#d5bfe3',
};

const otherMetal = '#9c8f7a';

/** Elements whose own colour is in the table. */
export const colouredElements = Object.keys(colours);

/** Hex colour of an element; one neutral shade for those without their own. */
export function atomColour(element: string): string {
  return colours[element] ?? otherMetal;
}

/** Black or white, whichever reads better on an atom of this element (WCAG relative luminance). */
export function inkOnAtom(element: string): '#14120f' | '#ffffff' {
  const channel = (at: number) => {
    const share = Number.parseInt(atomColour(element).slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  };
  const luminance = 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
  return luminance > 0.179 ? '#14120f' : '#ffffff';
}
