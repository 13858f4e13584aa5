import { describe, expect, it } from 'vitest';
import { momentFromReadings } from '@/lib/magnetism/moment-from-readings';
import { MOMENT_FACTOR } from '@/lib/magnetism/moment-factor';
import { momentInputSchema } from '@/lib/magnetism/moment-schema';

/** Relative tolerance of values that the reference calculates to seven digits with CODATA 2022. */
const close = (value: number | null | undefined, expected: number, relative = 1e-4) => {
  expect(value).not.toBeNull();
  expect(Math.abs((value ?? NaN) / expected - 1)).toBeLessThan(relative);
};

function moment(input: unknown) {
  const parsed = momentInputSchema.parse(input);
  const result = momentFromReadings(parsed);
  if (!result.ok) throw new Error(result.error.message);
  return result.value;
}

const dia = (value: number, u = 0) => ({ method: 'value', chiDiaCm3PerMol: { value, u }, source: 'example' });

describe('the moment factor', () => {
  it('is 2.827869 in cgs-emu (CODATA 2022: √(3 k_B/(N_A μ_B²)))', () => {
    expect(MOMENT_FACTOR).toBeCloseTo(2.827869, 5);
  });
});

describe('worked examples', () => {
  it('susceptibility balance, CuSO4·5H2O (Imperial College, laboratory page)', () => {
    const result = moment({
      technique: 'susceptibility balance',
      readings: {
        balanceConstant: 1.089,
        lengthCentimetre: 2.1,
        reading: 592,
        readingEmpty: -28,
        massGram: 0.238,
      },
      sample: { molarMassGramPerMole: 249.7, temperatureKelvin: 293, diamagnetism: dia(-117.8e-6) },
    });
    close(result.chiG, 5.957471e-6);
    close(result.chiM, 1.48758e-3);
    close(result.chiMCorrected, 1.60538e-3);
    close(result.muEff, 1.939465);
    // As printed: 5.957e-6, 1.488e-3, 1.94.
    expect(result.muEff?.toFixed(2)).toBe('1.94');
    expect(result.unpaired).toBeCloseTo(Math.sqrt(1 + 1.939465 ** 2) - 1, 4);
  });

  it('the same balance with displaced air (balance manual form)', () => {
    const result = moment({
      technique: 'susceptibility balance',
      readings: {
        balanceConstant: 1,
        lengthCentimetre: 2,
        reading: 820,
        readingEmpty: -34,
        massGram: 0.15,
        tubeCrossSectionSquareCentimetre: 0.1,
      },
      sample: { molarMassGramPerMole: 100, temperatureKelvin: 293, diamagnetism: { method: 'none' } },
    });
    close(result.chiG, 1.142533e-5);
  });

  it('Gouy tube calibrated with HgCo(NCS)4 (formula: Figgis & Lewis 1960, recalled)', () => {
    const result = moment({
      technique: 'Gouy balance',
      readings: {
        calibration: 'calibrant',
        tubeMassChangeMilligram: -1.2,
        sampleMassGram: 0.4102,
        sampleMassChangeMilligram: 21.3,
        tubeVolumeCubicCentimetre: 0.3,
        standardMassGram: 0.526,
        standardMassChangeMilligram: 35.8,
        standardChiGCm3PerGram: 16.44e-6,
      },
      sample: { molarMassGramPerMole: 300, temperatureKelvin: 293, diamagnetism: { method: 'none' } },
    });
    close(result.chiG, 1.282786e-5);
  });

  it('NMR shift by concentration, superconducting magnet (Evans 1959; Schubert 1992, recalled)', () => {
    const result = moment({
      technique: 'NMR shift',
      readings: {
        shiftHertz: { value: 180, u: 0.5 },
        spectrometerMegahertz: { value: 400.13, u: 0 },
        magnet: 'superconducting',
        concentrationMolePerCubicDecimetre: { value: 0.025, u: 0.0003 },
      },
      sample: { temperatureKelvin: { value: 298.15, u: 0.5 }, diamagnetism: dia(-250e-6, 25e-6) },
    });
    close(result.chiM, 4.295787e-3);
    close(result.chiMCorrected, 4.545787e-3);
    close(result.muEff, 3.292162);
    // GUM, first order: u(χ_M) = 5.291253e-5, u(χ_M′) = 5.852124e-5, u(μ) = 0.02137025.
    close(result.calculation.result('chiM')?.u, 5.291253e-5);
    close(result.calculation.result('chiMCorrected')?.u, 5.852124e-5);
    close(result.muEffU, 0.02137025);
    expect(result.chiG).toBeNull();
  });

  it('NMR shift by mass with the solvent term (teaching slides, Johnson 2016)', () => {
    const result = moment({
      technique: 'NMR shift',
      readings: {
        shiftHertz: 150,
        spectrometerMegahertz: 300.13,
        magnet: 'superconducting',
        massConcentrationGramPerCubicCentimetre: 0.008,
        solventChiGCm3PerGram: -0.4934e-6,
      },
      sample: { molarMassGramPerMole: 352.27, temperatureKelvin: 295, diamagnetism: dia(-166e-6) },
    });
    close(result.chiG, 1.442091e-5);
    close(result.chiM, 5.080055e-3);
    close(result.muEff, 3.517926);
  });

  it('NMR shift in an electromagnet, tube across the field', () => {
    const result = moment({
      technique: 'NMR shift',
      readings: {
        shiftHertz: 25,
        spectrometerMegahertz: 60,
        magnet: 'electromagnet',
        massConcentrationGramPerCubicCentimetre: 0.01,
      },
      sample: { molarMassGramPerMole: 200, temperatureKelvin: 300, diamagnetism: { method: 'none' } },
    });
    close(result.chiG, 1.989437e-5);
  });

  it('the moment of HgCo(NCS)4 itself at 293.15 K (χ_g = 16.44e-6, ±0.5 %: Figgis & Nyholm 1958)', () => {
    const result = moment({
      technique: 'magnetometer',
      readings: { massGram: 1, momentEmu: 16.44e-6 * 5000, fieldOersted: 5000 },
      sample: { molarMassGramPerMole: 491.85, temperatureKelvin: 293.15, diamagnetism: dia(-176e-6) },
    });
    close(result.chiMCorrected, 8.262014e-3);
    close(result.muEff, 4.400957);
  });
});

describe('the chain', () => {
  const input = {
    technique: 'susceptibility balance',
    readings: {
      balanceConstant: { value: 1.02, u: 0.015 },
      lengthCentimetre: { value: 2.31, u: 0.03 },
      reading: { replicates: [207, 209, 208, 206], u: 1 },
      readingEmpty: { value: -34, u: 1 },
      massGram: { value: 0.1842, u: 0.0003 },
    },
    sample: {
      formula: 'Cs2[CuCl4]',
      temperatureKelvin: { value: 295.2, u: 0.5 },
      diamagnetism: dia(-175e-6, 17e-6),
    },
  };

  it('agrees with Monte Carlo within 2 % (JCGM 101)', () => {
    const { calculation, muEffU } = moment(input);
    const simulated = calculation.simulate('muEff', { seed: 7, draws: 40_000 });
    expect(Math.abs((simulated?.u ?? NaN) / (muEffU ?? NaN) - 1)).toBeLessThan(0.02);
  });

  it('shares the variance out among its inputs', () => {
    const budget = moment(input).calculation.budget('muEff');
    expect(budget?.lines.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 10);
    expect(budget?.lines[0]?.key).toBe('balanceConstant');
  });

  it('divides by purity, adds a solvate and shares among the metals', () => {
    const pure = moment(input);
    const half = moment({ ...input, sample: { ...input.sample, purityMassFraction: 0.5 } });
    close(half.chiM, 2 * (pure.chiM ?? NaN), 1e-9);
    const wet = moment({
      ...input,
      sample: { ...input.sample, solvate: { formula: 'H2O', perFormulaUnit: 1 } },
    });
    // 18.015 g/mol more per formula unit (IUPAC atomic masses).
    close(wet.chiM, (pure.chiG ?? NaN) * (471.17 + 18.015), 1e-4);
    const two = moment({ ...input, sample: { ...input.sample, metalAtoms: 2 } });
    close(two.muEff, (pure.muEff ?? NaN) / Math.SQRT2, 1e-9);
  });

  it('has no moment where the corrected susceptibility is negative, and says so', () => {
    const result = moment({ ...input, readings: { ...input.readings, reading: -400 } });
    expect(result.muEff).toBeNull();
    expect(result.unpaired).toBeNull();
    expect(result.warnings.map(({ code }) => code)).toContain('no moment');
  });

  it('questions 17 in a kelvin field and takes 17 °C', () => {
    const cold = moment({ ...input, sample: { ...input.sample, temperatureKelvin: 17 } });
    expect(cold.warnings.map(({ code }) => code)).toContain('temperature questioned');
    const { temperatureKelvin: _kelvin, ...sample } = input.sample;
    const celsius = moment({ ...input, sample: { ...sample, temperatureCelsius: 22.05 } });
    close(celsius.muEff, moment(input).muEff ?? NaN, 1e-9);
  });

  it.each([
    ['massGram', -0.1],
    ['lengthCentimetre', 0],
    ['massGram', '0,18'],
    ['balanceConstant', null],
  ])('refuses %s = %j and names the field', (field, value) => {
    const parsed = momentInputSchema.safeParse({ ...input, readings: { ...input.readings, [field]: value } });
    expect(parsed.error?.issues[0]?.path).toContain(field);
    expect(parsed.error?.issues[0]?.message.length).toBeGreaterThan(15);
  });
});
