import { elementSymbol, elementSymbols } from '../chemistry/elements';
import { COINCIDENCE_ANGSTROM } from '../chemistry/bonds';
import { forEachNeighbourPair } from '../chemistry/neighbour-pairs';
import type { Structure, Vector3 } from '../chemistry/structure';
import { err, ok, type Result } from '../result';
import type { XyzProblem, XyzProblemCode } from './xyz-problem';

export interface XyzFrame extends Structure {
  /** The comment line as written, without the line end. */
  comment: string;
  /** 1-based line of the atom count. */
  line: number;
  /** Findings that do not stop the reading: atoms on top of each other. */
  warnings: XyzProblem[];
}

/** How many pairs of coincident atoms are named one by one; the rest is counted. */
const NAMED_PAIRS = 5;

/**
 * Reads an XYZ file: per frame the number of atoms, a comment line, then one line per atom with the
 * element (symbol in any case, or atomic number) and x, y, z in Å. Further columns are left aside.
 * Takes CRLF, tabs, a byte-order mark, Fortran exponents (1.0D-03) and blank lines between frames.
 * A `Lattice=` entry in the comment marks a periodic cell, which is refused: a cut-out would be needed.
 * @returns the frames in file order, at least one; otherwise the first problem with its line
 */
export function readXyz(text: string): Result<XyzFrame[], XyzProblem> {
  const lines = text.replace(/^\uFEFF/, '').split(/\r\n|\n|\r/);
  const frames: XyzFrame[] = [];
  let at = 0;
  for (;;) {
    while (at < lines.length && lines[at]?.trim() === '') at++;
    if (at >= lines.length) break;
    const frame = readFrame(lines, at, frames.length > 0);
    if (!frame.ok) return frame;
    frames.push(frame.value);
    at += frame.value.elements.length + 2;
  }
  if (frames.length === 0) {
    return problem('empty file', 1, 'The file holds no text. Give an XYZ file with at least one atom.');
  }
  return ok(frames);
}

function readFrame(
  lines: readonly string[],
  start: number,
  followsFrame: boolean,
): Result<XyzFrame, XyzProblem> {
  const head = (lines[start] ?? '').trim();
  const line = start + 1;
  if (!/^\d+$/.test(head)) {
    if (followsFrame) {
      return problem(
        'too many atoms',
        line,
        `The atoms announced have been read, yet "${clip(head)}" follows and is no count of a next frame. ` +
          'Correct the count in the first line of the frame or remove the extra lines.',
      );
    }
    return problem(
      'no atom count',
      line,
      `The first line must be the number of atoms, found "${clip(head)}". Write the count alone on that line.`,
    );
  }
  const count = Number(head);
  if (count === 0) return problem('no atoms', line, 'The frame announces 0 atoms. Give at least one atom.');
  const comment = lines[start + 1] ?? '';
  if (/(^|\s)(lattice|vec1)\s*=/i.test(comment) || /(^|\s)pbc\s*=\s*"?[^"]*\b(T|True|1)\b/i.test(comment)) {
    return problem(
      'periodic input',
      line + 1,
      'The comment line declares a periodic cell, and Spinstead treats molecules only. ' +
        'Cut out the complex with its whole ligands and write it without the lattice.',
    );
  }
  const elements: string[] = [];
  const positionsAngstrom: Vector3[] = [];
  for (let i = start + 2; i < start + 2 + count; i++) {
    const atom = readAtom(lines[i], i + 1, count, elements.length);
    if (!atom.ok) return atom;
    elements.push(atom.value.element);
    positionsAngstrom.push(atom.value.position);
  }
  const warnings = coincidences(positionsAngstrom, start + 3);
  return ok({ elements, positionsAngstrom, comment, line, warnings });
}

function readAtom(
  text: string | undefined,
  line: number,
  count: number,
  read: number,
): Result<{ element: string; position: Vector3 }, XyzProblem> {
  const fields = (text ?? '').trim().split(/[\s,]+/);
  const [label = '', ...rest] = fields;
  if (label === '' || (rest.length === 0 && /^\d+$/.test(label))) {
    return problem(
      'too few atoms',
      line,
      `The frame announces ${count} atoms and ends after ${read}. ` +
        'Correct the count or add the missing lines; the file may be cut short.',
    );
  }
  const element = readElement(label);
  if (element === null) {
    return problem(
      'unknown element',
      line,
      `"${clip(label)}" is no element symbol or atomic number. Write a symbol such as Fe, or a number from 1 to 118.`,
    );
  }
  if (rest.length < 3) {
    return problem(
      'incomplete atom line',
      line,
      `An atom needs an element and three coordinates, found "${clip((text ?? '').trim())}". Complete the line.`,
    );
  }
  const [x, y, z] = rest.slice(0, 3).map(readCoordinate);
  if (x === null || y === null || z === null || x === undefined || y === undefined || z === undefined) {
    const bad = rest.slice(0, 3).find((field) => readCoordinate(field) === null) ?? '';
    return problem(
      'not a number',
      line,
      `The coordinate "${clip(bad)}" is no finite number. Write plain numbers in ångström.`,
    );
  }
  return ok({ element, position: [x, y, z] });
}

/** "FE", "fe", "26" and labels such as "Fe1" or "O(2)" are understood; "X1" is not. */
function readElement(label: string): string | null {
  if (/^\d+$/.test(label)) {
    const z = Number(label);
    return z >= 1 ? (elementSymbols[z] ?? null) : null;
  }
  const letters = /^([A-Za-z]{1,2})(?:[\d_(].*)?$/.exec(label)?.[1];
  return letters === undefined ? null : elementSymbol(letters);
}

/** Also Fortran's double-precision exponents: 1.25D-01. */
function readCoordinate(field: string): number | null {
  if (!/^[-+]?(\d+\.?\d*|\.\d+)([eEdD][-+]?\d+)?$/.test(field)) return null;
  const value = Number(field.replace(/[dD]/, 'e'));
  return Number.isFinite(value) ? value : null;
}

function coincidences(positions: readonly Vector3[], firstLine: number): XyzProblem[] {
  const warnings: XyzProblem[] = [];
  let unnamed = 0;
  forEachNeighbourPair(positions, COINCIDENCE_ANGSTROM, (first, second, distanceAngstrom) => {
    if (warnings.length >= NAMED_PAIRS) {
      unnamed += 1;
      return;
    }
    warnings.push({
      code: 'coincident atoms',
      line: firstLine + second,
      message:
        `Atoms ${first + 1} and ${second + 1} are ${distanceAngstrom.toFixed(3)} Å apart: the same site written ` +
        'twice, or disorder. Remove one; no bond is drawn between them.',
    });
  });
  if (unnamed > 0) {
    warnings.push({
      code: 'coincident atoms',
      line: firstLine,
      message: `${unnamed} more pairs of atoms lie within ${COINCIDENCE_ANGSTROM} Å. Check the file for doubled sites.`,
    });
  }
  return warnings;
}

const clip = (text: string) => (text.length > 40 ? `${text.slice(0, 40)}…` : text);

function problem(code: XyzProblemCode, line: number, message: string): { ok: false; error: XyzProblem } {
  return err({ code, line, message });
}
