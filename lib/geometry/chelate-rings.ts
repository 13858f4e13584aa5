import { type BondGraph, shortestPath } from '../chemistry/bonds';
import { angleDegrees, cross, subtract } from '../chemistry/linear-algebra';
import type { Structure } from '../chemistry/structure';
import type { CoordinationSphere } from './coordination-sphere';

export interface ChelateRing {
  /** Atom indices of the two donors. */
  donors: [number, number];
  biteAngleDegrees: number;
  /** Atoms in the ring, the metal counted: 5 for ethylenediamine. */
  ringSize: number;
}

/** Larger rings are no chelates in the usual sense (the longest common ones have eight members). Common practice. */
const LARGEST_RING = 8;

/**
 * Chelate rings of a sphere: pairs of donors joined by a way through the ligand that passes no metal and no
 * other donor of the centre.
 */
export function chelateRings(
  structure: Structure,
  graph: BondGraph,
  sphere: CoordinationSphere,
): ChelateRing[] {
  const { donors, index: metal } = sphere;
  const { positionsAngstrom } = structure;
  const isBarred = (atom: number) => graph.metals[atom] ?? false;
  const donorIndices = new Set(donors.map((donor) => donor.index));
  const metalAt = positionsAngstrom[metal] ?? [0, 0, 0];
  const offset = (atom: number) => subtract(positionsAngstrom[atom] ?? metalAt, metalAt);
  const rings: ChelateRing[] = [];
  donors.forEach(({ index: first }, i) => {
    // A donor bonded to no atom but metals cannot belong to a ring; this spares most of the searches.
    if ((graph.neighbours[first] ?? []).every(isBarred)) return;
    for (const { index: second } of donors.slice(i + 1)) {
      const avoid = (atom: number) => donorIndices.has(atom) || isBarred(atom);
      const path = shortestPath(graph.neighbours, first, second, avoid, LARGEST_RING - 1);
      if (!path || path.length < 3) continue;
      const biteAngleDegrees = angleDegrees(offset(first), offset(second));
      rings.push({ donors: [first, second], biteAngleDegrees, ringSize: path.length + 1 });
    }
  });
  return rings;
}

/**
 * Dihedral angle between the two chelate planes (metal and two donors each) of a bis-chelate.
 * @returns 0 to 90 degrees; null unless the sphere has exactly two chelate rings without a common donor
 */
export function chelatePlaneAngleDegrees(
  structure: Structure,
  metal: number,
  rings: readonly ChelateRing[],
): number | null {
  const [first, second] = rings;
  if (rings.length !== 2 || !first || !second) return null;
  if (new Set([...first.donors, ...second.donors]).size !== 4) return null;
  const metalAt = structure.positionsAngstrom[metal] ?? [0, 0, 0];
  const normals = [first, second].map((ring) => {
    const [a, b] = ring.donors.map((atom) => subtract(structure.positionsAngstrom[atom] ?? metalAt, metalAt));
    return cross(a ?? [0, 0, 0], b ?? [0, 0, 0]);
  });
  const angle = angleDegrees(normals[0] ?? [0, 0, 0], normals[1] ?? [0, 0, 0]);
  return Math.min(angle, 180 - angle);
}
