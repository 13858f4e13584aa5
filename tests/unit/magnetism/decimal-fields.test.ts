import { describe, expect, it } from 'vitest';
import { decimal, decimals } from '@/lib/magnetism/decimal-fields';

describe('numbers typed into a form', () => {
  it.each([
    ['2.08', 2.08],
    ['2,08', 2.08],
    [' -1.5e-3 ', -0.0015],
    ['.5', 0.5],
    ['7', 7],
  ])('reads %j', (text, value) => {
    expect(decimal('x').parse(text)).toBe(value);
  });

  it.each(['', 'abc', '1.2.3', '1,234,5', '0x1F', 'Infinity', '1e999'])(
    'refuses %j and names the field',
    (text) => {
      expect(decimal('The length').safeParse(text).error?.issues[0]?.message).toContain('The length');
    },
  );

  it('reads a column with blank rows and says which value is no number', () => {
    expect(decimals('Moments', 5).parse('4,62\n\n4.64; 4.66\r\n')).toEqual([4.62, 4.64, 4.66]);
    expect(decimals('Moments', 5).safeParse('4.62\nx').error?.issues[0]?.message).toContain('value 2');
    expect(decimals('Moments', 1).safeParse('1 2').success).toBe(false);
    expect(decimals('Moments', 5).safeParse(' \n').success).toBe(false);
  });
});
