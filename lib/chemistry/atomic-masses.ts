import { atomicNumber } from './elements';

/**
 * Atomic masses in g/mol, hydrogen to uranium, in order of atomic number. Elements with an interval of standard
 * atomic weights carry the conventional value; elements without a stable isotope carry the mass number of a
 * long-lived one. Source: IUPAC, Standard atomic weights of the elements 2021, Pure Appl. Chem. 2022, 94, 573,
 * abridged values, from memory; checked through published molar masses in tests/published/magnetism-diamagnetic.test.ts.
 */
const massesGramPerMole = [
  1.008, 4.0026, 6.94, 9.0122, 10.81, 12.011, 14.007, 15.999, 18.998, 20.18, 22.99, 24.305, 26.982, 28.085,
  30.974, 32.06, 35.45, 39.95, 39.098, 40.078, 44.956, 47.867, 50.942, 51.996, 54.938, 55.845, 58.933, 58.693,
  63.546, 65.38, 69.723, 72.63, 74.922, 78.971, 79.904, 83.798, 85.468, 87.62, 88.906, 91.224, 92.906, 95.95,
  97, 101.07, 102.91, 106.42, 107.87, 112.41, 114.82, 118.71, 121.76, 127.6, 126.9, 131.29, 132.91, 137.33,
  138.91, 140.12, 140.91, 144.24, 145, 150.36, 151.96, 157.25, 158.93, 162.5, 164.93, 167.26, 168.93, 173.05,
  174.97, 178.49, 180.95, 183.84, 186.21, 190.23, 192.22, 195.08, 196.97, 200.59, 204.38, 207.2, 208.98, 209,
  210, 222, 223, 226, 227, 232.04, 231.04, 238.03,
];

/**
 * Atomic mass of an element, g/mol (natural composition).
 * @param symbol - element symbol in any letter case
 * @returns null for text that is no element symbol and for elements beyond uranium
 */
export function atomicMass(symbol: string): number | null {
  const z = atomicNumber(symbol);
  return z === null ? null : (massesGramPerMole[z - 1] ?? null);
}
