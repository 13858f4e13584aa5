import { describe, expect, it } from 'vitest';
import { emptyStep, type Step } from '@/lib/outputs/record';
import { followUps } from '@/lib/planning/follow-ups';
import { ferrate, method } from './decks/deck-cases';

const job = {
  jobKey: 'SP1234567W',
  method: method({ program: 'NWChem' }),
  task: 'optimisation' as const,
  structure: ferrate,
  charge: -2,
  multiplicity: 5,
};
const tasks = (more: Partial<Step>, others: number[] = []) =>
  followUps(job, { ...emptyStep('NWChem'), outcome: 'finished', ...more }, others).map((item) => [
    item.task,
    item.multiplicity,
  ]);
const optimised = { converged: true, steps: 3, energiesHartree: [], history: [] };

describe('follow-up jobs', () => {
  it('are frequencies and vertical single points after a converged optimisation', () => {
    expect(tasks({ optimisation: optimised }, [5, 3, 1, 3])).toEqual([
      ['frequencies', 5],
      ['single point', 3],
      ['single point', 1],
    ]);
  });

  it('are the same task again after running out of steps or being cut off', () => {
    expect(tasks({ optimisation: { ...optimised, converged: false } })).toEqual([['optimisation', 5]]);
    expect(tasks({ outcome: 'cut off' })).toEqual([['optimisation', 5]]);
  });

  it('are a stability analysis when ⟨S²⟩ is more than a tenth from its ideal, and none within', () => {
    const spin = (s2: number) => ({ spin: { s2, s2Ideal: 3.75, s2AfterAnnihilation: null } });
    expect(tasks(spin(4.75))).toEqual([['stability', 5]]);
    expect(tasks(spin(3.8))).toEqual([]);
  });

  it('are a new optimisation after imaginary frequencies', () => {
    const frequencies = { count: 9, lowestCm1: -80, imaginaryCount: 1, valuesCm1: [] };
    expect(tasks({ optimisation: optimised, frequencies })).toEqual([['optimisation', 5]]);
  });
});
