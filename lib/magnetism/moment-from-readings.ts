import { parseFormula } from '../chemistry/parse-formula';
import { err, ok, type Result } from '../result';
import { MOMENT_FACTOR } from './moment-factor';
import type { MomentInput } from './moment-schema';
import { quantityInput } from './quantity-input';
import { diamagnetismInput, molarMassInput, temperatureInput, type SampleProblem } from './sample-quantities';
import type { Sample } from './sample-schema';
import { showNumber } from './show-number';
import { balancePlan } from './technique-balance';
import { gouyPlan } from './technique-gouy';
import { literaturePlan } from './technique-literature';
import { magnetometerPlan } from './technique-magnetometer';
import { nmrPlan } from './technique-nmr-shift';
import type { TechniquePlan } from './technique-plan';
import { workedCalculation, type WorkedCalculation } from './worked-calculation';
import type { At, InputQuantity, StepDefinition } from './worked-step';

export interface MomentWarning {
  code: string;
  message: string;
  field: string | null;
}

/** A determination worked out: χ in cm³/g and cm³/mol (cgs-emu), μ in μ_B; null where it is not part of the chain. */
export interface MomentResult {
  chiG: number | null;
  chiM: number | null;
  /** Per metal atom, diamagnetism and temperature-independent part taken off */
  chiMCorrected: number | null;
  muEff: number | null;
  muEffU: number | null;
  unpaired: number | null;
  unpairedU: number | null;
  calculation: WorkedCalculation;
  warnings: MomentWarning[];
}

/** Below this a kelvin value may well have been read off in degrees Celsius; it is questioned, not refused. */
const QUESTIONED_KELVIN = 60;

/**
 * The whole chain: readings → χ_g → χ_M → χ_M′ → μ_eff → n, every line with its numbers and uncertainty.
 * Purity divides the observed susceptibility (the impurity counts as non-magnetic); a solvate adds its mass to the
 * molar mass and its diamagnetism to the correction. μ_eff = 2.82787 √(χ_M′ T); n = √(1 + μ²) − 1.
 * Errors: as a Result when the molar mass, the formula or the diamagnetic correction is not usable. A negative χ_M′
 * has no moment: the values are null and a warning says so.
 */
export function momentFromReadings(input: MomentInput): Result<MomentResult, SampleProblem> {
  if (input.technique === 'paper or another laboratory') {
    const plan = literaturePlan(input.readings);
    const steps: StepDefinition[] = [
      {
        key: 'muEff',
        symbol: 'μ_eff',
        expression: 'as printed',
        numbers: (at) => showNumber(at('muEffPrinted')),
        unit: 'μ_B',
        source: input.readings.reference,
        evaluate: (at) => at('muEffPrinted'),
      },
      unpairedStep,
    ];
    return ok(resultOf(workedCalculation(plan.inputs, steps), plan.warnings, plan.inputs));
  }
  const { sample } = input;
  const molarMass = molarMassInput(sample);
  if (!molarMass.ok) return molarMass;
  const plan = planOf(input, molarMass.value !== null);
  const solvate = solvateInputs(sample);
  if (!solvate.ok) return solvate;
  const diamagnetism = diamagnetismInput(sample, molarMass.value?.value ?? null);
  if (!diamagnetism.ok) return diamagnetism;
  if (plan.reaches === 'chiG' && molarMass.value === null)
    return err({
      code: 'molar mass missing',
      field: 'sample.molarMassGramPerMole',
      message: 'The molar mass is missing: enter it, or the formula of the compound.',
    });
  const inputs = [
    ...plan.inputs,
    ...(molarMass.value ? [molarMass.value] : []),
    ...solvate.value,
    temperatureInput(sample),
    ...(diamagnetism.value ? [diamagnetism.value] : []),
    ...(sample.purityMassFraction
      ? [quantityInput('purity', 'w', 'purity, mass fraction', sample.purityMassFraction, '')]
      : []),
    ...(sample.tipCm3PerMol
      ? [
          quantityInput(
            'tip',
            'χ_TIP',
            'temperature-independent paramagnetism',
            sample.tipCm3PerMol,
            'cm³/mol',
          ),
        ]
      : []),
  ];
  const steps = [...plan.steps, ...chainSteps(plan, sample, new Set(inputs.map(({ key }) => key)))];
  const result = resultOf(workedCalculation(inputs, steps), plan.warnings, inputs);
  const kelvin = sample.temperatureKelvin?.value;
  if (kelvin !== undefined && kelvin < QUESTIONED_KELVIN)
    result.warnings.push({
      code: 'temperature questioned',
      field: 'sample.temperatureKelvin',
      message: `${kelvin} K is ${(kelvin - 273.15).toFixed(0)} °C: if it was read in degrees Celsius, enter it as temperatureCelsius.`,
    });
  if (result.muEff === null)
    result.warnings.push({
      code: 'no moment',
      field: null,
      message:
        'The corrected susceptibility is negative: the sample is diamagnetic within the corrections, and has no moment.',
    });
  return ok(result);
}

function planOf(
  input: Exclude<MomentInput, { technique: 'paper or another laboratory' }>,
  hasMolarMass: boolean,
): TechniquePlan {
  switch (input.technique) {
    case 'susceptibility balance':
      return balancePlan(input.readings);
    case 'Gouy balance':
      return gouyPlan(input.readings);
    case 'NMR shift':
      return nmrPlan(input.readings, hasMolarMass);
    case 'magnetometer':
      return magnetometerPlan(input.readings);
  }
}

function solvateInputs(sample: Sample): Result<InputQuantity[], SampleProblem> {
  const { solvate } = sample;
  if (!solvate) return ok([]);
  const parsed = parseFormula(solvate.formula);
  if (!parsed.ok)
    return err({ code: 'formula', field: 'sample.solvate.formula', message: parsed.error.message });
  const mass = { value: parsed.value.molarMassGramPerMole, u: 0, degreesOfFreedom: null };
  return ok([
    quantityInput('solvateCount', 'k', `molecules of ${solvate.formula}`, solvate.perFormulaUnit, ''),
    quantityInput('solvateMass', 'M_s', `molar mass of ${solvate.formula}`, mass, 'g/mol'),
    ...(solvate.chiDiaCm3PerMol
      ? [
          quantityInput(
            'solvateChiDia',
            'χ_s',
            `diamagnetism of ${solvate.formula}`,
            solvate.chiDiaCm3PerMol,
            'cm³/mol',
          ),
        ]
      : []),
  ]);
}

/** From what the technique reaches to the number of electrons; `has` says which inputs there are. */
function chainSteps(plan: TechniquePlan, sample: Sample, has: ReadonlySet<string>): StepDefinition[] {
  const observed = plan.reaches === 'chiG' ? 'chiGObserved' : 'chiMObserved';
  const purity = has.has('purity');
  const withSolvate = has.has('solvateCount');
  const pure = (at: At) => at(observed) / (purity ? at('purity') : 1);
  const mass = (at: At) => at('molarMass') + (withSolvate ? at('solvateCount') * at('solvateMass') : 0);
  const massText = (at: At) =>
    withSolvate
      ? `(${showNumber(at('molarMass'))} + ${showNumber(at('solvateCount'))}·${showNumber(at('solvateMass'))})`
      : showNumber(at('molarMass'));
  const off = ['chiDia', 'tip'].filter((key) => has.has(key));
  const solvateDia = has.has('solvateChiDia');
  const taken = (at: At) =>
    off.reduce((sum, key) => sum + at(key), 0) + (solvateDia ? at('solvateCount') * at('solvateChiDia') : 0);
  const metals = sample.metalAtoms;
  const steps: StepDefinition[] = [];
  if (plan.reaches === 'chiG')
    steps.push({
      key: 'chiG',
      symbol: 'χ_g',
      expression: purity ? 'χ_g/w' : 'χ_g',
      numbers: (at) =>
        purity ? `${showNumber(at(observed))}/${showNumber(at('purity'))}` : showNumber(at(observed)),
      unit: 'cm³/g',
      source: purity ? 'impurity taken as non-magnetic (common practice)' : 'observed',
      evaluate: pure,
    });
  steps.push(
    {
      key: 'chiM',
      symbol: 'χ_M',
      expression:
        plan.reaches === 'chiG' ? (withSolvate ? 'χ_g·(M + k·M_s)' : 'χ_g·M') : purity ? 'χ_M/w' : 'χ_M',
      numbers: (at) =>
        plan.reaches === 'chiG' ? `${showNumber(at('chiG'))}·${massText(at)}` : showNumber(pure(at)),
      unit: 'cm³/mol',
      source: 'definition',
      evaluate: (at) => (plan.reaches === 'chiG' ? at('chiG') * mass(at) : pure(at)),
    },
    {
      key: 'chiMCorrected',
      symbol: 'χ_M′',
      expression: `${metals > 1 ? '(' : ''}χ_M${has.has('chiDia') ? ' − χ_dia' : ''}${has.has('tip') ? ' − χ_TIP' : ''}${solvateDia ? ' − k·χ_s' : ''}${metals > 1 ? `)/${metals}` : ''}`,
      numbers: (at) =>
        `(${showNumber(at('chiM'))} − (${showNumber(taken(at))}))${metals > 1 ? `/${metals}` : ''}`,
      unit: metals > 1 ? 'cm³/mol of metal' : 'cm³/mol',
      source:
        'diamagnetism is negative, so taking it off adds to χ (Bain & Berry, J. Chem. Educ. 2008, 85, 532)',
      evaluate: (at) => (at('chiM') - taken(at)) / metals,
    },
    {
      key: 'muEff',
      symbol: 'μ_eff',
      expression: '2.82787·√(χ_M′·T)',
      numbers: (at) => `2.82787·√(${showNumber(at('chiMCorrected'))}·${showNumber(at('temperature'))})`,
      unit: 'μ_B',
      source: 'Curie law, CODATA 2022 constants',
      evaluate: (at) => MOMENT_FACTOR * Math.sqrt(at('chiMCorrected') * at('temperature')),
    },
    unpairedStep,
  );
  return steps;
}

const unpairedStep: StepDefinition = {
  key: 'unpaired',
  symbol: 'n',
  expression: '√(1 + μ²) − 1',
  numbers: (at) => `√(1 + ${showNumber(at('muEff'))}²) − 1`,
  unit: '',
  source: 'spin-only formula; an orbital part raises it',
  evaluate: (at) => Math.hypot(1, at('muEff')) - 1,
};

function resultOf(
  calculation: WorkedCalculation,
  planWarnings: readonly MomentWarning[],
  inputs: readonly InputQuantity[],
): MomentResult {
  const value = (key: string) => calculation.steps.find((step) => step.key === key)?.value ?? null;
  const u = (key: string) => calculation.result(key)?.u ?? null;
  const unstated = inputs.filter((input) => input.u === null).map(({ label }) => label);
  return {
    chiG: value('chiG'),
    chiM: value('chiM'),
    chiMCorrected: value('chiMCorrected'),
    muEff: value('muEff'),
    muEffU: u('muEff'),
    unpaired: value('unpaired'),
    unpairedU: u('unpaired'),
    calculation,
    warnings: [
      ...planWarnings,
      ...(unstated.length > 0
        ? [
            {
              code: 'uncertainty not stated',
              field: null,
              message: `Counted as exact, for no uncertainty was stated: ${unstated.join(', ')}. The uncertainty of the moment is too small by so much.`,
            },
          ]
        : []),
    ],
  };
}
