import { isMetal } from '../chemistry/elements';
import { cite } from './cite';
import type { Line } from './landmark';
import type { Evidence, Population } from './record';

type Holder = { populations: Population[]; evidence: Evidence };

/**
 * Keeps lines of a table as evidence: the first row under `populations.<scheme>`, and the row of atom i under
 * `populations.<scheme>.<i>` for the first atom and for metals, whose values are looked up most.
 */
function citeRows(
  holder: Holder,
  scheme: Population['scheme'],
  rows: readonly { element: string }[],
  lines: readonly Line[],
  suffix = '',
): void {
  const [first] = lines;
  if (first) cite(holder, `populations.${scheme}${suffix}`, first);
  for (const [i, line] of lines.entries())
    if (i === 0 || isMetal(rows[i]?.element ?? '')) cite(holder, `populations.${scheme}.${i}${suffix}`, line);
}

/**
 * Puts a table of populations in the place of an earlier one of the same scheme.
 * @param lines - the lines of its rows, one per atom
 */
export function setPopulation(holder: Holder, population: Population, lines: readonly Line[]): void {
  const at = holder.populations.findIndex(({ scheme }) => scheme === population.scheme);
  if (at < 0) holder.populations.push(population);
  else holder.populations[at] = population;
  citeRows(holder, population.scheme, population.atoms, lines);
}

/** Adds the spin column that is printed in a table of its own; false when the tables do not fit together. */
export function addSpins(
  holder: Holder,
  scheme: Population['scheme'],
  spins: readonly { element: string; spin: number | null }[],
  lines: readonly Line[],
): boolean {
  const population = holder.populations.find((candidate) => candidate.scheme === scheme);
  if (
    !population ||
    population.atoms.length !== spins.length ||
    population.atoms.some((atom, i) => atom.element !== spins[i]?.element)
  )
    return false;
  population.atoms = population.atoms.map((atom, i) => ({ ...atom, spin: spins[i]?.spin ?? null }));
  citeRows(holder, scheme, spins, lines, '.spin');
  return true;
}
