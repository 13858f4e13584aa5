import type { Vector3 } from '../chemistry/structure';
import { twoLargestAngles } from './sphere-angles';

/**
 * The published divisor. The exact value 360° − 2 arccos(−1/3) is 141.0576°, so a regular tetrahedron
 * comes out as 1.0004 here; the difference never exceeds 4.1e-4.
 */
const DIVISOR_DEGREES = 141;

/**
 * Four-coordinate geometry index τ₄ = (360° − (α + β)) / 141°, α and β the two largest angles at the metal.
 * @returns 0 (square plane) to 1 (tetrahedron); null unless there are four donors
 * Source: L. Yang, D. R. Powell, R. P. Houser, Dalton Trans. 2007, 955. Checked against:
 * tests/published/geometry.test.ts.
 */
export function tau4(donors: readonly Vector3[]): number | null {
  const angles = donors.length === 4 ? twoLargestAngles(donors) : null;
  return angles && tau4FromAngles(...angles);
}

/** The same from the two largest angles, degrees. */
export function tau4FromAngles(beta: number, alpha: number): number {
  return (360 - (alpha + beta)) / DIVISOR_DEGREES;
}
