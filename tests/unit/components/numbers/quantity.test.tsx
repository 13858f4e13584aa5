import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { formatNumber } from '@/components/numbers/format-number';
import { decimalsForUncertainty } from '@/components/numbers/format-uncertain';
import { Quantity, type QuantityProps } from '@/components/numbers/quantity';

afterEach(cleanup);

const printed = (props: QuantityProps) =>
  render(<Quantity {...props} />).container.textContent?.replaceAll('\u00a0', ' ');

describe('Quantity', () => {
  it('prints a distance with its uncertainty in the last digit', () => {
    expect(printed({ value: 2.0834, uncertainty: 0.005, notation: 'parentheses', unit: 'Angstrom' })).toBe(
      '2.083(5) Å',
    );
  });

  it('prints a moment with ± and cuts both to the digits of the uncertainty', () => {
    expect(printed({ value: 4.8712, uncertainty: 0.0614, unit: 'muB' })).toBe('4.87 ± 0.06 μB');
  });

  it('prints a true minus and groups decimals by thin spaces', () => {
    expect(printed({ value: -3480.762348419, digits: 6, unit: 'Eh' })).toBe('−3480.762\u2009348 Eh');
  });

  it('prints a power of ten with raised exponents', () => {
    const view = render(
      <Quantity
        value={0.0014703}
        uncertainty={0.0000323}
        notation="parentheses"
        powerOfTen={-3}
        unit="cm3 mol-1"
      />,
    );
    expect(view.container.textContent?.replaceAll('\u00a0', ' ')).toBe('1.470(32) × 10−3 cm3 mol−1');
    expect([...view.container.querySelectorAll('sup')].map((sup) => sup.textContent)).toEqual([
      '−3',
      '3',
      '−1',
    ]);
  });

  it('says absent where there is no value, and never 0', () => {
    expect(printed({ value: null })).toBe('absent');
    expect(printed({ value: null, unit: 'K' })).not.toMatch(/0/);
  });

  it('prints a limit as a limit', () => expect(printed({ value: 0.3, bound: 'below' })).toBe('< 0.3'));

  it('sets no space before degrees', () =>
    expect(printed({ value: 129.5, digits: 1, unit: '°' })).toBe('129.5°'));

  it('keeps an uncertainty that the asked digits would hide', () => {
    expect(printed({ value: 2.0834, uncertainty: 0.0004, digits: 1 })).toBe('2.0834 ± 0.0004');
  });
});

describe('decimalsForUncertainty', () => {
  // The three worked cases of the Particle Data Group's rounding rule (from memory): 0.119, 0.367, 0.9673.
  it.each([
    [0.119, 2],
    [0.367, 1],
    [0.9673, 1],
    [0.032, 3],
    [12, 0],
    [1.2, 1],
  ])('%f earns %i decimals', (uncertainty, decimals) =>
    expect(decimalsForUncertainty(uncertainty)).toBe(decimals),
  );
});

describe('formatNumber', () => {
  it('prints no minus before a zero', () => expect(formatNumber(-0.0004, 3)).toBe('0.000'));
  it('groups five digits and more', () =>
    expect([formatNumber(19262), formatNumber(1401)]).toEqual(['19\u2009262', '1401']));
  it('refuses what is not finite', () =>
    expect(() => formatNumber(Number.NaN)).toThrow(/finite; received NaN/));
});
