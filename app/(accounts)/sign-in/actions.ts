'use server';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { giveSessionCookie } from '@/app/_server/browser-session';
import { signInWithPassword, type SignInProblem } from '@/app/_server/sign-in-with-password';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { demoAccounts } from '@/lib/access/demo-accounts';
import { isDemoMode } from '@/lib/access/demo-mode';
import { returnPath } from '@/lib/access/return-path';

const problemText: Record<SignInProblem, string> = {
  wrong: 'This e-mail and password do not belong together. Check both, or ask for a new password below.',
  'too many attempts':
    'Too many attempts for this e-mail. Wait a quarter of an hour, or ask for a new password.',
};

export async function signIn(_previous: FormState, form: FormData): Promise<FormState> {
  const email = String(form.get('email') ?? '');
  const outcome = await signInWithPassword(email, String(form.get('password') ?? ''), await userAgent());
  if (!outcome.ok) return failedForm(problemText[outcome.error], { email });
  await giveSessionCookie(outcome.value);
  redirect(returnPath(String(form.get('to') ?? '')));
}

/** Signs in as one of the announced demo accounts; does nothing outside demo mode. */
export async function signInAsDemo(form: FormData): Promise<void> {
  const account = demoAccounts.find(({ email }) => email === form.get('email'));
  if (!isDemoMode() || !account) redirect('/sign-in');
  const outcome = await signInWithPassword(account.email, account.password, await userAgent());
  if (!outcome.ok) redirect('/sign-in?notice=demo-failed');
  await giveSessionCookie(outcome.value);
  redirect(returnPath(String(form.get('to') ?? '')));
}

async function userAgent(): Promise<string> {
  return (await headers()).get('user-agent') ?? '';
}
