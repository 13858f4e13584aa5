import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';

/** The group's stated conclusion for a complex, as it stands now. */
export interface Assignment {
  id: string;
  complexId: string;
  candidateId: string;
  wording: string;
  confidence: 'tentative' | 'probable' | 'firm';
  state: 'proposed' | 'signed';
  proposedBy: string | null;
  proposedAt: Date;
  signedBy: string | null;
  signedAt: Date | null;
}

/** The standing (proposed or signed) assignment of each complex of a study: the newest one. */
export async function listStandingAssignments(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
): Promise<Assignment[]> {
  return trx('assignments as a')
    .distinctOn('a.complexId')
    .join('complexes as c', 'c.id', 'a.complexId')
    .leftJoin('users as p', 'p.id', 'a.proposedBy')
    .leftJoin('users as s', 's.id', 'a.signedBy')
    .where({ 'a.groupId': tenant.groupId, 'c.studyId': studyId })
    .whereIn('a.state', ['proposed', 'signed'])
    .orderBy([{ column: 'a.complexId' }, { column: 'a.proposedAt', order: 'desc' }])
    .select(
      'a.id',
      'a.complexId',
      'a.candidateId',
      'a.wording',
      'a.confidence',
      'a.state',
      'p.name as proposedBy',
      'a.proposedAt',
      's.name as signedBy',
      'a.signedAt',
    );
}

export async function insertAssignment(
  trx: Knex.Transaction,
  tenant: Tenant,
  assignment: Pick<Assignment, 'complexId' | 'candidateId' | 'wording' | 'confidence'>,
): Promise<string> {
  const [row] = await trx('assignments')
    .insert({ groupId: tenant.groupId, proposedBy: tenant.userId, state: 'proposed', ...assignment })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('The database returned no id for the new assignment.');
  return row.id;
}
