import { describe, expect, it } from 'vitest';
import { formatWithUncertainty } from '@/lib/chemistry/format-uncertainty';

describe('formatWithUncertainty', () => {
  it.each([
    [2.0831, 0.0049, '2.083(5)'],
    [4.8712, 0.0123, '4.871(12)'],
    [4.8712, 0.0195, '4.87(2)'],
    [1.9996, 0.0096, '2.000(10)'],
    [10.24, 1.3, '10.2(13)'],
    [1234.4, 23, '1230(20)'],
    [1234.4, 140, '1230(140)'],
    [0, 0.31, '0.0(3)'],
    [-0.004, 0.31, '0.0(3)'],
    [-3.52, 0.4, '−3.5(4)'],
    [5.9575e-6, 2.1e-8, '5.96(2)×10⁻⁶'],
    [-1.178e-4, 1.2e-5, '−1.18(12)×10⁻⁴'],
  ])('writes %f with u = %f as %s in brackets', (value, u, text) => {
    expect(formatWithUncertainty(value, u)).toBe(text);
  });

  it('writes the plus-minus form to the same digit on both sides', () => {
    expect(formatWithUncertainty(4.8712, 0.058, { style: 'plus-minus' })).toBe('4.87 ± 0.06');
    expect(formatWithUncertainty(5.9575e-6, 2.1e-8, { style: 'plus-minus' })).toBe('(5.96 ± 0.02)×10⁻⁶');
  });

  it('shows few digits and no uncertainty when none is known', () => {
    expect(formatWithUncertainty(4.87123, null)).toBe('4.87');
    expect(formatWithUncertainty(249.686, null, { digitsWithoutUncertainty: 5 })).toBe('249.69');
    expect(formatWithUncertainty(0, null)).toBe('0.00');
  });

  it('never shows more digits than the uncertainty supports', () => {
    for (let k = 1; k < 400; k += 1) {
      const u = 10 ** ((k % 7) - 3) * (1 + (k % 89) / 10);
      const text = formatWithUncertainty(123.456789 / k, u);
      const shown = /\((\d+)\)/.exec(text)?.[1] ?? '';
      const significant = shown.replace(/0+$/, '') || shown;
      expect(significant.length).toBeLessThanOrEqual(2);
    }
  });

  it('rejects what is no number', () => {
    expect(() => formatWithUncertainty(Number.NaN, 1)).toThrow(RangeError);
    expect(() => formatWithUncertainty(1, -1)).toThrow(RangeError);
  });
});
