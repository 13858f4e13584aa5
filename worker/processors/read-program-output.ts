import type { Tenant } from '@/lib/access/actor';
import { createOutputReader, READER_VERSION, type OutputReading } from '@/lib/outputs/reader';
import type { OutputRecord } from '@/lib/outputs/record';
import { LINES_PER_OFFSET } from '@/lib/outputs/scanner';
import { asTenant } from '@/db/knex';
import { insertEvent } from '@/db/repositories/events';
import { setLineIndex } from '@/db/repositories/files';
import { saveRun } from '@/db/repositories/runs';
import {
  failReading,
  finishReading,
  setBytesRead,
  type Upload,
  type UploadProblem,
} from '@/db/repositories/uploads';
import { matchRun } from './match-run';
import type { ReadContext } from './read-context';
import { saveRunGeometry } from './save-run-geometry';

const REPORT_EVERY_MS = 400;

/** Streams the output through its program's reader and saves run, structure, centres and match. */
export async function readProgramOutput(
  context: ReadContext,
  tenant: Tenant,
  upload: Upload & { sha256: string },
): Promise<void> {
  const { record, lineOffsets } = await streamThroughReader(context, tenant, upload);
  const { studyId, fileName, sha256 } = upload;
  await asTenant(context.db, tenant, async (trx) => {
    if (record.program === null) {
      return failReading(trx, tenant, upload.id, {
        code: 'unknown',
        message:
          'no line of this file says which program wrote it; send the whole output, from its banner on',
      });
    }
    await setLineIndex(trx, tenant, sha256, { every: LINES_PER_OFFSET, offsets: lineOffsets });
    const run = await saveRun(trx, tenant, {
      studyId,
      sha256,
      fileName,
      readerVersion: READER_VERSION,
      record,
    });
    const centres = await saveRunGeometry(trx, tenant, { studyId, runId: run.id, sha256, fileName, record });
    // A match that a person made stays; one that was found is found again, for the record may say more now.
    if (run.matchedBy !== 'hand') await matchRun(trx, tenant, { studyId, runId: run.id, record, centres });
    await finishReading(trx, tenant, upload.id, findingOf(record));
    await insertEvent(trx, tenant, {
      studyId,
      subject: 'run',
      subjectId: run.id,
      kind: 'read',
      after: { fileName, outcome: record.outcome, readerVersion: READER_VERSION },
    });
  });
}

async function streamThroughReader(
  { db, storage, report }: ReadContext,
  tenant: Tenant,
  upload: Upload & { sha256: string },
): Promise<OutputReading> {
  const reader = createOutputReader();
  let bytes = 0;
  let reported = Date.now();
  for await (const chunk of await storage.get(upload.sha256)) {
    reader.push(chunk as Uint8Array);
    bytes += (chunk as Uint8Array).length;
    if (Date.now() - reported > REPORT_EVERY_MS) {
      reported = Date.now();
      await asTenant(db, tenant, (trx) => setBytesRead(trx, tenant, upload.id, bytes));
      await report(tenant.groupId, upload.studyId);
    }
  }
  return reader.end();
}

/** What a person should know of a file that was read: how it ended when it did not end well. */
function findingOf({ outcome, failure, lines }: OutputRecord): UploadProblem | null {
  if (outcome === 'finished') return null;
  const said = failure?.message ?? 'The program ended with an error.';
  if (outcome === 'failed') return { code: outcome, message: said, line: failure?.line ?? null };
  return {
    code: outcome,
    message: `${said} It stops at line ${lines}: the job was killed, still runs, or the copy is not whole. Copy it again, or restart the job.`,
    line: failure?.line ?? null,
  };
}
