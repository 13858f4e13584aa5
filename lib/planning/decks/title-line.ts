import type { DeckRequest } from './deck-request';

/**
 * The one line that carries a job's key: key first, then the label, at most 72 characters. Only letters,
 * digits, blanks and . , + ( ) = stay: Gaussian forbids @ # ! - _ \ in titles, NWChem ends its title at a
 * quotation mark, "#" starts and ends a comment in ORCA and starts one in Psi4.
 */
export function titleLine({ jobKey, label, task, multiplicity }: DeckRequest): string {
  const words = `${label} m${multiplicity} ${task}`
    .replace(/[^A-Za-z0-9 .,+()=]/g, ' ')
    .replace(/\s+/g, ' ')
    .trim();
  return `${jobKey} ${words}`.slice(0, 72).trimEnd();
}
