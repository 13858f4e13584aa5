import { symmetricEigen } from './linear-algebra';
import type { Vector3 } from './structure';

/** A rotation matrix by rows. */
export type Rotation = readonly [Vector3, Vector3, Vector3];

export interface OptimalRotation {
  /** Turns the second set onto the first. */
  rotation: Rotation;
  /** Largest Σ aₖ · (R bₖ) over all proper rotations R. */
  overlap: number;
}

/**
 * The proper rotation that lays one set of paired points best onto another (least squares), both sets
 * centred beforehand. The largest eigenvalue of a symmetric 4 × 4 matrix is the overlap, its eigenvector
 * the rotation as a quaternion; mirror images are never formed.
 * Source: B. K. P. Horn, J. Opt. Soc. Am. A 1987, 4, 629; the same optimum as W. Kabsch, Acta Cryst. 1976,
 * A32, 922.
 * @param fixed - n points
 * @param moving - n points, `moving[k]` paired with `fixed[k]`
 * Errors: throws RangeError when the lengths differ.
 */
export function optimalRotation(fixed: readonly Vector3[], moving: readonly Vector3[]): OptimalRotation {
  if (fixed.length !== moving.length) {
    throw new RangeError(
      `paired sets of one size are needed, got ${fixed.length} and ${moving.length} points`,
    );
  }
  let [xx, xy, xz, yx, yy, yz, zx, zy, zz] = [0, 0, 0, 0, 0, 0, 0, 0, 0];
  moving.forEach((b, k) => {
    const a = fixed[k] ?? [0, 0, 0];
    xx += b[0] * a[0];
    xy += b[0] * a[1];
    xz += b[0] * a[2];
    yx += b[1] * a[0];
    yy += b[1] * a[1];
    yz += b[1] * a[2];
    zx += b[2] * a[0];
    zy += b[2] * a[1];
    zz += b[2] * a[2];
  });
  const eigen = symmetricEigen([
    [xx + yy + zz, yz - zy, zx - xz, xy - yx],
    [yz - zy, xx - yy - zz, xy + yx, zx + xz],
    [zx - xz, xy + yx, yy - xx - zz, yz + zy],
    [xy - yx, zx + xz, yz + zy, zz - xx - yy],
  ]);
  const [w = 1, x = 0, y = 0, z = 0] = eigen.vectors[0] ?? [];
  return {
    overlap: eigen.values[0] ?? 0,
    rotation: [
      [w * w + x * x - y * y - z * z, 2 * (x * y - w * z), 2 * (x * z + w * y)],
      [2 * (x * y + w * z), w * w - x * x + y * y - z * z, 2 * (y * z - w * x)],
      [2 * (x * z - w * y), 2 * (y * z + w * x), w * w - x * x - y * y + z * z],
    ],
  };
}

/** A point turned by a rotation. */
export function rotate(rotation: Rotation, point: Vector3): Vector3 {
  const [a, b, c] = rotation;
  return [
    a[0] * point[0] + a[1] * point[1] + a[2] * point[2],
    b[0] * point[0] + b[1] * point[1] + b[2] * point[2],
    c[0] * point[0] + c[1] * point[1] + c[2] * point[2],
  ];
}
