import {
  bondValenceOxidationStates,
  BOND_VALENCE_SOFTNESS_ANGSTROM,
  findBondValenceParameter,
} from '../chemistry/bond-valence-parameters';

export interface BondValenceSum {
  oxidationState: number;
  sum: number;
}

/** A sum farther than this from every assumed state supports none (common practice asks for about 0.25). */
const SUPPORT_LIMIT = 0.5;

/**
 * Bond valence sum Σ exp((R₀ − R)/b) for each oxidation state of the metal that has parameters for every
 * donor element of the sphere.
 * @returns ascending oxidation states; [] when the tables miss a pair or there is no donor
 * Source: I. D. Brown & D. Altermatt, Acta Cryst. 1985, B41, 244; parameters: see
 * lib/chemistry/bond-valence-parameters.ts. Checked against: tests/published/geometry-bond-valence.test.ts.
 */
export function bondValenceSums(
  metal: string,
  donors: readonly { element: string; distanceAngstrom: number }[],
): BondValenceSum[] {
  if (donors.length === 0) return [];
  const sums: BondValenceSum[] = [];
  for (const oxidationState of bondValenceOxidationStates(metal)) {
    let sum: number | null = 0;
    for (const { element, distanceAngstrom } of donors) {
      const parameter = findBondValenceParameter(metal, oxidationState, element);
      if (!parameter) {
        sum = null;
        break;
      }
      sum += bondValence(parameter.r0Angstrom, distanceAngstrom);
    }
    if (sum !== null) sums.push({ oxidationState, sum });
  }
  return sums;
}

/** Valence of one bond; 1 when the distance equals R₀. */
export function bondValence(
  r0Angstrom: number,
  distanceAngstrom: number,
  softnessAngstrom = BOND_VALENCE_SOFTNESS_ANGSTROM,
): number {
  return Math.exp((r0Angstrom - distanceAngstrom) / softnessAngstrom);
}

/** The assumed state whose own sum comes closest to it; null when none comes within 0.5. */
export function supportedOxidationState(sums: readonly BondValenceSum[]): number | null {
  let best: BondValenceSum | null = null;
  const miss = (entry: BondValenceSum) => Math.abs(entry.sum - entry.oxidationState);
  for (const entry of sums) if (best === null || miss(entry) < miss(best)) best = entry;
  return best !== null && miss(best) <= SUPPORT_LIMIT ? best.oxidationState : null;
}
