import type { Metadata } from 'next';
import { DeadLink } from '@/components/accounts/dead-link';
import { database } from '@/db/knex';
import { isFirstStartOpen } from '@/db/repositories/accounts';
import { accessTokenHash } from '@/lib/access/access-token';
import { createGroup } from './actions';
import { FirstStartForm } from './first-start-form';

export const metadata: Metadata = { title: 'First start', referrer: 'no-referrer' };

export default async function FirstStartPage({ params }: PageProps<'/first-start/[token]'>) {
  const { token } = await params;
  if (!(await isFirstStartOpen(database(), accessTokenHash(token))))
    return (
      <DeadLink what="It was to open the first group on this server.">
        While nobody has an account, each start of the server prints a new one.
      </DeadLink>
    );
  return (
    <>
      <h1 className="mb-3 text-title">Open your group</h1>
      <p className="mb-6 text-ink-2">
        Nobody has an account on this server yet. You become the group’s PI: you invite the others, give them
        their roles and sign assignments.
      </p>
      <FirstStartForm action={createGroup.bind(null, token)} />
    </>
  );
}
