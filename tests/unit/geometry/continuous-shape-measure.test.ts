import { describe, expect, it } from 'vitest';
import { centroid, dot, scale, subtract } from '@/lib/chemistry/linear-algebra';
import { optimalRotation, rotate } from '@/lib/chemistry/optimal-rotation';
import type { Vector3 } from '@/lib/chemistry/structure';
import { continuousShapeMeasure, overlaidIdeal } from '@/lib/geometry/continuous-shape-measure';
import {
  type IdealPolyhedron,
  idealPolyhedra,
  idealPolyhedraFor,
  requireIdealPolyhedron,
} from '@/lib/geometry/ideal-polyhedra';
import { rotationPermutations } from '@/lib/geometry/vertex-pairings';
import { randomDonors, randomRotation, seededRandom, shuffled } from './random-structures';

/** All orders of 0 … n − 1. */
function permutations(n: number): number[][] {
  if (n === 0) return [[]];
  return permutations(n - 1).flatMap((shorter) =>
    Array.from({ length: n }, (_, at) => [...shorter.slice(0, at), n - 1, ...shorter.slice(at)]),
  );
}

/** The definition, without any short cut: every pairing, metal included, by least squares. */
function bruteForce(donors: readonly Vector3[], ideal: IdealPolyhedron, orders: readonly number[][]): number {
  const centred = (points: readonly Vector3[]) => {
    const all: Vector3[] = [...points, [0, 0, 0]];
    const middle = centroid(all);
    return all.map((point) => subtract(point, middle));
  };
  const q = centred(donors);
  const size = (points: readonly Vector3[]) => points.reduce((sum, point) => sum + dot(point, point), 0);
  let least = 100;
  for (const order of orders) {
    const p = centred(order.map((vertex): Vector3 => ideal.vertices[vertex] ?? [0, 0, 0]));
    const { overlap } = optimalRotation(q, p);
    least = Math.min(least, 100 * (1 - overlap ** 2 / (size(q) * size(p))));
  }
  return least;
}

describe('continuous shape measure', () => {
  it('equals the minimum over every pairing for random spheres of two to seven donors', () => {
    const random = seededRandom(11);
    for (let n = 2; n <= 7; n++) {
      const orders = permutations(n);
      for (let trial = 0; trial < (n === 7 ? 1 : 4); trial++) {
        const donors = randomDonors(n, random);
        for (const ideal of idealPolyhedraFor(n)) {
          const expected = bruteForce(donors, ideal, orders);
          expect(continuousShapeMeasure(donors, ideal)?.measure, ideal.id).toBeCloseTo(expected, 7);
        }
      }
    }
  });

  it('finds the ideal again for eight and nine donors in any order and orientation, a little moved', () => {
    const random = seededRandom(5);
    for (const ideal of [...idealPolyhedraFor(8), ...idealPolyhedraFor(9)]) {
      const noise = () => 0.02 * (random() - 0.5);
      const turned = shuffled(ideal.vertices, random).map(
        (v): Vector3 => [v[0] + noise(), v[1] + noise(), v[2] + noise()],
      );
      const rotation = randomRotation(random);
      const measure = continuousShapeMeasure(
        turned.map((v) => rotate(rotation, v)),
        ideal,
      )?.measure;
      expect(measure, ideal.id).toBeLessThan(0.02);
    }
  });

  it('is not worse than any of 20,000 random pairings of nine donors', () => {
    const random = seededRandom(77);
    const donors = randomDonors(9, random);
    for (const ideal of idealPolyhedraFor(9)) {
      const orders = Array.from({ length: 20_000 }, () => shuffled([0, 1, 2, 3, 4, 5, 6, 7, 8], random));
      const measure = continuousShapeMeasure(donors, ideal)?.measure ?? NaN;
      expect(measure).toBeLessThanOrEqual(bruteForce(donors, ideal, orders) + 1e-9);
    }
  });

  it('returns a pairing that gives the measure', () => {
    const random = seededRandom(3);
    const donors = randomDonors(6, random);
    for (const ideal of idealPolyhedraFor(6)) {
      const shape = continuousShapeMeasure(donors, ideal);
      expect(shape?.measure).toBeCloseTo(bruteForce(donors, ideal, [shape?.pairing ?? []]), 8);
    }
  });

  it('is the same for a mirror image, since every ideal shape has a mirror plane', () => {
    const random = seededRandom(9);
    for (let n = 3; n <= 9; n++) {
      const donors = randomDonors(n, random);
      const mirrored = donors.map(([x, y, z]): Vector3 => [-x, y, z]);
      for (const ideal of idealPolyhedraFor(n)) {
        const measure = continuousShapeMeasure(donors, ideal)?.measure ?? NaN;
        expect(continuousShapeMeasure(mirrored, ideal)?.measure, ideal.id).toBeCloseTo(measure, 6);
      }
    }
  });

  it('keeps its digits where two rotations fit equally well', () => {
    // A sphere squeezed flat and short on one side: the largest root of the overlap is double or nearly so.
    const donors: Vector3[] = [
      [1, 0, 0],
      [-1, 0, 0],
      [0, 1e-9, 0],
      [0, 0, 1e-9],
    ];
    for (const ideal of idealPolyhedraFor(4)) {
      const expected = bruteForce(donors, ideal, permutations(4));
      expect(continuousShapeMeasure(donors, ideal)?.measure, ideal.id).toBeCloseTo(expected, 6);
    }
  });

  it('is null for donors on top of the metal and throws for a wrong number', () => {
    const octahedron = requireIdealPolyhedron('OC-6');
    expect(
      continuousShapeMeasure(
        Array.from({ length: 6 }, (): Vector3 => [0, 0, 0]),
        octahedron,
      ),
    ).toBeNull();
    expect(() => continuousShapeMeasure([[1, 0, 0]], octahedron)).toThrow(/OC-6 needs 6 donors/);
  });
});

describe('overlaid ideal polyhedron', () => {
  it('lies on the sphere that is a turned and scaled ideal', () => {
    const random = seededRandom(21);
    for (const ideal of idealPolyhedra) {
      const rotation = randomRotation(random);
      const donors = shuffled(ideal.vertices, random).map((v) => scale(rotate(rotation, v), 2.1));
      const overlaid = overlaidIdeal(donors, ideal);
      overlaid?.vertices.forEach((vertex, k) => {
        expect(Math.hypot(...subtract(vertex, donors[k] ?? [9, 9, 9])), ideal.id).toBeLessThan(1e-6);
      });
      expect(Math.hypot(...(overlaid?.centre ?? [9, 9, 9]))).toBeLessThan(1e-6);
    }
  });
});

describe('rotations of the ideal polyhedra', () => {
  // Orders of the rotation subgroups of the point groups; flat shapes count their mirror plane as a rotation.
  const orders: [string, number][] = [
    ['T-4', 12],
    ['SP-4', 8],
    ['TBPY-5', 6],
    ['SPY-5/90', 4],
    ['OC-6', 24],
    ['TPR-6', 6],
    ['PBPY-7', 10],
    ['OCF-7', 3],
    ['TPRS-7', 2],
    ['CU-8', 24],
    ['SAPR-8', 8],
    ['DD-8', 4],
    ['HBPY-8', 12],
    ['TPRS-9', 6],
    ['CSAPR-9', 4],
  ];
  it.each(orders)('%s has %i', (id, order) => {
    expect(rotationPermutations(requireIdealPolyhedron(id).vertices)).toHaveLength(order);
  });

  it('give equal edges where the table says so', () => {
    const shortest = (id: string, count: number) => {
      const { vertices } = requireIdealPolyhedron(id);
      const edges = vertices
        .flatMap((a, i) => vertices.slice(i + 1).map((b) => Math.hypot(...subtract(a, b))))
        .sort((a, b) => a - b)
        .slice(0, count);
      expect((edges[count - 1] ?? NaN) - (edges[0] ?? NaN), id).toBeLessThan(1e-9);
    };
    shortest('TPR-6', 9);
    shortest('SAPR-8', 16);
    shortest('TPRS-9', 18);
    shortest('CSAPR-9', 16);
  });
});
