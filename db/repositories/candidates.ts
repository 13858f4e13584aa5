import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';

/** One hypothesis for a complex: a polyhedron (IUPAC symbol) and a spin multiplicity. */
export interface Candidate {
  id: string;
  complexId: string;
  geometry: string;
  multiplicity: number;
  origin: 'planned' | 'from a returned output';
  note: string;
}

const columns = ['id', 'complexId', 'geometry', 'multiplicity', 'origin', 'note'];

export async function listCandidatesOfStudy(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
): Promise<Candidate[]> {
  return trx('candidates')
    .join('complexes', 'complexes.id', 'candidates.complexId')
    .where({ 'candidates.groupId': tenant.groupId, 'complexes.studyId': studyId })
    .orderBy(['candidates.complexId', { column: 'candidates.multiplicity', order: 'desc' }])
    .select(columns.map((column) => `candidates.${column}`));
}

export async function listCandidates(
  trx: Knex.Transaction,
  tenant: Tenant,
  complexId: string,
): Promise<Candidate[]> {
  return trx('candidates')
    .where({ groupId: tenant.groupId, complexId })
    .orderBy([{ column: 'multiplicity', order: 'desc' }, 'geometry'])
    .select(columns);
}

/** Adds the candidate, or finds the one that says the same. */
export async function ensureCandidate(
  trx: Knex.Transaction,
  tenant: Tenant,
  candidate: Omit<Candidate, 'id' | 'note'> & { note?: string },
): Promise<{ id: string; added: boolean }> {
  const values = { groupId: tenant.groupId, note: '', ...candidate };
  const [added] = await trx('candidates')
    .insert(values)
    .onConflict(['complexId', 'geometry', 'multiplicity', 'note'])
    .ignore()
    .returning<{ id: string }[]>('id');
  if (added) return { id: added.id, added: true };
  const existing = await trx('candidates')
    .where({
      groupId: tenant.groupId,
      complexId: values.complexId,
      geometry: values.geometry,
      multiplicity: values.multiplicity,
      note: values.note,
    })
    .first<{ id: string }>('id');
  return { id: existing.id, added: false };
}
