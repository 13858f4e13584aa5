import { z } from 'zod';

/**
 * What a reader returns for one program output. Absent values are null, never 0 and never NaN.
 * Energies in hartree, lengths in ångström, orbital energies in eV, wavenumbers in cm⁻¹, times in s.
 * Every path of a value that the text prints has an entry in `evidence` with the line it stands on.
 */

const nullableNumber = z.number().nullable();

export const programSchema = z.enum(['ORCA', 'Gaussian', 'NWChem', 'Psi4']);
export type Program = z.infer<typeof programSchema>;

export const outcomeSchema = z.enum(['finished', 'failed', 'cut off']);
export type Outcome = z.infer<typeof outcomeSchema>;

export const failureKindSchema = z.enum([
  'scf not converged',
  'optimisation out of steps',
  'out of memory',
  'out of disk',
  'out of time',
  'linear dependence',
  'input error',
  'killed',
  'other',
]);
export type FailureKind = z.infer<typeof failureKindSchema>;

/** `line` is 1-based; null when nothing is printed (a killed run prints no reason). */
export const failureSchema = z.object({ kind: failureKindSchema, message: z.string(), line: nullableNumber });
export type Failure = z.infer<typeof failureSchema>;

export const methodSchema = z.object({
  functional: z.string().nullable(),
  basis: z.string().nullable(),
  reference: z.enum(['restricted', 'unrestricted', 'restricted open-shell']).nullable(),
  dispersion: z.string().nullable(),
  solvation: z.string().nullable(),
  relativity: z.string().nullable(),
});
export type Method = z.infer<typeof methodSchema>;

export const populationSchema = z.object({
  scheme: z.enum(['Mulliken', 'Löwdin', 'Hirshfeld', 'natural']),
  atoms: z.array(z.object({ element: z.string(), charge: z.number(), spin: nullableNumber })),
});
export type Population = z.infer<typeof populationSchema>;

export const geometrySchema = z.object({
  elements: z.array(z.string()),
  positionsAngstrom: z.array(z.tuple([z.number(), z.number(), z.number()])),
});
export type Geometry = z.infer<typeof geometrySchema>;

const frontierSchema = z.object({ homoEv: nullableNumber, lumoEv: nullableNumber });

export const taskSchema = z.enum([
  'single point',
  'gradient',
  'optimisation',
  'transition state search',
  'frequencies',
  'stability',
  'broken symmetry',
  'properties',
  'excited states',
  'scan',
  'other',
]);
export type Task = z.infer<typeof taskSchema>;

export const optimisationStepSchema = z.object({
  energyHartree: nullableNumber,
  largestGradientHartreePerBohr: nullableNumber,
  rmsGradientHartreePerBohr: nullableNumber,
  /** Line of the energy of this geometry. */
  line: z.number(),
  /** Line on which the geometry's table is announced, for playback from the raw file; null when not printed. */
  geometryLine: nullableNumber,
});

/** What each code means stands in warnings.ts. */
export const warningCodeSchema = z.enum([
  'cut-off',
  'failed',
  'later-step-unfinished',
  'scf-not-converged',
  'scf-skipped',
  'optimisation-not-converged',
  'geometry-without-energy',
  'energy-without-geometry',
  'spin-multiplicity-parity',
  'electron-count',
  'spin-sum',
  'atom-count',
  'imaginary-modes',
  'table-damaged',
  'not-dft',
  'energy-is-reference',
  'beta-excess',
  'unknown-program',
  'steps-abridged',
]);
export type WarningCode = z.infer<typeof warningCodeSchema>;

export const warningSchema = z.object({
  code: warningCodeSchema,
  message: z.string(),
  line: nullableNumber,
});
export type Warning = z.infer<typeof warningSchema>;

export const evidenceSchema = z.record(z.string(), z.object({ line: z.number(), text: z.string() }));
export type Evidence = z.infer<typeof evidenceSchema>;

/** One job step: everything that a single calculation printed. */
export const stepSchema = z.object({
  program: programSchema.nullable(),
  version: z.string().nullable(),
  outcome: outcomeSchema,
  failure: failureSchema.nullable(),
  tasks: z.array(taskSchema),
  title: z.string().nullable(),
  jobKey: z.string().nullable(),
  formula: z.string().nullable(),
  atomCount: nullableNumber,
  electronCount: nullableNumber,
  charge: nullableNumber,
  multiplicity: nullableNumber,
  method: methodSchema,
  energyHartree: nullableNumber,
  scf: z.object({ converged: z.boolean().nullable(), iterations: nullableNumber }),
  spin: z.object({ s2: nullableNumber, s2Ideal: nullableNumber, s2AfterAnnihilation: nullableNumber }),
  populations: z.array(populationSchema),
  optimisation: z
    .object({
      converged: z.boolean().nullable(),
      steps: z.number(),
      energiesHartree: z.array(nullableNumber),
      history: z.array(optimisationStepSchema),
    })
    .nullable(),
  geometry: geometrySchema.nullable(),
  frequencies: z
    .object({
      count: z.number(),
      lowestCm1: nullableNumber,
      imaginaryCount: z.number(),
      valuesCm1: z.array(z.number()),
    })
    .nullable(),
  thermochemistry: z
    .object({
      temperatureK: nullableNumber,
      pressurePa: nullableNumber,
      zeroPointHartree: nullableNumber,
      enthalpyHartree: nullableNumber,
      gibbsHartree: nullableNumber,
    })
    .nullable(),
  orbitals: z.object({ alpha: frontierSchema, beta: frontierSchema.nullable() }).nullable(),
  dipoleDebye: nullableNumber,
  stability: z.object({ stable: z.boolean().nullable(), line: nullableNumber }).nullable(),
  brokenSymmetry: z
    .object({
      highSpinEnergyHartree: nullableNumber,
      brokenSymmetryEnergyHartree: nullableNumber,
      highSpinS2: nullableNumber,
      brokenSymmetryS2: nullableNumber,
    })
    .nullable(),
  resources: z.object({ wallSeconds: nullableNumber, cores: nullableNumber }),
  evidence: evidenceSchema,
  warnings: z.array(warningSchema),
});
export type Step = z.infer<typeof stepSchema>;

/** The whole file. The top level is the last step that finished; `steps` holds every job in file order. */
export const outputRecordSchema = stepSchema.extend({
  bytes: z.number(),
  lines: z.number(),
  steps: z.array(stepSchema),
});
export type OutputRecord = z.infer<typeof outputRecordSchema>;

/** A step with nothing read yet: what every reader starts from. */
export function emptyStep(program: Program | null): Step {
  return {
    program,
    version: null,
    outcome: 'cut off',
    failure: null,
    tasks: [],
    title: null,
    jobKey: null,
    formula: null,
    atomCount: null,
    electronCount: null,
    charge: null,
    multiplicity: null,
    method: {
      functional: null,
      basis: null,
      reference: null,
      dispersion: null,
      solvation: null,
      relativity: null,
    },
    energyHartree: null,
    scf: { converged: null, iterations: null },
    spin: { s2: null, s2Ideal: null, s2AfterAnnihilation: null },
    populations: [],
    optimisation: null,
    geometry: null,
    frequencies: null,
    thermochemistry: null,
    orbitals: null,
    dipoleDebye: null,
    stability: null,
    brokenSymmetry: null,
    resources: { wallSeconds: null, cores: null },
    evidence: {},
    warnings: [],
  };
}
