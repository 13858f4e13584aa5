import { describe, expect, it } from 'vitest';
import type { Landmark, Line, Section } from '@/lib/outputs/landmark';
import { LineScanner, MAX_LINE_BYTES } from '@/lib/outputs/scanner';

const encode = (text: string) => new TextEncoder().encode(text);

/** What a scanner shows of a text to landmarks with these beginnings, pushed in pieces of a size. */
function seen(
  text: string | Uint8Array,
  starts: string[],
  pieceBytes = 1 << 20,
  options: Partial<Landmark> = {},
) {
  const lines: Line[] = [];
  const read = (line: Line) => void lines.push(line);
  const scanner = new LineScanner(starts.map((start) => ({ text: start, read, ...options })));
  const bytes = typeof text === 'string' ? encode(text) : text;
  for (let at = 0; at < bytes.length; at += pieceBytes) scanner.push(bytes.subarray(at, at + pieceBytes));
  scanner.end();
  return { lines, scanner };
}

describe('LineScanner', () => {
  it('shows lines that start with a landmark, whatever the indentation and the run of blanks', () => {
    expect(seen('\t << step\n', ['<< step']).lines).toHaveLength(1);
    const { lines } = seen('x\n   Total Energy       :  -1.5\nTotal Energie\n', ['Total Energy :']);
    expect(lines).toEqual([{ text: '   Total Energy       :  -1.5', number: 2 }]);
  });

  it('gives the same lines for pieces of every size', () => {
    const text = 'alpha 1\r\n\n      beta  2\nalphabet\n  alpha 3\n';
    const whole = seen(text, ['alpha ', 'beta 2']).lines;
    expect(whole.map(({ number }) => number)).toEqual([1, 3, 5]);
    for (let size = 1; size < 20; size++) expect(seen(text, ['alpha ', 'beta 2'], size).lines).toEqual(whole);
  });

  it('takes the longest landmark that fits', () => {
    const hits: string[] = [];
    const landmark = (text: string) => ({ text, read: () => void hits.push(text) });
    const scanner = new LineScanner([landmark('Sum'), landmark('Sum of charges'), landmark('Sum of')]);
    scanner.push(encode('Sum of  charges : 1\nSum of spins\n'));
    expect(hits).toEqual(['Sum of charges', 'Sum of']);
  });

  it('strips a carriage return and a byte order mark, and reads Latin-1 where UTF-8 fails', () => {
    expect(seen('\uFEFFmark é\r\n', ['mark']).lines).toEqual([{ text: 'mark é', number: 1 }]);
    expect(seen(new Uint8Array([0x6d, 0x20, 0xe9, 10]), ['m']).lines).toEqual([{ text: 'm é', number: 1 }]);
  });

  it('shows a last line without newline only to landmarks that take it', () => {
    expect(seen('E = -1.2', ['E =']).lines).toEqual([]);
    expect(seen('E = -1.2', ['E ='], 3, { evenUnended: true }).lines).toHaveLength(1);
    expect(seen('a\nE = -1.2', ['E =']).scanner.lines).toBe(2);
  });

  it('passes over a line that is too long, counts it and goes on behind it', () => {
    const long = `mark ${'y'.repeat(3 * 262_144)}\nmark 2\n`;
    for (const size of [1000, 262_144, 1 << 22]) {
      const { lines, scanner } = seen(long, ['mark'], size);
      expect(lines).toEqual([{ text: 'mark 2', number: 2 }]);
      expect(scanner.lines).toBe(2);
      expect(scanner.bytes).toBe(long.length);
    }
    expect(seen(`${'m'.repeat(MAX_LINE_BYTES)}\n`, ['m']).lines).toHaveLength(1);
    expect(seen(`${'m'.repeat(MAX_LINE_BYTES + 1)}\n`, ['m']).lines).toHaveLength(0);
  });

  it('keeps the byte offset of lines 1, 1001, 2001', () => {
    const text = Array.from({ length: 2500 }, (_, i) => `line ${i + 1}\n`).join('');
    for (const size of [7, 4096, 1 << 20]) {
      const { lineOffsets } = seen(text, [], size).scanner;
      expect(lineOffsets).toEqual([0, text.indexOf('line 1001\n'), text.indexOf('line 2001\n')]);
    }
  });

  it('gives an open section the lines below until it has enough, and closes it at a landmark', () => {
    const taken: string[] = [];
    const section = (): Section => ({ take: ({ text }) => taken.push(text) % 2 !== 0 });
    const scanner = new LineScanner([
      { text: 'table', read: section },
      { text: 'stop', read: () => undefined },
    ]);
    scanner.push(encode('table\n1\n2\n3\ntable\n4\ntable\nstop\n5\n'));
    expect(taken).toEqual(['1', '2', '4']);
  });

  it('looks for no landmark inside an exclusive section, save those that are always looked for', () => {
    const hits: string[] = [];
    const scanner = new LineScanner([
      { text: 'deck', read: () => ({ exclusive: true, take: () => true }) },
      { text: 'energy', read: ({ number }) => void hits.push(`energy ${number}`) },
      { text: 'banner', always: true, read: ({ number }) => void hits.push(`banner ${number}`) },
    ]);
    scanner.push(encode('deck\nenergy\nbanner\nenergy\n'));
    expect(hits).toEqual(['banner 3', 'energy 4']);
  });

  it('survives NUL bytes, blanks only, and nothing at all', () => {
    expect(seen('\0\0\n    \nmark\0 1\n', ['mark']).lines).toEqual([{ text: 'mark\0 1', number: 3 }]);
    expect(seen('', ['mark']).scanner.lines).toBe(0);
    expect(seen('      ', ['mark']).scanner.lines).toBe(1);
  });
});
