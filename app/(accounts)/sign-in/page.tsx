import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { currentPerson } from '@/app/_server/actor';
import { DemoAccounts } from '@/components/accounts/demo-accounts';
import { FormMessage } from '@/components/accounts/form-message';
import { demoAccounts } from '@/lib/access/demo-accounts';
import { isDemoMode } from '@/lib/access/demo-mode';
import { returnPath } from '@/lib/access/return-path';
import { signIn, signInAsDemo } from './actions';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

const notices: Readonly<Record<string, string>> = {
  'password-set': 'The new password is set and every other session has ended. Sign in with it.',
  'signed-out': 'You are signed out.',
  'demo-failed': 'This demo account cannot sign in: its password was changed, or it was tried too often.',
};

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const { to, notice } = await searchParams;
  const target = returnPath(typeof to === 'string' ? to : null);
  if (await currentPerson()) redirect(target);
  const said = typeof notice === 'string' ? (notices[notice] ?? null) : null;
  const entrance = (
    <div>
      <h1 className="mb-6 text-title">Sign in</h1>
      <div className="grid gap-5">
        <FormMessage state={{ status: 'done', message: said }} />
        <SignInForm action={signIn} to={target} />
      </div>
      <p className="mt-5 text-small">
        <Link href="/reset-password">Forgotten the password?</Link>
      </p>
    </div>
  );
  if (!isDemoMode()) return entrance;
  return (
    <div data-spread className="grid gap-x-14 gap-y-10 book:grid-cols-[minmax(0,4fr)_minmax(0,5fr)]">
      {entrance}
      <DemoAccounts accounts={demoAccounts} action={signInAsDemo} to={target} />
    </div>
  );
}
