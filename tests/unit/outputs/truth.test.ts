import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { programs } from '@/lib/outputs/programs';
import { readOutput } from '@/lib/outputs/reader';
import type { OutputRecord, Population } from '@/lib/outputs/record';
import { demoFolder, outputsFolder, readDemoTruth, readTruth, type Truth } from './shared-outputs';

const known = new Set<string>(programs.map(({ name }) => name));
const truths = readTruth().filter(({ program }) => known.has(program));

/**
 * Values of the truth table that the record rightly does not repeat:
 * - after coupled cluster the table gives the populations of the correlated density; the record keeps those of
 *   the wavefunction that its energy belongs to, which the same file prints above.
 */
const otherDensity = new Set(['orca/water-ccsd-t.out']);

const outcomes = { normal: 'finished', error: 'failed', incomplete: 'cut off' } as const;
const plainName = (name: string | null | undefined) => name?.toLowerCase().replace(/^(?:u|ro?)(?=[a-z])/, '');

function populationOf(record: OutputRecord, scheme: Population['scheme']) {
  return record.populations.find((population) => population.scheme === scheme)?.atoms ?? [];
}

function expectPopulations(record: OutputRecord, truth: Truth) {
  const rows = [
    ['Mulliken', 'spin', truth.mulliken_spin_first5],
    ['Mulliken', 'charge', otherDensity.has(truth.file) ? null : truth.mulliken_charge_first5],
    ['Löwdin', 'spin', truth.loewdin_spin_first5],
  ] as const;
  for (const [scheme, column, expected] of rows) {
    if (!expected) continue;
    const atoms = populationOf(record, scheme).slice(0, expected.length);
    expect(atoms.map((atom) => atom.element)).toEqual(expected.map(([element]) => element));
    for (const [i, [, value]] of expected.entries())
      expect(atoms[i]?.[column], `${scheme} ${column} ${i}`).toBeCloseTo(value, 6);
  }
  if (truth.mulliken_spin_sum === null) return;
  const sum = populationOf(record, 'Mulliken').reduce((total, atom) => total + (atom.spin ?? 0), 0);
  expect(sum).toBeCloseTo(truth.mulliken_spin_sum, 1);
}

describe.skipIf(truths.length === 0)('real outputs', () => {
  it.each(truths)('$file is read as its text states', (truth) => {
    const record = readOutput(readFileSync(path.join(outputsFolder, truth.file)));
    expect(record.program).toBe(truth.program);
    expect(record.version).toContain(truth.version);
    expect(record.outcome).toBe(outcomes[truth.terminated]);
    expect(record.charge).toBe(truth.charge);
    expect(record.multiplicity).toBe(truth.multiplicity);
    expect(record.atomCount).toBe(truth.natoms);
    expect(record.formula).toBe(truth.formula);
    expect(plainName(record.method.functional)).toBe(plainName(truth.method));
    expect(plainName(record.method.basis)).toBe(plainName(truth.basis));
    expect(record.energyHartree).toBe(truth.energy_hartree);
    expect(record.scf.converged).toBe(truth.scf_converged);
    expect(record.optimisation?.converged ?? null).toBe(truth.opt_converged);
    expect(record.optimisation?.steps ?? null).toBe(truth.opt_steps);
    expect(record.spin.s2).toBe(truth.s2);
    expect(record.spin.s2Ideal).toBe(truth.s2_ideal);
    expectPopulations(record, truth);
    expect(record.frequencies?.count ?? null).toBe(truth.n_frequencies);
    expect(record.frequencies?.lowestCm1 ?? null).toBe(truth.lowest_frequency_cm1);
    expect(record.frequencies?.imaginaryCount ?? null).toBe(truth.n_imaginary);
    expect(record.thermochemistry?.zeroPointHartree ?? null).toBe(truth.zpe_hartree);
    expect(record.thermochemistry?.gibbsHartree ?? null).toBe(truth.gibbs_hartree);
    for (const [key, value] of [
      ['homoEv', truth.homo_ev_alpha],
      ['lumoEv', truth.lumo_ev_alpha],
    ] as const) {
      if (value === null) expect(record.orbitals?.alpha[key] ?? null).toBeNull();
      else expect(record.orbitals?.alpha[key]).toBeCloseTo(value, 3);
    }
    if (truth.wall_seconds === null) expect(record.resources.wallSeconds).toBeNull();
    else expect(record.resources.wallSeconds).toBeCloseTo(truth.wall_seconds, 3);
    for (const [i, [element, ...position]] of (truth.final_geometry_first3_angstrom ?? []).entries()) {
      expect(record.geometry?.elements[i]).toBe(element);
      for (const [axis, value] of position.entries())
        expect(Math.abs((record.geometry?.positionsAngstrom[i]?.[axis] ?? NaN) - value)).toBeLessThan(
          1.05e-6,
        );
    }
    if (truth.jobs)
      expect(record.steps.map((step) => step.energyHartree).slice(-truth.jobs.length)).toEqual(
        truth.jobs.map((job) => job.energy_hartree),
      );
  });

  it.each(truths)('$file: every value cited stands on the line it is cited from', (truth) => {
    const bytes = readFileSync(path.join(outputsFolder, truth.file));
    const lines = bytes.toString('latin1').split('\n');
    const record = readOutput(bytes);
    expect(Object.keys(record.evidence)).not.toHaveLength(0);
    for (const { evidence } of [record, ...record.steps])
      for (const [name, { line, text }] of Object.entries(evidence)) {
        expect(text.length).toBeLessThanOrEqual(200);
        const printed = Buffer.from(lines[line - 1] ?? '', 'latin1').toString('utf8');
        expect(printed.trim().slice(0, 200), `${name} line ${line}`).toBe(text);
      }
    for (const key of ['energyHartree', 'charge', 'multiplicity', 'geometry', 'dipoleDebye'] as const)
      if (record[key] !== null) expect(record.evidence, key).toHaveProperty(key);
  });
});

const demo = readDemoTruth().filter(({ file }) => known.has(file.startsWith('nwchem') ? 'NWChem' : 'Psi4'));

describe.skipIf(demo.length === 0)('outputs calculated for this project', () => {
  it.each(demo)('$file is read as calculated', (truth) => {
    const record = readOutput(readFileSync(path.join(demoFolder, truth.file)));
    expect(record.outcome === 'finished').toBe(truth.finished);
    expect(record.charge).toBe(truth.charge);
    expect(record.multiplicity).toBe(truth.multiplicity);
    if (!truth.finished) return;
    expect(record.optimisation?.converged ?? false).toBe(truth.optimisationConverged);
    expect(record.energyHartree).toBe(truth.lastEnergyHartree);
    expect(record.spin.s2).toBe(truth.s2);
    expect(record.spin.s2Ideal).toBe(truth.s2Ideal);
    expect(record.warnings).toEqual([]);
  });
});
