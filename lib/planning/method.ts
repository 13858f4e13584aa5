import { z } from 'zod';
import { programSchema } from '../outputs/record';

/** Extra text of the group, added to the checked part of a deck and never in place of it. */
export const extraLinesSchema = z.object({
  /** Added to ORCA's "!" line, Gaussian's route, NWChem's dft block, Psi4's set block. */
  keywords: z.array(z.string().max(200)).max(20).default([]),
  /** Whole lines before the coordinates (ORCA), at the end (Gaussian), before the task (NWChem, Psi4). */
  lines: z.array(z.string().max(500)).max(100).default([]),
});

/** A level of theory for one program. Names are the trade's; each program's spelling is looked up. */
export const methodSchema = z.object({
  name: z.string().min(1).max(120),
  version: z.number().int().min(1).default(1),
  program: programSchema,
  functional: z.string().min(1).max(40),
  basis: z.string().min(1).max(40),
  /** Another basis (and, where the basis needs one, another core potential) for single elements. */
  basisPerElement: z.record(z.string().max(3), z.string().max(40)).default({}),
  dispersion: z.enum(['none', 'D3(0)', 'D3(BJ)', 'D4']).default('none'),
  solvation: z
    .object({ model: z.enum(['CPCM', 'SMD', 'IEFPCM', 'COSMO']), solvent: z.string().min(1).max(40) })
    .nullable()
    .default(null),
  relativity: z.enum(['none', 'ZORA', 'DKH2']).default('none'),
  grid: z.enum(['normal', 'fine', 'very fine']).default('fine'),
  scf: z
    .object({
      maxIterations: z.number().int().min(10).max(5000).default(300),
      /** Damping and the like for open shells that are slow to converge. */
      difficult: z.boolean().default(false),
    })
    .default({ maxIterations: 300, difficult: false }),
  optimisation: z
    .object({
      maxSteps: z.number().int().min(1).max(2000).default(100),
      convergence: z.enum(['loose', 'normal', 'tight']).default('normal'),
    })
    .default({ maxSteps: 100, convergence: 'normal' }),
  extra: extraLinesSchema.default({ keywords: [], lines: [] }),
});
export type MethodInput = z.input<typeof methodSchema>;
export type PlannedMethod = z.infer<typeof methodSchema>;

export const deckTaskSchema = z.enum([
  'single point',
  'optimisation',
  'frequencies',
  'optimisation and frequencies',
  'stability',
  'broken symmetry',
]);
export type DeckTask = z.infer<typeof deckTaskSchema>;
