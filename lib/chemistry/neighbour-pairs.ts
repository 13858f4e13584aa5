import type { Vector3 } from './structure';

/** Cubes along one axis at most, so that a cube's number stays an exact integer. */
const MOST_CUBES = 100_000;

/**
 * Calls `visit` once for each pair of points (first < second) not farther apart than the cutoff.
 * Points are sorted into cubes with the cutoff as edge, so the time grows with the number of
 * neighbours, not with the square of the number of points.
 * @param positions - Å, finite
 * @param cutoffAngstrom - > 0
 */
export function forEachNeighbourPair(
  positions: readonly Vector3[],
  cutoffAngstrom: number,
  visit: (first: number, second: number, distanceAngstrom: number) => void,
): void {
  const low = [0, 1, 2].map((axis) =>
    positions.reduce((least, p) => Math.min(least, p[axis] ?? 0), Infinity),
  );
  const high = [0, 1, 2].map((axis) =>
    positions.reduce((most, p) => Math.max(most, p[axis] ?? 0), -Infinity),
  );
  const extent = Math.max(...high.map((x, axis) => x - (low[axis] ?? 0)), 0);
  const edge = Math.max(cutoffAngstrom, extent / MOST_CUBES);
  // One empty cube on each side keeps the neighbours of a border cube from wrapping round.
  const [nx = 0, ny = 0] = high.map((x, axis) => Math.floor((x - (low[axis] ?? 0)) / edge) + 3);
  const cubeOf = (p: Vector3) => {
    const [i, j, k] = p.map((x, axis) => Math.floor((x - (low[axis] ?? 0)) / edge) + 1) as [
      number,
      number,
      number,
    ];
    return i + nx * (j + ny * k);
  };
  const around: number[] = [];
  for (let k = -1; k <= 1; k++) {
    for (let j = -1; j <= 1; j++) for (let i = -1; i <= 1; i++) around.push(i + nx * (j + ny * k));
  }
  // Filling while looking visits each pair once, from its later point.
  const cubes = new Map<number, number[]>();
  positions.forEach((position, second) => {
    const cube = cubeOf(position);
    for (const step of around) {
      const points = cubes.get(cube + step);
      if (!points) continue;
      for (const first of points) {
        const other = positions[first] ?? position;
        const dx = position[0] - other[0];
        const dy = position[1] - other[1];
        const dz = position[2] - other[2];
        const separation = Math.sqrt(dx * dx + dy * dy + dz * dz);
        if (separation <= cutoffAngstrom) visit(first, second, separation);
      }
    }
    const here = cubes.get(cube);
    if (here) here.push(second);
    else cubes.set(cube, [second]);
  });
}
