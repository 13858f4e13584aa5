import { Queue } from 'bullmq';
import type { Redis } from 'ioredis';
import { z } from 'zod';
import { openRedis, redisUrl } from './connection';

export const READ_QUEUE = 'read-uploads';

/** The queue carries ids alone; everything else stands in the database. */
export const readJobSchema = z.object({ groupId: z.uuid(), uploadId: z.uuid() });
export type ReadJob = z.infer<typeof readJobSchema>;

let shared: { queue: Queue<ReadJob>; connection: Redis } | undefined;

function readQueue(): Queue<ReadJob> {
  if (!shared) {
    const connection = openRedis(redisUrl());
    shared = { connection, queue: new Queue<ReadJob>(READ_QUEUE, { connection }) };
  }
  return shared.queue;
}

/**
 * Rings for an upload to be read. The job's id is the upload's, so that ringing twice while one waits or
 * runs is one job; finished and failed jobs are dropped, so that a retry can ring again.
 */
export async function enqueueReads(jobs: readonly ReadJob[]): Promise<void> {
  await readQueue().addBulk(
    jobs.map((data) => ({
      name: 'read',
      data,
      opts: {
        jobId: data.uploadId,
        attempts: 3,
        backoff: { type: 'exponential' as const, delay: 2000 },
        removeOnComplete: true,
        removeOnFail: true,
      },
    })),
  );
}

export async function closeReadQueue(): Promise<void> {
  await shared?.queue.close();
  // A connection that was handed in is not the queue's to close.
  shared?.connection.disconnect();
  shared = undefined;
}
