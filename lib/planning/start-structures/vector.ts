import type { Vector3 } from '../../chemistry/structure';

export const add = (a: Vector3, b: Vector3): Vector3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
export const subtract = (a: Vector3, b: Vector3): Vector3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
export const scale = (a: Vector3, factor: number): Vector3 => [a[0] * factor, a[1] * factor, a[2] * factor];
export const dot = (a: Vector3, b: Vector3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const norm = (a: Vector3): number => Math.hypot(a[0], a[1], a[2]);
export const cross = (a: Vector3, b: Vector3): Vector3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

/** Unit vector, or null for a vector shorter than 1e-9. */
export function unit(a: Vector3): Vector3 | null {
  const length = norm(a);
  return length < 1e-9 ? null : scale(a, 1 / length);
}

/** Rotation about a unit axis through the origin, right-handed, radians (Rodrigues' formula). */
export function rotate(a: Vector3, axis: Vector3, angle: number): Vector3 {
  const cosine = Math.cos(angle);
  const parallel = scale(axis, dot(axis, a) * (1 - cosine));
  return add(add(scale(a, cosine), scale(cross(axis, a), Math.sin(angle))), parallel);
}
