import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';

const folder = mkdtempSync(path.join(tmpdir(), 'spinstead-read-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function file(name: string, content: string | Uint8Array): string {
  const target = path.join(folder, name);
  writeFileSync(target, content);
  return target;
}

function read(...files: string[]) {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['--import', 'tsx', 'worker/cli/main.ts', 'read', ...files],
    { encoding: 'utf8' },
  );
  const records = stdout
    .split('\n')
    .filter((line) => line !== '')
    .map((line) => JSON.parse(line) as Record<string, unknown>);
  return { status, records, errors: stderr.split('\n').filter((line) => line !== '') };
}

const text = `                                 * O   R   C   A *
                         Program Version 5.0.3 -  RELEASE  -
CARTESIAN COORDINATES (ANGSTROEM)
---------------------------------
  H      0.000000    0.000000    0.000000

 Total Charge           Charge          ....    0
 Multiplicity           Mult            ....    2
FINAL SINGLE POINT ENERGY      -0.499812345678
                             ****ORCA TERMINATED NORMALLY****
`;

describe('the read command', () => {
  it('prints one record a line, the file first', () => {
    const good = file('good.out', text);
    const { status, records, errors } = read(good);
    expect(errors).toEqual([]);
    expect(status).toBe(0);
    expect(Object.keys(records[0] ?? {}).slice(0, 4)).toEqual(['file', 'bytes', 'lines', 'sha256']);
    expect(records[0]).toMatchObject({
      file: good,
      bytes: text.length,
      lines: 10,
      sha256: createHash('sha256').update(text).digest('hex'),
      program: 'ORCA',
      outcome: 'finished',
      formula: 'H',
      energyHartree: -0.499812345678,
    });
  });

  it('names each file that cannot be read in one line and prints the others', () => {
    const good = file('good.out', text);
    const bad = [
      path.join(folder, 'absent.out'),
      folder,
      file('empty.out', ''),
      file(
        'binary.out',
        new Uint8Array(5000).map((_, i) => (i * 37) % 256),
      ),
    ];
    const { status, records, errors } = read(...bad, good);
    expect(status).toBe(1);
    expect(records.map((record) => record.file)).toEqual([good]);
    expect(errors).toEqual([
      `${bad[0]}: no such file`,
      `${bad[1]}: is a folder`,
      `${bad[2]}: is empty`,
      `${bad[3]}: is no output of ORCA, Gaussian, NWChem or Psi4`,
    ]);
  });

  it('asks for a file when none is given', () => {
    const { status, errors } = read();
    expect(status).toBe(1);
    expect(errors).toHaveLength(1);
  });
});
