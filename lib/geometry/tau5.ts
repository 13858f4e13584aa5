import type { Vector3 } from '../chemistry/structure';
import { twoLargestAngles } from './sphere-angles';

/**
 * Five-coordinate geometry index τ₅ = (β − α)/60°, β ≥ α the two largest angles at the metal.
 * @returns 0 (square pyramid, any basal angle) to 1 (trigonal bipyramid); null unless there are five donors
 * Source: A. W. Addison, T. N. Rao, J. Reedijk, J. van Rijn, G. C. Verschoor, J. Chem. Soc., Dalton Trans.
 * 1984, 1349. Checked against: tests/published/geometry.test.ts.
 */
export function tau5(donors: readonly Vector3[]): number | null {
  const angles = donors.length === 5 ? twoLargestAngles(donors) : null;
  return angles && tau5FromAngles(...angles);
}

/** The same from the two largest angles, degrees, larger first. */
export function tau5FromAngles(beta: number, alpha: number): number {
  return (beta - alpha) / 60;
}
