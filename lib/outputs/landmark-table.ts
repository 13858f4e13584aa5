import type { Landmark } from './landmark';

const BLANK = 32;
const TAB = 9;
const NEWLINE = 10;

interface CompiledLandmark {
  pattern: Uint8Array;
  landmark: Landmark;
}

/** Landmarks arranged by their first two bytes, so that a look at two bytes rules most lines out. */
export class LandmarkTable {
  /** 1 where some landmark starts with these two bytes; index = first × 256 + second. */
  readonly present = new Uint8Array(65_536);
  private readonly byStart = new Map<number, CompiledLandmark[]>();

  /** Errors: throws RangeError on a landmark that is empty or starts with a blank. */
  constructor(landmarks: readonly Landmark[]) {
    const encoder = new TextEncoder();
    const compiled = landmarks
      .map((landmark) => ({ pattern: encoder.encode(landmark.text), landmark }))
      .sort((a, b) => b.pattern.length - a.pattern.length);
    for (const entry of compiled) this.add(entry);
    // Few lines start with a tab; they are all looked at.
    this.present.fill(1, TAB * 256, (TAB + 1) * 256);
  }

  private add(entry: CompiledLandmark): void {
    const [first, second] = entry.pattern;
    if (first === undefined || first === BLANK)
      throw new RangeError(`a landmark starts with a character, got "${entry.landmark.text}"`);
    const seconds =
      second === undefined
        ? Array.from({ length: 256 }, (_, byte) => byte)
        : second === BLANK
          ? [BLANK, TAB]
          : [second];
    for (const byte of seconds) {
      const key = first * 256 + byte;
      this.present[key] = 1;
      const list = this.byStart.get(key);
      if (list) list.push(entry);
      else this.byStart.set(key, [entry]);
    }
  }

  /** The longest landmark that the line in bytes[from, to) starts with. */
  find(bytes: Uint8Array, from: number, to: number): Landmark | undefined {
    let at = from;
    while (at < to && (bytes[at] === BLANK || bytes[at] === TAB)) at++;
    if (at >= to) return undefined;
    const second = at + 1 < to ? (bytes[at + 1] as number) : NEWLINE;
    const key = (bytes[at] as number) * 256 + second;
    const candidates = this.present[key] === 1 ? this.byStart.get(key) : undefined;
    if (!candidates) return undefined;
    for (const { pattern, landmark } of candidates) if (startsWith(bytes, at, to, pattern)) return landmark;
    return undefined;
  }
}

/** Whether bytes[from, to) start with the pattern; a blank in it stands for a run of blanks. */
function startsWith(bytes: Uint8Array, from: number, to: number, pattern: Uint8Array): boolean {
  let at = from;
  for (let i = 0; i < pattern.length; i++) {
    if (at >= to) return false;
    if (pattern[i] === BLANK) {
      const before = at;
      while (at < to && (bytes[at] === BLANK || bytes[at] === TAB)) at++;
      if (at === before) return false;
    } else if (bytes[at++] !== pattern[i]) return false;
  }
  return true;
}
