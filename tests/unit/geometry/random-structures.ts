import { scale } from '@/lib/chemistry/linear-algebra';
import { rotate, type Rotation } from '@/lib/chemistry/optimal-rotation';
import type { Structure, Vector3 } from '@/lib/chemistry/structure';

/** Lehmer's generator: seeded, so that a failing case comes back. */
export function seededRandom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
}

/** A random proper rotation (Shoemake's uniform quaternion). */
export function randomRotation(random: () => number): Rotation {
  const [u, v, w] = [random(), 2 * Math.PI * random(), 2 * Math.PI * random()];
  const [a, b] = [Math.sqrt(1 - u), Math.sqrt(u)];
  const [x, y, z, s] = [a * Math.sin(v), a * Math.cos(v), b * Math.sin(w), b * Math.cos(w)];
  return [
    [1 - 2 * (y * y + z * z), 2 * (x * y - z * s), 2 * (x * z + y * s)],
    [2 * (x * y + z * s), 1 - 2 * (x * x + z * z), 2 * (y * z - x * s)],
    [2 * (x * z - y * s), 2 * (y * z + x * s), 1 - 2 * (x * x + y * y)],
  ];
}

export function shuffled<T>(items: readonly T[], random: () => number): T[] {
  const copy = [...items];
  for (let i = copy.length - 1; i > 0; i--) {
    const j = Math.floor(random() * (i + 1));
    const held = copy[i] as T;
    copy[i] = copy[j] as T;
    copy[j] = held;
  }
  return copy;
}

/** Donors about 2.1 Å away in directions at least 45° apart (35° for more than six), metal at the origin. */
export function randomDonors(count: number, random: () => number): Vector3[] {
  const closest = Math.cos(((count > 6 ? 35 : 45) * Math.PI) / 180);
  const directions: Vector3[] = [];
  while (directions.length < count) {
    const z = 2 * random() - 1;
    const azimuth = 2 * Math.PI * random();
    const r = Math.sqrt(1 - z * z);
    const candidate: Vector3 = [r * Math.cos(azimuth), r * Math.sin(azimuth), z];
    if (directions.every((d) => d[0] * candidate[0] + d[1] * candidate[1] + d[2] * candidate[2] < closest)) {
      directions.push(candidate);
    }
  }
  return directions.map((direction) => scale(direction, 1.95 + 0.3 * random()));
}

export function sphereStructure(metal: string, donor: string, donors: readonly Vector3[]): Structure {
  return { elements: [metal, ...donors.map(() => donor)], positionsAngstrom: [[0, 0, 0], ...donors] };
}

export function moved(structure: Structure, rotation: Rotation, shift: Vector3): Structure {
  return {
    elements: structure.elements,
    positionsAngstrom: structure.positionsAngstrom.map((position): Vector3 => {
      const [x, y, z] = rotate(rotation, position);
      return [x + shift[0], y + shift[1], z + shift[2]];
    }),
  };
}
