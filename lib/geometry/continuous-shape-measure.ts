import { norm } from '../chemistry/linear-algebra';
import { optimalRotation, rotate } from '../chemistry/optimal-rotation';
import type { Vector3 } from '../chemistry/structure';
import type { IdealPolyhedron } from './ideal-polyhedra';
import { type PairingStep, pairingTree } from './vertex-pairings';

export interface ShapeMeasure {
  /** 0 (the ideal shape) to 100. */
  measure: number;
  /** `pairing[k]`: the ideal vertex that donor k stands for at the optimum. */
  pairing: number[];
}

/** Donors and vertices up to this number: the coordination numbers with ideal polyhedra. */
const MOST_VERTICES = 9;

/**
 * When the slope of the polynomial at its largest root falls below this share, two roots meet there and
 * Newton's method leaves only half of the digits; then the root is taken from the eigenvalue problem.
 */
const DOUBLE_ROOT = 1e-3;

/** A pairing counts as better from this factor on: equally good ones are not solved again. 2e-8 in S. */
const BETTER = 1 + 1e-10;

interface Prepared {
  tree: readonly PairingStep[] | null;
  /** Σ of the vertices. */
  sum: Vector3;
  /** Σ |p − centroid|² with the metal as a point. */
  spread: number;
}
const preparedOf = new WeakMap<IdealPolyhedron, Prepared>();

function prepare(ideal: IdealPolyhedron): Prepared {
  const known = preparedOf.get(ideal);
  if (known) return known;
  const sum = total(ideal.vertices);
  const prepared = { tree: pairingTree(ideal.vertices), sum, spread: spreadWithMetal(ideal.vertices, sum) };
  preparedOf.set(ideal, prepared);
  return prepared;
}

/**
 * Continuous shape measure: the least mean-square deviation of a sphere from an ideal polyhedron, over all
 * pairings of donors with vertices, rotation, translation and scale, in per cent of the sphere's own size.
 * Convention: the metal counts as a point paired with the ideal's centre; mirror images are not formed
 * (every ideal shape in the table has a mirror plane, so it makes no difference).
 * With both sets centred, S = 100 (1 − T² / (|Q|² |P|²)), T the largest overlap Σ q · R p.
 * The search is exhaustive: pairings that differ by a rotation of the ideal shape are tried once, and a
 * branch is left only when a bound proves that it holds nothing better.
 * @param donors - positions relative to the metal, any length unit; as many as the ideal has vertices
 * @returns null when the donors coincide with the metal altogether
 * Errors: throws RangeError when the numbers differ or exceed 9. Accuracy: about 1e-6 in S.
 * Source: M. Pinsky & D. Avnir, Inorg. Chem. 1998, 37, 5575; S. Alvarez, D. Avnir, M. Llunell, M. Pinsky,
 * New J. Chem. 2002, 26, 996. Checked against: tests/published/geometry.test.ts.
 */
export function continuousShapeMeasure(
  donors: readonly Vector3[],
  ideal: IdealPolyhedron,
): ShapeMeasure | null {
  const n = donors.length;
  if (n !== ideal.vertices.length || n > MOST_VERTICES) {
    throw new RangeError(
      `${ideal.id} needs ${ideal.vertices.length} donors (at most ${MOST_VERTICES}), got ${n}`,
    );
  }
  const { tree, sum: idealSum, spread: idealSpread } = prepare(ideal);
  const donorSum = total(donors);
  const donorSpread = spreadWithMetal(donors, donorSum);
  if (!(donorSpread > 0)) return null;

  const { pairing, overlap } = bestPairing(donors, ideal.vertices, donorSum, idealSum, tree);
  return { measure: Math.max(0, 100 * (1 - (overlap * overlap) / (donorSpread * idealSpread))), pairing };
}

/**
 * The ideal polyhedron laid over a sphere in the best position, for drawing.
 * @param donors - relative to the metal, Å
 * @returns one vertex per donor, in the donors' order, and the ideal's centre, relative to the metal, Å;
 * null when the donors coincide with the metal
 */
export function overlaidIdeal(
  donors: readonly Vector3[],
  ideal: IdealPolyhedron,
): { vertices: Vector3[]; centre: Vector3 } | null {
  const shape = continuousShapeMeasure(donors, ideal);
  if (!shape) return null;
  const n = donors.length + 1;
  const donorSum = total(donors);
  const { sum: idealSum, spread } = prepare(ideal);
  const paired = shape.pairing.map((vertex): Vector3 => ideal.vertices[vertex] ?? [0, 0, 0]);
  const { rotation, overlap } = optimalRotation(withMetal(donors, donorSum), withMetal(paired, idealSum));
  const size = overlap / spread;
  const place = (point: Vector3): Vector3 => {
    const [x, y, z] = rotate(rotation, [
      point[0] - idealSum[0] / n,
      point[1] - idealSum[1] / n,
      point[2] - idealSum[2] / n,
    ]);
    return [x * size + donorSum[0] / n, y * size + donorSum[1] / n, z * size + donorSum[2] / n];
  };
  return { vertices: paired.map(place), centre: place([0, 0, 0]) };
}

function total(points: readonly Vector3[]): Vector3 {
  let [x, y, z] = [0, 0, 0];
  for (const p of points) {
    x += p[0];
    y += p[1];
    z += p[2];
  }
  return [x, y, z];
}

function spreadWithMetal(points: readonly Vector3[], sum: Vector3): number {
  let squares = 0;
  for (const p of points) squares += p[0] * p[0] + p[1] * p[1] + p[2] * p[2];
  return squares - (sum[0] * sum[0] + sum[1] * sum[1] + sum[2] * sum[2]) / (points.length + 1);
}

/** The points and the metal, moved to their common centroid. */
function withMetal(points: readonly Vector3[], sum: Vector3): Vector3[] {
  const n = points.length + 1;
  const [x, y, z] = [sum[0] / n, sum[1] / n, sum[2] / n];
  return [...points.map((p): Vector3 => [p[0] - x, p[1] - y, p[2] - z]), [-x, -y, -z]];
}

/**
 * The pairing with the largest overlap. For a pairing the 3 × 3 matrix H = Σ q pᵀ has the overlap T as the
 * largest root of λ⁴ − 2F λ² − 8D λ + F² − 4E (F = |H|², D = det H, E = |cofactors|²; all roots are real), so
 * "T < λ" is told by the signs of the polynomial and its derivatives at λ, without solving it.
 */
function bestPairing(
  donors: readonly Vector3[],
  vertices: readonly Vector3[],
  donorSum: Vector3,
  idealSum: Vector3,
  tree: readonly PairingStep[] | null,
): { pairing: number[]; overlap: number } {
  const n = donors.length;
  const every: readonly PairingStep[] = vertices.map((_, vertex) => ({ vertex, next: null }));
  // What the donors from k on can add at most: each vertex has length 1.
  const rest = new Float64Array(n + 1);
  for (let k = n - 1; k >= 0; k--) rest[k] = rest[k + 1]! + norm(donors[k]!);
  const current = new Array<number>(n).fill(0);
  let best = -1;
  let isDoubleRoot = false;
  let bestFound: number[] = vertices.map((_, i) => i);

  const descend = (
    k: number,
    used: number,
    steps: readonly PairingStep[] | null,
    h0: number,
    h1: number,
    h2: number,
    h3: number,
    h4: number,
    h5: number,
    h6: number,
    h7: number,
    h8: number,
  ): void => {
    if (k === n || (k > 2 && k < n - 1 && best > 0)) {
      const bound = best * BETTER - rest[k]!;
      const f = h0 * h0 + h1 * h1 + h2 * h2 + h3 * h3 + h4 * h4 + h5 * h5 + h6 * h6 + h7 * h7 + h8 * h8;
      const c0 = h4 * h8 - h5 * h7;
      const c1 = h5 * h6 - h3 * h8;
      const c2 = h3 * h7 - h4 * h6;
      const c3 = h2 * h7 - h1 * h8;
      const c4 = h0 * h8 - h2 * h6;
      const c5 = h1 * h6 - h0 * h7;
      const c6 = h1 * h5 - h2 * h4;
      const c7 = h2 * h3 - h0 * h5;
      const c8 = h0 * h4 - h1 * h3;
      const d = h0 * c0 + h1 * c1 + h2 * c2;
      const e = c0 * c0 + c1 * c1 + c2 * c2 + c3 * c3 + c4 * c4 + c5 * c5 + c6 * c6 + c7 * c7 + c8 * c8;
      if (bound > 0) {
        const square = bound * bound;
        const polynomial = square * (square - 2 * f) - 8 * d * bound + f * f - 4 * e;
        if (polynomial > 0 && bound * (square - f) - 2 * d > 0 && 3 * square > f) return;
      }
      if (k === n) {
        const overlap = largestRoot(f, d, e);
        if (overlap > best) {
          best = overlap;
          bestFound = [...current];
          isDoubleRoot = overlap * (overlap * overlap - f) - 2 * d < DOUBLE_ROOT * overlap ** 3;
        }
        return;
      }
    }
    const donor = donors[k]!;
    const x = donor[0];
    const y = donor[1];
    const z = donor[2];
    const choices = steps ?? every;
    for (let i = 0; i < choices.length; i++) {
      const step = choices[i]!;
      const bit = 1 << step.vertex;
      if (used & bit) continue;
      const point = vertices[step.vertex]!;
      const a = point[0];
      const b = point[1];
      const c = point[2];
      current[k] = step.vertex;
      descend(
        k + 1,
        used | bit,
        step.next,
        h0 + x * a,
        h1 + x * b,
        h2 + x * c,
        h3 + y * a,
        h4 + y * b,
        h5 + y * c,
        h6 + z * a,
        h7 + z * b,
        h8 + z * c,
      );
    }
  };

  // Moving both sets to their centroids (metal included) only shifts H by a constant.
  const shift = -1 / (n + 1);
  const [dx, dy, dz] = donorSum.map((component) => component * shift) as [number, number, number];
  const [px, py, pz] = idealSum;
  descend(0, 0, tree, dx * px, dx * py, dx * pz, dy * px, dy * py, dy * pz, dz * px, dz * py, dz * pz);
  if (!isDoubleRoot) return { pairing: bestFound, overlap: best };
  const paired = bestFound.map((vertex): Vector3 => vertices[vertex] ?? [0, 0, 0]);
  const { overlap } = optimalRotation(withMetal(donors, donorSum), withMetal(paired, idealSum));
  return { pairing: bestFound, overlap };
}

/** Newton's method from above: it comes down to the largest root without passing it. */
function largestRoot(f: number, d: number, e: number): number {
  let root = Math.sqrt(3 * f);
  for (let i = 0; i < 50; i++) {
    const square = root * root;
    const slope = 4 * (root * (square - f) - 2 * d);
    if (!(slope > 0)) break;
    const step = (square * (square - 2 * f) - 8 * d * root + f * f - 4 * e) / slope;
    if (!(step > root * 1e-14)) break;
    root -= step;
  }
  return root;
}
