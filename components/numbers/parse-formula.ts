/** A stretch of a formula as it is set: on the line, lowered, or raised. */
export interface FormulaRun {
  kind: 'line' | 'sub' | 'sup';
  text: string;
}

const lowered = '₀₁₂₃₄₅₆₇₈₉';
const raised = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const isDigit = (character: string | undefined) =>
  character !== undefined && character >= '0' && character <= '9';
const trueMinus = (text: string) => text.replaceAll('-', '−');

/** Splits into species (joined by spaces or hydrate dots) so that a sign at an end can be told from a hyphen. */
function splitSpecies(text: string): string[] {
  return text.split(/(\s+|[·*•]|(?<=[A-Za-z)\]]\d*)(?<!(?:^|[A-Za-z)\]])0)\.(?=\d*[A-Z([]))/).filter(Boolean);
}

/**
 * The charge at the end of a species. Digits before the sign are its size after a bracket ("[CuCl4]2-"), after
 * a caret and for a lone atom ("Fe2+"); in other molecules a single digit counts atoms ("NH4+") and of several
 * the last one is the charge ("SO42-").
 */
function splitCharge(species: string): [body: string, charge: string] {
  const match = /^(.*?)\^?(\d*)([+-]+)$/s.exec(species);
  if (match === null) return [species, ''];
  const [, body = '', digits = '', sign = ''] = match;
  if (species.includes('^') || body === '' || body.endsWith(']') || /^\d*[A-Z][a-z]?$/.test(body)) {
    return [body, digits + sign];
  }
  if (digits.length < 2) return [body + digits, sign];
  return [body + digits.slice(0, -1), digits.slice(-1) + sign];
}

/** Sets the body: digits after a symbol or a closing bracket count atoms, leading ones stay on the line. */
function setBody(body: string): FormulaRun[] {
  const runs: FormulaRun[] = [];
  const push = (kind: FormulaRun['kind'], text: string) => {
    const last = runs.at(-1);
    if (last !== undefined && last.kind === kind) last.text += text;
    else runs.push({ kind, text });
  };
  for (let at = 0; at < body.length; ) {
    const character = body[at] ?? '';
    const raisedNow = /^\^(?:\(([^)]*)\)|([IVX]+|\d*[+-]?))/.exec(body.slice(at));
    if (raisedNow !== null && raisedNow[0].length > 1) {
      push('sup', trueMinus(raisedNow[1] ?? raisedNow[2] ?? ''));
      at += raisedNow[0].length;
      continue;
    }
    const count = /^\d+(?:\.\d+)?/.exec(body.slice(at));
    if (count !== null) {
      const before = body[at - 1];
      const counts = before !== undefined && /[A-Za-z)\]}]/.test(before);
      push(counts ? 'sub' : 'line', count[0]);
      at += count[0].length;
      continue;
    }
    push('line', character);
    at += 1;
  }
  return runs;
}

/**
 * A chemical formula as runs to set. Understands charges ("[CuCl4]2-", "Fe^3+"), hydrates ("CuSO4.5H2O", "·",
 * "*"), Roman oxidation states ("Cu(II)" on the line, "Fe^III" raised) and text that already carries Unicode
 * subscripts and superscripts. A doubtful charge is settled with a caret: "O2-" is oxide, "O2^-" superoxide.
 * @returns runs in order; joined they give the text with a true minus and a middle dot
 */
export function parseFormula(text: string): FormulaRun[] {
  const plain = [...text]
    .map((character) => {
      const low = lowered.indexOf(character);
      if (low >= 0) return String(low);
      const high = raised.indexOf(character);
      if (high >= 0) return `^${high}`;
      if (character === '⁺') return '^+';
      if (character === '⁻') return '^-';
      return character === '−' || character === '–' ? '-' : character;
    })
    .join('')
    .replace(
      /\^(\d)((?:\^[\d+-])+)/g,
      (_, first: string, rest: string) => `^${first}${rest.replaceAll('^', '')}`,
    );
  const runs: FormulaRun[] = [];
  for (const piece of splitSpecies(plain)) {
    if (/^[·*•.]$/.test(piece)) {
      runs.push({ kind: 'line', text: '·' });
      continue;
    }
    if (/^\s+$/.test(piece)) {
      runs.push({ kind: 'line', text: ' ' });
      continue;
    }
    const [body, charge] = splitCharge(piece);
    // A charge written apart ("[Fe(OH2)6] 2+") belongs to what stands before it.
    if (body === '' && runs.at(-1)?.text === ' ') runs.pop();
    runs.push(...setBody(body));
    if (charge !== '') runs.push({ kind: 'sup', text: trueMinus(charge) });
  }
  return runs;
}

/** The formula in one string of Unicode characters, for labels, titles and files: "[CuCl₄]²⁻". */
export function formulaInUnicode(text: string): string {
  return parseFormula(text)
    .map((run) => {
      if (run.kind === 'line') return run.text;
      const digits = run.kind === 'sub' ? lowered : raised;
      return [...run.text]
        .map((character) => {
          if (isDigit(character)) return digits[Number(character)] ?? character;
          if (run.kind === 'sup' && character === '+') return '⁺';
          if (run.kind === 'sup' && character === '−') return '⁻';
          return character;
        })
        .join('');
    })
    .join('');
}
