import { type BondGraph, shortestPath } from '../chemistry/bonds';

/** Larger rings are not looked for: macrocycles are found by their chelate rings. */
const LARGEST_RING = 12;

/**
 * The smallest ring through each bond between non-metals, without repeats, by size: the aromatic and aliphatic
 * rings of the ligands. Rings through a metal are chelate rings (lib/geometry/chelate-rings.ts).
 * @returns rings as atom indices in order round the ring; sizes 3 to 12
 */
export function ligandRings(graph: BondGraph): number[][] {
  const found = new Map<string, number[]>();
  const isMetalAtom = (atom: number) => graph.metals[atom] ?? false;
  for (const { first, second } of graph.bonds) {
    if (isMetalAtom(first) || isMetalAtom(second)) continue;
    // The way back must not use the bond itself, so the search starts from each other neighbour.
    const ring = (graph.neighbours[first] ?? [])
      .filter((start) => start !== second && !isMetalAtom(start))
      .map((start) =>
        shortestPath(
          graph.neighbours,
          start,
          second,
          (atom) => atom === first || isMetalAtom(atom),
          LARGEST_RING - 1,
        ),
      )
      .filter((path) => path !== null)
      .sort((a, b) => a.length - b.length)[0];
    if (!ring) continue;
    const atoms = [first, ...ring];
    found.set([...atoms].sort((a, b) => a - b).join(), atoms);
  }
  return [...found.values()].sort((a, b) => a.length - b.length);
}
