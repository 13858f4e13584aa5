import { groundTerm } from './ground-term';

export type JahnTellerStrength = 'none' | 'weak' | 'moderate' | 'strong';

export interface JahnTellerExpectation {
  strength: JahnTellerStrength;
  /** What the distortion looks like, in words; null for strength "none". */
  form: string | null;
}

/**
 * First-order Jahn–Teller expectation of a dⁿ ion in a regular OC-6 or T-4 surrounding, from its ground
 * term. OC-6: E strong (σ-antibonding set unevenly filled), T weak, A none. T-4: T moderate, strong for
 * d4 and d9, E weak, A none. Textbook rule; the classes of reference table in tests/published agree.
 * @returns null where the rule does not speak (other geometries, no standard ground term)
 */
export function jahnTeller(
  geometry: string,
  dElectrons: number,
  unpaired: number,
): JahnTellerExpectation | null {
  if (geometry !== 'OC-6' && geometry !== 'T-4') return null;
  const symbol = groundTerm(geometry, dElectrons, unpaired)?.symbols[0];
  if (symbol === undefined) return null;
  if (symbol.includes('A')) return { strength: 'none', form: null };
  const isE = symbol.includes('E');
  if (geometry === 'OC-6') {
    return isE
      ? { strength: 'strong', form: 'elongation along one axis (4+2), less often compression (2+4)' }
      : { strength: 'weak', form: 'small tetragonal or trigonal distortion' };
  }
  if (isE) return { strength: 'weak', form: 'small tetragonal distortion' };
  const strong = dElectrons === 4 || dElectrons === 9;
  return {
    strength: strong ? 'strong' : 'moderate',
    // One hole in t2 (d4, d9) flattens towards SP-4; one electron or two holes (d3, d8) elongates.
    form: strong ? 'flattening towards SP-4' : 'elongation along a two-fold axis',
  };
}
