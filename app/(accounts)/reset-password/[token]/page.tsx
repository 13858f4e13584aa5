import type { Metadata } from 'next';
import Link from 'next/link';
import { DeadLink } from '@/components/accounts/dead-link';
import { database } from '@/db/knex';
import { findResetPerson } from '@/db/repositories/accounts';
import { accessTokenHash } from '@/lib/access/access-token';
import { setNewPassword } from './actions';
import { NewPasswordForm } from './new-password-form';

export const metadata: Metadata = { title: 'New password', referrer: 'no-referrer' };

export default async function NewPasswordPage({ params }: PageProps<'/reset-password/[token]'>) {
  const { token } = await params;
  const person = await findResetPerson(database(), accessTokenHash(token));
  if (!person)
    return (
      <DeadLink what="It was to set a new password.">
        <Link href="/reset-password">Ask for a new one</Link>; the old password still works.
      </DeadLink>
    );
  return (
    <>
      <h1 className="mb-3 text-title">New password</h1>
      <p className="mb-6 text-ink-2">For {person.email}. Every session that is still open will end.</p>
      <NewPasswordForm action={setNewPassword.bind(null, token)} email={person.email} />
    </>
  );
}
