import type { Vector3 } from '../chemistry/structure';
import { sphereAngles } from './sphere-angles';

/**
 * The twelve cis angles of six donors, degrees, ascending.
 * Convention: the twelve smallest of the fifteen angles. In every octahedron these are the angles that belong
 * to no trans pair; near a trigonal prism, where each donor has two partners at about 136°, there are no
 * trans pairs, and taking the smallest keeps Σ and σ² continuous there.
 * @param donors - six positions relative to the metal
 */
export function cisAngles(donors: readonly Vector3[]): number[] {
  return sphereAngles(donors)
    .map(({ degrees }) => degrees)
    .sort((a, b) => a - b)
    .slice(0, 12);
}
