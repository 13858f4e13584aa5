import { z } from 'zod';
import { clusterSchema } from './cluster';
import { complexSchema } from './complex';
import { deckTaskSchema, methodSchema } from './method';

/** A structure inline or in an XYZ file beside the plan. */
export const planStructureSchema = z.union([
  z.object({ file: z.string().min(1).max(500) }),
  z.object({ xyz: z.string().min(1).max(5_000_000) }),
  z.object({
    elements: z.array(z.string().max(3)).min(1),
    positionsAngstrom: z.array(z.tuple([z.number(), z.number(), z.number()])).min(1),
  }),
]);

const siteSchema = z.object({
  atomIndex: z.number().int().min(0),
  oxidationState: z.number().int().min(-4).max(9),
  unpaired: z.number().int().min(1).max(7),
  spinUp: z.boolean(),
});

/** One calculation, spelled out. */
export const planJobSchema = z.object({
  label: z.string().min(1).max(120),
  structure: planStructureSchema,
  charge: z.number().int().min(-30).max(30),
  multiplicity: z.number().int().min(1).max(60),
  task: deckTaskSchema,
  /** Name of one of the methods. */
  method: z.string(),
  jobKey: z.string().optional(),
  sites: z.array(siteSchema).optional(),
});

/** A complex whose candidates become jobs, for every geometry that has a starting structure. */
export const planComplexSchema = z.object({
  label: z.string().min(1).max(120),
  complex: complexSchema,
  /** Starting structures by the candidate's geometries, for example "OC-6" or "SPY-5+SPY-5". */
  structures: z.record(z.string(), planStructureSchema),
  task: deckTaskSchema.default('optimisation'),
  method: z.string(),
});

/** What `npm run -s cli -- plan FILE.json` reads. */
export const planFileSchema = z
  .object({
    methods: z.array(methodSchema).min(1).max(50),
    cluster: clusterSchema,
    jobs: z.array(planJobSchema).max(2000).default([]),
    complexes: z.array(planComplexSchema).max(200).default([]),
  })
  .strict();
export type PlanFile = z.infer<typeof planFileSchema>;
export type PlanStructure = z.infer<typeof planStructureSchema>;
