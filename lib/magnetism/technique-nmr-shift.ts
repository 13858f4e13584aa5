import { z } from 'zod';
import { quantityInput } from './quantity-input';
import { quantitySchema } from './quantity-schema';
import { showNumber } from './show-number';
import { findSolventSusceptibility } from './solvent-susceptibility';
import type { TechniquePlan } from './technique-plan';
import type { At, StepDefinition } from './worked-step';

const density = (label: string) =>
  quantitySchema({
    label: `density of the ${label}`,
    unit: 'g/cm³',
    range: 'above zero',
    most: 25,
  }).optional();

/** NMR shift method with a coaxial insert: shift of a reference line between solution and pure solvent. */
export const nmrReadingsSchema = z
  .strictObject({
    shiftHertz: quantitySchema({
      label: 'shift of the reference line',
      unit: 'Hz',
      range: 'zero or more',
      advice: 'Enter its size without sign.',
    }),
    spectrometerMegahertz: quantitySchema({
      label: 'spectrometer frequency',
      unit: 'MHz',
      range: 'above zero',
      most: 3000,
      advice: '400 MHz is entered as 400, not as 4e8.',
    }),
    magnet: z.enum(['superconducting', 'electromagnet'], {
      error: 'The magnet must be superconducting (tube along the field) or electromagnet (tube across it).',
    }),
    concentrationMolePerCubicDecimetre: quantitySchema({
      label: 'concentration',
      unit: 'mol/dm³',
      range: 'above zero',
      most: 20,
    }).optional(),
    massConcentrationGramPerCubicCentimetre: quantitySchema({
      label: 'mass concentration',
      unit: 'g/cm³',
      range: 'above zero',
      most: 5,
    }).optional(),
    molalityMolePerKilogram: quantitySchema({
      label: 'molality',
      unit: 'mol/kg',
      range: 'above zero',
      most: 50,
    }).optional(),
    solvent: z.string().optional(),
    solventChiGCm3PerGram: quantitySchema({
      label: 'mass susceptibility of the solvent',
      unit: 'cm³/g',
      range: 'any',
    }).optional(),
    solventDensityGramPerCubicCentimetre: density('solvent'),
    solutionDensityGramPerCubicCentimetre: density('solution'),
  })
  .superRefine((readings, ctx) => {
    const issue = (path: string, message: string) => ctx.addIssue({ code: 'custom', path: [path], message });
    const given = [
      readings.concentrationMolePerCubicDecimetre,
      readings.massConcentrationGramPerCubicCentimetre,
      readings.molalityMolePerKilogram,
    ].filter((quantity) => quantity !== undefined).length;
    if (given !== 1)
      issue(
        'concentrationMolePerCubicDecimetre',
        'Enter the concentration once: mol/dm³, g/cm³, or molality with the density of the solution.',
      );
    if (readings.molalityMolePerKilogram && !readings.solutionDensityGramPerCubicCentimetre)
      issue(
        'solutionDensityGramPerCubicCentimetre',
        'A molality needs the density of the solution in g/cm³.',
      );
    if (readings.solvent !== undefined && readings.solventChiGCm3PerGram !== undefined)
      issue('solventChiGCm3PerGram', 'Give the solvent by name or by its susceptibility, not both.');
    if (readings.solvent !== undefined && !findSolventSusceptibility(readings.solvent))
      issue(
        'solvent',
        `The solvent "${readings.solvent}" is in no table: enter its mass susceptibility (solventChiGCm3PerGram).`,
      );
  });
export type NmrReadings = z.infer<typeof nmrReadingsSchema>;

const n = (at: At, key: string) => showNumber(at(key));

/** Mass concentration in g/cm³ from what was entered; molar entries need the molar mass among the inputs. */
function massConcentrationStep(readings: NmrReadings): StepDefinition | null {
  if (readings.massConcentrationGramPerCubicCentimetre) return null;
  if (readings.concentrationMolePerCubicDecimetre)
    return {
      key: 'massConcentration',
      symbol: 'ρ_B',
      expression: 'c·M/1000',
      numbers: (at) => `${n(at, 'concentration')}·${n(at, 'molarMass')}/1000`,
      unit: 'g/cm³',
      source: 'definition',
      evaluate: (at) => (at('concentration') * at('molarMass')) / 1000,
    };
  return {
    key: 'massConcentration',
    symbol: 'ρ_B',
    expression: 'd_s·b·M/(1000 + b·M)',
    numbers: (at) =>
      `${n(at, 'solutionDensity')}·${n(at, 'molality')}·${n(at, 'molarMass')}/(1000 + ${n(at, 'molality')}·${n(at, 'molarMass')})`,
    unit: 'g/cm³',
    source: 'definition of molality',
    evaluate: (at) => {
      const massPerKilogram = at('molality') * at('molarMass');
      return (at('solutionDensity') * massPerKilogram) / (1000 + massPerKilogram);
    },
  };
}

/**
 * χ_g = 3Δν/(4π ν₀ ρ_B) for a tube along the field (superconducting magnet), 3Δν/(2π ν₀ ρ_B) across it
 * (electromagnet), plus χ₀ of the solvent and, when both densities are given, χ₀(d₀ − d_s)/ρ_B.
 * Result in cm³/g, cgs-emu. Concentrations are those at the temperature of measurement.
 * Source: D. F. Evans, J. Chem. Soc. 1959, 2003; geometry factors: Grant, J. Chem. Educ. 1995, 72, 39 (recalled).
 * Checked against: tests/published/magnetism-magnetometry.test.ts.
 * @param molarMass - whether a molar mass is among the inputs of the sample
 */
export function nmrPlan(readings: NmrReadings, molarMass: boolean): TechniquePlan {
  const inputs = [
    quantityInput('shiftHertz', 'Δν', 'shift', readings.shiftHertz, 'Hz'),
    quantityInput('spectrometerMhz', 'ν₀', 'spectrometer frequency', readings.spectrometerMegahertz, 'MHz'),
  ];
  const { concentrationMolePerCubicDecimetre: c, massConcentrationGramPerCubicCentimetre: rho } = readings;
  const { molalityMolePerKilogram: b, solventDensityGramPerCubicCentimetre: d0 } = readings;
  const ds = readings.solutionDensityGramPerCubicCentimetre;
  if (c) inputs.push(quantityInput('concentration', 'c', 'concentration', c, 'mol/dm³'));
  if (rho) inputs.push(quantityInput('massConcentration', 'ρ_B', 'mass concentration', rho, 'g/cm³'));
  if (b) inputs.push(quantityInput('molality', 'b', 'molality', b, 'mol/kg'));
  if (d0) inputs.push(quantityInput('solventDensity', 'd₀', 'density of the solvent', d0, 'g/cm³'));
  if (ds) inputs.push(quantityInput('solutionDensity', 'd_s', 'density of the solution', ds, 'g/cm³'));
  const table = readings.solvent === undefined ? undefined : findSolventSusceptibility(readings.solvent);
  if (table)
    inputs.push(
      quantityInput(
        'solventChiG',
        'χ₀',
        `solvent ${table.name}`,
        // Table values of solvents scatter by about 2 % between compilations (common practice).
        { value: table.chiGCm3PerGram, u: 0.02 * Math.abs(table.chiGCm3PerGram), degreesOfFreedom: null },
        'cm³/g',
        `${table.source}; u 2 % (common practice)`,
      ),
    );
  if (readings.solventChiGCm3PerGram)
    inputs.push(quantityInput('solventChiG', 'χ₀', 'solvent', readings.solventChiGCm3PerGram, 'cm³/g'));

  const hasSolvent = inputs.some((input) => input.key === 'solventChiG');
  const hasDensities = hasSolvent && d0 !== undefined && ds !== undefined;
  const divisor = readings.magnet === 'superconducting' ? 4 : 2;
  const warnings: TechniquePlan['warnings'] = [];
  if (!hasSolvent)
    warnings.push({
      code: 'solvent left out',
      message: 'No solvent was given: its own diamagnetism (about 1 % of a typical moment) is left out.',
      field: 'solvent',
    });
  const source = 'Evans, J. Chem. Soc. 1959, 2003';

  if (c && !molarMass && !hasSolvent)
    return {
      inputs,
      reaches: 'chiM',
      warnings,
      steps: [
        {
          key: 'chiMObserved',
          symbol: 'χ_M',
          expression: `3000·Δν/(${divisor}π·ν₀·c)`,
          numbers: (at) =>
            `3000·${n(at, 'shiftHertz')}/(${divisor}π·${n(at, 'spectrometerMhz')}×10⁶·${n(at, 'concentration')})`,
          unit: 'cm³/mol',
          source,
          evaluate: (at) =>
            (3000 * at('shiftHertz')) /
            (divisor * Math.PI * at('spectrometerMhz') * 1e6 * at('concentration')),
        },
      ],
    };

  const concentrationStep = massConcentrationStep(readings);
  return {
    inputs,
    reaches: 'chiG',
    warnings,
    steps: [
      ...(concentrationStep ? [concentrationStep] : []),
      {
        key: 'chiGObserved',
        symbol: 'χ_g',
        expression: `3·Δν/(${divisor}π·ν₀·ρ_B)${hasSolvent ? ' + χ₀' : ''}${hasDensities ? ' + χ₀·(d₀ − d_s)/ρ_B' : ''}`,
        numbers: (at) =>
          `3·${n(at, 'shiftHertz')}/(${divisor}π·${n(at, 'spectrometerMhz')}×10⁶·${n(at, 'massConcentration')})` +
          (hasSolvent ? ` + (${n(at, 'solventChiG')})` : '') +
          (hasDensities
            ? ` + (${n(at, 'solventChiG')})·(${n(at, 'solventDensity')} − ${n(at, 'solutionDensity')})/${n(at, 'massConcentration')}`
            : ''),
        unit: 'cm³/g',
        source,
        evaluate: (at) => {
          const rhoB = at('massConcentration');
          const paramagnetic =
            (3 * at('shiftHertz')) / (divisor * Math.PI * at('spectrometerMhz') * 1e6 * rhoB);
          const solvent = hasSolvent ? at('solventChiG') : 0;
          const displaced = hasDensities
            ? (at('solventChiG') * (at('solventDensity') - at('solutionDensity'))) / rhoB
            : 0;
          return paramagnetic + solvent + displaced;
        },
      },
    ],
  };
}
