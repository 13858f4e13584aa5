import { z } from 'zod';
import { quantitySchema } from './quantity-schema';

const countSchema = z
  .number({ error: 'The count of each part must be a number.' })
  .nonnegative('The count of each part must be 0 or more.');

const tablePart = z.strictObject({
  kind: z.literal('table').default('table'),
  table: z.enum(['atoms', 'constitutive', 'cations', 'anions', 'ligands', 'solvents'], {
    error: 'The table must be atoms, constitutive, cations, anions, ligands or solvents.',
  }),
  name: z.string(),
  count: countSchema,
});

const measuredPart = z.strictObject({
  kind: z.literal('measured'),
  name: z.string(),
  count: countSchema,
  valueMicroCm3PerMol: z.number({ error: 'The measured value must be a number in 10⁻⁶ cm³/mol.' }),
  uMicroCm3PerMol: z.number().nonnegative().nullable().default(null),
  source: z.string().min(1, 'Say where the measured ligand value comes from.'),
});

/** How the diamagnetism of the sample is taken off. */
export const diamagnetismSchema = z.discriminatedUnion(
  'method',
  [
    z.strictObject({
      method: z.literal('pascal'),
      parts: z.array(z.union([measuredPart, tablePart])).min(1, 'Add at least one ion, ligand or atom.'),
    }),
    z.strictObject({
      method: z.literal('value'),
      chiDiaCm3PerMol: quantitySchema({
        label: 'diamagnetic susceptibility',
        unit: 'cm³/mol',
        range: 'any',
      }),
      source: z.string().min(1, 'Say where the diamagnetic value comes from.'),
    }),
    z.strictObject({ method: z.literal('half molar mass') }),
    z.strictObject({ method: z.literal('none') }),
  ],
  { error: 'The method of diamagnetism must be pascal, value, half molar mass or none.' },
);

const hotAdvice = 'Add 273.15 to a Celsius value, or enter it as temperatureCelsius.';

/** The sample and the conditions, common to all techniques. */
export const sampleSchema = z
  .strictObject({
    formula: z.string().optional(),
    molarMassGramPerMole: quantitySchema({
      label: 'molar mass',
      unit: 'g/mol',
      range: 'above zero',
    }).optional(),
    temperatureKelvin: quantitySchema({
      label: 'temperature',
      unit: 'K',
      range: 'above zero',
      advice: hotAdvice,
    }).optional(),
    temperatureCelsius: quantitySchema({ label: 'temperature', unit: '°C', range: 'any' }).optional(),
    metalAtoms: z
      .number({ error: 'The number of metal atoms must be a whole number.' })
      .int('The number of metal atoms must be a whole number.')
      .positive('The number of metal atoms per formula unit must be 1 or more.')
      .default(1),
    purityMassFraction: quantitySchema({
      label: 'purity',
      unit: 'as a mass fraction',
      range: 'above zero',
      most: 1,
      advice: 'Enter 98 % as 0.98.',
    }).optional(),
    solvate: z
      .strictObject({
        formula: z.string().min(1, 'Give the formula of the solvent molecule.'),
        perFormulaUnit: quantitySchema({
          label: 'solvent molecules per formula unit',
          unit: '(a count)',
          range: 'zero or more',
        }),
        chiDiaCm3PerMol: quantitySchema({
          label: 'diamagnetic susceptibility of the solvent molecule',
          unit: 'cm³/mol',
          range: 'any',
        }).optional(),
      })
      .optional(),
    diamagnetism: diamagnetismSchema,
    tipCm3PerMol: quantitySchema({
      label: 'temperature-independent paramagnetism',
      unit: 'cm³/mol',
      range: 'any',
    }).optional(),
  })
  .superRefine((sample, ctx) => {
    if ((sample.temperatureKelvin === undefined) === (sample.temperatureCelsius === undefined))
      ctx.addIssue({
        code: 'custom',
        path: ['temperatureKelvin'],
        message: 'Enter the temperature once: temperatureKelvin or temperatureCelsius.',
      });
    if (sample.temperatureCelsius && sample.temperatureCelsius.value <= -273.15)
      ctx.addIssue({
        code: 'custom',
        path: ['temperatureCelsius'],
        message: 'The temperature must be above −273.15 °C (absolute zero).',
      });
  });
export type Sample = z.infer<typeof sampleSchema>;
