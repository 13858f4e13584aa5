import { atomicNumber } from '../../chemistry/elements';

/** First and last atomic number of a run of elements, and the contracted functions of each. */
type Run = readonly [number, number, number];

/**
 * Contracted functions per element (spherical; 6-31G(d) with six Cartesian d functions and ten f), counted
 * from the published basis sets as the Basis Set Exchange and the programs' libraries print them: def2,
 * Weigend and Ahlrichs, Phys. Chem. Chem. Phys. 2005, 7, 3297; 6-31G(d), Rassolov et al., J. Chem. Phys.
 * 1998, 109, 1223 and earlier papers; STO-3G, Hehre, Stewart and Pople, J. Chem. Phys. 1969, 51, 2657.
 */
const counts: Readonly<Record<string, readonly Run[]>> = {
  'def2-SVP': [
    [1, 2, 5],
    [3, 4, 9],
    [5, 10, 14],
    [11, 11, 15],
    [12, 18, 18],
    [19, 20, 24],
    [21, 30, 31],
    [31, 36, 32],
    [37, 37, 24],
    [38, 38, 23],
    [39, 48, 31],
    [49, 53, 26],
    [54, 54, 50],
    [55, 55, 24],
    [56, 56, 30],
    [57, 57, 32],
    [72, 80, 32],
  ],
  'def2-TZVP': [
    [1, 2, 6],
    [3, 3, 14],
    [4, 4, 19],
    [5, 10, 31],
    [11, 12, 32],
    [13, 18, 37],
    [19, 19, 33],
    [20, 20, 36],
    [21, 29, 45],
    [30, 36, 48],
    [37, 38, 33],
    [39, 48, 40],
    [49, 54, 50],
    [55, 55, 29],
    [56, 57, 40],
    [72, 79, 40],
    [80, 80, 43],
  ],
  'def2-TZVPP': [
    [1, 2, 14],
    [3, 4, 19],
    [5, 10, 31],
    [11, 12, 32],
    [13, 18, 42],
    [19, 19, 33],
    [20, 20, 36],
    [21, 30, 64],
    [31, 36, 48],
    [37, 38, 40],
    [39, 48, 56],
    [49, 54, 50],
    [55, 55, 36],
    [56, 56, 40],
    [57, 57, 56],
    [72, 79, 56],
    [80, 80, 59],
  ],
  '6-31G(d)': [
    [1, 2, 2],
    [3, 10, 15],
    [11, 18, 19],
    [19, 20, 23],
    [21, 30, 39],
  ],
  'STO-3G': [
    [1, 2, 1],
    [3, 10, 5],
    [11, 18, 9],
    [19, 20, 13],
    [21, 36, 18],
  ],
};

/**
 * Number of basis functions of a molecule.
 * @param basisPerElement - other basis sets for single elements
 * @returns null when the count of any element is not known here
 */
export function basisFunctionCount(
  elements: readonly string[],
  basis: string,
  basisPerElement: Readonly<Record<string, string>> = {},
): number | null {
  let total = 0;
  for (const element of elements) {
    const z = atomicNumber(element);
    const runs = counts[basisPerElement[element] ?? basis];
    const run = z === null ? undefined : runs?.find(([first, last]) => z >= first && z <= last);
    if (!run) return null;
    total += run[2];
  }
  return total;
}
