'use server';
import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { currentPerson } from '@/app/_server/actor';
import { signedOut } from '@/app/_server/authorise-action';
import { readForm } from '@/app/_server/read-form';
import { doneForm, failedForm, type FormState } from '@/components/accounts/form-state';
import { database } from '@/db/knex';
import { countAttempt, findAccountForSignIn, forgetAttempts, setPassword } from '@/db/repositories/accounts';
import { revokeOtherSessions, revokeSession } from '@/db/repositories/sessions';
import { hashPassword, isPassword } from '@/lib/access/password-hash';
import { passwordProblem, passwordProblemText } from '@/lib/access/password-rules';

const triesAllowed = 10;

/** Sets a new password after the present one was given; the person's other sessions end. */
export async function changePassword(_previous: FormState, form: FormData): Promise<FormState> {
  const person = await currentPerson();
  if (!person) return failedForm(signedOut.message);
  const db = database();
  const attempt = `password change ${person.userId}`;
  if ((await countAttempt(db, attempt, 15 * 60)) > triesAllowed)
    return failedForm('Too many attempts. Wait a quarter of an hour, or have a link sent by e-mail.');
  const account = await findAccountForSignIn(db, person.email);
  const present = String(form.get('presentPassword') ?? '');
  if (!(await isPassword(account?.passwordHash ?? null, present)))
    return failedForm(null, {}, { presentPassword: 'This is not the present password.' });
  await forgetAttempts(db, attempt);
  const password = String(form.get('password') ?? '');
  const problem = passwordProblem(password, person.email);
  if (problem) return failedForm(null, {}, { password: passwordProblemText[problem] });
  await setPassword(db, person.userId, await hashPassword(password), person.sessionId);
  revalidatePath('/settings/account');
  return doneForm('The password is changed. Your other sessions have ended.');
}

const sessionFields = z.object({ sessionId: z.uuid() });

export async function endOneSession(_previous: FormState, form: FormData): Promise<FormState> {
  const person = await currentPerson();
  if (!person) return failedForm(signedOut.message);
  const read = readForm(sessionFields, form);
  if (!read.ok) return read.error;
  const ended = await revokeSession(database(), person.userId, read.value.sessionId);
  revalidatePath('/settings/account');
  return ended ? doneForm('The session has ended.') : failedForm('That session was over already.');
}

export async function endOtherSessions(_previous: FormState, _form: FormData): Promise<FormState> {
  const person = await currentPerson();
  if (!person) return failedForm(signedOut.message);
  const ended = await revokeOtherSessions(database(), person.userId, person.sessionId);
  revalidatePath('/settings/account');
  return doneForm(ended === 1 ? 'One other session has ended.' : `${ended} other sessions have ended.`);
}
