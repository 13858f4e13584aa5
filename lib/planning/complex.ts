import { z } from 'zod';

/** A ligand by its dictionary abbreviation, or one of the group's own. */
export const ligandChoiceSchema = z.union([
  z.string().min(1).max(40),
  z.object({
    name: z.string().min(1).max(120),
    formula: z.string().min(1).max(120),
    charge: z.number().int().min(-12).max(12),
    donors: z.array(z.string().min(1).max(3)).max(12),
    unpairedElectrons: z.number().int().min(0).max(4).default(0),
  }),
]);

export const complexMetalSchema = z.object({
  element: z.string().min(1).max(3),
  oxidationState: z.number().int().min(-4).max(9),
  /** Needed when there are several metals; otherwise it follows from the ligands. */
  coordinationNumber: z.number().int().min(2).max(8).optional(),
  /** IUPAC polyhedral symbol, when only that geometry is to be planned. */
  geometry: z.string().max(10).optional(),
});

/**
 * One compound, as the planner takes it. `charge` is the total charge; it must equal the sum of
 * oxidation states and ligand charges. Ligands outside the coordination sphere (solvent, counter-ions)
 * have an empty `donors` list.
 */
export const complexSchema = z.object({
  name: z.string().max(200).optional(),
  metals: z.array(complexMetalSchema).min(1).max(8),
  ligands: z.array(z.object({ ligand: ligandChoiceSchema, count: z.number().int().min(1).max(60) })).max(40),
  charge: z.number().int().min(-30).max(30),
});

export type ComplexInput = z.input<typeof complexSchema>;
export type Complex = z.infer<typeof complexSchema>;
export type ComplexMetal = z.infer<typeof complexMetalSchema>;
