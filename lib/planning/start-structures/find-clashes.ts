import { isMetal } from '../../chemistry/elements';
import type { BondedStructure } from './recipe';
import { norm, subtract } from './vector';

export interface Clash {
  atoms: readonly [number, number];
  distanceAngstrom: number;
}

/** Unbonded atoms closer than the sum of their covalent radii plus this are in each other's way. */
const roomAngstrom = 0.5;

/**
 * Pairs of atoms that stand too close, nearest first. Bonded pairs and pairs with a common neighbour
 * that is no metal are left out. The margin is a rule of thumb (H···H 1.1 Å, C···H 1.6 Å), meant to catch broken builds.
 * @param covalentRadiusAngstrom - per element; null when unknown (such atoms are not checked)
 */
export function findClashes(
  { structure, bonds }: BondedStructure,
  covalentRadiusAngstrom: (element: string) => number | null,
): Clash[] {
  const { elements, positionsAngstrom } = structure;
  const neighbours = elements.map(() => new Set<number>());
  for (const [a, b] of bonds) {
    neighbours[a]?.add(b);
    neighbours[b]?.add(a);
  }
  const radii = elements.map(covalentRadiusAngstrom);
  const clashes: Clash[] = [];
  positionsAngstrom.forEach((here, i) => {
    for (let j = 0; j < i; j++) {
      const there = positionsAngstrom[j];
      const [first, second] = [radii[i], radii[j]];
      if (!there || first === null || second === null || first === undefined || second === undefined)
        continue;
      const distanceAngstrom = norm(subtract(here, there));
      if (distanceAngstrom >= first + second + roomAngstrom) continue;
      const mine = neighbours[i] ?? new Set<number>();
      if (
        mine.has(j) ||
        [...mine].some((between) => neighbours[between]?.has(j) && !isMetal(elements[between] ?? ''))
      )
        continue;
      clashes.push({ atoms: [j, i], distanceAngstrom });
    }
  });
  return clashes.sort((a, b) => a.distanceAngstrom - b.distanceAngstrom);
}
