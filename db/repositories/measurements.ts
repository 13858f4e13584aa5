import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';

export const techniques = [
  'Gouy balance',
  'susceptibility balance',
  'NMR shift',
  'magnetometer',
  'paper or another laboratory',
] as const;
export type Technique = (typeof techniques)[number];

export interface Sample {
  id: string;
  complexId: string;
  code: string;
  description: string;
}

/** One magnetic determination on a sample, with its replicates in μB in the order of entry. */
export interface Measurement {
  id: string;
  complexId: string;
  sampleId: string;
  sampleCode: string;
  technique: Technique;
  temperatureK: number;
  uTemperatureK: number;
  uSystematicBohr: number;
  measuredOn: string;
  reference: string;
  note: string;
  invented: boolean;
  enteredBy: string | null;
  createdAt: Date;
  withdrawnAt: Date | null;
  withdrawnBecause: string | null;
  replicatesBohr: number[];
}

export interface NewMeasurement {
  sampleId: string;
  technique: Technique;
  temperatureK: number;
  uTemperatureK: number;
  uSystematicBohr: number;
  measuredOn: string;
  reference: string;
  note: string;
  invented: boolean;
  replicatesBohr: number[];
}

export async function listSamples(
  trx: Knex.Transaction,
  tenant: Tenant,
  complexId: string,
): Promise<Sample[]> {
  return trx('samples')
    .where({ groupId: tenant.groupId, complexId })
    .orderBy('code')
    .select('id', 'complexId', 'code', 'description');
}

/** The sample of this code, added when the complex has none. */
export async function ensureSample(
  trx: Knex.Transaction,
  tenant: Tenant,
  sample: { complexId: string; code: string; description: string },
): Promise<string> {
  const [row] = await trx('samples')
    .insert({ groupId: tenant.groupId, createdBy: tenant.userId, ...sample })
    .onConflict(['complexId', 'code'])
    // A no-op update, so that the row that was there is returned.
    .merge(['code'])
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('The database returned no id for the sample.');
  return row.id;
}

export async function insertMeasurement(
  trx: Knex.Transaction,
  tenant: Tenant,
  { replicatesBohr, ...measurement }: NewMeasurement,
): Promise<string> {
  const [row] = await trx('measurements')
    .insert({ groupId: tenant.groupId, enteredBy: tenant.userId, ...measurement })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('The database returned no id for the new measurement.');
  await trx('replicates').insert(
    replicatesBohr.map((muEffBohr, index) => ({
      groupId: tenant.groupId,
      measurementId: row.id,
      ordinal: index + 1,
      muEffBohr,
    })),
  );
  return row.id;
}

/** Measurements of one complex or of a whole study, withdrawn ones included; newest first. */
export async function listMeasurements(
  trx: Knex.Transaction,
  tenant: Tenant,
  of: { studyId: string } | { complexId: string },
): Promise<Measurement[]> {
  const query = trx('measurements as m')
    .join('samples as s', 's.id', 'm.sampleId')
    .join('complexes as c', 'c.id', 's.complexId')
    .leftJoin('users as u', 'u.id', 'm.enteredBy')
    .join('replicates as r', 'r.measurementId', 'm.id')
    .where('m.groupId', tenant.groupId);
  void ('studyId' in of ? query.where('c.studyId', of.studyId) : query.where('c.id', of.complexId));
  return query
    .groupBy('m.id', 's.id', 'u.name')
    .orderBy([
      { column: 'm.measuredOn', order: 'desc' },
      { column: 'm.createdAt', order: 'desc' },
    ])
    .select(
      'm.id',
      's.complexId',
      'm.sampleId',
      's.code as sampleCode',
      'm.technique',
      'm.temperatureK',
      'm.uTemperatureK',
      'm.uSystematicBohr',
      'm.measuredOn',
      'm.reference',
      'm.note',
      'm.invented',
      'u.name as enteredBy',
      'm.createdAt',
      'm.withdrawnAt',
      'm.withdrawnBecause',
      trx.raw('array_agg(r.mu_eff_bohr order by r.ordinal) as replicates_bohr'),
    );
}

/** Withdraws a measurement with a reason; it stays readable. False when it was withdrawn before. */
export async function withdrawMeasurement(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
  because: string,
): Promise<boolean> {
  const changed = await trx('measurements')
    .where({ groupId: tenant.groupId, id })
    .whereNull('withdrawnAt')
    .update({ withdrawnAt: trx.fn.now(), withdrawnBecause: because });
  return changed === 1;
}
