import { cite } from './cite';
import type { Line } from './landmark';
import type { Evidence, Population } from './record';

type Holder = { populations: Population[]; evidence: Evidence };

/** Puts a table of populations in the place of an earlier one of the same scheme. */
export function setPopulation(holder: Holder, population: Population, firstRow: Line): void {
  const at = holder.populations.findIndex(({ scheme }) => scheme === population.scheme);
  if (at < 0) holder.populations.push(population);
  else holder.populations[at] = population;
  cite(holder, `populations.${population.scheme}`, firstRow);
}

/** Adds the spin column that is printed in a table of its own; false when the tables do not fit together. */
export function addSpins(
  holder: Holder,
  scheme: Population['scheme'],
  spins: readonly { element: string; spin: number | null }[],
  firstRow: Line,
): boolean {
  const population = holder.populations.find((candidate) => candidate.scheme === scheme);
  if (
    !population ||
    population.atoms.length !== spins.length ||
    population.atoms.some((atom, i) => atom.element !== spins[i]?.element)
  )
    return false;
  population.atoms = population.atoms.map((atom, i) => ({ ...atom, spin: spins[i]?.spin ?? null }));
  cite(holder, `populations.${scheme}.spin`, firstRow);
  return true;
}
