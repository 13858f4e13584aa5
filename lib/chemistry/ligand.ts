import { electronCount } from './electron-count';
import { formulaElements } from './formula-elements';

/** One ligand as bound: formula and charge of the free ligand in that form. */
export interface Ligand {
  /** IUPAC-style name as in a complex's name. */
  name: string;
  formula: string;
  charge: number;
  /** Donor elements, one per donor atom; the denticity is its length. */
  donors: readonly string[];
  /** Unpaired electrons of the ligand itself: 0, or 1 for a radical. */
  unpairedElectrons: number;
  /** A macrocycle that holds its four donors in one plane, so that T-4, TBPY-5 and TPR-6 cannot form. */
  planarMacrocycle?: boolean;
}

/** Number of donor atoms that bind one centre. */
export const denticity = (ligand: Ligand): number => ligand.donors.length;

/**
 * Total electrons of a ligand, core included.
 * @returns null when the formula cannot be read
 */
export function ligandElectronCount(ligand: Ligand): number | null {
  const elements = formulaElements(ligand.formula);
  return elements === null ? null : electronCount(elements, ligand.charge);
}
