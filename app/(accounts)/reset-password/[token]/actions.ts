'use server';
import { redirect } from 'next/navigation';
import { database } from '@/db/knex';
import { findResetPerson, forgetAttempts, resetPassword } from '@/db/repositories/accounts';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { accessTokenHash } from '@/lib/access/access-token';
import { hashPassword } from '@/lib/access/password-hash';
import { passwordProblem, passwordProblemText } from '@/lib/access/password-rules';

const deadLink = failedForm(
  'This link was used or has run out. Ask for a new one; the old password still works.',
);

export async function setNewPassword(
  token: string,
  _previous: FormState,
  form: FormData,
): Promise<FormState> {
  const db = database();
  const tokenHash = accessTokenHash(token);
  const person = await findResetPerson(db, tokenHash);
  if (!person) return deadLink;
  const password = String(form.get('password') ?? '');
  const problem = passwordProblem(password, person.email);
  if (problem) return failedForm(null, {}, { password: passwordProblemText[problem] });
  const done = await resetPassword(db, tokenHash, await hashPassword(password));
  if (!done.ok) return deadLink;
  await forgetAttempts(db, `sign-in ${person.email}`);
  redirect('/sign-in?notice=password-set');
}
