'use server';
import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { authoriseAction } from '@/app/_server/authorise-action';
import { readForm } from '@/app/_server/read-form';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { asTenant, database } from '@/db/knex';
import { findComplex } from '@/db/repositories/complexes';
import { insertEvent } from '@/db/repositories/events';
import { ensureSample, insertMeasurement, techniques } from '@/db/repositories/measurements';
import { decimal, decimals } from '@/lib/magnetism/decimal-fields';

const fields = z.object({
  sampleCode: z
    .string()
    .trim()
    .min(1, 'Name the sample, for example "Co-7b".')
    .max(60, 'At most 60 characters.'),
  technique: z.enum(techniques, 'Choose a technique.'),
  temperatureK: decimal('The temperature in kelvin').refine(
    (kelvin) => kelvin > 0 && kelvin < 2000,
    'A temperature between 0 and 2000 K. Was it typed in degrees Celsius? Add 273.15.',
  ),
  uTemperatureK: decimal('The uncertainty of the temperature').refine((u) => u >= 0, 'Zero or more.'),
  replicates: decimals('The moments', 100).refine(
    (values) => values.every((value) => value >= 0 && value < 30),
    'Each moment lies between 0 and 30 μB. Was χ typed instead of μ?',
  ),
  uSystematicBohr: decimal('The systematic uncertainty').refine(
    (u) => u >= 0 && u < 10,
    'Between 0 and 10 μB: what calibration and corrections contribute.',
  ),
  measuredOn: z.iso.date('Give the date as year-month-day.'),
  reference: z.string().trim().max(500, 'At most 500 characters.'),
  note: z.string().trim().max(2000, 'At most 2000 characters.'),
  coldIsMeant: z.string().optional(),
});

/** Below this a temperature may well be degrees Celsius in a kelvin field; it is asked once. */
const ASK_BELOW_K = 60;

/** Saves a measurement with its replicates; everything typed is kept when something is wrong. */
export async function enterMeasurement(
  studyId: string,
  complexId: string,
  _previous: FormState,
  form: FormData,
): Promise<FormState> {
  const access = await authoriseAction('enter measurements');
  if (!access.ok) return failedForm(access.error.message, typedValues(form));
  const actor = access.value;
  const read = readForm(fields, form);
  if (!read.ok) return read.error;
  const { sampleCode, replicates, coldIsMeant, ...measurement } = read.value;
  if (measurement.temperatureK < ASK_BELOW_K && coldIsMeant !== 'yes') {
    return failedForm('Is the temperature in kelvin?', typedValues(form), {
      temperatureK: `${measurement.temperatureK} K is ${(measurement.temperatureK - 273.15).toFixed(0)} °C. If that is meant, tick “Measured cold”; if it was in °C, add 273.15.`,
    });
  }
  const saved = await asTenant(database(), actor, async (trx) => {
    const complex = await findComplex(trx, actor, complexId);
    if (!complex || complex.studyId !== studyId) return null;
    const sampleId = await ensureSample(trx, actor, { complexId, code: sampleCode, description: '' });
    const id = await insertMeasurement(trx, actor, {
      ...measurement,
      sampleId,
      invented: false,
      replicatesBohr: replicates,
    });
    await insertEvent(trx, actor, {
      studyId,
      subject: 'measurement',
      subjectId: id,
      kind: 'entered',
      after: { sampleCode, technique: measurement.technique, replicates },
    });
    return id;
  });
  if (saved === null) return failedForm('This complex is no longer there.', typedValues(form));
  revalidatePath(`/studies/${studyId}`);
  redirect(`/studies/${studyId}/complexes/${complexId}`);
}
