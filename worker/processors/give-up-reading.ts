import type { Tenant } from '@/lib/access/actor';
import { asTenant } from '@/db/knex';
import { failReading, findUpload } from '@/db/repositories/uploads';
import type { ReadContext } from './read-context';

/** After the last attempt: the upload says so and can be retried by hand. Its bytes are kept. */
export async function giveUpReading(
  { db, report }: ReadContext,
  tenant: Tenant,
  uploadId: string,
): Promise<void> {
  const upload = await asTenant(db, tenant, async (trx) => {
    await failReading(trx, tenant, uploadId, {
      code: 'reading failed',
      message:
        'the file could not be read because something around it failed (storage, database, or the reader itself); the file is kept. Try again, and tell whoever runs this installation if it stays',
    });
    return findUpload(trx, tenant, uploadId);
  });
  if (upload) await report(tenant.groupId, upload.studyId);
}
