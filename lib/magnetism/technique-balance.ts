import { z } from 'zod';
import { exact, quantityInput } from './quantity-input';
import { quantitySchema } from './quantity-schema';
import { showNumber } from './show-number';
import { AIR_SOURCE, AIR_VOLUME_SUSCEPTIBILITY, type TechniquePlan } from './technique-plan';

/** Readings of a moving-magnet susceptibility balance. R and R₀ are the display, in the balance's own units. */
export const balanceReadingsSchema = z.strictObject({
  balanceConstant: quantitySchema({
    label: 'balance constant',
    unit: '(C, near 1)',
    range: 'above zero',
    advice: 'Take it from a calibrant run or from the instrument.',
  }),
  lengthCentimetre: quantitySchema({
    label: 'sample length',
    unit: 'cm',
    range: 'above zero',
    advice: 'Measure the height of the packed powder; balances ask for at least 1.5 cm.',
  }),
  reading: quantitySchema({ label: 'reading of the filled tube', unit: '(display)', range: 'any' }),
  readingEmpty: quantitySchema({
    label: 'reading of the empty tube',
    unit: '(display, often negative)',
    range: 'any',
  }),
  massGram: quantitySchema({
    label: 'sample mass',
    unit: 'g',
    range: 'above zero',
    advice: 'Enter filled tube minus empty tube, not the other way round.',
  }),
  tubeCrossSectionSquareCentimetre: quantitySchema({
    label: 'inner cross-section of the tube',
    unit: 'cm²',
    range: 'above zero',
  }).optional(),
});
export type BalanceReadings = z.infer<typeof balanceReadingsSchema>;

/**
 * χ_g = C l (R − R₀)/(10⁹ m), with l in cm, m in g; with the tube's cross-section A also the displaced air,
 * χ_g = (l/m)[10⁻⁹ C (R − R₀) + κ_air A]. Result in cm³/g, cgs-emu.
 * Source: balance practice; the form is given on the Imperial College teaching page for CuSO4·5H2O.
 * Checked against: tests/published/magnetism-magnetometry.test.ts.
 */
export function balancePlan(readings: BalanceReadings): TechniquePlan {
  const area = readings.tubeCrossSectionSquareCentimetre;
  const inputs = [
    quantityInput('balanceConstant', 'C', 'balance constant', readings.balanceConstant, ''),
    quantityInput('lengthCentimetre', 'l', 'sample length', readings.lengthCentimetre, 'cm'),
    quantityInput('reading', 'R', 'reading, filled', readings.reading, ''),
    quantityInput('readingEmpty', 'R₀', 'reading, empty', readings.readingEmpty, ''),
    quantityInput('massGram', 'm', 'sample mass', readings.massGram, 'g'),
  ];
  if (area) {
    inputs.push(quantityInput('areaCm2', 'A', 'cross-section of the tube', area, 'cm²'));
    inputs.push(
      quantityInput('kappaAir', 'κ_air', 'air, per volume', exact(AIR_VOLUME_SUSCEPTIBILITY), '', AIR_SOURCE),
    );
  }
  return {
    inputs,
    reaches: 'chiG',
    warnings: [],
    steps: [
      {
        key: 'chiGObserved',
        symbol: 'χ_g',
        expression: area ? '(l/m)·[10⁻⁹·C·(R − R₀) + κ_air·A]' : 'C·l·(R − R₀)/(10⁹·m)',
        numbers: (at) => {
          const n = (key: string) => showNumber(at(key));
          const difference = `(${n('reading')} − (${n('readingEmpty')}))`;
          return area
            ? `(${n('lengthCentimetre')}/${n('massGram')})·[10⁻⁹·${n('balanceConstant')}·${difference} + ${n('kappaAir')}·${n('areaCm2')}]`
            : `${n('balanceConstant')}·${n('lengthCentimetre')}·${difference}/(10⁹·${n('massGram')})`;
        },
        unit: 'cm³/g',
        source: 'moving-magnet balance relation (common practice)',
        evaluate: (at) => {
          const air = area ? at('kappaAir') * at('areaCm2') : 0;
          const display = 1e-9 * at('balanceConstant') * (at('reading') - at('readingEmpty'));
          return (at('lengthCentimetre') / at('massGram')) * (display + air);
        },
      },
    ],
  };
}
