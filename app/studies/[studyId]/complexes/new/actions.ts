'use server';
import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { authoriseAction } from '@/app/_server/authorise-action';
import { readForm } from '@/app/_server/read-form';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { asTenant, database } from '@/db/knex';
import { insertComplex, listComplexes } from '@/db/repositories/complexes';
import { insertEvent } from '@/db/repositories/events';
import { findStudy } from '@/db/repositories/studies';
import { complexIdentity } from '@/lib/chemistry/complex-identity';

const fields = z.object({
  formula: z
    .string()
    .trim()
    .min(1, 'Write the complex as a formula: [CuCl4]2-')
    .max(200, 'At most 200 characters.'),
  oxidationState: z.coerce.number('A whole number.').int('A whole number.').min(-4).max(9),
  name: z.string().trim().max(300, 'At most 300 characters.'),
  section: z.string().trim().max(120, 'At most 120 characters.'),
});

/** Adds a complex to a study; its composition and charge come from the formula. */
export async function addComplex(studyId: string, _previous: FormState, form: FormData): Promise<FormState> {
  const access = await authoriseAction('manage studies');
  if (!access.ok) return failedForm(access.error.message, typedValues(form));
  const actor = access.value;
  const read = readForm(fields, form);
  if (!read.ok) return read.error;
  const { formula, oxidationState, name, section } = read.value;
  const identity = complexIdentity(formula);
  if (!identity.ok) return failedForm(null, typedValues(form), { formula: identity.error });
  const { composition, charge, metals } = identity.value;
  const metal = metals[0];
  if (metals.length !== 1 || metal === undefined) {
    return failedForm(null, typedValues(form), {
      formula: `The formula holds ${metals.join(' and ')}; a complex with one kind of metal is compared so far.`,
    });
  }
  const added = await asTenant(database(), actor, async (trx) => {
    if (!(await findStudy(trx, actor, studyId))) return 'no study' as const;
    const others = await listComplexes(trx, actor, studyId);
    if (others.some((other) => other.formula === formula)) return 'known' as const;
    const position = Math.max(-1, ...others.map((other) => other.position)) + 1;
    const complex = {
      studyId,
      position,
      section,
      formula,
      name,
      composition,
      charge,
      metal,
      oxidationState,
      note: '',
    };
    const id = await insertComplex(trx, actor, complex);
    await insertEvent(trx, actor, {
      studyId,
      subject: 'complex',
      subjectId: id,
      kind: 'added',
      after: { formula },
    });
    return { id };
  });
  if (added === 'no study') return failedForm('This study is no longer there.', typedValues(form));
  if (added === 'known')
    return failedForm(null, typedValues(form), { formula: 'The study has this complex already.' });
  revalidatePath(`/studies/${studyId}`);
  redirect(`/studies/${studyId}/complexes/${added.id}`);
}
