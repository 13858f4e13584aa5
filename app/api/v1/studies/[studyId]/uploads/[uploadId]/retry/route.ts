import { z } from 'zod';
import { failure, studyOfRequest } from '@/app/_server/study-of-request';
import { asTenant, database } from '@/db/knex';
import { requeueUpload } from '@/db/repositories/uploads';
import { publishProgress } from '@/lib/queue/progress';
import { enqueueReads } from '@/lib/queue/read-queue';

/** Puts an upload whose reading failed back in line. */
export async function POST(
  request: Request,
  { params }: RouteContext<'/api/v1/studies/[studyId]/uploads/[uploadId]/retry'>,
) {
  const { studyId, uploadId } = await params;
  const found = await studyOfRequest(request, 'retry reading', studyId);
  if (!found.ok) return found.error;
  const { actor, study } = found.value;
  const upload = z.uuid().safeParse(uploadId).success
    ? await asTenant(database(), actor, (trx) => requeueUpload(trx, actor, uploadId))
    : undefined;
  if (!upload)
    return failure(409, 'not to be retried', 'Only an upload whose reading failed can be read again.');
  await enqueueReads([{ groupId: actor.groupId, uploadId }]);
  await publishProgress(actor.groupId, study.id);
  return Response.json({ id: upload.id, state: upload.state });
}
