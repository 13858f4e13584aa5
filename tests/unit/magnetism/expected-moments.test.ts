import { describe, expect, it } from 'vitest';
import { expectedMoments } from '@/lib/magnetism/expected-moments';

const divalent = { Mn: 5, Fe: 6, Co: 7, Ni: 8, Cu: 9, Zn: 10 };

describe('expectedMoments', () => {
  it('has a band for every spin state of the divalent ions from Mn to Zn in T-4, SP-4 and OC-6', () => {
    for (const [element, dCount] of Object.entries(divalent)) {
      const most = dCount <= 5 ? dCount : 10 - dCount;
      for (const geometry of ['T-4', 'SP-4', 'OC-6'])
        for (let unpaired = most; unpaired >= 0; unpaired -= 2) {
          const band = expectedMoments({ element, oxidationState: 2, dCount }, unpaired + 1, geometry);
          if (!band) throw new Error(`${element} ${geometry} n = ${unpaired} has no band`);
          expect(band.high).toBeGreaterThanOrEqual(band.low);
          expect(band.spinPlusOrbit).toBeGreaterThanOrEqual(band.spinOnly);
          expect(band.source).not.toBe('');
        }
    }
  });

  it('falls back to labelled limits where no handbook range exists', () => {
    const band = expectedMoments({ element: 'Ru', oxidationState: 3, dCount: 5 }, 2, 'OC-6');
    expect(band).toMatchObject({ tag: 'limits' });
    expect(band?.low).toBeCloseTo(Math.sqrt(3), 12);
    expect(band?.high).toBeCloseTo(3, 12);
  });

  it('gives limits when the geometry is not known', () => {
    expect(expectedMoments({ element: 'Ni', oxidationState: 2, dCount: 8 }, 3, null)?.tag).toBe('limits');
    expect(expectedMoments({ element: 'Zn', oxidationState: 2, dCount: 10 }, 1, null)?.tag).toBe('soft');
  });

  it('is null for a multiplicity that the d count cannot carry', () => {
    expect(expectedMoments({ element: 'Zn', oxidationState: 2, dCount: 10 }, 3, 'T-4')).toBeNull();
    expect(expectedMoments({ element: 'Cu', oxidationState: 2, dCount: 9 }, 4, 'SP-4')).toBeNull();
  });
});
