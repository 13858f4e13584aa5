import { z } from 'zod';
import type { Structure } from '../../chemistry/structure';

const atomIndex = z.number().int().min(0);

/**
 * How a starting structure was made from another one: kept as data beside the structure, so that it can be
 * shown and made again. Atom indices are 0-based and belong to the structure before the step.
 */
export const recipeStepSchema = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('exchange metal'),
    centre: atomIndex,
    element: z.string().max(3),
    /** Difference of the ionic radii, new less old (spin state and coordination number taken into account). */
    radiusDifferenceAngstrom: z.number().min(-1.5).max(1.5),
  }),
  z.object({
    kind: z.literal('add axial water'),
    centre: atomIndex,
    distanceAngstrom: z.number().min(1.6).max(3.2),
  }),
  z.object({
    kind: z.literal('remove ligands'),
    centre: atomIndex,
    donors: z.array(atomIndex).min(1).max(8),
  }),
  z.object({
    kind: z.literal('set elevation'),
    centre: atomIndex,
    /** Angle of the four donors above and below the mean plane: 0 = SP-4, 35.264 = T-4. */
    elevationDegrees: z.number().min(0).max(60),
  }),
  z.object({
    kind: z.literal('twist'),
    centre: atomIndex,
    donors: z.tuple([atomIndex, atomIndex]),
    degrees: z.number().min(-180).max(180),
  }),
  z.object({
    kind: z.literal('shift donors'),
    centre: atomIndex,
    donors: z.array(atomIndex).min(1).max(8),
    /** Positive elongates. */
    shiftAngstrom: z.number().min(-1).max(2),
  }),
]);
export type RecipeStep = z.infer<typeof recipeStepSchema>;

/** Bonded pairs of a structure, 0-based; metal–donor bonds included. */
export type Bonds = readonly (readonly [number, number])[];

export interface RecipeProblem {
  code:
    | 'no such atom'
    | 'unknown element'
    | 'not a donor'
    | 'not four-coordinate'
    | 'ligand cannot move alone';
  message: string;
}

/** A structure with its bonds, both changed together. */
export interface BondedStructure {
  structure: Structure;
  bonds: Bonds;
}
