import type { Knex } from 'knex';
import { asPerson, asTenant } from '@/db/knex';
import { insertMemberEvent } from '@/db/repositories/member-events';
import type { Actor, Tenant } from '@/lib/access/actor';
import type { Role } from '@/lib/access/roles';
import { err, ok, type Result } from '@/lib/result';

/** A group that a person belongs to, with their role in it. */
export interface GroupOfPerson {
  groupId: string;
  groupName: string;
  role: Role;
}

/** A person of the group. */
export interface Member {
  userId: string;
  name: string;
  email: string;
  role: Role;
  joinedAt: Date;
}

/** A group without a PI could sign nothing and invite nobody. */
export type MemberProblem = 'last PI' | 'not a member';

/** The person's groups, the oldest membership first. */
export function listGroupsOfPerson(db: Knex, userId: string): Promise<GroupOfPerson[]> {
  return asPerson(db, userId, (trx) =>
    trx('memberships as m')
      .join('groups as g', 'g.id', 'm.group_id')
      .where('m.user_id', userId)
      .orderBy(['m.created_at', 'g.id'])
      .select<GroupOfPerson[]>({ groupId: 'm.group_id', groupName: 'g.name', role: 'm.role' }),
  );
}

/** Everybody in the actor's group, by name. */
export function listMembers(db: Knex, actor: Tenant): Promise<Member[]> {
  return asTenant(db, actor, (trx) =>
    trx('memberships as m')
      .join('users as u', 'u.id', 'm.user_id')
      .where('m.group_id', actor.groupId)
      .orderBy(['u.name', 'u.id'])
      .select<Member[]>({
        userId: 'u.id',
        name: 'u.name',
        email: 'u.email',
        role: 'm.role',
        joinedAt: 'm.created_at',
      }),
  );
}

export function changeRole(
  db: Knex,
  actor: Actor,
  userId: string,
  role: Role,
): Promise<Result<{ changed: boolean }, MemberProblem>> {
  return asTenant(db, actor, async (trx) => {
    const current = await lockedRole(trx, actor.groupId, userId);
    if (!current) return err('not a member' as const);
    if (current === role) return ok({ changed: false });
    if (current === 'PI' && (await countPis(trx, actor.groupId)) < 2) return err('last PI' as const);
    await trx('memberships').where({ group_id: actor.groupId, user_id: userId }).update({ role });
    await insertMemberEvent(trx, {
      groupId: actor.groupId,
      actorId: actor.userId,
      userId,
      kind: 'role changed',
      before: { role: current },
      after: { role },
    });
    return ok({ changed: true });
  });
}

/** Takes a person out of the group. What they wrote stays, under their name. */
export function removeMember(db: Knex, actor: Actor, userId: string): Promise<Result<null, MemberProblem>> {
  return asTenant(db, actor, async (trx) => {
    const current = await lockedRole(trx, actor.groupId, userId);
    if (!current) return err('not a member' as const);
    if (current === 'PI' && (await countPis(trx, actor.groupId)) < 2) return err('last PI' as const);
    await trx('memberships').where({ group_id: actor.groupId, user_id: userId }).delete();
    await insertMemberEvent(trx, {
      groupId: actor.groupId,
      actorId: actor.userId,
      userId,
      kind: 'removed',
      before: { role: current },
    });
    return ok(null);
  });
}

/** A member's role, read under a lock on the group: two PIs who demote each other at once take turns. */
async function lockedRole(trx: Knex.Transaction, groupId: string, userId: string): Promise<Role | undefined> {
  await trx('groups').where({ id: groupId }).forUpdate().select('id');
  const row = await trx<{ group_id: string; user_id: string; role: Role }>('memberships')
    .where({ group_id: groupId, user_id: userId })
    .first('role');
  return row?.role;
}

async function countPis(trx: Knex.Transaction, groupId: string): Promise<number> {
  const rows = await trx('memberships').where({ group_id: groupId, role: 'PI' }).select('user_id');
  return rows.length;
}
