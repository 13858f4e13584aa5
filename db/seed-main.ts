import path from 'node:path';
import { closeReadQueue, enqueueReads } from '@/lib/queue/read-queue';
import { openStorage } from '@/lib/storage/open-storage';
import { closeDatabase, database } from './knex';
import { seedDemo } from './seeds/seed-demo';

async function main(): Promise<void> {
  const seeded = await seedDemo(database(), openStorage(), path.resolve('public/demo'));
  if (!seeded) {
    process.stdout.write('the demo is there already\n');
    return;
  }
  const { groupId, uploadIds } = seeded;
  await enqueueReads(uploadIds.map((uploadId) => ({ groupId, uploadId })));
  process.stdout.write(`demo seeded, ${uploadIds.length} outputs queued\n`);
}

main()
  .catch((error: unknown) => {
    process.stderr.write(
      `seeding the demo failed: ${error instanceof Error ? error.message : String(error)}\n`,
    );
    process.exitCode = 1;
  })
  .finally(() => Promise.all([closeReadQueue(), closeDatabase()]));
