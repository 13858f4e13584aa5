import { Worker } from 'bullmq';
import pino from 'pino';
import { closeDatabase, database } from '@/db/knex';
import { openRedis, redisUrl } from '@/lib/queue/connection';
import { closeProgress, publishProgress } from '@/lib/queue/progress';
import { READ_QUEUE, closeReadQueue, readJobSchema } from '@/lib/queue/read-queue';
import { openStorage } from '@/lib/storage/open-storage';
import { giveUpReading } from './processors/give-up-reading';
import { readUpload } from './processors/read-upload';
import { reconcile } from './reconcile';

const RECONCILE_EVERY_MS = 5_000;

const log = pino({ name: 'worker' });
const context = { db: database(), storage: openStorage(), report: publishProgress };

const connection = openRedis(redisUrl());
const worker = new Worker(
  READ_QUEUE,
  async (job) => {
    const { groupId, uploadId } = readJobSchema.parse(job.data);
    const started = Date.now();
    await readUpload(context, { groupId, userId: null }, uploadId);
    log.info({ uploadId, milliseconds: Date.now() - started, attempt: job.attemptsMade + 1 }, 'upload read');
  },
  {
    connection,
    concurrency: 2,
    // A killed worker's job is taken up again within seconds instead of a minute.
    lockDuration: 10_000,
    stalledInterval: 5_000,
    maxStalledCount: 3,
  },
);

worker.on('failed', (job, error) => {
  log.error({ uploadId: job?.data.uploadId, attempt: job?.attemptsMade, err: error }, 'reading failed');
  const last = !job || job.attemptsMade >= (job.opts.attempts ?? 1);
  const data = readJobSchema.safeParse(job?.data);
  if (last && data.success) {
    giveUpReading(context, { groupId: data.data.groupId, userId: null }, data.data.uploadId).catch(
      (failure: unknown) =>
        // The upload stays in its state; reconciling finds it again.
        log.error({ err: failure, uploadId: data.data.uploadId }, 'the failure could not be noted'),
    );
  }
});
worker.on('error', (error) => log.error({ err: error }, 'queue connection'));

const timer = setInterval(() => {
  reconcile(context.db).then(
    (rung) => rung > 0 && log.info({ rung }, 'uploads found waiting and queued again'),
    (error: unknown) => log.error({ err: error }, 'looking for waiting uploads failed'),
  );
}, RECONCILE_EVERY_MS);

let stopping = false;
async function stop(signal: string): Promise<void> {
  if (stopping) return;
  stopping = true;
  log.info({ signal }, 'finishing what is being read, then stopping');
  clearInterval(timer);
  await worker.close();
  connection.disconnect();
  await Promise.all([closeReadQueue(), closeProgress(), closeDatabase()]);
  process.exit(0);
}
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => void stop(signal));
log.info('waiting for uploads');
