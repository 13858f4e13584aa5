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
  for (let first = 0; first < donors.length; first++) {
    for (let second = first + 1; second < donors.length; second++) {
      const [a, b] = [donors[first], donors[second]];
      if (a && b) angles.push({ first, second, degrees: angleDegrees(a, b) });
    }
  }
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
