import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { centreDescriptionSchema } from '@/lib/geometry/centre-description';
import { run } from '@/worker/cli/geometry';

const lineSchema = z.object({
  file: z.string(),
  formula: z.string(),
  centres: z.array(centreDescriptionSchema),
});
const chloride = (d: number) => `5\n\nCu 0 0 0\nCl ${d} 0 0\nCl -${d} 0 0\nCl 0 ${d} 0\nCl 0 -${d} 0\n`;

let folder = '';
let out = '';
let complaints = '';

beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'spheres-'));
  out = '';
  complaints = '';
  vi.spyOn(process.stdout, 'write').mockImplementation((text) => {
    out += String(text);
    return true;
  });
  vi.spyOn(process.stderr, 'write').mockImplementation((text) => {
    complaints += String(text);
    return true;
  });
});
afterEach(async () => {
  vi.restoreAllMocks();
  await rm(folder, { recursive: true });
});

async function file(name: string, content: string | Uint8Array): Promise<string> {
  const target = path.join(folder, name);
  await writeFile(target, content);
  return target;
}
const printed = () =>
  out
    .trim()
    .split('\n')
    .filter(Boolean)
    .map((line) => lineSchema.parse(JSON.parse(line)));

describe('the geometry command', () => {
  it('prints one line of JSON per file', async () => {
    const files = [await file('a.xyz', chloride(2.25)), await file('b.xyz', chloride(2.3))];
    expect(await run(files)).toBe(0);
    expect(printed().map((line) => line.file)).toEqual(files);
    expect(printed()[0]).toMatchObject({
      formula: 'Cl4Cu',
      centres: [{ element: 'Cu', index: 0, nearest: 'SP-4', tau5: null }],
    });
    expect(complaints).toBe('');
  });

  it('takes the last frame, or the one asked for', async () => {
    const target = await file('path.xyz', chloride(2.2) + chloride(2.3));
    await run([target]);
    await run(['--frame', '1', target]);
    await run(['--frame=2', target]);
    expect(printed().map((line) => line.centres[0]?.meanDistanceAngstrom)).toEqual([2.3, 2.2, 2.3]);
    expect(await run(['--frame', '3', target])).toBe(1);
    expect(complaints).toContain('has 2 frame(s), frame 3 was asked for');
  });

  it('reports bad files in one line each and still prints the good ones', async () => {
    const good = await file('good.xyz', chloride(2.2));
    const bad = [
      await file('empty.xyz', ''),
      await file('zero.xyz', '0\n\n'),
      await file('short.xyz', '7\n\nCu 0 0 0\n'),
      await file('binary.xyz', new Uint8Array([1, 0, 2, 3])),
      path.join(folder, 'missing.xyz'),
      folder,
    ];
    expect(await run([...bad.slice(0, 3), good, ...bad.slice(3)])).toBe(1);
    expect(printed()).toHaveLength(1);
    const lines = complaints.trim().split('\n');
    expect(lines).toHaveLength(bad.length);
    expect(lines[2]).toMatch(/short\.xyz: line 4: The frame announces 7 atoms and ends after 1/);
    expect(complaints).not.toMatch(/\n\s+at /);
  });

  it('says how it is used when the arguments make no sense', async () => {
    expect(await run([])).toBe(1);
    expect(await run(['--frame', 'x', 'a.xyz'])).toBe(1);
    expect(await run(['--colour', 'a.xyz'])).toBe(1);
    expect(complaints.trim().split('\n')).toHaveLength(3);
  });
});
