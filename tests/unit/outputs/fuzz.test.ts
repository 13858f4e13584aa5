import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { programs } from '@/lib/outputs/programs';
import { createOutputReader, readOutput } from '@/lib/outputs/reader';
import { outputRecordSchema, type OutputRecord, type Step } from '@/lib/outputs/record';
import { outputsFolder, readTruth } from './shared-outputs';

const known = new Set<string>(programs.map(({ name }) => name));
const files = readTruth()
  .filter(({ program }) => known.has(program))
  .map(({ file, terminated }) => ({ file, terminated }));

/** Seeded numbers in [0, 1): mulberry32, public domain (T. Ettinger). */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

const load = (file: string) => readFileSync(path.join(outputsFolder, file));

/** Values that are printed as they stand in the record, so that their digits must stand on the cited line. */
const printed: [string, (step: Step) => number | null | undefined][] = [
  ['energyHartree', (step) => step.energyHartree],
  ['charge', (step) => step.charge],
  ['electronCount', (step) => step.electronCount],
  ['spin.s2', (step) => step.spin.s2],
  ['spin.s2Ideal', (step) => step.spin.s2Ideal],
  ['thermochemistry.temperatureK', (step) => step.thermochemistry?.temperatureK],
  ['thermochemistry.zeroPointHartree', (step) => step.thermochemistry?.zeroPointHartree],
  ['thermochemistry.gibbsHartree', (step) => step.thermochemistry?.gibbsHartree],
];

function numbersIn(text: string): number[] {
  return (text.match(/[+-]?(?:\d+\.?\d*|\.\d+)(?:[eEdD][+-]?\d+)?/g) ?? []).map((word) =>
    Number(word.replace(/[dD]/, 'e')),
  );
}

function numbersOf(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (value === null || typeof value !== 'object') return [];
  return Object.values(value).flatMap(numbersOf);
}

/** A record of damaged bytes: well formed, no NaN, and every cited value on its line. */
function expectHonest(record: OutputRecord, bytes: Uint8Array) {
  expect(numbersOf(record).every(Number.isFinite)).toBe(true);
  const lines = Buffer.from(bytes).toString('latin1').split('\n');
  for (const step of [record, ...record.steps])
    for (const [name, valueOf] of printed) {
      const value = valueOf(step);
      if (value === null || value === undefined) continue;
      const evidence = step.evidence[name];
      expect(evidence, name).toBeDefined();
      expect(numbersIn(evidence?.text ?? '').map(Math.abs), `${name} in "${evidence?.text}"`).toContain(
        Math.abs(value),
      );
      const line = lines[(evidence?.line ?? 0) - 1] ?? '';
      expect(line).toContain(Buffer.from((evidence?.text ?? '').slice(0, 20), 'utf8').toString('latin1'));
    }
}

/** The lines of a file with one of them dropped, doubled or swapped with the next. */
function disturbLines(lines: readonly string[], at: number, how: number): string[] {
  const here = lines[at] ?? '';
  const next = lines[at + 1] ?? '';
  const middle = [[next], [here, here, next], [next, here]][how] ?? [];
  return [...lines.slice(0, at), ...middle, ...lines.slice(at + 2)];
}

describe.skipIf(files.length === 0)('damaged outputs', () => {
  it.each(files)('$file cut short at 200 places is never finished', ({ file }) => {
    const bytes = load(file);
    const random = seeded(1);
    const end = Math.max(
      bytes.lastIndexOf('TERMINATED NORMALLY****'),
      bytes.lastIndexOf('Total times'),
      bytes.lastIndexOf('Normal termination'),
      bytes.lastIndexOf('exiting successfully'),
    );
    const limit = end < 0 ? bytes.length : end;
    for (let i = 0; i < 200; i++) {
      const cut = bytes.subarray(0, Math.floor(random() * limit));
      const record = readOutput(cut);
      expect(record.outcome, `cut at ${cut.length}`).not.toBe('finished');
      if (i % 10 === 0) expectHonest(record, cut);
    }
  });

  it.each(files)('$file with lines dropped, doubled and swapped is read honestly', ({ file }) => {
    const lines = load(file).toString('latin1').split('\n');
    const random = seeded(2);
    for (let i = 0; i < 30; i++) {
      let disturbed = lines;
      for (let k = 0; k < 5; k++)
        disturbed = disturbLines(
          disturbed,
          Math.floor(random() * disturbed.length),
          Math.floor(random() * 3),
        );
      const bytes = Buffer.from(disturbed.join('\n'), 'latin1');
      expectHonest(readOutput(bytes), bytes);
    }
  });

  it.each(files)('$file with bytes flipped is read honestly', ({ file }) => {
    const original = load(file);
    const random = seeded(3);
    for (let i = 0; i < 20; i++) {
      const bytes = Buffer.from(original);
      for (let k = 0; k < 200; k++) bytes[Math.floor(random() * bytes.length)] = Math.floor(random() * 256);
      expectHonest(readOutput(bytes), bytes);
    }
  });

  it.each(files)(
    '$file reads the same with CRLF, a byte order mark, and in pieces of any size',
    ({ file }) => {
      const bytes = load(file);
      const { bytes: _, ...expected } = readOutput(bytes);
      const same = (changed: Uint8Array, pieceBytes: number) => {
        const reader = createOutputReader();
        for (let at = 0; at < changed.length; at += pieceBytes)
          reader.push(changed.subarray(at, at + pieceBytes));
        const { bytes: __, ...record } = reader.end().record;
        expect(record).toEqual(expected);
      };
      same(bytes, 997);
      same(Buffer.concat([Buffer.from([0xef, 0xbb, 0xbf]), bytes]), 65_536);
      if (!bytes.includes('\r'))
        same(Buffer.from(bytes.toString('latin1').replaceAll('\n', '\r\n'), 'latin1'), 10_007);
    },
  );

  it.each(files)('$file keeps the shape of a record', ({ file }) => {
    expect(outputRecordSchema.safeParse(readOutput(load(file))).error).toBeUndefined();
  });

  it('passes over a line of 50 MB and NUL bytes in the middle of a file', () => {
    const [first] = files;
    if (!first) return;
    const bytes = load(first.file);
    const middle = bytes.indexOf('\n', bytes.length / 2) + 1;
    const reader = createOutputReader();
    reader.push(bytes.subarray(0, middle));
    const filler = new Uint8Array(1 << 20).fill(120);
    for (let i = 0; i < 50; i++) reader.push(filler);
    reader.push(Buffer.from('\n\0\0\0\n'));
    reader.push(bytes.subarray(middle));
    const { record } = reader.end();
    expect(record.outcome).toBe(readOutput(bytes).outcome);
    expect(record.lines).toBe(readOutput(bytes).lines + 2);
  });
});
