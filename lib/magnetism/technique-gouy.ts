import { z } from 'zod';
import { STANDARD_GRAVITY_CM_PER_S2 } from '../chemistry/constants';
import { exact, quantityInput } from './quantity-input';
import { quantitySchema } from './quantity-schema';
import { showNumber } from './show-number';
import { AIR_SOURCE, AIR_VOLUME_SUSCEPTIBILITY, type TechniquePlan } from './technique-plan';
import type { StepDefinition } from './worked-step';

const massChange = (label: string) =>
  quantitySchema({
    label: `apparent mass change of the ${label} (field on minus off)`,
    unit: 'mg',
    range: 'any',
  });
const mass = (label: string) =>
  quantitySchema({
    label: `mass of the ${label}`,
    unit: 'g',
    range: 'above zero',
    advice: 'Enter filled tube minus empty tube, both without the field.',
  });

const common = {
  tubeMassChangeMilligram: massChange('empty tube'),
  sampleMassGram: mass('sample'),
  sampleMassChangeMilligram: massChange('tube with sample'),
};
const tubeVolumeCubicCentimetre = quantitySchema({
  label: 'filled volume of the tube',
  unit: 'cm³',
  range: 'above zero',
});

/** Gouy balance. Mass changes are field on minus field off; the tube's own change is subtracted from both fillings. */
export const gouyReadingsSchema = z.discriminatedUnion(
  'calibration',
  [
    z.strictObject({
      calibration: z.literal('calibrant'),
      ...common,
      tubeVolumeCubicCentimetre,
      standardMassGram: mass('calibrant'),
      standardMassChangeMilligram: massChange('tube with calibrant'),
      standardChiGCm3PerGram: quantitySchema({
        label: 'mass susceptibility of the calibrant',
        unit: 'cm³/g',
        range: 'any',
      }),
    }),
    z.strictObject({
      calibration: z.literal('tube constant'),
      ...common,
      tubeVolumeCubicCentimetre,
      tubeConstantCm3PerMilligram: quantitySchema({
        label: 'tube constant β',
        unit: 'cm³/mg',
        range: 'above zero',
      }),
    }),
    z.strictObject({
      calibration: z.literal('field and area'),
      ...common,
      lengthCentimetre: quantitySchema({
        label: 'filled length of the tube',
        unit: 'cm',
        range: 'above zero',
      }),
      areaSquareCentimetre: quantitySchema({
        label: 'inner cross-section of the tube',
        unit: 'cm²',
        range: 'above zero',
      }),
      fieldOersted: quantitySchema({
        label: 'field at the lower end of the sample',
        unit: 'Oe',
        range: 'above zero',
        advice: '1 T corresponds to 10 000 Oe.',
      }),
    }),
  ],
  { error: 'The calibration must be calibrant, tube constant or field and area.' },
);
export type GouyReadings = z.infer<typeof gouyReadingsSchema>;

const forceStep: StepDefinition = {
  key: 'netChangeMg',
  symbol: 'F′',
  expression: 'Δw(sample) − Δw(tube)',
  numbers: (at) => `${showNumber(at('sampleChangeMg'))} − (${showNumber(at('tubeChangeMg'))})`,
  unit: 'mg',
  source: 'tube correction (common practice)',
  evaluate: (at) => at('sampleChangeMg') - at('tubeChangeMg'),
};

const relativeStep: StepDefinition = {
  key: 'chiGObserved',
  symbol: 'χ_g',
  expression: '(κ_air·V + β·F′)/w',
  numbers: (at) =>
    `(${showNumber(at('kappaAir'))}·${showNumber(at('volumeCm3'))} + ${showNumber(at('beta'))}·${showNumber(at('netChangeMg'))})/${showNumber(at('massGram'))}`,
  unit: 'cm³/g',
  source: 'Figgis & Lewis 1960; Earnshaw, Introduction to Magnetochemistry (recalled)',
  evaluate: (at) => (at('kappaAir') * at('volumeCm3') + at('beta') * at('netChangeMg')) / at('massGram'),
};

const calibrationStep: StepDefinition = {
  key: 'beta',
  symbol: 'β',
  expression: '(χ_std·w_std − κ_air·V)/(Δw(std) − Δw(tube))',
  numbers: (at) =>
    `(${showNumber(at('standardChiG'))}·${showNumber(at('standardMassGram'))} − ${showNumber(at('kappaAir'))}·${showNumber(at('volumeCm3'))})/(${showNumber(at('standardChangeMg'))} − (${showNumber(at('tubeChangeMg'))}))`,
  unit: 'cm³/mg',
  source: 'calibration of the tube with a substance of known χ_g',
  evaluate: (at) =>
    (at('standardChiG') * at('standardMassGram') - at('kappaAir') * at('volumeCm3')) /
    (at('standardChangeMg') - at('tubeChangeMg')),
};

const absoluteSteps: StepDefinition[] = [
  {
    key: 'kappa',
    symbol: 'κ',
    expression: '2·g·F′/(A·H²) + κ_air',
    numbers: (at) =>
      `2·${STANDARD_GRAVITY_CM_PER_S2}·${showNumber(at('netChangeMg') * 1e-3)}/(${showNumber(at('areaCm2'))}·${showNumber(at('fieldOersted'))}²) + ${showNumber(at('kappaAir'))}`,
    unit: '',
    source:
      'F = ½(κ − κ_air)·A·H² (Nettleton & Sugden, Proc. R. Soc. A 1939), far end of the tube out of the field',
    evaluate: (at) =>
      (2 * STANDARD_GRAVITY_CM_PER_S2 * at('netChangeMg') * 1e-3) /
        (at('areaCm2') * at('fieldOersted') ** 2) +
      at('kappaAir'),
  },
  {
    key: 'chiGObserved',
    symbol: 'χ_g',
    expression: 'κ·A·l/w',
    numbers: (at) =>
      `${showNumber(at('kappa'))}·${showNumber(at('areaCm2'))}·${showNumber(at('lengthCm'))}/${showNumber(at('massGram'))}`,
    unit: 'cm³/g',
    source: 'volume to mass susceptibility',
    evaluate: (at) => (at('kappa') * at('areaCm2') * at('lengthCm')) / at('massGram'),
  },
];

/**
 * Gouy balance to χ_g in cm³/g, cgs-emu: relative to a calibrant or a known tube constant, or absolute from field
 * and cross-section.
 * Checked against: tests/published/magnetism-magnetometry.test.ts.
 */
export function gouyPlan(readings: GouyReadings): TechniquePlan {
  const inputs = [
    quantityInput('tubeChangeMg', 'Δw(tube)', 'mass change, tube', readings.tubeMassChangeMilligram, 'mg'),
    quantityInput('massGram', 'w', 'sample mass', readings.sampleMassGram, 'g'),
    quantityInput(
      'sampleChangeMg',
      'Δw(sample)',
      'mass change, sample',
      readings.sampleMassChangeMilligram,
      'mg',
    ),
    quantityInput('kappaAir', 'κ_air', 'air, per volume', exact(AIR_VOLUME_SUSCEPTIBILITY), '', AIR_SOURCE),
  ];
  const plan = (steps: StepDefinition[]): TechniquePlan => ({ inputs, steps, reaches: 'chiG', warnings: [] });
  if (readings.calibration === 'field and area') {
    inputs.push(
      quantityInput('lengthCm', 'l', 'filled length', readings.lengthCentimetre, 'cm'),
      quantityInput('areaCm2', 'A', 'cross-section of the tube', readings.areaSquareCentimetre, 'cm²'),
      quantityInput('fieldOersted', 'H', 'field', readings.fieldOersted, 'Oe'),
    );
    return plan([forceStep, ...absoluteSteps]);
  }
  inputs.push(quantityInput('volumeCm3', 'V', 'filled volume', readings.tubeVolumeCubicCentimetre, 'cm³'));
  if (readings.calibration === 'tube constant') {
    inputs.push(quantityInput('beta', 'β', 'tube constant', readings.tubeConstantCm3PerMilligram, 'cm³/mg'));
    return plan([forceStep, relativeStep]);
  }
  inputs.push(
    quantityInput('standardMassGram', 'w_std', 'calibrant mass', readings.standardMassGram, 'g'),
    quantityInput(
      'standardChangeMg',
      'Δw(std)',
      'mass change, calibrant',
      readings.standardMassChangeMilligram,
      'mg',
    ),
    quantityInput(
      'standardChiG',
      'χ_std',
      'calibrant susceptibility',
      readings.standardChiGCm3PerGram,
      'cm³/g',
    ),
  );
  return plan([calibrationStep, forceStep, relativeStep]);
}
