import { decodeLine } from './decode-line';
import type { Landmark, Line, Section } from './landmark';
import { LandmarkTable } from './landmark-table';

/**
 * The scanner under every program reader: bytes in, landmark lines out, constant memory.
 *
 * Pieces of the file are copied into one reused buffer and its newlines are walked. A line becomes text only
 * when it starts (after leading blanks) with a landmark, or when a section is open. What is left of the last
 * line moves to the buffer's beginning; a line longer than MAX_LINE_BYTES holds no landmark of any program
 * and is counted but never looked at. The caller may reuse a piece's memory as soon as `push` returns.
 *
 * How landmarks are compared: leading blanks (and tabs) of the line are skipped; one blank in the landmark stands for
 * one or more blanks in the line; everything else byte by byte; the longest landmark that fits wins.
 * A landmark therefore is the beginning of a line, never something in its middle.
 *
 * A line that the file leaves without its newline is cut short as far as anybody can tell, and a number cut
 * short is a wrong number: it is shown only to landmarks that say `evenUnended` (closing lines whose text
 * proves that they are whole).
 *
 * Speed: blanks and newlines are looked for four bytes at a time in 32-bit words. On a NWChem optimisation of
 * 300 MB this walked 1.2 to 1.5 GB/s; one `indexOf(10)` a line 0.8 to 1.0, byte by byte 0.7 to 0.8.
 */

/** Longest line looked at, bytes. The four programs print lines of up to some 200 characters. */
export const MAX_LINE_BYTES = 16_384;
/** The byte offset of every 1000th line is kept: of lines 1, 1001, 2001 … */
export const LINES_PER_OFFSET = 1000;

const BUFFER_BYTES = 262_144;
const NEWLINE = 10;
const RETURN = 13;
const BLANK = 32;
const FOUR_BLANKS = 0x20202020;
const FOUR_NEWLINES = 0x0a0a0a0a;

export class LineScanner {
  /** Lines seen so far; a last line without newline counts at the end. */
  lines = 0;
  /** Byte offsets of lines 1, 1001, 2001 … */
  readonly lineOffsets: number[] = [];
  private table: LandmarkTable;
  private section: Section | null = null;
  /** One byte more than is filled: a newline stands behind the last byte, so that every search ends. */
  private readonly words = new Int32Array(BUFFER_BYTES / 4 + 1);
  private readonly buffer = new Uint8Array(this.words.buffer);
  private filled = 0;
  /** Where the buffer's first byte stands in the file. */
  private bufferOffset = 0;
  /** Inside a line that is too long: its bytes are dropped until its newline comes. */
  private dropping = false;
  private droppedFrom = 0;

  constructor(landmarks: readonly Landmark[]) {
    this.table = new LandmarkTable(landmarks);
  }

  /** Bytes seen so far. */
  get bytes(): number {
    return this.bufferOffset + this.filled;
  }

  /** Replaces the landmarks: a program was recognised. The line at hand is shown to the new ones. */
  switchTo(landmarks: readonly Landmark[], line: Line): Section | void {
    this.table = new LandmarkTable(landmarks);
    const bytes = new TextEncoder().encode(line.text);
    return this.table.find(bytes, 0, bytes.length)?.read(line);
  }

  push(chunk: Uint8Array): void {
    for (let from = 0; from < chunk.length; ) {
      const to = Math.min(chunk.length, from + BUFFER_BYTES - this.filled);
      this.buffer.set(chunk.subarray(from, to), this.filled);
      this.filled += to - from;
      this.walk();
      from = to;
    }
  }

  /** Says that the file is over: a line without newline is shown to the landmarks that take it. */
  end(): void {
    if (this.dropping) this.count(this.lines++, this.droppedFrom);
    else if (this.filled > 0) {
      this.count(this.lines++, this.bufferOffset);
      this.show(0, this.filled, true);
    }
    this.bufferOffset += this.filled;
    this.filled = 0;
    this.dropping = false;
  }

  /** Walks the whole lines in the buffer and moves the rest to its beginning. */
  private walk(): void {
    const { buffer, words, filled, bufferOffset } = this;
    buffer[filled] = NEWLINE;
    let start = this.dropping ? this.finishDropped() : 0;
    let { lines } = this;
    let { present } = this.table;
    let inSection = this.section !== null;
    let nextOffset = this.lineOffsets.length * LINES_PER_OFFSET;
    while (start < filled) {
      const at = skipBlanks(buffer, words, start);
      const newline = findNewline(buffer, words, at);
      if (newline >= filled) break;
      if (lines === nextOffset) {
        this.count(lines, bufferOffset + start);
        nextOffset += LINES_PER_OFFSET;
      }
      lines++;
      if (
        inSection ||
        present[((buffer[at] as number) << 8) | (buffer[at + 1] as number)] === 1 ||
        lines === 1
      ) {
        this.lines = lines;
        this.show(start, newline, false);
        present = this.table.present;
        inSection = this.section !== null;
      }
      start = newline + 1;
    }
    this.lines = lines;
    this.keepRest(start);
  }

  private keepRest(start: number): void {
    if (this.filled - start > MAX_LINE_BYTES && !this.dropping) {
      this.dropping = true;
      this.droppedFrom = this.bufferOffset + start;
    }
    if (this.dropping) start = this.filled;
    this.buffer.copyWithin(0, start, this.filled);
    this.bufferOffset += start;
    this.filled -= start;
  }

  /** The end of a line that is too long: returns where the next one starts. */
  private finishDropped(): number {
    const newline = findNewline(this.buffer, this.words, 0);
    if (newline >= this.filled) return this.filled;
    this.dropping = false;
    this.count(this.lines++, this.droppedFrom);
    return newline + 1;
  }

  /** Keeps the offset of every 1000th line; `before` lines stand above it. */
  private count(before: number, offset: number): void {
    if (before % LINES_PER_OFFSET === 0) this.lineOffsets.push(offset);
  }

  /** Shows the line in buffer[from, to), whose number is `lines`, to the landmarks and the open section. */
  private show(from: number, to: number, unended: boolean): void {
    const { buffer, section } = this;
    if (to - from > MAX_LINE_BYTES) return;
    const begin = this.lines === 1 && startsWithByteOrderMark(buffer) ? from + 3 : from;
    const stop = to > begin && buffer[to - 1] === RETURN ? to - 1 : to;
    const landmark = this.table.find(buffer, begin, stop);
    const shut = section !== null && (landmark?.onlyOutside || (section.exclusive && !landmark?.always));
    const found = shut || (unended && !landmark?.evenUnended) ? undefined : landmark;
    if (!found && (section === null || unended)) return;
    if (found?.glance && !found.glance(buffer, begin, stop, this.lines)) return;
    if (!found && section?.takeBytes) {
      if (!section.takeBytes(buffer, begin, stop)) this.section = null;
      return;
    }
    const line = { text: decodeLine(buffer, begin, stop), number: this.lines };
    if (found) this.section = found.read(line) ?? null;
    else if (section && !section.take(line)) this.section = null;
  }
}

/** The first place from `at` on that holds no blank. */
function skipBlanks(bytes: Uint8Array, words: Int32Array, at: number): number {
  while (bytes[at] === BLANK) {
    if ((at & 3) === 0) {
      let word = at >> 2;
      while (words[word] === FOUR_BLANKS) word++;
      at = word << 2;
      if (bytes[at] !== BLANK) return at;
    }
    at++;
  }
  return at;
}

/** The first newline from `at` on; one stands behind the buffer's last byte. */
function findNewline(bytes: Uint8Array, words: Int32Array, at: number): number {
  while ((at & 3) !== 0) {
    if (bytes[at] === NEWLINE) return at;
    at++;
  }
  let word = at >> 2;
  let difference = (words[word] as number) ^ FOUR_NEWLINES;
  // A byte of the word is a newline when the difference has a zero byte (the usual test for one).
  while (((difference - 0x01010101) & ~difference & 0x80808080) === 0)
    difference = (words[++word] as number) ^ FOUR_NEWLINES;
  at = word << 2;
  while (bytes[at] !== NEWLINE) at++;
  return at;
}

function startsWithByteOrderMark(bytes: Uint8Array): boolean {
  return bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
}
