import { centroid, dot, subtract, symmetricEigen } from '../chemistry/linear-algebra';
import type { Vector3 } from '../chemistry/structure';
import type { AxialSplit } from './tetragonality';

export interface PlaneDisplacement {
  /** Distance of the metal from the least-squares plane, ≥ 0, Å. */
  distanceAngstrom: number;
  /** Root mean square distance of the donors themselves from that plane, Å. */
  planarityAngstrom: number;
  /** Positions, in the list given, of the donors that make the plane. */
  donors: number[];
}

/** Donors farther from their plane than this (root mean square) make no plane. Common practice. */
const NO_PLANE_ANGSTROM = 0.5;

/**
 * Displacement of the metal from the mean plane of its donors: all donors for three and four, the
 * equatorial ones for five and six.
 * @param donors - relative to the metal, Å
 * @returns null for other numbers and when the donors lie near no plane (a tetrahedron)
 */
export function planeDisplacement(
  donors: readonly Vector3[],
  split: AxialSplit | null,
): PlaneDisplacement | null {
  const all = donors.map((_, i) => i);
  const members =
    donors.length === 3 || donors.length === 4 ? all : split?.equatorial.filter((i) => i < donors.length);
  if (!members || members.length < 3 || donors.length > 6) return null;
  const points = members.map((i): Vector3 => donors[i] ?? [0, 0, 0]);
  const middle = centroid(points);
  const spread = [0, 1, 2].map((row) =>
    [0, 1, 2].map((column) =>
      points.reduce(
        (sum, p) => sum + ((p[row] ?? 0) - (middle[row] ?? 0)) * ((p[column] ?? 0) - (middle[column] ?? 0)),
        0,
      ),
    ),
  );
  const eigen = symmetricEigen(spread);
  const [x = 0, y = 0, z = 0] = eigen.vectors[2] ?? [];
  const normal: Vector3 = [x, y, z];
  const planarityAngstrom = Math.sqrt(Math.max(0, eigen.values[2] ?? 0) / points.length);
  if (planarityAngstrom > NO_PLANE_ANGSTROM) return null;
  return {
    distanceAngstrom: Math.abs(dot(normal, subtract([0, 0, 0], middle))),
    planarityAngstrom,
    donors: members,
  };
}
