'use server';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { openSession } from '@/app/_server/open-session';
import { readForm } from '@/app/_server/read-form';
import { rememberGroup } from '@/app/_server/remember-group';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { database } from '@/db/knex';
import { createFirstGroup, isFirstStartOpen } from '@/db/repositories/accounts';
import { accessTokenHash } from '@/lib/access/access-token';
import { emailField, groupNameField, nameField } from '@/lib/access/account-fields';
import { hashPassword } from '@/lib/access/password-hash';
import { passwordProblem, passwordProblemText } from '@/lib/access/password-rules';

const fields = z.object({ groupName: groupNameField, name: nameField, email: emailField });

const problemText = {
  'link not valid': 'This link was used or has run out. Start the server again for a new one.',
  'e-mail taken': 'An account of the demo has this e-mail. Use another one.',
};

/** Opens the first group with its PI and signs them in. */
export async function createGroup(token: string, _previous: FormState, form: FormData): Promise<FormState> {
  const read = readForm(fields, form);
  if (!read.ok) return read.error;
  const db = database();
  const tokenHash = accessTokenHash(token);
  if (!(await isFirstStartOpen(db, tokenHash)))
    return failedForm(problemText['link not valid'], typedValues(form));
  const password = String(form.get('password') ?? '');
  const problem = passwordProblem(password, read.value.email);
  if (problem) return failedForm(null, typedValues(form), { password: passwordProblemText[problem] });
  const passwordHash = await hashPassword(password);
  const created = await createFirstGroup(db, tokenHash, { ...read.value, passwordHash });
  if (!created.ok) return failedForm(problemText[created.error], typedValues(form));
  await openSession(created.value.userId);
  await rememberGroup(created.value.groupId);
  redirect('/');
}
