import { covalentRadiusAngstrom } from './covalent-radii';
import { isMetal } from './elements';
import { forEachNeighbourPair } from './neighbour-pairs';
import type { Structure } from './structure';

/** What a pair may exceed the sum of covalent radii by and still count as bonded. Common practice: 0.3 to 0.45 Å. */
export const BOND_TOLERANCE_ANGSTROM = 0.3;
export const METAL_BOND_TOLERANCE_ANGSTROM = 0.45;
/** Closer than this, two nuclei are the same atom written twice, not a bond. */
export const COINCIDENCE_ANGSTROM = 0.4;

export interface Bond {
  first: number;
  second: number;
  distanceAngstrom: number;
}

export interface BondGraph {
  bonds: Bond[];
  /** `neighbours[i]`: indices of the atoms bonded to atom i. */
  neighbours: number[][];
  /** `metals[i]`: whether atom i is a metal. */
  metals: boolean[];
}

/**
 * Bonds of a structure by covalent radii (Cordero 2008): distance ≤ sum of the radii + 0.30 Å, or + 0.45 Å
 * when one atom is a metal. Mn, Fe and Co count with their larger, high-spin radius against non-metals
 * (a bond must not vanish for want of a spin state) and with the smaller one between metals. Atoms
 * closer than 0.4 Å are not bonded to each other. Elements without a radius (beyond Cm) form no bonds.
 */
export function findBonds(structure: Structure): BondGraph {
  const { elements, positionsAngstrom } = structure;
  const kinds = new Map<string, { metal: boolean; small: number; large: number }>();
  for (const element of elements) {
    if (kinds.has(element)) continue;
    const small = covalentRadiusAngstrom(element, 'low');
    const large = covalentRadiusAngstrom(element, 'high');
    if (small !== null && large !== null) kinds.set(element, { metal: isMetal(element), small, large });
  }
  const largest = Math.max(0.5, ...[...kinds.values()].map((kind) => kind.large));
  const bonds: Bond[] = [];
  const neighbours: number[][] = elements.map(() => []);
  const cutoff = 2 * largest + METAL_BOND_TOLERANCE_ANGSTROM;
  forEachNeighbourPair(positionsAngstrom, cutoff, (first, second, distanceAngstrom) => {
    const a = kinds.get(elements[first] ?? '');
    const b = kinds.get(elements[second] ?? '');
    if (!a || !b || distanceAngstrom < COINCIDENCE_ANGSTROM) return;
    const radii = a.metal && b.metal ? a.small + b.small : a.large + b.large;
    const tolerance = a.metal || b.metal ? METAL_BOND_TOLERANCE_ANGSTROM : BOND_TOLERANCE_ANGSTROM;
    if (distanceAngstrom > radii + tolerance) return;
    bonds.push({ first, second, distanceAngstrom });
    neighbours[first]?.push(second);
    neighbours[second]?.push(first);
  });
  const metalKinds = new Map([...new Set(elements)].map((element) => [element, isMetal(element)]));
  const metals = elements.map((element) => metalKinds.get(element) ?? false);
  return { bonds, neighbours, metals };
}

/**
 * Shortest way along bonds between two atoms.
 * @param avoid - whether the way must not pass an atom; not asked of the two ends
 * @param longest - give up beyond this many atoms, both ends counted
 * @returns atom indices from `start` to `end`; null when there is no such way
 */
export function shortestPath(
  neighbours: readonly (readonly number[])[],
  start: number,
  end: number,
  avoid: (atom: number) => boolean,
  longest: number,
): number[] | null {
  const cameFrom = new Map<number, number>([[start, start]]);
  let frontier = [start];
  for (let length = 2; length <= longest && frontier.length > 0; length++) {
    const next: number[] = [];
    for (const atom of frontier) {
      for (const neighbour of neighbours[atom] ?? []) {
        if (cameFrom.has(neighbour) || (neighbour !== end && avoid(neighbour))) continue;
        cameFrom.set(neighbour, atom);
        if (neighbour !== end) {
          next.push(neighbour);
          continue;
        }
        const path = [end];
        for (let at = end; at !== start; ) {
          at = cameFrom.get(at) ?? start;
          path.unshift(at);
        }
        return path;
      }
    }
    frontier = next;
  }
  return null;
}
