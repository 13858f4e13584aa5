import type { Knex } from 'knex';
import { listWaitingUploads } from '@/db/repositories/uploads';
import { enqueueReads } from '@/lib/queue/read-queue';

/** An upload that has stood still for so long has no live entry in the queue, or one that does no harm to ring twice. */
const UNCHANGED_SECONDS = 15;

/**
 * Rings again for uploads that the database knows as waiting: the queue is only a wake-up and may have lost
 * them. May run at any time and in any number of workers; a job that waits or runs already is left alone.
 * @returns how many were rung for
 */
export async function reconcile(db: Knex): Promise<number> {
  const waiting = await listWaitingUploads(db, UNCHANGED_SECONDS);
  if (waiting.length > 0) await enqueueReads(waiting);
  return waiting.length;
}
