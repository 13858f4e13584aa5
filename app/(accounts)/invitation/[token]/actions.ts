'use server';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { currentPerson } from '@/app/_server/actor';
import { takeSessionCookie } from '@/app/_server/browser-session';
import { openSession } from '@/app/_server/open-session';
import { readForm } from '@/app/_server/read-form';
import { rememberGroup } from '@/app/_server/remember-group';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { database } from '@/db/knex';
import { acceptInvitation, findInvitation, type AcceptProblem } from '@/db/repositories/invitations';
import { endSession } from '@/db/repositories/sessions';
import { accessTokenHash } from '@/lib/access/access-token';
import { nameField } from '@/lib/access/account-fields';
import { hashPassword } from '@/lib/access/password-hash';
import { passwordProblem, passwordProblemText } from '@/lib/access/password-rules';

const problemText: Record<AcceptProblem, string> = {
  'link not valid': 'This invitation was used, withdrawn or has run out. Ask the group’s PI for a new one.',
  'account exists':
    'This e-mail has got an account in the meantime. Load the page again and sign in to join.',
  'other e-mail': 'You are signed in with another e-mail than the invited one.',
};

const newcomerFields = z.object({ name: nameField });

/** Joins with a new account and signs it in. */
export async function joinAsNewcomer(
  token: string,
  _previous: FormState,
  form: FormData,
): Promise<FormState> {
  const read = readForm(newcomerFields, form);
  if (!read.ok) return read.error;
  const db = database();
  const tokenHash = accessTokenHash(token);
  const invitation = await findInvitation(db, tokenHash);
  if (!invitation) return failedForm(problemText['link not valid'], typedValues(form));
  const password = String(form.get('password') ?? '');
  const problem = passwordProblem(password, invitation.email);
  if (problem) return failedForm(null, typedValues(form), { password: passwordProblemText[problem] });
  const passwordHash = await hashPassword(password);
  const joined = await acceptInvitation(db, tokenHash, { name: read.value.name, passwordHash });
  if (!joined.ok) return failedForm(problemText[joined.error], typedValues(form));
  await openSession(joined.value.userId);
  await rememberGroup(joined.value.groupId);
  redirect('/');
}

/** Joins with the account that is signed in. */
export async function joinSignedIn(token: string, _previous: FormState, _form: FormData): Promise<FormState> {
  const person = await currentPerson();
  if (!person) redirect(`/sign-in?to=${encodeURIComponent(`/invitation/${token}`)}`);
  const joined = await acceptInvitation(database(), accessTokenHash(token), {
    userId: person.userId,
    email: person.email,
  });
  if (!joined.ok) return failedForm(problemText[joined.error]);
  await rememberGroup(joined.value.groupId);
  redirect('/');
}

/** Signs out and comes back to the invitation. */
export async function signInAsOther(
  token: string,
  _previous: FormState,
  _form: FormData,
): Promise<FormState> {
  const person = await currentPerson();
  if (person) await endSession(database(), person.sessionId);
  await takeSessionCookie();
  redirect(`/invitation/${encodeURIComponent(token)}`);
}
