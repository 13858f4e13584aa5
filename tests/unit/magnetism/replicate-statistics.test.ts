import { describe, expect, it } from 'vitest';
import { replicateStatistics } from '@/lib/magnetism/replicate-statistics';

describe('replicateStatistics', () => {
  it('gives mean, s, standard error and the t-interval of three moments', () => {
    const result = replicateStatistics([5.87, 5.93, 5.9]);
    if (!result.ok) throw new Error(result.error.message);
    const { value } = result;
    expect(value.mean).toBeCloseTo(5.9, 12);
    expect(value.sampleStandardDeviation).toBeCloseTo(0.03, 12);
    expect(value.standardError).toBeCloseTo(0.03 / Math.sqrt(3), 12);
    expect(value.coverageFactor).toBeCloseTo(4.30265, 4);
    expect(value.interval?.low).toBeCloseTo(5.9 - 4.30265 * 0.0173205, 5);
    expect(value.interval?.high).toBeCloseTo(5.9 + 4.30265 * 0.0173205, 5);
  });

  it('leaves the scatter of a single value absent, not zero', () => {
    const result = replicateStatistics([4.2]);
    expect(result.ok && result.value.sampleStandardDeviation).toBeNull();
    expect(result.ok && result.value.interval).toBeNull();
    expect(result.ok && result.value.mean).toBe(4.2);
  });

  it('names the offending replicate', () => {
    const result = replicateStatistics([1, Number.NaN, 3]);
    expect(result).toMatchObject({ ok: false, error: { code: 'not a number', index: 1 } });
    expect(replicateStatistics([])).toMatchObject({ ok: false, error: { code: 'no values' } });
  });

  it('keeps digits when values are close to each other and far from zero', () => {
    const result = replicateStatistics([1e9 + 1, 1e9 + 2, 1e9 + 3]);
    expect(result.ok && result.value.sampleStandardDeviation).toBeCloseTo(1, 9);
  });

  it('does not depend on the order of the values', () => {
    const one = replicateStatistics([1.1, 2.7, 3.3, 0.4]);
    const two = replicateStatistics([3.3, 0.4, 2.7, 1.1]);
    expect(
      one.ok && two.ok && Math.abs((one.value.standardError ?? 0) - (two.value.standardError ?? 1)),
    ).toBeLessThan(1e-12);
  });
});
