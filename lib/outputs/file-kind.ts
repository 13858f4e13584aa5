import { elementSymbol, elementSymbols } from '../chemistry/elements';
import { createOutputReader } from './reader';

export type FileKind = 'program output' | 'xyz' | 'csv';
export type FileKindAnswer = { kind: FileKind } | { refused: { code: string; message: string } };

/** How many bytes from the front decide. Job scripts may print some pages before a program's banner. */
export const FILE_KIND_HEAD_BYTES = 1024 * 1024;

/**
 * Tells by content what a file is: a program output (by its banner), an XYZ file (an atom count, a comment,
 * then element and three numbers) or a table of numbers in CSV or TSV. Anything else is refused with what it
 * looks like. A damaged file of a known kind is still of that kind: its reader says what is wrong and where.
 * @param head - the first {@link FILE_KIND_HEAD_BYTES} bytes, or all when there are fewer
 */
export function fileKind(head: Uint8Array): FileKindAnswer {
  if (head.length === 0) {
    return refuse('empty', 'the file is empty (0 bytes); copy it again from where it was calculated');
  }
  if (recognisesProgram(head)) return { kind: 'program output' };
  if (isBinary(head)) {
    return refuse(
      'binary',
      'these are binary data, not the text output of a program; send the .out or .log file',
    );
  }
  const lines = new TextDecoder()
    .decode(head)
    .replace(/^\ufeff/, '')
    .split(/\r?\n/, 400);
  if (looksLikeXyz(lines)) return { kind: 'xyz' };
  if (looksLikeTable(lines)) return { kind: 'csv' };
  return refuse(
    'unknown',
    'this is neither an output of ORCA, Gaussian, NWChem or Psi4, nor an XYZ file, nor a table of numbers (CSV)',
  );
}

function refuse(code: string, message: string): FileKindAnswer {
  return { refused: { code, message } };
}

function recognisesProgram(head: Uint8Array): boolean {
  const reader = createOutputReader();
  reader.push(head);
  return reader.end().record.program !== null;
}

/** More than one byte in a hundred is a control character that no text file has. */
function isBinary(head: Uint8Array): boolean {
  const sample = head.subarray(0, 65_536);
  let odd = 0;
  for (const byte of sample) if (byte < 9 || (byte > 13 && byte < 32 && byte !== 27)) odd++;
  return odd > sample.length / 100;
}

function looksLikeXyz(lines: string[]): boolean {
  if (!/^\s*\d{1,9}\s*$/.test(lines[0] ?? '')) return false;
  const [symbol, ...numbers] = (lines[2] ?? '').trim().split(/\s+/);
  // No third line, or no atom in it: a count alone is a broken XYZ file, and its reader says how.
  if (symbol === undefined || symbol === '') return true;
  const named =
    elementSymbol(symbol.replace(/\d+$/, '')) !== null || elementSymbols[Number(symbol)] !== undefined;
  return named || (numbers.length >= 3 && numbers.slice(0, 3).every((text) => Number.isFinite(Number(text))));
}

/** Two or more rows with the same number of separators, and numbers in most cells below the head. */
function looksLikeTable(lines: string[]): boolean {
  const rows = lines.filter((line) => line.trim() !== '' && !line.startsWith('#')).slice(0, 30);
  if (rows.length < 2) return false;
  return [';', '\t', ','].some((separator) => {
    const cells = rows.map((row) => row.split(separator));
    const width = cells[0]?.length ?? 0;
    if (width < 2 || cells.slice(0, -1).some((row) => row.length !== width)) return false;
    const body = cells.slice(1).flat();
    const numeric = body.filter((cell) => /^\s*"?[-+]?\d*[.,]?\d+([eE][-+]?\d+)?"?\s*$/.test(cell));
    return numeric.length >= body.length / 2;
  });
}
