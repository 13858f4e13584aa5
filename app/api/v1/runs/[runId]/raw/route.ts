import { z } from 'zod';
import { authoriseRequest } from '@/app/_server/authorise-request';
import { failure } from '@/app/_server/study-of-request';
import { asTenant, database } from '@/db/knex';
import { findRun } from '@/db/repositories/runs';
import { openStorage } from '@/lib/storage/open-storage';

/** The raw file of a run, byte for byte, always as an attachment of plain text. */
export async function GET(request: Request, { params }: RouteContext<'/api/v1/runs/[runId]/raw'>) {
  const access = await authoriseRequest(request, 'read');
  if (!access.ok) return access.error;
  const actor = access.value;
  const { runId } = await params;
  const run = z.uuid().safeParse(runId).success
    ? await asTenant(database(), actor, (trx) => findRun(trx, actor, runId))
    : undefined;
  if (!run) return failure(404, 'no such run', 'Your group has no run with this address.');
  const bytes = await openStorage().get(run.sha256);
  const iterator = bytes[Symbol.asyncIterator]();
  const name = run.fileName.split('/').at(-1) ?? 'output';
  return new Response(
    new ReadableStream({
      async pull(controller) {
        const next = await iterator.next();
        if (next.done) controller.close();
        else controller.enqueue(next.value);
      },
      async cancel() {
        await iterator.return?.();
      },
    }),
    {
      headers: {
        'content-type': 'text/plain; charset=utf-8',
        'content-disposition': `attachment; filename*=UTF-8''${encodeURIComponent(name)}`,
        'x-content-type-options': 'nosniff',
        'content-security-policy': "default-src 'none'; sandbox",
      },
    },
  );
}
