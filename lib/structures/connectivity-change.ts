import { findBonds } from '../chemistry/bonds';
import type { Structure } from '../chemistry/structure';
import { err, ok, type Result } from '../result';
import { fragments } from './fragments';

export interface ConnectivityChange {
  /** Bonds (pairs of atom indices, smaller first) of the end that the start has not, and the reverse. */
  formed: [number, number][];
  broken: [number, number][];
  /** Fragments of the end without a metal that hung on a metal at the start: ligands that came off. */
  dissociated: number[][];
  /** Fragments of the start without a metal that hang on a metal at the end. */
  associated: number[][];
}

export interface ConnectivityProblem {
  code: 'different atoms';
  message: string;
}

/**
 * What an optimisation did to the bonds of a structure. Bonds by covalent radii (`findBonds`), so a bond near
 * the limit may come or go with a small move: read it together with the distances.
 * @param start, end - the same atoms in the same order
 */
export function connectivityChange(
  start: Structure,
  end: Structure,
): Result<ConnectivityChange, ConnectivityProblem> {
  const same =
    start.elements.length === end.elements.length && start.elements.every((e, i) => e === end.elements[i]);
  if (!same) {
    return err({
      code: 'different atoms',
      message: 'Start and end must hold the same atoms in the same order; superpose them by matching first.',
    });
  }
  const [before, after] = [findBonds(start), findBonds(end)];
  const keysOf = (graph: typeof before) =>
    new Map(
      graph.bonds.map(({ first, second }): [string, [number, number]] => {
        const pair: [number, number] = [Math.min(first, second), Math.max(first, second)];
        return [pair.join(), pair];
      }),
    );
  const [bondsBefore, bondsAfter] = [keysOf(before), keysOf(after)];
  const boundToMetal = (graph: typeof before) =>
    new Set(
      fragments(graph)
        .filter((atoms) => atoms.some((atom) => graph.metals[atom]))
        .flat(),
    );
  const [boundBefore, boundAfter] = [boundToMetal(before), boundToMetal(after)];
  const freed = (graph: typeof before, bound: ReadonlySet<number>, boundElsewhere: ReadonlySet<number>) =>
    fragments(graph).filter((atoms) => atoms.every((atom) => !bound.has(atom) && boundElsewhere.has(atom)));
  return ok({
    formed: [...bondsAfter].filter(([key]) => !bondsBefore.has(key)).map(([, pair]) => pair),
    broken: [...bondsBefore].filter(([key]) => !bondsAfter.has(key)).map(([, pair]) => pair),
    dissociated: freed(after, boundAfter, boundBefore),
    associated: freed(before, boundBefore, boundAfter),
  });
}
