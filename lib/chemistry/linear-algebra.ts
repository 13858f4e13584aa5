import type { Vector3 } from './structure';

/** Small linear algebra on points in space; no unit of its own. */
export const add = (a: Vector3, b: Vector3): Vector3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
export const subtract = (a: Vector3, b: Vector3): Vector3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
export const scale = (a: Vector3, factor: number): Vector3 => [a[0] * factor, a[1] * factor, a[2] * factor];
export const dot = (a: Vector3, b: Vector3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const cross = (a: Vector3, b: Vector3): Vector3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
export const norm = (a: Vector3): number => Math.sqrt(dot(a, a));
export const distance = (a: Vector3, b: Vector3): number => norm(subtract(a, b));

/** Unit vector; null for a vector of no length. */
export function direction(a: Vector3): Vector3 | null {
  const length = norm(a);
  return length > 0 ? scale(a, 1 / length) : null;
}

/** Centroid of points; the origin for no points. */
export function centroid(points: readonly Vector3[]): Vector3 {
  let [x, y, z] = [0, 0, 0];
  for (const point of points) {
    x += point[0];
    y += point[1];
    z += point[2];
  }
  const n = Math.max(points.length, 1);
  return [x / n, y / n, z / n];
}

/**
 * Angle between two vectors, degrees, 0 to 180. The arctangent form keeps full accuracy near 0 and 180,
 * where the arccosine loses half of the digits.
 */
export function angleDegrees(a: Vector3, b: Vector3): number {
  const x = a[1] * b[2] - a[2] * b[1];
  const y = a[2] * b[0] - a[0] * b[2];
  const z = a[0] * b[1] - a[1] * b[0];
  return (Math.atan2(Math.sqrt(x * x + y * y + z * z), dot(a, b)) * 180) / Math.PI;
}

export interface SymmetricEigen {
  /** Descending. */
  values: number[];
  /** `vectors[i]` is the unit eigenvector of `values[i]`. */
  vectors: number[][];
}

/**
 * Eigenvalues and eigenvectors of a small symmetric matrix by Jacobi rotations: slow for large ones,
 * accurate to rounding and safe with equal eigenvalues. Source: C. G. J. Jacobi, J. reine angew. Math.
 * 1846, 30, 51.
 * @param matrix - n × n, symmetric; not changed
 */
export function symmetricEigen(matrix: readonly (readonly number[])[]): SymmetricEigen {
  const n = matrix.length;
  const a = Float64Array.from(matrix.flat());
  const v = new Float64Array(n * n);
  for (let i = 0; i < n; i++) v[i * n + i] = 1;
  const at = (m: Float64Array, i: number, j: number) => m[i * n + j] ?? 0;
  // Off-diagonal squares below rounding of the whole matrix cannot move an eigenvalue any more.
  const negligible = 1e-33 * a.reduce((sum, x) => sum + x * x, 0);
  for (let sweep = 0; sweep < 60; sweep++) {
    let off = 0;
    for (let i = 0; i < n; i++) for (let j = i + 1; j < n; j++) off += at(a, i, j) ** 2;
    if (off <= negligible) break;
    for (let p = 0; p < n; p++) {
      for (let q = p + 1; q < n; q++) {
        const apq = at(a, p, q);
        if (apq === 0) continue;
        const theta = (at(a, q, q) - at(a, p, p)) / (2 * apq);
        const t = (theta >= 0 ? 1 : -1) / (Math.abs(theta) + Math.sqrt(theta * theta + 1));
        const c = 1 / Math.sqrt(t * t + 1);
        const s = t * c;
        for (let k = 0; k < n; k++) {
          const kp = at(a, k, p);
          const kq = at(a, k, q);
          a[k * n + p] = c * kp - s * kq;
          a[k * n + q] = s * kp + c * kq;
        }
        for (let k = 0; k < n; k++) {
          const pk = at(a, p, k);
          const qk = at(a, q, k);
          a[p * n + k] = c * pk - s * qk;
          a[q * n + k] = s * pk + c * qk;
          const kp = at(v, k, p);
          const kq = at(v, k, q);
          v[k * n + p] = c * kp - s * kq;
          v[k * n + q] = s * kp + c * kq;
        }
      }
    }
  }
  const order = Array.from({ length: n }, (_, i) => i).sort((i, j) => at(a, j, j) - at(a, i, i));
  return {
    values: order.map((i) => at(a, i, i)),
    vectors: order.map((i) => Array.from({ length: n }, (_, k) => at(v, k, i))),
  };
}
