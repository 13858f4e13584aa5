import type { Metadata } from 'next';
import { requirePermission } from '@/app/_server/actor';
import { InviteForm } from '@/components/accounts/invite-form';
import { MemberTable } from '@/components/accounts/member-table';
import { OpenInvitations } from '@/components/accounts/open-invitations';
import { database } from '@/db/knex';
import { listOpenInvitations } from '@/db/repositories/invitations';
import { listMembers } from '@/db/repositories/memberships';
import { can } from '@/lib/access/permissions';
import { roles } from '@/lib/access/roles';
import { changeMemberRole, removeFromGroup } from './actions';
import { invite, sendAgain, withdraw } from './invitation-actions';
import { roleMeaning } from './role-meaning';

export const metadata: Metadata = { title: 'Members' };

export default async function MembersPage() {
  const actor = await requirePermission('read');
  const manages = can(actor.role, 'manage members');
  const [members, invitations] = await Promise.all([
    listMembers(database(), actor),
    manages ? listOpenInvitations(database(), actor) : [],
  ]);
  const now = new Date();
  return (
    <>
      <h1 className="text-title">Members</h1>
      <p className="mt-1 mb-6 text-ink-2">
        {members.length === 1 ? '1 person' : `${members.length} people`} in {actor.groupName}.
        {manages ? '' : ' A PI of the group can invite people and change their roles.'}
      </p>
      <div className="grid gap-x-14 gap-y-10 wide:grid-cols-[minmax(0,7fr)_minmax(0,5fr)]">
        <div>
          <MemberTable
            members={members.map((member) => ({
              ...member,
              // A guest comes from outside the group and needs nobody's address.
              email: actor.role === 'guest' ? null : member.email,
              joinedAt: member.joinedAt.toISOString(),
              you: member.userId === actor.userId,
            }))}
            roles={roles}
            changeRole={manages ? changeMemberRole : null}
            remove={manages ? removeFromGroup : null}
          />
          {manages ? <RoleMeanings /> : null}
        </div>
        {manages ? (
          <section aria-labelledby="invite">
            <h2 id="invite" className="mb-4 border-b-2 border-ink pb-2 text-section">
              Invite
            </h2>
            <InviteForm action={invite} roles={roles} />
            <OpenInvitations
              invitations={invitations.map((invitation) => ({
                ...invitation,
                invitedAt: invitation.invitedAt.toISOString(),
                expiresAt: invitation.expiresAt.toISOString(),
                over: invitation.expiresAt <= now,
              }))}
              withdraw={withdraw}
              sendAgain={sendAgain}
            />
          </section>
        ) : null}
        {manages ? null : <RoleMeanings />}
      </div>
    </>
  );
}

function RoleMeanings() {
  return (
    <dl className="mt-5 grid gap-x-4 gap-y-1 text-small text-ink-2 book:grid-cols-[max-content_1fr]">
      {roles.map((role) => (
        <div key={role} className="contents max-book:block">
          <dt className="font-semibold">{role}</dt>
          <dd className="max-book:mb-2">{roleMeaning[role]}</dd>
        </div>
      ))}
    </dl>
  );
}
