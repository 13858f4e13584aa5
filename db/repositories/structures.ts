import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';
import type { Vector3 } from '@/lib/chemistry/structure';
import { centreDescriptionSchema, type CentreDescription } from '@/lib/geometry/centre-description';

export interface StructureSummary {
  id: string;
  runId: string | null;
  complexId: string | null;
  sha256: string;
  frame: number;
  title: string;
  formula: string;
}

export interface StoredStructure extends StructureSummary {
  elements: string[];
  positionsAngstrom: Vector3[];
  centres: StoredCentre[];
}

/** One metal of a stored structure, with the spin population the run printed for it. */
export interface StoredCentre {
  atomIndex: number;
  spinPopulation: number | null;
  description: CentreDescription;
}

export interface NewStructure {
  studyId: string;
  runId: string | null;
  complexId: string | null;
  sha256: string;
  frame: number;
  title: string;
  formula: string;
  elements: readonly string[];
  positionsAngstrom: readonly Vector3[];
  centres: StoredCentre[];
}

/** Saves a structure and its centres; what an earlier reading of the same bytes left is replaced. */
export async function saveStructure(
  trx: Knex.Transaction,
  tenant: Tenant,
  structure: NewStructure,
): Promise<string> {
  const { centres, elements, positionsAngstrom, ...values } = structure;
  const [row] = await trx('structures')
    .insert({
      groupId: tenant.groupId,
      ...values,
      elements: [...elements],
      positionsAngstrom: JSON.stringify(positionsAngstrom),
    })
    .onConflict(['studyId', 'sha256', 'frame'])
    .merge()
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('The database returned no id for the structure.');
  await trx('centres').where({ groupId: tenant.groupId, structureId: row.id }).delete();
  if (centres.length > 0) {
    await trx('centres').insert(
      centres.map(({ atomIndex, spinPopulation, description }) => ({
        groupId: tenant.groupId,
        structureId: row.id,
        atomIndex,
        element: description.element,
        coordinationNumber: description.coordinationNumber,
        nearest: description.nearest,
        meanDistanceAngstrom: description.meanDistanceAngstrom,
        baurDistortion: description.baurDistortion,
        tau4: description.tau4,
        spinPopulation,
        description: JSON.stringify(description),
      })),
    );
  }
  return row.id;
}

/** A reading that found no geometry any more: the structure an earlier reader saw is taken back. */
export async function removeStructureOfRun(
  trx: Knex.Transaction,
  tenant: Tenant,
  runId: string,
): Promise<void> {
  await trx('structures').where({ groupId: tenant.groupId, runId }).delete();
}

export async function listStructuresOfComplex(
  trx: Knex.Transaction,
  tenant: Tenant,
  complexId: string,
): Promise<StoredStructure[]> {
  return withCentres(trx, tenant, { complexId });
}

export async function findStructureOfRun(
  trx: Knex.Transaction,
  tenant: Tenant,
  runId: string,
): Promise<StoredStructure | undefined> {
  const [structure] = await withCentres(trx, tenant, { runId });
  return structure;
}

export async function setStructureComplex(
  trx: Knex.Transaction,
  tenant: Tenant,
  of: { runId: string } | { id: string },
  complexId: string | null,
): Promise<void> {
  await trx('structures')
    .where({ groupId: tenant.groupId, ...of })
    .update({ complexId });
}

/** The numbers of one centre that a table of the study shows. */
export interface CentreSummary {
  runId: string;
  complexId: string;
  atomIndex: number;
  element: string;
  coordinationNumber: number;
  nearest: string | null;
  meanDistanceAngstrom: number | null;
  baurDistortion: number | null;
  tau4: number | null;
  spinPopulation: number | null;
  shapes: { symbol: string; measure: number }[];
}

/** First centres of all matched runs of a study, without the structures themselves. */
export async function listCentresOfStudy(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
): Promise<CentreSummary[]> {
  return trx('centres as c')
    .join('structures as s', 's.id', 'c.structureId')
    .where({ 'c.groupId': tenant.groupId, 's.studyId': studyId })
    .whereNotNull('s.runId')
    .whereNotNull('s.complexId')
    .orderBy(['s.runId', 'c.atomIndex'])
    .select(
      's.runId',
      's.complexId',
      'c.atomIndex',
      'c.element',
      'c.coordinationNumber',
      'c.nearest',
      'c.meanDistanceAngstrom',
      'c.baurDistortion',
      'c.tau4',
      'c.spinPopulation',
      trx.raw(`c.description -> 'shapes' as shapes`),
    );
}

async function withCentres(
  trx: Knex.Transaction,
  tenant: Tenant,
  where: { complexId: string } | { runId: string },
): Promise<StoredStructure[]> {
  const structures = await trx('structures')
    .where({ groupId: tenant.groupId, ...where })
    .orderBy(['title', 'id'])
    .select<Omit<StoredStructure, 'centres'>[]>(
      'id',
      'runId',
      'complexId',
      'sha256',
      'frame',
      'title',
      'formula',
      'elements',
      'positionsAngstrom',
    );
  const centres = await trx('centres')
    .where({ groupId: tenant.groupId })
    .whereIn(
      'structureId',
      structures.map(({ id }) => id),
    )
    .orderBy('atomIndex')
    .select<(StoredCentre & { structureId: string })[]>(
      'structureId',
      'atomIndex',
      'spinPopulation',
      'description',
    );
  return structures.map((structure) => ({
    ...structure,
    centres: centres
      .filter(({ structureId }) => structureId === structure.id)
      .map(({ atomIndex, spinPopulation, description }) => ({
        atomIndex,
        spinPopulation,
        description: centreDescriptionSchema.parse(description),
      })),
  }));
}
