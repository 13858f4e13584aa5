import type { BondGraph } from '../chemistry/bonds';
import { centroid, subtract } from '../chemistry/linear-algebra';
import type { Structure, Vector3 } from '../chemistry/structure';
import type { CoordinationSphere } from './coordination-sphere';

/** One place in a sphere: a donor atom, or the middle of a π-bound group. */
export interface CoordinationSite {
  /** Atom indices; one for a donor atom, two or more for a π-bound group. */
  atoms: number[];
  /** η: how many contiguous atoms bind. 1 for a donor atom. */
  hapticity: number;
  /** Position relative to the metal, Å. */
  offsetAngstrom: Vector3;
}

/**
 * Sites of a sphere, in the order of their nearest donor. Donors bonded to each other, at least one of them
 * carbon or boron, are one π-bound group (η² alkene, η⁵ cyclopentadienyl) and take one site at their centroid;
 * bonded donors without carbon (peroxide, hydrazine) keep a site each. Common practice.
 */
export function coordinationSites(
  structure: Structure,
  graph: BondGraph,
  sphere: CoordinationSphere,
): CoordinationSite[] {
  const donorIndices = new Set(sphere.donors.map((donor) => donor.index));
  const metal = structure.positionsAngstrom[sphere.index] ?? [0, 0, 0];
  const seen = new Set<number>();
  const sites: CoordinationSite[] = [];
  for (const { index } of sphere.donors) {
    if (seen.has(index)) continue;
    const group = [index];
    seen.add(index);
    for (const atom of group) {
      for (const neighbour of graph.neighbours[atom] ?? []) {
        if (!donorIndices.has(neighbour) || seen.has(neighbour)) continue;
        seen.add(neighbour);
        group.push(neighbour);
      }
    }
    const isPi =
      group.length > 1 && group.some((atom) => ['C', 'B'].includes(structure.elements[atom] ?? ''));
    const members = isPi ? [group] : group.map((atom) => [atom]);
    for (const atoms of members) {
      const points = atoms.map((atom): Vector3 => structure.positionsAngstrom[atom] ?? metal);
      sites.push({ atoms, hapticity: atoms.length, offsetAngstrom: subtract(centroid(points), metal) });
    }
  }
  return sites;
}
