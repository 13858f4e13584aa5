import { parseFormula } from '../chemistry/parse-formula';
import { err, ok, type Result } from '../result';
import { halfMolarMassCorrection, pascalCorrection } from './diamagnetic-correction';
import { quantityInput } from './quantity-input';
import type { Sample } from './sample-schema';
import type { InputQuantity } from './worked-step';

/** A sample that cannot be worked with, with the field it concerns. */
export interface SampleProblem {
  code: 'molar mass missing' | 'formula' | 'diamagnetism';
  field: string;
  message: string;
}

/** The molar mass: as given, else from the formula; null when neither is there. */
export function molarMassInput(sample: Sample): Result<InputQuantity | null, SampleProblem> {
  if (sample.molarMassGramPerMole)
    return ok(quantityInput('molarMass', 'M', 'molar mass', sample.molarMassGramPerMole, 'g/mol'));
  if (sample.formula === undefined) return ok(null);
  const parsed = parseFormula(sample.formula);
  if (!parsed.ok) return err({ code: 'formula', field: 'sample.formula', message: parsed.error.message });
  const mass = { value: parsed.value.molarMassGramPerMole, u: 0, degreesOfFreedom: null };
  return ok(quantityInput('molarMass', 'M', 'molar mass', mass, 'g/mol', `formula ${sample.formula}`));
}

/** The absolute temperature, from kelvin or degrees Celsius. */
export function temperatureInput(sample: Sample): InputQuantity {
  const celsius = sample.temperatureCelsius;
  const quantity = sample.temperatureKelvin ?? {
    value: (celsius?.value ?? Number.NaN) + 273.15,
    u: celsius?.u ?? null,
    degreesOfFreedom: celsius?.degreesOfFreedom ?? null,
  };
  return quantityInput('temperature', 'T', 'temperature', quantity, 'K');
}

/** χ_dia of the formula unit by the method chosen; null when none is to be taken off. */
export function diamagnetismInput(
  sample: Sample,
  molarMassGramPerMole: number | null,
): Result<InputQuantity | null, SampleProblem> {
  const { diamagnetism } = sample;
  const asInput = (value: number, u: number, source: string) =>
    quantityInput(
      'chiDia',
      'χ_dia',
      'diamagnetic susceptibility',
      { value, u, degreesOfFreedom: null },
      'cm³/mol',
      source,
    );
  switch (diamagnetism.method) {
    case 'none':
      return ok(null);
    case 'value':
      return ok(
        quantityInput(
          'chiDia',
          'χ_dia',
          'diamagnetic susceptibility',
          diamagnetism.chiDiaCm3PerMol,
          'cm³/mol',
          diamagnetism.source,
        ),
      );
    case 'half molar mass': {
      if (molarMassGramPerMole === null)
        return err({
          code: 'molar mass missing',
          field: 'sample.molarMassGramPerMole',
          message: 'The rule −M/2 needs the molar mass: enter it or the formula.',
        });
      const rule = halfMolarMassCorrection(molarMassGramPerMole);
      return ok(asInput(rule.chiDiaCm3PerMol, rule.uCm3PerMol, rule.note));
    }
    case 'pascal': {
      const sum = pascalCorrection(diamagnetism.parts);
      if (!sum.ok)
        return err({ code: 'diamagnetism', field: 'sample.diamagnetism.parts', message: sum.error.message });
      return ok(asInput(sum.value.chiDiaCm3PerMol, sum.value.uCm3PerMol, sum.value.note));
    }
  }
}
