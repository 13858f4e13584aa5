import { atomicNumber } from './elements';

/**
 * Total number of electrons of a set of atoms with a charge: sum of the atomic numbers less charge.
 * @param elements - IUPAC symbols, one per atom; ghost atoms and point charges must not be among them
 * @returns a whole number ≥ 0, or null for an unknown element or a charge above the nuclear charge
 */
export function electronCount(elements: readonly string[], charge: number): number | null {
  let total = -charge;
  for (const element of elements) {
    const z = atomicNumber(element);
    if (z === null) return null;
    total += z;
  }
  return Number.isInteger(total) && total >= 0 ? total : null;
}

/**
 * Whether a number of electrons can carry a spin multiplicity 2S + 1: the unpaired electrons
 * (multiplicity − 1) must have the parity of the total and not exceed it.
 */
export function multiplicityFits(electrons: number, multiplicity: number): boolean {
  if (!Number.isInteger(multiplicity) || multiplicity < 1) return false;
  const unpaired = multiplicity - 1;
  return unpaired <= electrons && (electrons - unpaired) % 2 === 0;
}
