import type { Vector3 } from '../chemistry/structure';
import { cisAngles } from './cis-angles';
import { sphereAngles } from './sphere-angles';

const TETRAHEDRAL_DEGREES = (Math.acos(-1 / 3) * 180) / Math.PI;

/**
 * Bond-angle variance σ² = Σ (θᵢ − θ₀)² / (m − 1): for six donors the twelve cis angles (the
 * twelve smallest) against 90°, for four
 * donors the six angles against 109.4712°.
 * @param donors - relative to the metal
 * @returns degrees², 0 for the regular polyhedron; null unless there are four or six donors
 * Source: K. Robinson, G. V. Gibbs, P. H. Ribbe, Science 1971, 172, 567. Checked against:
 * tests/published/geometry.test.ts.
 */
export function angleVarianceDegrees2(donors: readonly Vector3[]): number | null {
  if (donors.length !== 4 && donors.length !== 6) return null;
  const ideal = donors.length === 6 ? 90 : TETRAHEDRAL_DEGREES;
  const angles = donors.length === 6 ? cisAngles(donors) : sphereAngles(donors).map((angle) => angle.degrees);
  return angles.reduce((sum, angle) => sum + (angle - ideal) ** 2, 0) / (angles.length - 1);
}
