import type { Vector3 } from '../chemistry/structure';
import { continuousShapeMeasure } from './continuous-shape-measure';
import { idealPolyhedraFor } from './ideal-polyhedra';

export interface ShapeEntry {
  /** Symbol with the angle where one symbol covers several shapes: "SPY-5/104.48". */
  id: string;
  /** IUPAC polyhedral symbol. */
  symbol: string;
  /** The choice behind the reference shape, or null when the symbol leaves none. */
  variant: string | null;
  measure: number;
}

/**
 * Continuous shape measures of a sphere against every ideal polyhedron of its coordination number,
 * ascending, so that the first is the nearest.
 * @param donors - relative to the metal
 * @returns [] outside coordination numbers 2 to 9
 */
export function sphereShapes(donors: readonly Vector3[]): ShapeEntry[] {
  const shapes: ShapeEntry[] = [];
  for (const ideal of idealPolyhedraFor(donors.length)) {
    const shape = continuousShapeMeasure(donors, ideal);
    if (shape === null) return [];
    shapes.push({ id: ideal.id, symbol: ideal.symbol, variant: ideal.variant, measure: shape.measure });
  }
  return shapes.sort((a, b) => a.measure - b.measure);
}
