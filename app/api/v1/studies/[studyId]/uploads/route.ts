import { z } from 'zod';
import { failure, studyOfRequest } from '@/app/_server/study-of-request';
import { readUploadList } from '@/app/_server/upload-list';
import { asTenant, database } from '@/db/knex';
import { insertReceivedFile, type Upload } from '@/db/repositories/uploads';
import { publishProgress } from '@/lib/queue/progress';
import { enqueueReads } from '@/lib/queue/read-queue';
import { openStorage } from '@/lib/storage/open-storage';
import { receiveFiles } from '@/lib/storage/receive-files';
import { defaultUploadLimits } from '@/lib/storage/upload-limits';

const querySchema = z.object({ name: z.string().min(1).max(500), drop: z.uuid() });

/** The study's newest uploads. */
export async function GET(request: Request, { params }: RouteContext<'/api/v1/studies/[studyId]/uploads'>) {
  const found = await studyOfRequest(request, 'read', (await params).studyId);
  if (!found.ok) return found.error;
  return Response.json(await readUploadList(found.value.actor, found.value.study.id));
}

/**
 * Takes one file or archive as the raw body: `?name=…&drop=…`. Bytes stream to storage while they are hashed; each
 * file is noted in a transaction of its own, so that one refused file loses none of the others.
 */
export async function PUT(request: Request, { params }: RouteContext<'/api/v1/studies/[studyId]/uploads'>) {
  const found = await studyOfRequest(request, 'upload files', (await params).studyId);
  if (!found.ok) return found.error;
  const { actor, study } = found.value;
  const query = querySchema.safeParse(Object.fromEntries(new URL(request.url).searchParams));
  if (!query.success) {
    return failure(
      400,
      'bad request',
      'Give the file name as ?name= (1–500 characters) and a UUID as &drop=.',
    );
  }
  const drop = { studyId: study.id, dropId: query.data.drop };
  const storage = openStorage();
  const uploads: Upload[] = [];
  for await (const received of receiveFiles(
    query.data.name,
    bodyOf(request),
    (source) => storage.store(source),
    defaultUploadLimits,
  )) {
    const upload = await asTenant(database(), actor, (trx) => insertReceivedFile(trx, actor, drop, received));
    uploads.push(upload);
    // The row is the truth; should this ring be lost, the worker finds the row by itself.
    if (upload.state === 'queued') await enqueueReads([{ groupId: actor.groupId, uploadId: upload.id }]);
    await publishProgress(actor.groupId, study.id);
  }
  return Response.json({
    uploads: uploads.map(({ id, fileName, state, known, problem }) => ({
      id,
      fileName,
      state,
      known,
      problem,
    })),
  });
}

async function* bodyOf(request: Request): AsyncGenerator<Uint8Array> {
  if (!request.body) return;
  const reader = request.body.getReader();
  try {
    for (;;) {
      const { done, value } = await reader.read();
      if (done) return;
      yield value;
    }
  } finally {
    reader.releaseLock();
  }
}
