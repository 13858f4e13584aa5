import { findJobKey } from '../job-key-pattern';
import type { Line } from '../landmark';
import { readInteger, words } from '../numbers';
import { isBasis, isDispersion, isFunctional, isRelativity, isSolvation } from './keywords';

export interface Cited<Value> {
  value: Value;
  line: Line;
}

/** What the echoed input of one job says. */
export interface Deck {
  functional: Cited<string> | null;
  hartreeFock: Cited<string> | null;
  basis: Cited<string> | null;
  dispersion: Cited<string> | null;
  solvation: Cited<string> | null;
  relativity: Cited<string> | null;
  charge: Cited<number> | null;
  multiplicity: Cited<number> | null;
  cores: Cited<number> | null;
  title: Cited<string> | null;
  jobKey: Cited<string> | null;
  transitionState: boolean;
  /** All words of the keyword lines, in capitals. */
  keywords: Set<string>;
}

export function emptyDeck(): Deck {
  return {
    functional: null,
    hartreeFock: null,
    basis: null,
    dispersion: null,
    solvation: null,
    relativity: null,
    charge: null,
    multiplicity: null,
    cores: null,
    title: null,
    jobKey: null,
    transitionState: false,
    keywords: new Set(),
  };
}

function readKeyword(deck: Deck, keyword: string, line: Line): void {
  deck.keywords.add(keyword.toUpperCase());
  const cited = { value: keyword, line };
  if (isFunctional(keyword)) deck.functional = cited;
  else if (/^(?:hf|uhf|rhf|rohf|hf-3c)$/i.test(keyword)) deck.hartreeFock = cited;
  else if (isDispersion(keyword)) deck.dispersion = cited;
  else if (isSolvation(keyword)) deck.solvation = cited;
  else if (isRelativity(keyword)) deck.relativity = cited;
  else if (isBasis(keyword)) deck.basis ??= cited;
  else if (/^optts$|^scants$|^neb-ts$|^tsopt$/i.test(keyword)) deck.transitionState = true;
  const parallel = /^pal(\d{1,3})$/i.exec(keyword);
  const cores = readInteger(parallel?.[1]);
  if (cores !== null) deck.cores = { value: cores, line };
}

/**
 * One line of the echoed input, without its "|  1>". Keywords stand in lines with an exclamation mark, in any
 * case; what follows "#" is a comment and may contradict them.
 */
export function readDeckLine(deck: Deck, input: string, line: Line): void {
  const jobKey = findJobKey(input);
  if (jobKey !== null) deck.jobKey = { value: jobKey, line };
  const hash = input.indexOf('#');
  const text = (hash < 0 ? input : input.slice(0, hash)).trim();
  if (text === '') {
    const comment = input.slice(hash + 1).trim();
    // The only title that an input has is a comment above its keywords.
    if (hash >= 0 && comment !== '' && deck.keywords.size === 0)
      deck.title ??= { value: comment.slice(0, 200), line };
    return;
  }
  if (text.startsWith('!')) {
    for (const keyword of words(text.slice(1))) readKeyword(deck, keyword, line);
    return;
  }
  readSetting(deck, words(text), line);
}

function readSetting(deck: Deck, row: string[], line: Line): void {
  const lower = row.map((word) => word.toLowerCase());
  const following = (name: string) => {
    const at = lower.indexOf(name);
    return at < 0 ? undefined : row[at + 1]?.replaceAll('"', '');
  };
  const cores = readInteger(following('nprocs'));
  if (cores !== null) deck.cores = { value: cores, line };
  const functional = following('functional');
  if (functional !== undefined) deck.functional = { value: functional, line };
  if (following('smd')?.toLowerCase() === 'true') deck.solvation = { value: 'SMD', line };
  const solvent = following('smdsolvent');
  if (solvent !== undefined) deck.solvation = { value: `SMD(${solvent})`, line };
  // * xyz 0 2   /   *xyzfile 0 2 start.xyz   /   * int 0 1
  const star =
    lower[0] === '*'
      ? row.slice(1)
      : lower[0]?.startsWith('*')
        ? [row[0]?.slice(1) ?? '', ...row.slice(1)]
        : null;
  if (star && /^(?:xyz|xyzfile|int|internal|gzmt|gzmtfile|pdbfile)$/i.test(star[0] ?? '')) {
    readCharge(deck, star[1], line);
    readMultiplicity(deck, star[2], line);
  }
  if (lower[0] === 'charge') readCharge(deck, row.at(-1), line);
  if (lower[0] === 'mult') readMultiplicity(deck, row.at(-1), line);
}

function readCharge(deck: Deck, text: string | undefined, line: Line): void {
  const value = readInteger(text);
  if (value !== null) deck.charge = { value, line };
}

function readMultiplicity(deck: Deck, text: string | undefined, line: Line): void {
  const value = readInteger(text);
  if (value !== null && value > 0) deck.multiplicity = { value, line };
}
