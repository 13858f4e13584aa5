import { describe, expect, it } from 'vitest';
import { emptyStep } from '@/lib/outputs/record';
import { restartStructure } from '@/lib/planning/start-structures/restart-structure';

const run = {
  ...emptyStep('ORCA'),
  geometry: {
    elements: ['O', 'H'],
    positionsAngstrom: [
      [0, 0, 0],
      [0, 0, 1],
    ] as [number, number, number][],
  },
};

describe('a restart', () => {
  it('takes the last geometry of the run', () => {
    expect(restartStructure(run, 'HO')).toEqual({ ok: true, value: run.geometry });
  });

  it('is refused without a geometry or with another composition', () => {
    expect(restartStructure(emptyStep('ORCA'), 'HO').ok).toBe(false);
    expect(restartStructure(run, 'H2O').ok).toBe(false);
  });
});
