import type { Metadata } from 'next';
import Link from 'next/link';
import { currentPerson } from '@/app/_server/actor';
import { DeadLink } from '@/components/accounts/dead-link';
import { database } from '@/db/knex';
import { findInvitation } from '@/db/repositories/invitations';
import { accessTokenHash } from '@/lib/access/access-token';
import { joinAsNewcomer, joinSignedIn, signInAsOther } from './actions';
import { JoinForm } from './join-form';
import { NewcomerForm } from './newcomer-form';

export const metadata: Metadata = { title: 'Invitation', referrer: 'no-referrer' };

export default async function InvitationPage({ params }: PageProps<'/invitation/[token]'>) {
  const { token } = await params;
  const [invitation, person] = await Promise.all([
    findInvitation(database(), accessTokenHash(token)),
    currentPerson(),
  ]);
  if (!invitation)
    return (
      <DeadLink what="It was an invitation to a group.">Ask the group’s PI to invite you again.</DeadLink>
    );
  const { groupName, role, email, hasAccount } = invitation;
  return (
    <>
      <h1 className="mb-3 text-title">Join {groupName}</h1>
      <p className="mb-6">
        The group invites <strong>{email}</strong> as <strong>{role}</strong>.
      </p>
      {person?.email === email ? (
        <JoinForm action={joinSignedIn.bind(null, token)} label={`Join as ${person.name}`} />
      ) : person ? (
        <>
          <p className="mb-4">
            You are signed in as {person.email}, which is another account. Sign out to take the invitation up
            as {email}.
          </p>
          <JoinForm action={signInAsOther.bind(null, token)} label="Sign out" />
        </>
      ) : hasAccount ? (
        <p>
          This e-mail has an account already.{' '}
          <Link href={`/sign-in?to=${encodeURIComponent(`/invitation/${token}`)}`}>Sign in to join</Link>.
        </p>
      ) : (
        <NewcomerForm action={joinAsNewcomer.bind(null, token)} email={email} />
      )}
    </>
  );
}
