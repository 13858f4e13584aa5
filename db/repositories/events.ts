import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';

/** One line of a group's history. `before` and `after` hold only the values that changed. */
export interface HistoryEvent {
  studyId?: string | null;
  subject:
    | 'study'
    | 'complex'
    | 'candidate'
    | 'run'
    | 'upload'
    | 'sample'
    | 'measurement'
    | 'assignment'
    | 'member';
  subjectId: string | null;
  kind: string;
  before?: unknown;
  after?: unknown;
}

/** Appends to the history; the application's role cannot change or delete what stands there. */
export async function insertEvent(trx: Knex.Transaction, tenant: Tenant, event: HistoryEvent): Promise<void> {
  await trx('events').insert({
    groupId: tenant.groupId,
    actorId: tenant.userId,
    studyId: event.studyId ?? null,
    subject: event.subject,
    subjectId: event.subjectId,
    kind: event.kind,
    before: event.before === undefined ? null : JSON.stringify(event.before),
    after: event.after === undefined ? null : JSON.stringify(event.after),
  });
}
