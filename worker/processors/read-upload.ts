import type { Tenant } from '@/lib/access/actor';
import { asTenant } from '@/db/knex';
import { finishReading, startReading } from '@/db/repositories/uploads';
import type { ReadContext } from './read-context';
import { readProgramOutput } from './read-program-output';
import { readXyz } from './read-xyz';

/**
 * Reads one stored upload and saves what it says, in one transaction. Running twice does no harm: the same
 * bytes and reader version give the same run. What is wrong with the file is stored with the upload; what is
 * wrong around it (database, storage) is thrown, and the queue tries again.
 */
export async function readUpload(context: ReadContext, tenant: Tenant, uploadId: string): Promise<void> {
  const upload = await asTenant(context.db, tenant, (trx) => startReading(trx, tenant, uploadId));
  if (!upload) return;
  if (upload.sha256 === null) throw new Error(`Upload ${upload.id} is queued without stored bytes.`);
  const stored = { ...upload, sha256: upload.sha256 };
  await context.report(tenant.groupId, upload.studyId);
  if (upload.kind === 'program output') await readProgramOutput(context, tenant, stored);
  else if (upload.kind === 'xyz') await readXyz(context, tenant, stored);
  // A table is kept as it is: measurements take it up, where its columns are chosen.
  else await asTenant(context.db, tenant, (trx) => finishReading(trx, tenant, upload.id, null));
  await context.report(tenant.groupId, upload.studyId);
}
