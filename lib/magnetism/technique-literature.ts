import { z } from 'zod';
import { quantityInput } from './quantity-input';
import { quantitySchema } from './quantity-schema';
import type { TechniquePlan } from './technique-plan';

/** A moment taken from a paper or another laboratory, with its stated uncertainty and reference. */
export const literatureReadingsSchema = z.strictObject({
  muEffBohrMagneton: quantitySchema({
    label: 'effective moment',
    unit: 'μ_B',
    range: 'zero or more',
    most: 20,
    advice: 'Moments of 3d ions lie between 0 and about 7 μ_B.',
  }),
  reference: z
    .string({ error: 'Give the reference that the moment comes from.' })
    .trim()
    .min(1, 'Give the reference that the moment comes from.'),
});
export type LiteratureReadings = z.infer<typeof literatureReadingsSchema>;

/** The moment enters as it was printed; nothing before it is known. */
export function literaturePlan(readings: LiteratureReadings): TechniquePlan {
  return {
    inputs: [
      quantityInput(
        'muEffPrinted',
        'μ_eff',
        'moment as printed',
        readings.muEffBohrMagneton,
        'μ_B',
        readings.reference,
      ),
    ],
    steps: [],
    reaches: 'muEff',
    warnings: [],
  };
}
