import { err, ok, type Result } from '../result';
import { atomicMass } from './atomic-masses';
import { elementSymbol } from './elements';
import { ligandAbbreviations } from './ligand-abbreviations';
import { splitFormulaCharge } from './split-formula-charge';

/** One part of a formula between addition dots: the complex, a solvate, a hydrate. */
export interface FormulaPart {
  text: string;
  /** Number in front of the part ("·1.5 H2O" → 1.5) */
  multiplier: number;
  /** Atoms of one such part, by element symbol; may be fractional */
  composition: Readonly<Record<string, number>>;
}

export interface ParsedFormula {
  composition: Readonly<Record<string, number>>;
  charge: number;
  molarMassGramPerMole: number;
  parts: readonly FormulaPart[];
}

export interface FormulaError {
  code: 'empty' | 'unknown symbol' | 'bracket' | 'count' | 'charge' | 'no mass';
  message: string;
  /** 0-based place in the text after spaces are removed */
  position: number;
}

type Counts = Map<string, number>;
interface Species {
  counts: Counts;
  charge: number;
}

const closing: Record<string, string> = { '(': ')', '[': ']', '{': '}' };
const abbreviations = Object.keys(ligandAbbreviations).sort((a, b) => b.length - a.length);

function addTo(total: Counts, more: Counts, times: number): void {
  for (const [element, count] of more) total.set(element, (total.get(element) ?? 0) + count * times);
}

/** Place of the bracket that closes the one at `start`, or −1. */
function matchingBracket(text: string, start: number): number {
  const stack: string[] = [];
  for (let i = start; i < text.length; i += 1) {
    const c = text[i] ?? '';
    if (closing[c]) stack.push(closing[c]);
    else if (')]}'.includes(c)) {
      if (stack.pop() !== c) return -1;
      if (stack.length === 0) return i;
    }
  }
  return -1;
}

/** An abbreviation or element at the start of the text, longest first. */
function readSymbol(text: string): { length: number; counts: Counts } | null {
  const short = abbreviations.find((name) => text.startsWith(name));
  const two = /^[A-Z][a-z]/.exec(text)?.[0];
  const element = (two && elementSymbol(two)) ?? (/^[A-Z]/.test(text) ? elementSymbol(text[0] ?? '') : null);
  if (short && short.length >= (element?.length ?? 0)) {
    const parsed = parseSpecies(ligandAbbreviations[short] ?? '', 0);
    return parsed.ok ? { length: short.length, counts: parsed.value.counts } : null;
  }
  return element ? { length: element.length, counts: new Map([[element, 1]]) } : null;
}

function parseSpecies(text: string, offset: number): Result<Species, FormulaError> {
  const split = splitFormulaCharge(text);
  const body = split.body;
  const counts: Counts = new Map();
  let charge = 0;
  let at = 0;
  while (at < body.length) {
    const c = body[at] ?? '';
    let counted: Counts;
    let innerCharge = 0;
    const start = at;
    if (closing[c]) {
      const end = matchingBracket(body, at);
      if (end < 0)
        return err({ code: 'bracket', message: `The bracket "${c}" is not closed.`, position: offset + at });
      const inner = parseSpecies(body.slice(at + 1, end), offset + at + 1);
      if (!inner.ok) return inner;
      counted = inner.value.counts;
      innerCharge = inner.value.charge;
      at = end + 1;
    } else {
      const symbol = readSymbol(body.slice(at));
      if (!symbol) {
        const code = ')]}'.includes(c) ? 'bracket' : /\d/.test(c) ? 'count' : 'unknown symbol';
        const what =
          code === 'bracket'
            ? `The bracket "${c}" was never opened.`
            : `"${body.slice(at, at + 3)}" is no element and no known abbreviation.`;
        return err({ code, message: what, position: offset + at });
      }
      counted = symbol.counts;
      at += symbol.length;
    }
    const digits = /^\d+(?:\.\d+)?/.exec(body.slice(at))?.[0] ?? '';
    at += digits.length;
    const times = digits === '' ? 1 : Number(digits);
    if (times === 0)
      return err({ code: 'count', message: 'A count of zero is not allowed.', position: offset + start });
    addTo(counts, counted, times);
    charge += innerCharge * times;
  }
  if (counts.size === 0)
    return err({ code: 'empty', message: 'There is no element here.', position: offset });
  return ok({ counts, charge: split.charge ?? charge });
}

/**
 * Parts of a formula between addition dots. A full stop between digits is a decimal point after a lone 0 or in the
 * number that opens a part, and an addition dot elsewhere (CuSO4.5H2O).
 */
function splitParts(text: string): { text: string; offset: number }[] {
  const parts: { text: string; offset: number }[] = [];
  let start = 0;
  let depth = 0;
  for (let i = 0; i < text.length; i += 1) {
    const c = text[i] ?? '';
    if (closing[c]) depth += 1;
    if (')]}'.includes(c)) depth -= 1;
    const before = text.slice(start, i);
    const isDecimal =
      c === '.' && /\d/.test(text[i + 1] ?? '') && (/^\d+$/.test(before) || /(^|\D)0$/.test(before));
    if ((c === '·' || c === '*' || (c === '.' && !isDecimal)) && depth === 0) {
      parts.push({ text: before, offset: start });
      start = i + 1;
    }
  }
  parts.push({ text: text.slice(start), offset: start });
  return parts;
}

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const subscripts = '₀₁₂₃₄₅₆₇₈₉';

/** Plain signs and digits: subscripts become counts, superscripts a charge after "^", all dots "·", no spaces. */
function plainText(text: string): string {
  return text
    .replace(/[₀-₉]/g, (c) => String(subscripts.indexOf(c)))
    .replace(
      /[⁰¹²³⁴-⁹]*[⁺⁻]/g,
      (c) => `^${[...c].map((s) => (s === '⁺' ? '+' : s === '⁻' ? '-' : superscripts.indexOf(s))).join('')}`,
    )
    .replace(/[•∙⋅×]/g, '·')
    .replace(/[−–]/g, '-')
    .replace(/\s+/g, '');
}

/**
 * Composition, charge and molar mass of a formula as chemists write it: brackets of all kinds, addition dots
 * (· . *) with multipliers for hydrates and solvates, charges (^2-, 2-, ²⁻), subscripts, common ligand abbreviations.
 * A digit before a sign at the end is the charge after "]" or a lone element (Cu2+) and after another digit (SO42-);
 * otherwise it is a count (NO3-): write "^" to be certain.
 * @param text - for example "[Ni(en)3]Cl2·2H2O"
 * @returns molar mass in g/mol from IUPAC 2021 abridged atomic weights
 * Errors: as a Result with a code and the place. Checked against: tests/published/magnetism-diamagnetic.test.ts.
 */
export function parseFormula(text: string): Result<ParsedFormula, FormulaError> {
  const plain = plainText(text);
  if (plain === '') return err({ code: 'empty', message: 'The formula is empty.', position: 0 });
  const total: Counts = new Map();
  const parts: FormulaPart[] = [];
  let charge = 0;
  for (const part of splitParts(plain)) {
    const number = /^\d+(?:\.\d+)?/.exec(part.text)?.[0] ?? '';
    const multiplier = number === '' ? 1 : Number(number);
    const body = part.text.slice(number.length);
    const species = parseSpecies(body, part.offset + number.length);
    if (!species.ok) return species;
    if (multiplier === 0)
      return err({ code: 'count', message: 'A part cannot be taken zero times.', position: part.offset });
    addTo(total, species.value.counts, multiplier);
    charge += species.value.charge * multiplier;
    parts.push({ text: body, multiplier, composition: Object.fromEntries(species.value.counts) });
  }
  let mass = 0;
  for (const [element, count] of total) {
    const atomic = atomicMass(element);
    if (atomic === null)
      return err({ code: 'no mass', message: `No atomic mass is known for ${element}.`, position: 0 });
    mass += atomic * count;
  }
  return ok({ composition: Object.fromEntries(total), charge, molarMassGramPerMole: mass, parts });
}
