import { cross, direction, dot, scale, subtract } from '../chemistry/linear-algebra';
import type { Vector3 } from '../chemistry/structure';
import { type OctahedralPairs, octahedralPairs } from './octahedral-pairs';

/** How Θ is projected here; shown beside every value, since other conventions differ by up to a factor of two. */
export const THETA_CONVENTION =
  'projection along the line between the centroids of two opposite faces, angles taken at the projected metal, ' +
  'neighbours by order round it; do not compare with values from other sources';

/**
 * Octahedral twist Θ = Σ |60° − θᵢ| over 24 angles: four pairs of opposite faces, each seen along its
 * pseudo-threefold axis, six angles each between neighbouring donors.
 * Convention: see THETA_CONVENTION.
 * @param donors - relative to the metal
 * @param pairs - their trans pairs, when known already
 * @returns degrees, 0 for an octahedron; null unless there are six donors, or when two opposite faces share
 * their centroid
 * Source: M. Marchivie, P. Guionneau, J.-F. Létard, D. Chasseau, Acta Cryst. 2005, B61, 25. Checked against:
 * tests/published/geometry.test.ts.
 */
export function thetaDegrees(donors: readonly Vector3[], pairs?: OctahedralPairs): number | null {
  if (donors.length !== 6) return null;
  const [[a, A], [b, B], [c, C]] = pairs ?? octahedralPairs(donors);
  const faces = [
    [a, b, c, A, B, C],
    [a, b, C, A, B, c],
    [a, B, c, A, b, C],
    [a, B, C, A, b, c],
  ];
  let sum = 0;
  for (const face of faces) {
    const twist = twistOfFaces(face.map((i): Vector3 => donors[i] ?? [0, 0, 0]));
    if (twist === null) return null;
    sum += twist;
  }
  return sum;
}

/** Σ |60° − gap| of the six donors round the axis; the first three are one face, the others the opposite one. */
function twistOfFaces(face: readonly Vector3[]): number | null {
  const [p, q, r, P, Q, R] = face as [Vector3, Vector3, Vector3, Vector3, Vector3, Vector3];
  const axis = direction([
    p[0] + q[0] + r[0] - P[0] - Q[0] - R[0],
    p[1] + q[1] + r[1] - P[1] - Q[1] - R[1],
    p[2] + q[2] + r[2] - P[2] - Q[2] - R[2],
  ]);
  if (!axis) return null;
  const right = direction(subtract(p, scale(axis, dot(p, axis))));
  if (!right) return null;
  const up = cross(axis, right);
  const azimuths = face
    .map((donor) => (Math.atan2(dot(donor, up), dot(donor, right)) * 180) / Math.PI)
    .sort((x, y) => x - y);
  let sum = 0;
  azimuths.forEach((azimuth, i) => {
    const next = i + 1 < azimuths.length ? azimuths[i + 1] : (azimuths[0] ?? 0) + 360;
    sum += Math.abs(60 - ((next ?? 0) - azimuth));
  });
  return sum;
}
