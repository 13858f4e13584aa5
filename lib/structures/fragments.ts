import type { BondGraph } from '../chemistry/bonds';

/** Sets of atoms held together by bonds, each ascending, the set with the lowest atom first. */
export function fragments(graph: BondGraph): number[][] {
  const seen = new Set<number>();
  const found: number[][] = [];
  graph.neighbours.forEach((_, start) => {
    if (seen.has(start)) return;
    const atoms = [start];
    seen.add(start);
    for (const atom of atoms) {
      for (const neighbour of graph.neighbours[atom] ?? []) {
        if (seen.has(neighbour)) continue;
        seen.add(neighbour);
        atoms.push(neighbour);
      }
    }
    found.push(atoms.sort((a, b) => a - b));
  });
  return found;
}
