import { z } from 'zod';
import { sampleSchema } from './sample-schema';
import { balanceReadingsSchema } from './technique-balance';
import { gouyReadingsSchema } from './technique-gouy';
import { literatureReadingsSchema } from './technique-literature';
import { magnetometerReadingsSchema } from './technique-magnetometer';
import { nmrReadingsSchema } from './technique-nmr-shift';

/** Readings of one determination with what they were made on. Units are in the names; χ is cgs-emu. */
export const momentInputSchema = z.discriminatedUnion(
  'technique',
  [
    z.strictObject({
      technique: z.literal('susceptibility balance'),
      readings: balanceReadingsSchema,
      sample: sampleSchema,
    }),
    z.strictObject({
      technique: z.literal('Gouy balance'),
      readings: gouyReadingsSchema,
      sample: sampleSchema,
    }),
    z.strictObject({ technique: z.literal('NMR shift'), readings: nmrReadingsSchema, sample: sampleSchema }),
    z.strictObject({
      technique: z.literal('magnetometer'),
      readings: magnetometerReadingsSchema,
      sample: sampleSchema,
    }),
    z.strictObject({
      technique: z.literal('paper or another laboratory'),
      readings: literatureReadingsSchema,
    }),
  ],
  {
    error:
      'The technique must be "susceptibility balance", "Gouy balance", "NMR shift", "magnetometer" or "paper or another laboratory".',
  },
);
export type MomentInput = z.infer<typeof momentInputSchema>;
