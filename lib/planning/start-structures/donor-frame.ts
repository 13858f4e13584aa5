import type { Vector3 } from '../../chemistry/structure';
import { add, cross, dot, subtract, unit } from './vector';

/** The axis across a four-coordinate centre and its two pairs of opposite donors. */
export interface DonorFrame {
  /** Plane normal of SP-4, four-fold improper axis of T-4. */
  axis: Vector3;
  /** Indices into the four vectors: [first pair, second pair]. */
  pairs: readonly [readonly [number, number], readonly [number, number]];
}

const pairings = [
  [
    [0, 1],
    [2, 3],
  ],
  [
    [0, 2],
    [1, 3],
  ],
  [
    [0, 3],
    [1, 2],
  ],
] as const;

/**
 * Pair four donors so that opposite ones enclose the largest angles, and find the axis perpendicular to
 * both pairs' connecting lines.
 * @param vectors - centre to donor, four of them, none zero
 * @returns null when the donors span no plane
 */
export function donorFrame(vectors: readonly Vector3[]): DonorFrame | null {
  const units = vectors.map(unit);
  const [a, b, c, d] = units;
  if (units.length !== 4 || !a || !b || !c || !d) return null;
  const at = [a, b, c, d];
  const pick = (index: number): Vector3 => at[index] ?? a;
  let best: DonorFrame | null = null;
  let lowest = Infinity;
  for (const pairing of pairings) {
    const [[i, j], [k, l]] = pairing;
    // Sum of cosines: −2 for two straight angles.
    const cosines = dot(pick(i), pick(j)) + dot(pick(k), pick(l));
    const across = unit(cross(subtract(pick(i), pick(j)), subtract(pick(k), pick(l))));
    if (across === null || cosines >= lowest - 1e-9) continue;
    // The first pair shall stand on the positive side.
    const upward = dot(across, add(pick(i), pick(j))) - dot(across, add(pick(k), pick(l)));
    lowest = cosines;
    best = { axis: upward < 0 ? [-across[0], -across[1], -across[2]] : across, pairs: pairing };
  }
  return best;
}
