import type { ShapeEntry } from './sphere-shapes';
import { continuousShapeMeasure } from './continuous-shape-measure';
import { requireIdealPolyhedron } from './ideal-polyhedra';

export interface InterconversionPath {
  from: string;
  to: string;
  /** Generalised coordinate: 0 % at `from`, 100 % at `to`. */
  coordinatePercent: number;
  /** How far off the shortest path the sphere lies; 0 % on it. */
  deviationPercent: number;
}

/** Pairs of ideal shapes (by id) whose minimal-distortion path is followed, per coordination number. */
const paths: Record<number, readonly [string, string]> = {
  4: ['SP-4', 'T-4'],
  5: ['TBPY-5', 'SPY-5/104.48'],
  6: ['OC-6', 'TPR-6'],
};

const spanOf = new Map<string, number>();

/** Angle between two ideal shapes, arcsin(√S/10), radians. */
function pathSpan(from: string, to: string): number {
  const key = `${from} ${to}`;
  let span = spanOf.get(key);
  if (span === undefined) {
    const shape = continuousShapeMeasure(requireIdealPolyhedron(from).vertices, requireIdealPolyhedron(to));
    span = shapeAngle(shape?.measure ?? 0);
    spanOf.set(key, span);
  }
  return span;
}

const shapeAngle = (measure: number) => Math.asin(Math.min(1, Math.sqrt(measure) / 10));

/**
 * Place of a sphere on the minimal-distortion path between two ideal shapes A and B. With the angles
 * a = arcsin(√S_A/10), b = arcsin(√S_B/10) and c the same between A and B: coordinate = 100 a/c, deviation =
 * 100 ((a + b)/c − 1), per cent.
 * @param shapes - the sphere's shape measures (metal included)
 * @returns null for coordination numbers without a path (only 4, 5 and 6 have one)
 * Source: D. Casanova, J. Cirera, M. Llunell, P. Alemany, D. Avnir, S. Alvarez, J. Am. Chem. Soc. 2004, 126,
 * 1755. Checked against: tests/published/geometry.test.ts.
 */
export function interconversionPath(
  coordinationNumber: number,
  shapes: readonly ShapeEntry[],
): InterconversionPath | null {
  const ends = paths[coordinationNumber];
  const from = shapes.find((shape) => shape.id === ends?.[0]);
  const to = shapes.find((shape) => shape.id === ends?.[1]);
  if (!from || !to) return null;
  const span = pathSpan(from.id, to.id);
  const [a, b] = [shapeAngle(from.measure), shapeAngle(to.measure)];
  return {
    from: from.id,
    to: to.id,
    coordinatePercent: (100 * a) / span,
    deviationPercent: 100 * ((a + b) / span - 1),
  };
}
