import { z } from 'zod';

/**
 * What is known of one metal centre. Stored as a JSON column and printed by the command line. Distances in Å,
 * angles in degrees, indices 0-based. What does not apply is null; `doesNotApply` (does-not-apply.ts) says why.
 * Distance-based values run over donor atoms, angle-based values and shapes over sites (one per donor atom,
 * one per π-bound group); `coordinationNumber` counts sites.
 */
const contactSchema = z.object({ element: z.string(), index: z.number(), distanceAngstrom: z.number() });
const nullableNumber = z.number().nullable();
const spinStateSchema = z.enum(['high', 'low']);

export const donorSchema = contactSchema.extend({
  /** Other metal centres that this donor bridges to. */
  bridgesTo: z.array(z.number()),
  /** Added by a person. */
  addedByHand: z.boolean(),
});
export type Donor = z.infer<typeof donorSchema>;

export const siteSchema = z.object({
  atoms: z.array(z.number()),
  hapticity: z.number(),
  /** From the metal to the donor atom or to the centroid of the π-bound group. */
  distanceAngstrom: z.number(),
});
export type Site = z.infer<typeof siteSchema>;

export const angleSchema = z.object({
  /** Positions in `sites`. */
  sites: z.tuple([z.number(), z.number()]),
  angleDegrees: z.number(),
  trans: z.boolean(),
});

export const shapeSchema = z.object({
  id: z.string(),
  symbol: z.string(),
  variant: z.string().nullable(),
  measure: z.number(),
});

export const axialSchema = z.object({
  /** Atom indices; for a π-bound group its first atom. */
  axial: z.array(z.number()),
  equatorial: z.array(z.number()),
  meanAxialAngstrom: z.number(),
  meanEquatorialAngstrom: z.number(),
  tetragonality: z.number(),
  kind: z.enum(['elongated', 'compressed', 'regular']),
});

export const centreDescriptionSchema = z.object({
  element: z.string(),
  index: z.number(),
  coordinationNumber: z.number(),
  /** "6", or "4 + 2" with long contacts. */
  notation: z.string(),
  /** The spin state whose radius found the donors; null when it was not given or makes no difference. */
  spinStateUsed: spinStateSchema.nullable(),
  donors: z.array(donorSchema),
  sites: z.array(siteSchema),
  longContacts: z.array(contactSchema),
  metalContacts: z.array(contactSchema),
  donorChanges: z.object({ added: z.array(z.number()), removed: z.array(z.number()) }),
  meanDistanceAngstrom: nullableNumber,
  meansByElement: z.array(
    z.object({
      element: z.string(),
      count: z.number(),
      meanDistanceAngstrom: z.number(),
      standardDeviationAngstrom: nullableNumber,
    }),
  ),
  baurDistortion: nullableNumber,
  meanSquareDistortion: nullableNumber,
  angles: z.array(angleSchema),
  chelates: z.array(
    z.object({
      donors: z.tuple([z.number(), z.number()]),
      biteAngleDegrees: z.number(),
      ringSize: z.number(),
    }),
  ),
  axial: axialSchema.nullable(),
  planeDisplacement: z
    .object({
      distanceAngstrom: z.number(),
      planarityAngstrom: z.number(),
      /** Atom indices that make the plane. */
      donors: z.array(z.number()),
    })
    .nullable(),
  tau4: nullableNumber,
  tau4Prime: nullableNumber,
  tau5: nullableNumber,
  sigmaDegrees: nullableNumber,
  thetaDegrees: nullableNumber,
  angleVarianceDegrees2: nullableNumber,
  quadraticElongation: nullableNumber,
  chelatePlaneAngleDegrees: nullableNumber,
  shapes: z.array(shapeSchema).nullable(),
  /** IUPAC symbol of the nearest ideal polyhedron. */
  nearest: z.string().nullable(),
  path: z
    .object({
      from: z.string(),
      to: z.string(),
      coordinatePercent: z.number(),
      deviationPercent: z.number(),
    })
    .nullable(),
  bondValenceSum: z.array(z.object({ oxidationState: z.number(), sum: z.number() })).nullable(),
  /** The same with the long contacts; null without any. */
  bondValenceSumWithLongContacts: z
    .array(z.object({ oxidationState: z.number(), sum: z.number() }))
    .nullable(),
  supportedOxidationState: nullableNumber,
  ionicRadiusSums: z
    .array(
      z.object({
        oxidationState: z.number(),
        spinState: spinStateSchema.nullable(),
        cationRadiusAngstrom: z.number(),
        meanSumAngstrom: z.number(),
      }),
    )
    .nullable(),
});
export type CentreDescription = z.infer<typeof centreDescriptionSchema>;
