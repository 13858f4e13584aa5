import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import type { DeckRequest } from '@/lib/planning/decks/deck-request';
import { writeDeck } from '@/lib/planning/decks/write-deck';
import { findJobKey } from '@/lib/planning/job-key';
import { methodSchema, type DeckTask, type MethodInput } from '@/lib/planning/method';

/**
 * Decks run for real, where NWChem 7.0 and Psi4 1.3 (Debian packages "nwchem" and "psi4") are installed.
 * Values are taken from the outputs by plain patterns here, on purpose not by lib/outputs.
 */
const has = (program: string) => spawnSync('which', [program]).status === 0;
const installed = { NWChem: has('nwchem'), Psi4: has('psi4') };
for (const [program, there] of Object.entries(installed))
  if (!there) console.log(`decks.test: ${program} is not installed, its decks are not run`);

const position = (...values: [number, number, number][]) => values;
// Distances of gas-phase water and the hydroxyl radical, rounded; dihydrogen; two hydrogen atoms far apart.
const water = {
  elements: ['O', 'H', 'H'],
  positionsAngstrom: position([0, 0, 0.117], [0, 0.757, -0.469], [0, -0.757, -0.469]),
};
const hydroxyl = { elements: ['O', 'H'], positionsAngstrom: position([0, 0, 0], [0, 0, 0.97]) };
const dihydrogen = { elements: ['H', 'H'], positionsAngstrom: position([0, 0, 0], [0, 0, 0.74]) };
const hydrogens = { elements: ['H', 'H'], positionsAngstrom: position([0, 0, 0], [0, 0, 2.5]) };
const zincAqua = {
  elements: ['Zn', 'O', 'H', 'H'],
  positionsAngstrom: position([0, 0, 0], [0, 0, 1.87], [0, 0.78, 2.46], [0, -0.78, 2.46]),
};

type Program = 'NWChem' | 'Psi4';
const request = (
  program: Program,
  task: DeckTask,
  more: Partial<DeckRequest>,
  method: Partial<MethodInput> = {},
): DeckRequest => ({
  method: methodSchema.parse({
    name: 'small',
    program,
    functional: 'B3LYP',
    basis: 'STO-3G',
    grid: 'normal',
    ...method,
  }),
  task,
  structure: water,
  charge: 0,
  multiplicity: 1,
  jobKey: 'SP1234567W',
  label: 'test run',
  cores: 1,
  memoryMb: 1000,
  ...more,
});

/** Write the deck, run it in a folder of its own and return what it prints. */
function run(wanted: DeckRequest): string {
  const deck = writeDeck(wanted);
  if (!deck.ok) throw new Error(deck.error.message);
  const folder = mkdtempSync(path.join(tmpdir(), 'deck-'));
  try {
    const file = `job.${deck.value.extension}`;
    writeFileSync(path.join(folder, file), deck.value.text);
    const command =
      wanted.method.program === 'NWChem' ? `nwchem ${file} > out` : `psi4 -n 1 -i ${file} -o out`;
    const result = spawnSync('nice', ['-n', '10', 'bash', '-c', command], {
      cwd: folder,
      env: { ...process.env, OMP_NUM_THREADS: '1', PSI_SCRATCH: folder },
      timeout: 110_000,
      encoding: 'utf8',
    });
    const output = readFileSync(path.join(folder, 'out'), 'utf8');
    if (result.status !== 0)
      throw new Error(`exit ${String(result.status)}: ${result.stderr} ${output.slice(-500)}`);
    // Every output must find its way home.
    expect(findJobKey(output)).toBe('SP1234567W');
    return output;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

const last = (output: string, pattern: RegExp): number =>
  Number([...output.matchAll(pattern)].at(-1)?.[1] ?? NaN);
const energy = (program: Program, output: string) =>
  last(output, program === 'NWChem' ? /Total DFT energy =\s+(-\d+\.\d+)/g : /Final Energy:\s+(-\d+\.\d+)/g);
const s2 = (program: Program, output: string) =>
  last(output, program === 'NWChem' ? /<S2> =\s+(\d+\.\d+)/g : /S\^2 Observed:\s+(\S+)/g);

describe.each(['NWChem', 'Psi4'] as const)('decks of %s', (program) => {
  const when = it.skipIf(!installed[program]);

  when('run a doublet single point with damping and a basis per element', { timeout: 120_000 }, () => {
    const output = run(
      request(
        program,
        'single point',
        { structure: hydroxyl, multiplicity: 2 },
        { basisPerElement: { O: 'def2-SVP' }, scf: { difficult: true } },
      ),
    );
    // Both programs, met at -75.6545 hartree on first running them; they must agree to density fitting.
    expect(energy(program, output)).toBeCloseTo(-75.6545, 3);
    expect(s2(program, output)).toBeCloseTo(0.752, 2);
  });

  when(
    'run an optimisation with frequencies, and water bends below 2000 cm⁻¹ and stretches above 3000',
    { timeout: 120_000 },
    () => {
      const output = run(request(program, 'optimisation and frequencies', {}));
      const values =
        program === 'NWChem'
          ? [...output.matchAll(/P\.Frequency\s+(.+)/g)].flatMap((match) =>
              (match[1] ?? '').trim().split(/\s+/).map(Number),
            )
          : [...output.matchAll(/Freq \[cm\^-1\]\s+(.+)/g)].flatMap((match) =>
              (match[1] ?? '').trim().split(/\s+/).map(Number),
            );
      const vibrations = values.filter((value) => Math.abs(value) > 50);
      expect(vibrations).toHaveLength(3);
      expect(vibrations[0]).toBeGreaterThan(1000);
      expect(vibrations[0]).toBeLessThan(2500);
      expect(Math.min(...vibrations.slice(1))).toBeGreaterThan(3000);
      expect(output).toMatch(
        program === 'NWChem' ? /Optimization converged/ : /Optimization is complete|Final optimized geometry/,
      );
    },
  );

  when('run an optimisation of a cation, and frequencies alone', { timeout: 120_000 }, () => {
    const cation = run(request(program, 'optimisation', { charge: 1, multiplicity: 2 }));
    expect(s2(program, cation)).toBeCloseTo(0.751, 2);
    const alone = run(request(program, 'frequencies', { structure: dihydrogen }));
    expect(alone).toMatch(program === 'NWChem' ? /P\.Frequency/ : /Freq \[cm\^-1\]/);
  });

  when(
    'break the symmetry of two separated hydrogen atoms: ⟨S²⟩ near 1, energy near two atoms',
    { timeout: 120_000 },
    () => {
      const output = run(
        request(program, 'broken symmetry', {
          structure: hydrogens,
          sites: [
            { atomIndex: 0, oxidationState: 0, unpaired: 1, spinUp: true },
            { atomIndex: 1, oxidationState: 0, unpaired: 1, spinUp: false },
          ],
        }),
      );
      // The ideal of two coupled S = 1/2 is 1; the closed shell would give 0.
      expect(s2(program, output)).toBeGreaterThan(0.9);
      expect(s2(program, output)).toBeLessThan(1.05);
      // NWChem prints the lone atom as well: −0.4675 hartree in this basis.
      expect(energy(program, output)).toBeLessThan(2 * -0.4675);
      expect(energy(program, output)).toBeGreaterThan(2 * -0.4675 - 0.01);
    },
  );

  when('run a zinc(II) monoaqua single point', { timeout: 120_000 }, () => {
    const output = run(
      request(program, 'single point', { structure: zincAqua, charge: 2 }, { basis: 'def2-SVP' }),
    );
    expect(energy(program, output)).toBeLessThan(-1850);
    expect(energy(program, output)).toBeGreaterThan(-1860);
  });

  when('know every functional of the list', { timeout: 300_000 }, () => {
    const functionals = [
      'B3LYP',
      'B3LYP*',
      'PBE0',
      'PBE',
      'BP86',
      'BLYP',
      'TPSS',
      'TPSSh',
      'M06-L',
      'M06',
      'ωB97X-D',
    ];
    const energies = functionals.flatMap((functional) => {
      const wanted = request(program, 'single point', { structure: dihydrogen }, { functional });
      return writeDeck(wanted).ok ? [energy(program, run(wanted))] : [];
    });
    // One of the list is refused by each program.
    expect(energies).toHaveLength(10);
    for (const value of energies) expect(value).toBeCloseTo(-1.16, 1);
    expect(new Set(energies.map((value) => value.toFixed(6))).size).toBe(10);
  });
});

describe('a fragment guess of NWChem', () => {
  it.skipIf(!installed.NWChem)(
    'puts ligand and sites in their places: H up, He closed, H down',
    { timeout: 120_000 },
    () => {
      const output = run(
        request('NWChem', 'broken symmetry', {
          structure: {
            elements: ['H', 'He', 'H'],
            positionsAngstrom: position([0, 0, -1.6], [0, 0, 0], [0, 0, 1.6]),
          },
          sites: [
            { atomIndex: 0, oxidationState: 0, unpaired: 1, spinUp: true },
            { atomIndex: 2, oxidationState: 0, unpaired: 1, spinUp: false },
          ],
        }),
      );
      expect(s2('NWChem', output)).toBeCloseTo(1, 1);
      // Last spin table: He first (atoms that are no site), then the sites in their order.
      const table = output.slice(output.lastIndexOf('Spin Density - Mulliken'));
      const spins = [...table.matchAll(/^\s+\d (?:He|H)\s+\d\s+(-?\d+\.\d+)/gm)]
        .slice(0, 3)
        .map((row) => Number(row[1]));
      expect(spins[0]).toBeCloseTo(0, 1);
      expect(spins[1]).toBeGreaterThan(0.9);
      expect(spins[2]).toBeLessThan(-0.9);
    },
  );
});

describe('the two programs', () => {
  it.skipIf(!installed.NWChem || !installed.Psi4)(
    'agree on the energy of water to 0.1 millihartree beyond density fitting',
    { timeout: 120_000 },
    () => {
      const of = (program: Program) =>
        energy(program, run(request(program, 'single point', {}, { basis: 'def2-SVP', grid: 'fine' })));
      expect(Math.abs(of('NWChem') - of('Psi4'))).toBeLessThan(1e-4);
    },
  );
});
