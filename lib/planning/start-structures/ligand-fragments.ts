import { isMetal } from '../../chemistry/elements';
import type { BondedStructure } from './recipe';

/** A ligand of one centre: its atoms, its donors to that centre, and whether it binds another metal too. */
export interface LigandFragment {
  atoms: readonly number[];
  donors: readonly number[];
  bridging: boolean;
}

/** Ligands of a centre: what hangs together once all metal–ligand bonds are cut. */
export function ligandFragments({ structure, bonds }: BondedStructure, centre: number): LigandFragment[] {
  const neighbours = new Map<number, number[]>();
  for (const [a, b] of bonds) {
    neighbours.set(a, [...(neighbours.get(a) ?? []), b]);
    neighbours.set(b, [...(neighbours.get(b) ?? []), a]);
  }
  const metal = (index: number) => isMetal(structure.elements[index] ?? '');
  const donors = (neighbours.get(centre) ?? []).filter((index) => !metal(index));
  const seen = new Set<number>();
  const fragments: LigandFragment[] = [];
  for (const start of donors) {
    if (seen.has(start)) continue;
    const atoms: number[] = [];
    const queue = [start];
    seen.add(start);
    let bridging = false;
    for (let here = queue.pop(); here !== undefined; here = queue.pop()) {
      atoms.push(here);
      for (const next of neighbours.get(here) ?? []) {
        if (metal(next)) bridging ||= next !== centre;
        else if (!seen.has(next)) {
          seen.add(next);
          queue.push(next);
        }
      }
    }
    fragments.push({ atoms, donors: donors.filter((donor) => atoms.includes(donor)), bridging });
  }
  return fragments;
}
