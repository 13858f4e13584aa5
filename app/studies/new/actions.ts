'use server';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { authoriseAction } from '@/app/_server/authorise-action';
import { readForm } from '@/app/_server/read-form';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { asTenant, database } from '@/db/knex';
import { insertEvent } from '@/db/repositories/events';
import { insertStudy } from '@/db/repositories/studies';

const fields = z.object({
  title: z.string().trim().min(1, 'Give the study a title.').max(200, 'At most 200 characters.'),
  question: z.string().trim().max(2000, 'At most 2000 characters.'),
});

export async function createStudy(_previous: FormState, form: FormData): Promise<FormState> {
  const access = await authoriseAction('manage studies');
  if (!access.ok) return failedForm(access.error.message, typedValues(form));
  const actor = access.value;
  const read = readForm(fields, form);
  if (!read.ok) return read.error;
  const id = await asTenant(database(), actor, async (trx) => {
    const studyId = await insertStudy(trx, actor, read.value);
    await insertEvent(trx, actor, { studyId, subject: 'study', subjectId: studyId, kind: 'created' });
    return studyId;
  });
  redirect(`/studies/${id}`);
}
