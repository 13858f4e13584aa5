import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';
import { outputRecordSchema, type OutputRecord } from '@/lib/outputs/record';

/** A run without its record: what lists, ladders and comparisons need. */
export interface RunSummary {
  id: string;
  studyId: string;
  sha256: string;
  fileName: string;
  readerVersion: string;
  complexId: string | null;
  candidateId: string | null;
  matchedBy: 'job key' | 'composition' | 'hand' | null;
  program: string | null;
  programVersion: string | null;
  outcome: OutputRecord['outcome'];
  formula: string | null;
  charge: number | null;
  multiplicity: number | null;
  functional: string | null;
  basis: string | null;
  reference: string | null;
  dispersion: string | null;
  solvation: string | null;
  relativity: string | null;
  tasks: string[];
  atomCount: number | null;
  energyHartree: number | null;
  zeroPointHartree: number | null;
  enthalpyHartree: number | null;
  gibbsHartree: number | null;
  s2: number | null;
  s2Ideal: number | null;
  scfConverged: boolean | null;
  optimisationConverged: boolean | null;
  imaginaryCount: number | null;
  readAt: Date;
}

export interface Run extends RunSummary {
  record: OutputRecord;
}

const summaryColumns = [
  'id',
  'studyId',
  'sha256',
  'fileName',
  'readerVersion',
  'complexId',
  'candidateId',
  'matchedBy',
  'program',
  'programVersion',
  'outcome',
  'formula',
  'charge',
  'multiplicity',
  'functional',
  'basis',
  'reference',
  'dispersion',
  'solvation',
  'relativity',
  'tasks',
  'atomCount',
  'energyHartree',
  'zeroPointHartree',
  'enthalpyHartree',
  'gibbsHartree',
  's2',
  's2Ideal',
  'scfConverged',
  'optimisationConverged',
  'imaginaryCount',
  'readAt',
];

/** Columns that a table of runs may be sorted by. */
export const runSortColumns = [
  'fileName',
  'program',
  'outcome',
  'formula',
  'charge',
  'multiplicity',
  'functional',
  'energyHartree',
  's2',
  'readAt',
] as const;
export type RunSortColumn = (typeof runSortColumns)[number];

export interface RunQuery {
  search?: string;
  outcome?: OutputRecord['outcome'];
  sort: RunSortColumn;
  descending: boolean;
  page: number;
  pageSize: number;
}

export async function listRuns(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
  query: RunQuery,
): Promise<{ runs: RunSummary[]; total: number }> {
  const filtered = trx('runs').where({ groupId: tenant.groupId, studyId });
  if (query.outcome) void filtered.andWhere({ outcome: query.outcome });
  if (query.search) {
    const pattern = `%${query.search.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`;
    void filtered.andWhere((where) => {
      for (const column of ['fileName', 'formula', 'functional', 'program'])
        void where.orWhereILike(column, pattern);
    });
  }
  const [count] = await filtered.clone().select<{ total: number }[]>(trx.raw('count(*)::int as total'));
  const runs = await filtered
    .orderBy([{ column: query.sort, order: query.descending ? 'desc' : 'asc', nulls: 'last' }, 'id'])
    .limit(query.pageSize)
    .offset(query.page * query.pageSize)
    .select<RunSummary[]>(summaryColumns);
  return { runs, total: count?.total ?? 0 };
}

/** Every run of a study that belongs to a complex. */
export async function listMatchedRuns(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
): Promise<RunSummary[]> {
  return trx('runs')
    .where({ groupId: tenant.groupId, studyId })
    .whereNotNull('complexId')
    .orderBy('fileName')
    .select(summaryColumns);
}

export async function listRunsOfComplex(
  trx: Knex.Transaction,
  tenant: Tenant,
  complexId: string,
): Promise<Run[]> {
  return trx('runs')
    .where({ groupId: tenant.groupId, complexId })
    .orderBy('fileName')
    .select([...summaryColumns, 'record']);
}

export async function findRun(trx: Knex.Transaction, tenant: Tenant, id: string): Promise<Run | undefined> {
  const run = await trx('runs')
    .where({ groupId: tenant.groupId, id })
    .first<Run | undefined>([...summaryColumns, 'record']);
  return run && { ...run, record: outputRecordSchema.parse(run.record) };
}

export interface RunMatch {
  complexId: string;
  candidateId: string | null;
  matchedBy: 'job key' | 'composition' | 'hand';
}

/**
 * Saves what was read from stored bytes: one run per study and SHA-256. Reading again replaces the
 * record; a record of another reader version is kept among the earlier ones. A match made by hand stays.
 */
export async function saveRun(
  trx: Knex.Transaction,
  tenant: Tenant,
  run: { studyId: string; sha256: string; fileName: string; readerVersion: string; record: OutputRecord },
): Promise<{ id: string; matchedBy: RunMatch['matchedBy'] | null }> {
  const where = { groupId: tenant.groupId, studyId: run.studyId, sha256: run.sha256 };
  const earlier = await trx('runs')
    .where(where)
    .forUpdate()
    .first<
      Pick<Run, 'id' | 'readerVersion' | 'record' | 'readAt' | 'matchedBy'> | undefined
    >(['id', 'readerVersion', 'record', 'readAt', 'matchedBy']);
  if (earlier) {
    if (earlier.readerVersion !== run.readerVersion) {
      await trx('earlierRecords')
        .insert({
          groupId: tenant.groupId,
          runId: earlier.id,
          readerVersion: earlier.readerVersion,
          record: JSON.stringify(earlier.record),
          readAt: earlier.readAt,
        })
        .onConflict(['runId', 'readerVersion'])
        .ignore();
    }
    await trx('runs').where({ groupId: tenant.groupId, id: earlier.id }).update(runColumns(run));
    return { id: earlier.id, matchedBy: earlier.matchedBy };
  }
  const [row] = await trx('runs')
    .insert({ ...where, fileName: run.fileName, ...runColumns(run) })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('The database returned no id for the new run.');
  return { id: row.id, matchedBy: null };
}

export async function setRunMatch(
  trx: Knex.Transaction,
  tenant: Tenant,
  runId: string,
  match: RunMatch | null,
): Promise<void> {
  await trx('runs')
    .where({ groupId: tenant.groupId, id: runId })
    .update(match ?? { complexId: null, candidateId: null, matchedBy: null });
}

function runColumns({ readerVersion, record }: { readerVersion: string; record: OutputRecord }) {
  return {
    readerVersion,
    program: record.program,
    programVersion: record.version,
    outcome: record.outcome,
    formula: record.formula,
    charge: record.charge,
    multiplicity: record.multiplicity,
    functional: record.method.functional,
    basis: record.method.basis,
    reference: record.method.reference,
    dispersion: record.method.dispersion,
    solvation: record.method.solvation,
    relativity: record.method.relativity,
    tasks: record.tasks,
    atomCount: record.atomCount,
    energyHartree: record.energyHartree,
    zeroPointHartree: record.thermochemistry?.zeroPointHartree ?? null,
    enthalpyHartree: record.thermochemistry?.enthalpyHartree ?? null,
    gibbsHartree: record.thermochemistry?.gibbsHartree ?? null,
    s2: record.spin.s2,
    s2Ideal: record.spin.s2Ideal,
    scfConverged: record.scf.converged,
    optimisationConverged: record.optimisation?.converged ?? null,
    imaginaryCount: record.frequencies?.imaginaryCount ?? null,
    record: JSON.stringify(record),
    readAt: new Date(),
  };
}

/** The run of each of these files in the study, by SHA-256. */
export async function listRunIdsByFile(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
  sha256s: readonly string[],
): Promise<Map<string, string>> {
  const rows = await trx('runs')
    .where({ groupId: tenant.groupId, studyId })
    .whereIn('sha256', sha256s)
    .select<{ id: string; sha256: string }[]>('id', 'sha256');
  return new Map(rows.map(({ sha256, id }) => [sha256, id]));
}
