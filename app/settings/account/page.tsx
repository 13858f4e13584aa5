import type { Metadata } from 'next';
import { currentGroups, requirePerson } from '@/app/_server/actor';
import { switchGroup } from '@/app/_server/session-actions';
import { ChangePasswordForm } from '@/components/accounts/change-password-form';
import { GroupList } from '@/components/accounts/group-list';
import { SessionList } from '@/components/accounts/session-list';
import { database } from '@/db/knex';
import { listSessions } from '@/db/repositories/sessions';
import { browserName } from '@/lib/access/browser-name';
import { changePassword, endOtherSessions, endOneSession } from './actions';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const person = await requirePerson();
  const [groups, sessions] = await Promise.all([currentGroups(), listSessions(database(), person.userId)]);
  return (
    <>
      <h1 className="text-title">{person.name}</h1>
      <p className="mt-1 mb-8 text-ink-2">{person.email}</p>
      <div className="grid gap-x-14 gap-y-10 book:grid-cols-2">
        <div className="grid content-start gap-10">
          <GroupList groups={groups} action={switchGroup} />
          <ChangePasswordForm action={changePassword} email={person.email} />
        </div>
        <SessionList
          sessions={sessions.map((session) => ({
            id: session.id,
            browser: browserName(session.userAgent),
            startedAt: session.createdAt.toISOString(),
            seenAt: session.seenAt.toISOString(),
            current: session.id === person.sessionId,
          }))}
          endOne={endOneSession}
          endOthers={endOtherSessions}
        />
      </div>
    </>
  );
}
