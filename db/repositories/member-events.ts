import type { Knex } from 'knex';

/** What the history keeps of who belongs to a group. */
export interface MemberEvent {
  groupId: string;
  /** Who did it. */
  actorId: string;
  /** Whom it concerns; null for an invitation, which goes to an address. */
  userId: string | null;
  kind: 'invited' | 'invitation withdrawn' | 'joined' | 'role changed' | 'removed';
  before?: Record<string, string>;
  after?: Record<string, string>;
}

export async function insertMemberEvent(trx: Knex.Transaction, event: MemberEvent): Promise<void> {
  await trx('events').insert({
    group_id: event.groupId,
    actor_id: event.actorId,
    subject: 'member',
    subject_id: event.userId,
    kind: event.kind,
    before: event.before ?? null,
    after: event.after ?? null,
  });
}
