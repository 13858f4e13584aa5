import type { Vector3 } from '../chemistry/structure';
import { cisAngles } from './cis-angles';

/**
 * Octahedral angular distortion Σ = Σ |90° − φᵢ| over the twelve cis angles (the twelve smallest).
 * @param donors - relative to the metal
 * @returns degrees, 0 for an octahedron; null unless there are six donors
 * Source: J. K. McCusker, A. L. Rheingold, D. N. Hendrickson, Inorg. Chem. 1996, 35, 2100. Checked against:
 * tests/published/geometry.test.ts.
 */
export function sigmaDegrees(donors: readonly Vector3[]): number | null {
  if (donors.length !== 6) return null;
  return cisAngles(donors).reduce((sum, angle) => sum + Math.abs(90 - angle), 0);
}
