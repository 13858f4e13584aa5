import { z } from 'zod';
import { quantityInput } from './quantity-input';
import { quantitySchema } from './quantity-schema';
import { showNumber } from './show-number';
import type { TechniquePlan } from './technique-plan';
import type { StepDefinition } from './worked-step';

const moment = (label: string, unit: string) => quantitySchema({ label, unit, range: 'any' }).optional();

/** One magnetometer point: the long moment and the field, in cgs-emu or in SI, each given once. */
export const magnetometerReadingsSchema = z
  .strictObject({
    massGram: quantitySchema({
      label: 'sample mass',
      unit: 'g',
      range: 'above zero',
      advice: '10 mg is 0.010 g.',
    }),
    momentEmu: moment('magnetic moment', 'emu'),
    momentAmpereSquareMetre: moment('magnetic moment', 'A·m²'),
    holderMomentEmu: moment('moment of the empty holder', 'emu'),
    fieldOersted: quantitySchema({ label: 'field', unit: 'Oe', range: 'above zero' }).optional(),
    fieldTesla: quantitySchema({ label: 'field', unit: 'T', range: 'above zero', most: 100 }).optional(),
  })
  .superRefine((readings, ctx) => {
    if ((readings.momentEmu === undefined) === (readings.momentAmpereSquareMetre === undefined))
      ctx.addIssue({
        code: 'custom',
        path: ['momentEmu'],
        message: 'Enter the moment once: momentEmu or momentAmpereSquareMetre.',
      });
    if ((readings.fieldOersted === undefined) === (readings.fieldTesla === undefined))
      ctx.addIssue({
        code: 'custom',
        path: ['fieldOersted'],
        message: 'Enter the field once: fieldOersted or fieldTesla.',
      });
  });
export type MagnetometerReadings = z.infer<typeof magnetometerReadingsSchema>;

function conversion(key: string, symbol: string, from: string, factor: number, unit: string): StepDefinition {
  return {
    key,
    symbol,
    expression: `${showNumber(factor)}·${symbol}(SI)`,
    numbers: (at) => `${showNumber(factor)}·${showNumber(at(from))}`,
    unit,
    source: 'definition of the cgs-emu unit',
    evaluate: (at) => factor * at(from),
  };
}

/**
 * χ_g = (m_obs − m_holder)/(m H), valid while the moment is linear in the field. Result in cm³/g, cgs-emu
 * (1 emu = 10⁻³ A·m², 1 T ≙ 10⁴ Oe).
 * Checked against: tests/published/magnetism-magnetometry.test.ts.
 */
export function magnetometerPlan(readings: MagnetometerReadings): TechniquePlan {
  const inputs = [quantityInput('massGram', 'm', 'sample mass', readings.massGram, 'g')];
  const steps: StepDefinition[] = [];
  if (readings.momentEmu) inputs.push(quantityInput('momentEmu', 'μ', 'moment', readings.momentEmu, 'emu'));
  if (readings.momentAmpereSquareMetre) {
    inputs.push(quantityInput('momentSi', 'μ(SI)', 'moment', readings.momentAmpereSquareMetre, 'A·m²'));
    steps.push(conversion('momentEmu', 'μ', 'momentSi', 1e3, 'emu'));
  }
  if (readings.fieldOersted)
    inputs.push(quantityInput('fieldOersted', 'H', 'field', readings.fieldOersted, 'Oe'));
  if (readings.fieldTesla) {
    inputs.push(quantityInput('fieldTesla', 'H(SI)', 'field', readings.fieldTesla, 'T'));
    steps.push(conversion('fieldOersted', 'H', 'fieldTesla', 1e4, 'Oe'));
  }
  const holder = readings.holderMomentEmu;
  if (holder) inputs.push(quantityInput('holderEmu', 'μ_holder', 'moment of the holder', holder, 'emu'));
  const net = (at: (key: string) => number) => at('momentEmu') - (holder ? at('holderEmu') : 0);
  steps.push({
    key: 'chiGObserved',
    symbol: 'χ_g',
    expression: holder ? '(μ − μ_holder)/(m·H)' : 'μ/(m·H)',
    numbers: (at) =>
      `${showNumber(net(at))}/(${showNumber(at('massGram'))}·${showNumber(at('fieldOersted'))})`,
    unit: 'cm³/g',
    source: 'definition of the susceptibility in the linear range',
    evaluate: (at) => net(at) / (at('massGram') * at('fieldOersted')),
  });
  return { inputs, steps, reaches: 'chiG', warnings: [] };
}
