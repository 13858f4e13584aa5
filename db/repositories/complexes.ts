import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';

/** One compound of a study. `composition` is the Hill formula of the ion that outputs are matched by. */
export interface Complex {
  id: string;
  studyId: string;
  position: number;
  section: string;
  formula: string;
  name: string;
  composition: string;
  charge: number;
  metal: string;
  oxidationState: number;
  note: string;
}

export type NewComplex = Omit<Complex, 'id'>;

const columns = [
  'id',
  'studyId',
  'position',
  'section',
  'formula',
  'name',
  'composition',
  'charge',
  'metal',
  'oxidationState',
  'note',
];

export async function listComplexes(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
): Promise<Complex[]> {
  return trx('complexes')
    .where({ groupId: tenant.groupId, studyId })
    .orderBy(['position', 'formula'])
    .select(columns);
}

export async function findComplex(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
): Promise<Complex | undefined> {
  return trx('complexes').where({ groupId: tenant.groupId, id }).first(columns);
}

export async function insertComplex(
  trx: Knex.Transaction,
  tenant: Tenant,
  complex: NewComplex,
): Promise<string> {
  const [row] = await trx('complexes')
    .insert({ groupId: tenant.groupId, ...complex })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('The database returned no id for the new complex.');
  return row.id;
}

/** Complexes of the study with this composition and charge: more than one is possible (isomers, salts). */
export async function listComplexesOfComposition(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
  composition: string,
  charge: number | null,
): Promise<Complex[]> {
  const query = trx('complexes').where({ groupId: tenant.groupId, studyId, composition });
  if (charge !== null) void query.andWhere({ charge });
  return query.orderBy('position').select(columns);
}
