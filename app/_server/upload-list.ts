import 'server-only';
import { asTenant, database } from '@/db/knex';
import { countUploadsByState, listUploads } from '@/db/repositories/uploads';
import { listRunIdsByFile } from '@/db/repositories/runs';
import type { Actor } from '@/lib/access/actor';
import type { UploadList } from '@/components/uploads/upload-list';

/** The study's newest uploads as the page shows them. */
export async function readUploadList(actor: Actor, studyId: string): Promise<UploadList> {
  return asTenant(database(), actor, async (trx) => {
    const uploads = await listUploads(trx, actor, studyId);
    const counts = await countUploadsByState(trx, actor, studyId);
    const runs = await listRunIdsByFile(
      trx,
      actor,
      studyId,
      uploads.flatMap(({ sha256 }) => sha256 ?? []),
    );
    return {
      counts,
      uploads: uploads.map(({ id, fileName, bytes, kind, state, known, problem, bytesRead, sha256 }) => ({
        id,
        fileName,
        bytes,
        kind,
        state,
        known,
        problem,
        bytesRead,
        runId: sha256 === null ? null : (runs.get(sha256) ?? null),
      })),
    };
  });
}
