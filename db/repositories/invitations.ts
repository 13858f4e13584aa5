import type { Knex } from 'knex';
import { asTenant, asTokenHolder } from '@/db/knex';
import { createAccount, findAccountForSignIn } from '@/db/repositories/accounts';
import { isUniqueViolation } from '@/db/unique-violation';
import { insertMemberEvent } from '@/db/repositories/member-events';
import type { Actor } from '@/lib/access/actor';
import type { Role } from '@/lib/access/roles';
import { err, ok, type Result } from '@/lib/result';

/** An invitation that is neither accepted nor withdrawn; it may have run out. */
export interface OpenInvitation {
  id: string;
  email: string;
  role: Role;
  invitedAt: Date;
  expiresAt: Date;
}

/** What the holder of the link sees. */
export interface InvitationForHolder {
  id: string;
  groupId: string;
  groupName: string;
  email: string;
  role: Role;
  /** Whether the invited address already has an account, which then has to sign in. */
  hasAccount: boolean;
}

/** Who takes an invitation up: somebody signed in, or somebody new. */
export type Newcomer = { userId: string; email: string } | { name: string; passwordHash: string };

export type InviteProblem = 'already a member';
export type AcceptProblem = 'link not valid' | 'account exists' | 'other e-mail';

/** Those that can still be accepted or withdrawn, the newest first. */
export function listOpenInvitations(db: Knex, actor: Actor): Promise<OpenInvitation[]> {
  return asTenant(db, actor, (trx) =>
    trx('invitations')
      .where({ group_id: actor.groupId, accepted_at: null, withdrawn_at: null })
      .orderBy('created_at', 'desc')
      .select<OpenInvitation[]>({
        id: 'id',
        email: 'email',
        role: 'role',
        invitedAt: 'created_at',
        expiresAt: 'expires_at',
      }),
  );
}

/** Invites an address. An open invitation of the same address is withdrawn: its link stops working. */
export function insertInvitation(
  db: Knex,
  actor: Actor,
  invitation: { email: string; role: Role; tokenHash: string; expiresAt: Date },
): Promise<Result<{ id: string }, InviteProblem>> {
  return asTenant(db, actor, async (trx) => {
    // Two invitations of one address at once take turns on the group.
    await trx('groups').where({ id: actor.groupId }).forUpdate().select('id');
    const member = await trx('memberships as m')
      .join('users as u', 'u.id', 'm.user_id')
      .where({ 'm.group_id': actor.groupId, 'u.email': invitation.email })
      .first('u.id');
    if (member) return err('already a member' as const);
    await trx('invitations')
      .where({ group_id: actor.groupId, email: invitation.email, accepted_at: null, withdrawn_at: null })
      .update({ withdrawn_at: trx.fn.now() });
    const [row] = await trx('invitations')
      .insert({
        group_id: actor.groupId,
        email: invitation.email,
        role: invitation.role,
        token_hash: invitation.tokenHash,
        invited_by: actor.userId,
        expires_at: invitation.expiresAt,
      })
      .returning<{ id: string }[]>('id');
    if (!row) throw new Error('The invitation was not stored.');
    await insertMemberEvent(trx, {
      groupId: actor.groupId,
      actorId: actor.userId,
      userId: null,
      kind: 'invited',
      after: { email: invitation.email, role: invitation.role },
    });
    return ok({ id: row.id });
  });
}

/** Withdraws an open invitation; returns it, or undefined when there is none. */
export function withdrawInvitation(
  db: Knex,
  actor: Actor,
  invitationId: string,
): Promise<{ email: string } | undefined> {
  return asTenant(db, actor, async (trx) => {
    const [row] = await trx('invitations')
      .where({ id: invitationId, group_id: actor.groupId, accepted_at: null, withdrawn_at: null })
      .update({ withdrawn_at: trx.fn.now() })
      .returning<{ email: string; role: Role }[]>(['email', 'role']);
    if (!row) return undefined;
    await insertMemberEvent(trx, {
      groupId: actor.groupId,
      actorId: actor.userId,
      userId: null,
      kind: 'invitation withdrawn',
      before: { email: row.email, role: row.role },
    });
    return { email: row.email };
  });
}

/** The invitation of a link; undefined when it was accepted, withdrawn, has run out or never existed. */
export async function findInvitation(db: Knex, tokenHash: string): Promise<InvitationForHolder | undefined> {
  const row = await asTokenHolder(db, tokenHash, (trx) =>
    trx('invitations as i')
      .join('groups as g', 'g.id', 'i.group_id')
      .where({ 'i.token_hash': tokenHash, 'i.accepted_at': null, 'i.withdrawn_at': null })
      .where('i.expires_at', '>', trx.fn.now())
      .first<Omit<InvitationForHolder, 'hasAccount'> | undefined>({
        id: 'i.id',
        groupId: 'i.group_id',
        groupName: 'g.name',
        email: 'i.email',
        role: 'i.role',
      }),
  );
  if (!row) return undefined;
  return { ...row, hasAccount: (await findAccountForSignIn(db, row.email)) !== undefined };
}

/**
 * Takes an invitation up, once: marks it accepted, creates the account of somebody new, adds the membership.
 * A person who is already in the group keeps their role.
 */
export async function acceptInvitation(
  db: Knex,
  tokenHash: string,
  newcomer: Newcomer,
): Promise<Result<{ userId: string; groupId: string }, AcceptProblem>> {
  const invitation = await findInvitation(db, tokenHash);
  if (!invitation) return err('link not valid');
  const { id, groupId, email, role } = invitation;
  if ('userId' in newcomer && newcomer.email !== email) return err('other e-mail');
  if (!('userId' in newcomer) && invitation.hasAccount) return err('account exists');
  try {
    return await asTenant(db, { groupId, userId: null }, async (trx) => {
      const spent = await trx('invitations')
        .where({ id, accepted_at: null, withdrawn_at: null })
        .where('expires_at', '>', trx.fn.now())
        .update({ accepted_at: trx.fn.now() });
      if (spent === 0) return err('link not valid' as const);
      const userId =
        'userId' in newcomer ? newcomer.userId : await createAccount(trx, { email, ...newcomer });
      const joined = await trx('memberships')
        .insert({ group_id: groupId, user_id: userId, role })
        .onConflict(['group_id', 'user_id'])
        .ignore()
        .returning('user_id');
      if (joined.length > 0)
        await insertMemberEvent(trx, { groupId, actorId: userId, userId, kind: 'joined', after: { role } });
      return ok({ userId, groupId });
    });
  } catch (error) {
    // The address got its account a moment ago, through another group's invitation.
    if (isUniqueViolation(error, 'users_email_key')) return err('account exists');
    throw error;
  }
}
