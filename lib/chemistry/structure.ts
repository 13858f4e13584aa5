/** A point or vector in space, Å unless the name says otherwise. */
export type Vector3 = readonly [number, number, number];

/**
 * A set of atoms with positions: the shape that readers return and that structures, geometry,
 * planning and comparison share. `elements[i]` (IUPAC case) stands at `positionsAngstrom[i]`.
 */
export interface Structure {
  elements: readonly string[];
  positionsAngstrom: readonly Vector3[];
}
