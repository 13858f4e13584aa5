import { angleDegrees } from '../chemistry/linear-algebra';
import type { Vector3 } from '../chemistry/structure';

export interface SphereAngle {
  /** Positions of the two donors in the list given. */
  first: number;
  second: number;
  degrees: number;
}

/** All donor–metal–donor angles, donors relative to the metal; n(n − 1)/2 of them, by position. */
export function sphereAngles(donors: readonly Vector3[]): SphereAngle[] {
  const angles: SphereAngle[] = [];
  donors.forEach((a, first) => {
    donors.slice(first + 1).forEach((b, offset) => {
      angles.push({ first, second: first + 1 + offset, degrees: angleDegrees(a, b) });
    });
  });
  return angles;
}

/** The two largest angles, degrees, larger first; null with fewer than three donors. */
export function twoLargestAngles(donors: readonly Vector3[]): [number, number] | null {
  let [largest, second] = [-1, -1];
  for (const { degrees } of sphereAngles(donors)) {
    if (degrees > largest) [largest, second] = [degrees, largest];
    else if (degrees > second) second = degrees;
  }
  return second < 0 ? null : [largest, second];
}
