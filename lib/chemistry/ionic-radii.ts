import type { SpinState } from './covalent-radii';

/**
 * Effective ionic radii, Å, of the 3d ions and common anions. Source: R. D. Shannon, Acta Cryst. 1976,
 * A32, 751 (scale with r(O²⁻, six-coordinate) = 1.40 Å). About a quarter of the values was checked
 * against a reproduction of the table, the rest stands from memory: use as a handbook value.
 */
export interface CationRadius {
  element: string;
  oxidationState: number;
  coordinationNumber: number;
  /** Shannon's "SQ" entries; other four-coordinate entries are tetrahedral. */
  squarePlanar: boolean;
  /** null where the table makes no difference. */
  spinState: SpinState | null;
  radiusAngstrom: number;
}

type Row = readonly [string, number, number, 'SQ' | '', SpinState | null, number];
const rows: readonly Row[] = [
  ['Sc', 3, 6, '', null, 0.745],
  ['Ti', 2, 6, '', null, 0.86],
  ['Ti', 3, 6, '', null, 0.67],
  ['Ti', 4, 4, '', null, 0.42],
  ['Ti', 4, 6, '', null, 0.605],
  ['V', 2, 6, '', null, 0.79],
  ['V', 3, 6, '', null, 0.64],
  ['V', 4, 5, '', null, 0.53],
  ['V', 4, 6, '', null, 0.58],
  ['V', 5, 4, '', null, 0.355],
  ['V', 5, 5, '', null, 0.46],
  ['V', 5, 6, '', null, 0.54],
  ['Cr', 2, 6, '', 'low', 0.73],
  ['Cr', 2, 6, '', 'high', 0.8],
  ['Cr', 3, 6, '', null, 0.615],
  ['Mn', 2, 4, '', 'high', 0.66],
  ['Mn', 2, 5, '', 'high', 0.75],
  ['Mn', 2, 6, '', 'low', 0.67],
  ['Mn', 2, 6, '', 'high', 0.83],
  ['Mn', 2, 7, '', 'high', 0.9],
  ['Mn', 2, 8, '', null, 0.96],
  ['Mn', 3, 5, '', null, 0.58],
  ['Mn', 3, 6, '', 'low', 0.58],
  ['Mn', 3, 6, '', 'high', 0.645],
  ['Mn', 4, 4, '', null, 0.39],
  ['Mn', 4, 6, '', null, 0.53],
  ['Fe', 2, 4, '', 'high', 0.63],
  ['Fe', 2, 4, 'SQ', 'high', 0.64],
  ['Fe', 2, 6, '', 'low', 0.61],
  ['Fe', 2, 6, '', 'high', 0.78],
  ['Fe', 2, 8, '', 'high', 0.92],
  ['Fe', 3, 4, '', 'high', 0.49],
  ['Fe', 3, 5, '', null, 0.58],
  ['Fe', 3, 6, '', 'low', 0.55],
  ['Fe', 3, 6, '', 'high', 0.645],
  ['Fe', 3, 8, '', 'high', 0.78],
  ['Co', 2, 4, '', 'high', 0.58],
  ['Co', 2, 5, '', null, 0.67],
  ['Co', 2, 6, '', 'low', 0.65],
  ['Co', 2, 6, '', 'high', 0.745],
  ['Co', 2, 8, '', null, 0.9],
  ['Co', 3, 6, '', 'low', 0.545],
  ['Co', 3, 6, '', 'high', 0.61],
  ['Ni', 2, 4, '', null, 0.55],
  ['Ni', 2, 4, 'SQ', 'low', 0.49],
  ['Ni', 2, 5, '', null, 0.63],
  ['Ni', 2, 6, '', null, 0.69],
  ['Ni', 3, 6, '', 'low', 0.56],
  ['Ni', 3, 6, '', 'high', 0.6],
  ['Cu', 1, 2, '', null, 0.46],
  ['Cu', 1, 4, '', null, 0.6],
  ['Cu', 1, 6, '', null, 0.77],
  ['Cu', 2, 4, '', null, 0.57],
  ['Cu', 2, 4, 'SQ', null, 0.57],
  ['Cu', 2, 5, '', null, 0.65],
  ['Cu', 2, 6, '', null, 0.73],
  ['Cu', 3, 6, '', 'low', 0.54],
  ['Zn', 2, 4, '', null, 0.6],
  ['Zn', 2, 5, '', null, 0.68],
  ['Zn', 2, 6, '', null, 0.74],
  ['Zn', 2, 8, '', null, 0.9],
];

export const cationRadii: readonly CationRadius[] = rows.map(
  ([element, oxidationState, coordinationNumber, plane, spinState, radiusAngstrom]) => ({
    element,
    oxidationState,
    coordinationNumber,
    squarePlanar: plane === 'SQ',
    spinState,
    radiusAngstrom,
  }),
);

/** Radii of the anions that stand for donor atoms: six-coordinate values, N³⁻ four-coordinate (the only one). */
export const anionRadiiAngstrom: Record<string, number> = {
  O: 1.4,
  F: 1.33,
  Cl: 1.81,
  Br: 1.96,
  I: 2.2,
  S: 1.84,
  N: 1.46,
};
