import type { Vector3 } from '../chemistry/structure';
import { sphereAngles } from './sphere-angles';

export type OctahedralPairs = readonly [
  readonly [number, number],
  readonly [number, number],
  readonly [number, number],
];

/** The fifteen ways to part six donors into three pairs. */
const partings: readonly OctahedralPairs[] = [1, 2, 3, 4, 5].flatMap((mate) => {
  const rest = [1, 2, 3, 4, 5].filter((i) => i !== mate);
  const [a = 0, b = 0, c = 0, d = 0] = rest;
  return [
    [
      [0, mate],
      [a, b],
      [c, d],
    ],
    [
      [0, mate],
      [a, c],
      [b, d],
    ],
    [
      [0, mate],
      [a, d],
      [b, c],
    ],
  ] as OctahedralPairs[];
});

/**
 * The three trans pairs of six donors: the parting with the largest sum of angles. In an octahedron
 * these are the opposite vertices; towards a trigonal prism the choice stays the best there is.
 * @param donors - six positions relative to the metal
 * @param angles - their angles, when known already
 */
export function octahedralPairs(donors: readonly Vector3[], angles = sphereAngles(donors)): OctahedralPairs {
  const table = new Array<number>(36).fill(0);
  for (const { first, second, degrees } of angles) table[first * 6 + second] = degrees;
  let best = partings[0] as OctahedralPairs;
  let most = -1;
  for (const parting of partings) {
    let sum = 0;
    for (const [i, j] of parting) sum += table[i * 6 + j] ?? 0;
    if (sum > most) {
      most = sum;
      best = parting;
    }
  }
  return best;
}
