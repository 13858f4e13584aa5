import { centroid, dot, subtract } from '../chemistry/linear-algebra';
import { optimalRotation, rotate, type Rotation } from '../chemistry/optimal-rotation';
import type { Vector3 } from '../chemistry/structure';

export interface Superposition {
  rotation: Rotation;
  /** Added after the rotation, Å. */
  translation: Vector3;
  /** Root mean square distance of the pairs after superposition, Å. */
  rmsdAngstrom: number;
}

/**
 * Lays one set of paired points onto another by rotation and translation with the least sum of squared
 * distances; mirror images are never formed. All points weigh the same.
 * @param fixed - n ≥ 1 points, Å
 * @param moving - n points, `moving[k]` paired with `fixed[k]`
 * Errors: throws RangeError when the lengths differ or are 0. Accuracy: RMSD to about 1e-7 Å.
 * Source: W. Kabsch, Acta Cryst. 1976, A32, 922. Checked against: tests/unit/structures/superposition.test.ts.
 */
export function superposition(fixed: readonly Vector3[], moving: readonly Vector3[]): Superposition {
  if (fixed.length !== moving.length || fixed.length === 0) {
    throw new RangeError(`superposition needs paired points, got ${fixed.length} and ${moving.length}`);
  }
  const [fixedCentre, movingCentre] = [centroid(fixed), centroid(moving)];
  const a = fixed.map((point) => subtract(point, fixedCentre));
  const b = moving.map((point) => subtract(point, movingCentre));
  const { rotation } = optimalRotation(a, b);
  let squares = 0;
  a.forEach((point, k) => {
    const gap = subtract(point, rotate(rotation, b[k] ?? [0, 0, 0]));
    squares += dot(gap, gap);
  });
  return {
    rotation,
    translation: subtract(fixedCentre, rotate(rotation, movingCentre)),
    rmsdAngstrom: Math.sqrt(squares / a.length),
  };
}

/** A point moved as the superposition moves its set. */
export function place({ rotation, translation }: Superposition, point: Vector3): Vector3 {
  const [x, y, z] = rotate(rotation, point);
  return [x + translation[0], y + translation[1], z + translation[2]];
}
