import type { Vector3 } from '../chemistry/structure';
import { twoLargestAngles } from './sphere-angles';

const TETRAHEDRAL_DEGREES = (Math.acos(-1 / 3) * 180) / Math.PI;

/**
 * Four-coordinate geometry index τ₄′ = (β − α)/(360° − θ) + (180° − β)/(180° − θ), β ≥ α the two largest
 * angles at the metal, θ = arccos(−1/3). Unlike τ₄ it tells unequal large angles apart.
 * @returns 0 (square plane) to 1 (tetrahedron); null unless there are four donors
 * Source: A. Okuniewski, D. Rosiak, J. Chojnacki, B. Becker, Polyhedron 2015, 90, 47. Checked against:
 * tests/published/geometry.test.ts.
 */
export function tau4Prime(donors: readonly Vector3[]): number | null {
  const angles = donors.length === 4 ? twoLargestAngles(donors) : null;
  return angles && tau4PrimeFromAngles(...angles);
}

/** The same from the two largest angles, degrees, larger first. */
export function tau4PrimeFromAngles(beta: number, alpha: number): number {
  return (beta - alpha) / (360 - TETRAHEDRAL_DEGREES) + (180 - beta) / (180 - TETRAHEDRAL_DEGREES);
}
