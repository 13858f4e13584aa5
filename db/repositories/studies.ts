import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';

export interface Study {
  id: string;
  title: string;
  question: string;
  /** Shown on every page of the study: the demo says here that its measurements are invented. */
  notice: string;
  createdAt: Date;
}

const columns = ['id', 'title', 'question', 'notice', 'createdAt'];

export async function listStudies(trx: Knex.Transaction, tenant: Tenant): Promise<Study[]> {
  return trx('studies').where({ groupId: tenant.groupId }).orderBy('createdAt', 'desc').select(columns);
}

export async function findStudy(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
): Promise<Study | undefined> {
  return trx('studies').where({ groupId: tenant.groupId, id }).first(columns);
}

export async function insertStudy(
  trx: Knex.Transaction,
  tenant: Tenant,
  study: { title: string; question: string; notice?: string },
): Promise<string> {
  const [row] = await trx('studies')
    .insert({ groupId: tenant.groupId, createdBy: tenant.userId, notice: '', ...study })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('The database returned no id for the new study.');
  return row.id;
}
