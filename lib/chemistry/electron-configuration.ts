import { atomicNumber } from './elements';

/**
 * Group of the periodic table (3–12) of a d-block element. Convention: lanthanum and lutetium both
 * count as group 3; the other f-block elements have no group here.
 * Source: IUPAC periodic table of the elements (2022).
 * @returns 3–12, or null outside the d block
 */
export function dBlockGroup(element: string): number | null {
  const z = atomicNumber(element);
  if (z === null) return null;
  if (z >= 21 && z <= 30) return z - 18;
  if (z >= 39 && z <= 48) return z - 36;
  if (z === 57) return 3;
  if (z >= 71 && z <= 80) return z - 68;
  return null;
}

/** Which d series an element belongs to: 3, 4 or 5; null outside the d block. */
export function dSeries(element: string): 3 | 4 | 5 | null {
  const z = atomicNumber(element);
  if (z === null || dBlockGroup(element) === null) return null;
  return z <= 30 ? 3 : z <= 48 ? 4 : 5;
}

/**
 * Number of d electrons of a metal ion in a complex: group number less oxidation state (all valence
 * electrons of a complexed d-block ion count as d electrons). Common practice.
 * @returns 0–10, or null when the element is outside the d block or the state leaves it no valid count
 */
export function dElectronCount(element: string, oxidationState: number): number | null {
  const group = dBlockGroup(element);
  if (group === null || !Number.isInteger(oxidationState)) return null;
  const count = group - oxidationState;
  return count >= 0 && count <= 10 ? count : null;
}
