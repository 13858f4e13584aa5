import { decodeLine } from './decode-line';
import type { Line, Section } from './landmark';

const BLANK = 32;
const TAB = 9;

/** Lines kept as bytes, to become text only if they are still wanted when everything has been read. */
export class KeptLines {
  private bytes = new Uint8Array(1024);
  private length = 0;
  private readonly ends: number[] = [];

  constructor(private readonly firstNumber: number) {}

  add(bytes: Uint8Array, from: number, to: number): void {
    const size = to - from;
    if (this.length + size > this.bytes.length) {
      const larger = new Uint8Array(2 * (this.length + size));
      larger.set(this.bytes.subarray(0, this.length));
      this.bytes = larger;
    }
    for (let i = 0; i < size; i++) this.bytes[this.length + i] = bytes[from + i] as number;
    this.length += size;
    this.ends.push(this.length);
  }

  lines(): Line[] {
    return this.ends.map((end, i) => ({
      text: decodeLine(this.bytes, this.ends[i - 1] ?? 0, end),
      number: this.firstNumber + i,
    }));
  }

  /** Shows the lines to a section as if they were read now. */
  replay(section: Section): void {
    for (const line of this.lines()) if (!section.take(line)) return;
  }

  isSame(other: KeptLines): boolean {
    if (this.length !== other.length || this.ends.length !== other.ends.length) return false;
    for (let i = 0; i < this.length; i++) if (this.bytes[i] !== other.bytes[i]) return false;
    return true;
  }
}

/** A table longer than this is none, bytes. */
const MAX_TABLE_BYTES = 16_000_000;

/**
 * A section that keeps the lines below its landmark up to the n-th blank one, for tables that are printed at
 * every step of a long optimisation and of which the last one counts.
 * @param done - called with the lines (the closing blank one included) when the table came to its end
 */
export function keepTable(landmark: Line, blanks: number, done: (lines: KeptLines) => void): Section {
  const kept = new KeptLines(landmark.number + 1);
  let seen = 0;
  let size = 0;
  return {
    take: () => false,
    takeBytes(bytes, from, to) {
      kept.add(bytes, from, to);
      size += to - from + 1;
      if (isBlank(bytes, from, to) && ++seen === blanks) {
        done(kept);
        return false;
      }
      return size < MAX_TABLE_BYTES;
    },
  };
}

function isBlank(bytes: Uint8Array, from: number, to: number): boolean {
  for (let i = from; i < to; i++) if (bytes[i] !== BLANK && bytes[i] !== TAB) return false;
  return true;
}
