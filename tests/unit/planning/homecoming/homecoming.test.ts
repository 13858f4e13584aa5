import { describe, expect, it } from 'vitest';
import { emptyStep, type Step } from '@/lib/outputs/record';
import { canonicalFunctional } from '@/lib/planning/homecoming/canonical-functional';
import { checkReturn } from '@/lib/planning/homecoming/check-return';
import { matchRun } from '@/lib/planning/homecoming/match-run';
import type { PlannedJob } from '@/lib/planning/homecoming/planned-job';
import { ferrate, method } from '../decks/deck-cases';

const planned: PlannedJob = {
  jobKey: 'SP1234567W',
  method: method({ program: 'NWChem' }),
  task: 'optimisation',
  structure: ferrate,
  charge: -2,
  multiplicity: 5,
};
const triplet: PlannedJob = { ...planned, jobKey: 'SP00000000', multiplicity: 3 };
const run = (more: Partial<Step>): Step => ({
  ...emptyStep('NWChem'),
  outcome: 'finished',
  tasks: ['optimisation'],
  formula: 'Cl4Fe',
  charge: -2,
  multiplicity: 5,
  method: { ...emptyStep(null).method, functional: 'B3LYP', basis: 'def2-svp' },
  energyHartree: -3104,
  scf: { converged: true, iterations: 12 },
  optimisation: { converged: true, steps: 4, energiesHartree: [], history: [] },
  geometry: { elements: [...ferrate.elements], positionsAngstrom: ferrate.positionsAngstrom },
  ...more,
});

describe('a returned run', () => {
  it('finds its job by the key alone, even where its multiplicity is wrong', () => {
    const found = matchRun(run({ jobKey: 'SP1234567W', multiplicity: 3 }), [triplet, planned]);
    expect(found).toEqual({ matchedJobKey: 'SP1234567W', unknownJobKey: null, suggestions: [] });
  });

  it('is never matched without a key, only proposed, best first and with reasons', () => {
    const found = matchRun(run({}), [triplet, planned]);
    expect(found.matchedJobKey).toBeNull();
    expect(found.suggestions.map((item) => item.jobKey)).toEqual(['SP1234567W', 'SP00000000']);
    expect(found.suggestions[0]?.score).toBe(1);
    expect(found.suggestions[1]?.score).toBeLessThan(0.9);
    expect(found.suggestions[1]?.reasons).toContain('multiplicity differs: planned 3, returned 5');
  });

  it('says that its key is unknown, and is proposed nothing of another composition', () => {
    const found = matchRun(run({ jobKey: 'SP7777777' + 'Z', formula: 'C2H6' }), [planned]);
    expect(found).toEqual({ matchedJobKey: null, unknownJobKey: 'SP7777777Z', suggestions: [] });
  });
});

describe('plan against return', () => {
  const verdicts = (step: Step, same: boolean | null = true) =>
    Object.fromEntries(checkReturn(planned, step, same).map((check) => [check.field, check.verdict]));

  it('agrees in every field for the right run', () => {
    expect(new Set(Object.values(verdicts(run({}))))).toEqual(new Set(['agrees']));
  });

  it.each<[string, Partial<Step>]>([
    ['multiplicity', { multiplicity: 3 }],
    ['charge', { charge: -1 }],
    ['program', { program: 'ORCA' }],
    ['composition', { formula: 'C2H6' }],
    ['outcome', { outcome: 'cut off' }],
    ['SCF convergence', { scf: { converged: false, iterations: 300 } }],
    [
      'geometry convergence',
      { optimisation: { converged: false, steps: 100, energiesHartree: [], history: [] } },
    ],
    ['task', { optimisation: null }],
    ['basis', { method: { ...run({}).method, basis: 'sto-3g' } }],
    ['functional', { method: { ...run({}).method, functional: 'pbe0' } }],
  ])('differs in %s where it does', (field, more) => {
    expect(verdicts(run(more))[field]).toBe('differs');
  });

  it('tells bonds that changed, and does not pretend where nothing is printed or known', () => {
    expect(verdicts(run({}), false)['connectivity']).toBe('differs');
    expect(verdicts(run({}), null)['connectivity']).toBe('not printed');
    expect(verdicts(run({ charge: null }))['charge']).toBe('not printed');
    expect(
      verdicts(run({ method: { ...run({}).method, functional: 'our own mixture' } }))['functional'],
    ).toBe('cannot tell');
  });
});

describe('the name of a functional', () => {
  // Left: as the programs print it (Gaussian's SCF line, NWChem's xc input, ORCA's keyword).
  it.each([
    ['Gaussian', 'UPBE1PBE', 'PBE0'],
    ['Gaussian', 'RB3LYP', 'B3LYP'],
    ['NWChem', 'becke88 perdew86', 'BP86'],
    ['ORCA', 'B3LYP/G', 'B3LYP'],
    ['ORCA', 'B3LYP', 'B3LYP with VWN5'],
    ['Psi4', 'PBE0', 'PBE0'],
    ['Psi4', 'TPSSH', 'TPSSh'],
    ['Psi4', 'made up', null],
  ] as const)('of %s %s is %s', (program, printed, name) => {
    expect(canonicalFunctional(program, printed)).toBe(name);
  });
});
