import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';
import type { ReceivedFile } from '@/lib/storage/receive-files';
import { ensureFile } from './files';

export type UploadState = 'queued' | 'reading' | 'read' | 'failed' | 'refused';
export type UploadKind = 'program output' | 'xyz' | 'csv';

/** What went wrong with a file: what, where, what to do. `line` is 1-based. */
export interface UploadProblem {
  code: string;
  message: string;
  line?: number | null;
}

/** One file of one drop. Refused files have no stored bytes; all others do. */
export interface Upload {
  id: string;
  studyId: string;
  dropId: string;
  fileName: string;
  sha256: string | null;
  bytes: number;
  kind: UploadKind | null;
  state: UploadState;
  known: boolean;
  problem: UploadProblem | null;
  bytesRead: number;
  attempts: number;
  createdAt: Date;
  changedAt: Date;
}

const columns = [
  'id',
  'studyId',
  'dropId',
  'fileName',
  'sha256',
  'bytes',
  'kind',
  'state',
  'known',
  'problem',
  'bytesRead',
  'attempts',
  'createdAt',
  'changedAt',
];

export interface NewUpload {
  studyId: string;
  dropId: string;
  fileName: string;
  sha256: string | null;
  bytes: number;
  kind: UploadKind | null;
  state: 'queued' | 'read' | 'refused';
  known: boolean;
  problem: UploadProblem | null;
}

export async function insertUpload(
  trx: Knex.Transaction,
  tenant: Tenant,
  upload: NewUpload,
): Promise<Upload> {
  const [row] = await trx('uploads')
    .insert({
      groupId: tenant.groupId,
      uploadedBy: tenant.userId,
      ...upload,
      problem: upload.problem === null ? null : JSON.stringify(upload.problem),
    })
    .returning<Upload[]>(columns);
  if (!row) throw new Error('The database returned no row for the new upload.');
  return row;
}

/** The newest uploads of a study, newest first. */
export async function listUploads(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
  limit = 200,
): Promise<Upload[]> {
  return trx('uploads')
    .where({ groupId: tenant.groupId, studyId })
    .orderBy([{ column: 'createdAt', order: 'desc' }, 'fileName'])
    .limit(limit)
    .select(columns);
}

export async function countUploadsByState(
  trx: Knex.Transaction,
  tenant: Tenant,
  studyId: string,
): Promise<Record<UploadState, number>> {
  const counts: Record<UploadState, number> = { queued: 0, reading: 0, read: 0, failed: 0, refused: 0 };
  const rows = await trx('uploads')
    .where({ groupId: tenant.groupId, studyId })
    .groupBy('state')
    .select<{ state: UploadState; count: number }[]>('state', trx.raw('count(*)::int as count'));
  for (const row of rows) counts[row.state] = row.count;
  return counts;
}

export async function findUpload(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
): Promise<Upload | undefined> {
  return trx('uploads').where({ groupId: tenant.groupId, id }).first(columns);
}

/** Takes the upload for reading unless it is finished; the attempt is counted. */
export async function startReading(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
): Promise<Upload | undefined> {
  const [row] = await trx('uploads')
    .where({ groupId: tenant.groupId, id })
    .whereIn('state', ['queued', 'reading'])
    .update({ state: 'reading', attempts: trx.raw('attempts + 1'), changedAt: trx.fn.now() })
    .returning<Upload[]>(columns);
  return row;
}

export async function setBytesRead(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
  bytesRead: number,
): Promise<void> {
  await trx('uploads')
    .where({ groupId: tenant.groupId, id, state: 'reading' })
    .update({ bytesRead, changedAt: trx.fn.now() });
}

/** `finding` is what the file says of itself that a person should know: cut off, failed, not converged. */
export async function finishReading(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
  finding: UploadProblem | null,
): Promise<void> {
  await trx('uploads')
    .where({ groupId: tenant.groupId, id })
    .update({
      state: 'read',
      problem: finding === null ? null : JSON.stringify(finding),
      bytesRead: trx.ref('bytes'),
      changedAt: trx.fn.now(),
    });
}

export async function failReading(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
  problem: UploadProblem,
): Promise<void> {
  await trx('uploads')
    .where({ groupId: tenant.groupId, id })
    .update({ state: 'failed', problem: JSON.stringify(problem), changedAt: trx.fn.now() });
}

/** Puts a failed upload back in line; undefined when it is not in a state to be retried. */
export async function requeueUpload(
  trx: Knex.Transaction,
  tenant: Tenant,
  id: string,
): Promise<Upload | undefined> {
  const [row] = await trx('uploads')
    .where({ groupId: tenant.groupId, id, state: 'failed' })
    .update({ state: 'queued', problem: null, bytesRead: 0, changedAt: trx.fn.now() })
    .returning<Upload[]>(columns);
  return row;
}

/** Uploads of every group that wait or have stood still: ids only, for the worker to ring again. */
export async function listWaitingUploads(
  db: Knex,
  unchangedSeconds: number,
): Promise<{ groupId: string; uploadId: string }[]> {
  const { rows } = await db.raw<{ rows: { groupId: string; uploadId: string }[] }>(
    'select group_id as "groupId", upload_id as "uploadId" from waiting_uploads(?)',
    [unchangedSeconds],
  );
  return rows;
}

/** Notes one received file of a drop: its bytes once per group, and the upload, queued or refused. */
export async function insertReceivedFile(
  trx: Knex.Transaction,
  tenant: Tenant,
  drop: { studyId: string; dropId: string },
  received: ReceivedFile,
): Promise<Upload> {
  const { fileName } = received;
  if ('refused' in received) {
    const refused = { sha256: null, bytes: 0, kind: null, state: 'refused' as const, known: false };
    return insertUpload(trx, tenant, { ...drop, fileName, ...refused, problem: received.refused });
  }
  const { sha256, bytes, kind } = received;
  const { known } = await ensureFile(trx, tenant, { sha256, bytes });
  return insertUpload(trx, tenant, {
    ...drop,
    fileName,
    sha256,
    bytes,
    kind,
    state: 'queued',
    known,
    problem: null,
  });
}
