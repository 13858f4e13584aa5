import { describe, expect, it } from 'vitest';
import { compareComplex, type ComparedRun } from '@/lib/comparison/complex-comparison';
import { measuredMoment } from '@/lib/comparison/measured-moment';
import { momentVerdict } from '@/lib/comparison/verdict';

const nickel = { metal: 'Ni', oxidationState: 2, composition: 'Cl4Ni', charge: -2 };
const candidates = [
  { id: 'square', geometry: 'SP-4', multiplicity: 1 },
  { id: 'tetrahedron', geometry: 'T-4', multiplicity: 3 },
];
const run = (change: Partial<ComparedRun>): ComparedRun => ({
  id: 'run',
  candidateId: 'tetrahedron',
  formula: 'Cl4Ni',
  charge: -2,
  outcome: 'finished',
  program: 'NWChem',
  functional: 'B3LYP',
  basis: 'def2-SVP',
  dispersion: null,
  solvation: null,
  relativity: null,
  energyHartree: -1,
  s2: 2,
  s2Ideal: 2,
  scfConverged: true,
  optimisationConverged: true,
  ...change,
});
const two = [
  run({ id: 't', energyHartree: -1.01 }),
  run({ id: 's', candidateId: 'square', energyHartree: -1 }),
];

describe('comparing a complex', () => {
  it('favours the lowest candidate and gives gaps in kJ/mol', () => {
    const { favoured, candidates: rows } = compareComplex(nickel, candidates, two, null);
    expect(favoured?.candidate.id).toBe('tetrahedron');
    // 0.01 hartree = 26.25500 kJ/mol (CODATA 2022).
    expect(rows[1]?.gapKJPerMol).toBeCloseTo(26.255, 3);
  });

  it('never sets energies of two levels, compositions or charges against each other', () => {
    for (const other of [
      { functional: 'PBE0' },
      { basis: 'def2-TZVP' },
      { program: 'Psi4' },
      { solvation: 'water' },
      { formula: 'Cl3Ni' },
      { charge: -1 },
    ]) {
      const mixed = [
        two[0] as ComparedRun,
        run({ id: 's', candidateId: 'square', energyHartree: -5, ...other }),
      ];
      const { candidates: rows } = compareComplex(nickel, candidates, [...mixed, run({ id: 'again' })], null);
      expect(
        rows.filter(({ run: used }) => used !== null).map(({ candidate }) => candidate.id),
        JSON.stringify(other),
      ).toEqual(['tetrahedron']);
    }
  });

  it('leaves out runs that failed, were cut off or did not converge', () => {
    for (const bad of [
      { outcome: 'failed' },
      { outcome: 'cut off' },
      { scfConverged: false },
      { optimisationConverged: false },
      { energyHartree: null },
    ] as const) {
      expect(compareComplex(nickel, candidates, [run(bad)], null).favoured).toBeNull();
    }
  });

  it('says joined, broken, dotted or one-ended', () => {
    const moment = (mu: number) => measuredMoment([mu], 0.03);
    const mark = (mu: number | null, runs = two) =>
      compareComplex(nickel, candidates, runs, mu === null ? null : moment(mu)).agreement;
    // Tetrahedral nickel(II): 3.2–4.1 μB (handbook range, recalled); octahedral-like 2.97 lies below it.
    expect(mark(3.5)).toBe('joined');
    expect(mark(2.97)).toBe('broken');
    expect(mark(3.17)).toBe('dotted');
    expect(mark(null)).toBe('one-ended calculated');
    expect(mark(3.5, [])).toBe('one-ended measured');
    expect(mark(null, [])).toBe('nothing');
  });

  it('cannot tell when a near rival’s band holds the moment too', () => {
    const copper = { metal: 'Cu', oxidationState: 2, composition: 'Cl4Cu', charge: -2 };
    const doublets = candidates.map((candidate) => ({ ...candidate, multiplicity: 2 }));
    const runs = two.map((each) => ({ ...each, formula: 'Cl4Cu' }));
    const far = [runs[0], { ...runs[1], energyHartree: -0.9 }] as ComparedRun[];
    expect(compareComplex(copper, doublets, runs, measuredMoment([1.97], 0.02)).agreement).toBe('dotted');
    // 0.11 hartree = 289 kJ/mol: no rival any more.
    expect(compareComplex(copper, doublets, far, measuredMoment([1.97], 0.02)).agreement).toBe('joined');
  });
});

describe('the verdict of a moment on a band', () => {
  it('depends on the value first and on the interval at the edges', () => {
    const band = { low: 3, high: 4 };
    expect(momentVerdict(3, 0, band)).toBe('consistent');
    expect(momentVerdict(2.95, 0.06, band)).toBe('cannot tell');
    expect(momentVerdict(2.95, 0.04, band)).toBe('excluded');
    expect(momentVerdict(4.2, 0.1, band)).toBe('excluded');
  });
});

describe('a moment from replicates', () => {
  it('adds scatter and systematic part in quadrature', () => {
    // By hand: mean 4.64, s = 0.02, s/√3 = 0.011547; √(0.011547² + 0.02²) = 0.023094.
    const moment = measuredMoment([4.62, 4.64, 4.66], 0.02);
    expect(moment?.muBohr).toBeCloseTo(4.64, 10);
    expect(moment?.uMuBohr).toBeCloseTo(0.023094, 6);
    // n = √(1 + μ²) − 1 = 3.746535; u(n) = μ u/√(1 + μ²) = 0.022575.
    expect(moment?.unpaired).toBeCloseTo(3.746535, 5);
    expect(moment?.uUnpaired).toBeCloseTo(0.022575, 5);
  });

  it('shows no scatter of a single value and refuses none', () => {
    expect(measuredMoment([3], 0.1)).toMatchObject({ uMuBohr: 0.1, scatterKnown: false });
    expect(measuredMoment([], 0.1)).toBeNull();
  });
});
