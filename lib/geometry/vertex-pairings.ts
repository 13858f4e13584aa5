import { distance } from '../chemistry/linear-algebra';
import type { Vector3 } from '../chemistry/structure';

/**
 * A step of the search over all ways to pair donors with vertices: the vertices that the next donor may
 * take, each with the step after it. Vertices that a rotation of the ideal shape carries into each other
 * (with the vertices taken so far left in place) are tried once. `next` is null once no rotation is left;
 * then every free vertex must be tried.
 */
export interface PairingStep {
  vertex: number;
  next: readonly PairingStep[] | null;
}

/**
 * Rotations of a set of vertices onto itself, as permutations (`permutation[i]` = where vertex i goes);
 * the identity first. Proper rotations about the origin only, so that a mirror image is never confused
 * with a rotation.
 */
export function rotationPermutations(vertices: readonly Vector3[]): number[][] {
  const n = vertices.length;
  const gap = (i: number, j: number) => distance(vertices[i] ?? [0, 0, 0], vertices[j] ?? [0, 0, 0]);
  const handedness = (i: number, j: number, k: number) => {
    const [a, b, c] = [vertices[i] ?? [0, 0, 0], vertices[j] ?? [0, 0, 0], vertices[k] ?? [0, 0, 0]];
    return (
      a[0] * (b[1] * c[2] - b[2] * c[1]) -
      a[1] * (b[0] * c[2] - b[2] * c[0]) +
      a[2] * (b[0] * c[1] - b[1] * c[0])
    );
  };
  const found: number[][] = [];
  const extend = (images: number[]) => {
    const k = images.length;
    if (k === n) {
      found.push([...images]);
      return;
    }
    for (let image = 0; image < n; image++) {
      if (images.includes(image)) continue;
      const keepsDistances = images.every((other, i) => Math.abs(gap(i, k) - gap(other, image)) < 1e-6);
      if (!keepsDistances) continue;
      let keepsHand = true;
      for (let i = 0; i < k && keepsHand; i++) {
        for (let j = i + 1; j < k && keepsHand; j++) {
          keepsHand =
            Math.abs(handedness(i, j, k) - handedness(images[i] ?? 0, images[j] ?? 0, image)) < 1e-6;
        }
      }
      if (keepsHand) extend([...images, image]);
    }
  };
  extend([]);
  return found;
}

/** The first step of the reduced search for a set of ideal vertices. */
export function pairingTree(vertices: readonly Vector3[]): readonly PairingStep[] | null {
  const grow = (group: number[][], taken: number[]): PairingStep[] | null => {
    if (group.length === 1 || taken.length === vertices.length) return null;
    const steps: PairingStep[] = [];
    const covered = new Set(taken);
    for (let vertex = 0; vertex < vertices.length; vertex++) {
      if (covered.has(vertex)) continue;
      for (const permutation of group) covered.add(permutation[vertex] ?? vertex);
      const stabiliser = group.filter((permutation) => permutation[vertex] === vertex);
      steps.push({ vertex, next: grow(stabiliser, [...taken, vertex]) });
    }
    return steps;
  };
  return grow(rotationPermutations(vertices), []);
}
