import { findBonds } from '../chemistry/bonds';
import { hillFormula } from '../chemistry/formula';
import { isMetal } from '../chemistry/elements';
import { cross, distance, norm, subtract } from '../chemistry/linear-algebra';
import type { Structure, Vector3 } from '../chemistry/structure';
import { err, ok, type Result } from '../result';
import { assignment } from './assignment';
import { atomClasses } from './atom-classes';
import { place, type Superposition, superposition } from './superposition';

export interface AtomMatch extends Superposition {
  /** `partner[i]`: the atom of the moving structure that stands for atom i of the fixed one. */
  partner: number[];
  /** Whether like atoms were told by their bonds, or, when the bonds differ, by element alone. */
  likeBy: 'bonds' | 'element';
}

export interface MatchProblem {
  code: 'different composition' | 'no atoms';
  message: string;
}

/** Starting positions tried in full, out of all triples of like atoms; those with the best distances first. */
const MOST_STARTS = 300;
/** Triples weighed at all; enough for 60 like atoms. */
const MOST_TRIPLES = 250_000;
/** Classes above this size are paired nearest first instead of by the exact assignment. */
const LARGEST_EXACT_CLASS = 60;
const MOST_REFINEMENTS = 12;

/**
 * Lays a structure onto another of the same composition, whatever the order of their atoms and whichever of
 * several equivalent atoms stands where. Three anchor atoms of rare kinds are tried against all like triples;
 * each start is refined by turns (pair like atoms by least squared distance, superpose) until the pairing
 * stands. The best result is returned; the search is thorough for single complexes, not proven optimal for
 * large flexible molecules. Mirror images are never formed.
 * @returns pairing, rotation, translation and RMSD (Å)
 */
export function matchAtoms(fixed: Structure, moving: Structure): Result<AtomMatch, MatchProblem> {
  if (fixed.elements.length === 0)
    return err({ code: 'no atoms', message: 'There are no atoms to superpose.' });
  const [formula, other] = [hillFormula(fixed.elements), hillFormula(moving.elements)];
  if (formula !== other) {
    return err({ code: 'different composition', message: `${formula} and ${other} cannot be superposed.` });
  }
  const classes = atomClasses(
    { elements: fixed.elements, graph: findBonds(fixed) },
    { elements: moving.elements, graph: findBonds(moving) },
  );
  const sameBonds = [...classes[0]].sort().join() === [...classes[1]].sort().join();
  const names: [readonly string[], readonly string[]] = sameBonds
    ? classes
    : [fixed.elements, moving.elements];
  const members = [groupBy(names[0]), groupBy(names[1])] as const;

  let best: AtomMatch | null = null;
  for (const start of startingPairs(fixed, moving, names[0], members)) {
    const anchored = superposition(
      start.map(([i]) => positionOf(fixed, i)),
      start.map(([, j]) => positionOf(moving, j)),
    );
    const refined = refine(fixed, moving, members, anchored);
    if (best === null || refined.rmsdAngstrom < best.rmsdAngstrom) {
      best = { ...refined, likeBy: sameBonds ? 'bonds' : 'element' };
    }
    if (best.rmsdAngstrom < 1e-6) break;
  }
  if (best === null) throw new Error('no starting position for the superposition');
  return ok(best);
}

type Groups = ReadonlyMap<string, readonly number[]>;

const positionOf = (structure: Structure, i: number): Vector3 => structure.positionsAngstrom[i] ?? [0, 0, 0];

function groupBy(names: readonly string[]): Groups {
  const groups = new Map<string, number[]>();
  names.forEach((name, i) => {
    const group = groups.get(name);
    if (group) group.push(i);
    else groups.set(name, [i]);
  });
  return groups;
}

/** Pairs (fixed, moving) of up to three anchors for every start, the most alike first. */
function startingPairs(
  fixed: Structure,
  moving: Structure,
  names: readonly string[],
  [fixedGroups, movingGroups]: readonly [Groups, Groups],
): [number, number][][] {
  const anchors = chooseAnchors(fixed, names, fixedGroups);
  const candidates = anchors.map((anchor) => movingGroups.get(names[anchor] ?? '') ?? []);
  const gap = (structure: Structure, i: number, j: number) =>
    distance(positionOf(structure, i), positionOf(structure, j));
  const starts: { pairs: [number, number][]; mismatch: number }[] = [];
  const extend = (pairs: [number, number][], mismatch: number) => {
    if (starts.length >= MOST_TRIPLES) return;
    const k = pairs.length;
    const anchor = anchors[k];
    if (anchor === undefined) {
      starts.push({ pairs, mismatch });
      return;
    }
    for (const candidate of candidates[k] ?? []) {
      if (pairs.some(([, taken]) => taken === candidate)) continue;
      let added = mismatch;
      for (const [i, j] of pairs) added += Math.abs(gap(fixed, i, anchor) - gap(moving, j, candidate));
      extend([...pairs, [anchor, candidate]], added);
    }
  };
  extend([], 0);
  starts.sort((a, b) => a.mismatch - b.mismatch);
  return starts.slice(0, MOST_STARTS).map((start) => start.pairs);
}

/** Up to three atoms of rare kinds, metals first, that span a plane. */
function chooseAnchors(structure: Structure, names: readonly string[], groups: Groups): number[] {
  const rank = (i: number) => {
    const element = structure.elements[i] ?? '';
    return (
      (groups.get(names[i] ?? '')?.length ?? 1) + (element === 'H' ? 1000 : 0) - (isMetal(element) ? 0.5 : 0)
    );
  };
  const order = structure.elements.map((_, i) => i).sort((i, j) => rank(i) - rank(j) || i - j);
  const anchors: number[] = [];
  for (const i of order) {
    const [first, second] = anchors.map((anchor) => positionOf(structure, anchor));
    const here = positionOf(structure, i);
    if (!first) anchors.push(i);
    else if (!second) {
      if (distance(first, here) > 0.5) anchors.push(i);
    } else if (norm(cross(subtract(second, first), subtract(here, first))) > 0.5) {
      anchors.push(i);
      break;
    }
  }
  return anchors;
}

function refine(
  fixed: Structure,
  moving: Structure,
  members: readonly [Groups, Groups],
  start: Superposition,
): Superposition & { partner: number[] } {
  let placed = start;
  let partner: number[] = [];
  for (let turn = 0; turn < MOST_REFINEMENTS; turn++) {
    const next = pairUp(fixed, moving, members, placed);
    if (partner.length > 0 && next.every((j, i) => j === partner[i])) break;
    partner = next;
    placed = superposition(
      fixed.positionsAngstrom,
      partner.map((j) => positionOf(moving, j)),
    );
  }
  return { ...placed, partner };
}

function pairUp(
  fixed: Structure,
  moving: Structure,
  [fixedGroups, movingGroups]: readonly [Groups, Groups],
  placed: Superposition,
): number[] {
  const partner = new Array<number>(fixed.elements.length).fill(0);
  for (const [name, rows] of fixedGroups) {
    const columns = movingGroups.get(name) ?? [];
    const targets = columns.map((j) => place(placed, positionOf(moving, j)));
    const squares = rows.map((i) => targets.map((target) => distance(positionOf(fixed, i), target) ** 2));
    const columnOf = rows.length <= LARGEST_EXACT_CLASS ? assignment(squares) : nearestFirst(squares);
    rows.forEach((i, row) => {
      partner[i] = columns[columnOf[row] ?? 0] ?? 0;
    });
  }
  return partner;
}

function nearestFirst(squares: readonly (readonly number[])[]): number[] {
  const free = new Set(squares.map((_, i) => i));
  return squares.map((row) => {
    let nearest = -1;
    for (const column of free) if (nearest < 0 || (row[column] ?? 0) < (row[nearest] ?? 0)) nearest = column;
    free.delete(nearest);
    return nearest;
  });
}
