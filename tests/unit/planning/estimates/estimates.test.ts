import { describe, expect, it } from 'vitest';
import { clusterSchema } from '@/lib/planning/cluster';
import { basisFunctionCount } from '@/lib/planning/estimates/basis-function-count';
import { planEstimate } from '@/lib/planning/estimates/plan-estimate';
import { wallTimeEstimate, type EarlierRun } from '@/lib/planning/estimates/wall-time-estimate';

const earlier = (basisFunctions: number, wallSeconds: number, cores = 2): EarlierRun => ({
  program: 'NWChem',
  task: 'optimisation',
  basisFunctions,
  wallSeconds,
  cores,
});
const wanted = { program: 'NWChem', task: 'optimisation', basisFunctions: 400, cores: 4 } as const;

describe('the number of basis functions', () => {
  // def2-SVP is [3s2p1d] = 14 on O and [2s1p] = 5 on H, def2-TZVP [5s3p2d1f] = 31 on O; Weigend and Ahlrichs 2005.
  it('of water is 24 in def2-SVP, 43 in def2-TZVP, 7 in STO-3G and 19 in 6-31G(d)', () => {
    const count = (basis: string) => basisFunctionCount(['O', 'H', 'H'], basis);
    expect([count('def2-SVP'), count('def2-TZVP'), count('STO-3G'), count('6-31G(d)')]).toEqual([
      24, 43, 7, 19,
    ]);
  });

  it('of tetrachloridoferrate is 31 + 4·18 = 103 in def2-SVP and 117 with iron in def2-TZVP', () => {
    const atoms = ['Fe', 'Cl', 'Cl', 'Cl', 'Cl'];
    expect(basisFunctionCount(atoms, 'def2-SVP')).toBe(103);
    expect(basisFunctionCount(atoms, 'def2-SVP', { Fe: 'def2-TZVP' })).toBe(117);
  });

  it('is absent where the set or the element is not known', () => {
    expect(basisFunctionCount(['O'], 'our basis')).toBeNull();
    expect(basisFunctionCount(['Ce'], 'def2-SVP')).toBeNull();
  });
});

describe('an estimated wall time', () => {
  it('is honest without earlier runs of that program and task', () => {
    expect(wallTimeEstimate([], wanted)).toEqual({ kind: 'no earlier runs' });
    expect(wallTimeEstimate([{ ...earlier(100, 10), task: 'frequencies' }], wanted)).toEqual({
      kind: 'no earlier runs',
    });
  });

  it('finds the power law it was made from, and no spread', () => {
    const runs = [50, 100, 200, 800].map((size) => earlier(size, 1e-4 * size ** 2.5));
    const estimate = wallTimeEstimate(runs, wanted);
    if (estimate.kind !== 'fitted') throw new Error('not fitted');
    expect(estimate.exponent).toBeCloseTo(2.5, 10);
    // Twice the cores of the earlier runs, half the time.
    expect(estimate.wallSeconds).toBeCloseTo((1e-4 * 400 ** 2.5) / 2, 6);
    expect(estimate.spread).toBeCloseTo(0, 10);
    expect(estimate.extrapolated).toBe(false);
    expect(estimate.coreHours).toBeCloseTo((2e-4 * 400 ** 2.5) / 3600, 8);
  });

  it('gets a wider band from scattered runs and says when it extrapolates', () => {
    const runs = [50, 100, 200, 300].map((size, index) =>
      earlier(size, 1e-3 * size ** 2 * (index % 2 ? 2 : 0.5)),
    );
    const estimate = wallTimeEstimate(runs, wanted);
    if (estimate.kind !== 'fitted' || estimate.wallSecondsHigh === null || estimate.wallSecondsLow === null)
      throw new Error('no band');
    expect(estimate.wallSecondsHigh / estimate.wallSecondsLow).toBeGreaterThan(10);
    expect(estimate.extrapolated).toBe(true);
  });

  it('assumes the exponent when there is one run or one size, and has no band from one run', () => {
    const single = wallTimeEstimate([earlier(200, 100)], wanted);
    expect(single).toMatchObject({ exponentFitted: false, exponent: 3, wallSecondsHigh: null, runs: 1 });
    // Twice the size to the third power, on twice the cores.
    if (single.kind === 'fitted') expect(single.wallSeconds).toBeCloseTo(400, 6);
    expect(wallTimeEstimate([earlier(200, 100), earlier(200, 110), earlier(201, 90)], wanted)).toMatchObject({
      exponentFitted: false,
    });
  });

  it('adds up to core-hours and warns about jobs beyond the cluster’s time', () => {
    const cluster = clusterSchema.parse({ name: 'c', scheduler: 'Slurm', wallMinutes: 5 });
    const long = wallTimeEstimate([earlier(200, 100)], wanted);
    const total = planEstimate(
      [
        { jobKey: 'SP1234567W', estimate: long },
        { jobKey: 'SP00000000', estimate: { kind: 'no earlier runs' } },
      ],
      cluster,
    );
    expect(total).toMatchObject({ estimated: 1, notEstimated: 1 });
    expect(total.coreHours).toBeCloseTo(1600 / 3600, 10);
    expect(total.warnings.map((warning) => warning.jobKey)).toEqual(['SP1234567W']);
  });
});
