import { spawn, type ChildProcess } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { mkdir, mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import { execFile } from 'node:child_process';
import pg from 'pg';
import { freePort } from '@/lib/launch/ports.mjs';
import { prepareDatabase } from '@/lib/launch/prepare-database.mjs';

const run = promisify(execFile);

export interface RunningApplication {
  url: string;
  mailFolder: string;
  stop: () => Promise<void>;
}

/** The built application with its worker against an own database, Redis number, storage and mail folder. */
export async function startApplication(): Promise<RunningApplication> {
  const superuserUrl = process.env.TEST_DATABASE_SUPERUSER_URL;
  const redis = process.env.TEST_REDIS_URL;
  if (!superuserUrl || !redis) throw new Error('Run browser tests through npm run test:e2e.');
  const folder = await mkdtemp(path.join(tmpdir(), 'spinstead-e2e-'));
  const name = `e2e_${randomBytes(6).toString('hex')}`;
  const passwords = { ownerPassword: 'owner', appPassword: 'app' };
  const { ownerUrl, appUrl } = await prepareDatabase(superuserUrl, passwords, name);
  const [web, mail] = [await freePort(), await freePort()];
  const url = `http://127.0.0.1:${web}`;
  const mailFolder = path.join(folder, 'mail');
  const env = {
    ...process.env,
    NODE_ENV: 'production' as const,
    NEXT_TELEMETRY_DISABLED: '1',
    MIGRATE_DATABASE_URL: ownerUrl,
    DATABASE_URL: appUrl,
    REDIS_URL: `${redis}/1`,
    NEXTAUTH_URL: url,
    NEXTAUTH_SECRET: randomBytes(32).toString('base64url'),
    STORAGE_DIR: path.join(folder, 'storage'),
    SMTP_URL: `smtp://127.0.0.1:${mail}`,
    MAIL_CAPTURE_DIR: mailFolder,
    MAIL_CAPTURE_PORT: String(mail),
    SPINSTEAD_DEMO: '1',
  };
  await run('node', ['.build/migrate.mjs'], { env });
  await run('node', ['.build/seed.mjs'], { env });
  const logs = path.resolve('.data/test');
  await mkdir(logs, { recursive: true });
  const start = (program: string, args: string[]): ChildProcess => {
    const child = spawn('node', args, { env, stdio: ['ignore', 'pipe', 'pipe'] });
    const log = createWriteStream(path.join(logs, `e2e-${program}.log`));
    child.stdout?.pipe(log, { end: false });
    child.stderr?.pipe(log, { end: false });
    return child;
  };
  const children = [
    start('mail', ['.build/mail-capture.mjs']),
    start('worker', ['.build/worker.mjs']),
    start('web', ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(web)]),
  ];
  for (let n = 0; ; n++) {
    const answer = await fetch(`${url}/sign-in`).catch(() => null);
    if (answer?.ok) break;
    if (n > 300) throw new Error(`The application does not answer; see ${logs}/e2e-web.log`);
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return {
    url,
    mailFolder,
    async stop() {
      await Promise.all(
        children.map(
          (child) =>
            new Promise<void>((resolve) => {
              if (child.exitCode !== null) return resolve();
              child.once('exit', () => resolve());
              child.kill('SIGTERM');
            }),
        ),
      );
      const client = new pg.Client({ connectionString: superuserUrl });
      await client.connect();
      await client.query(`drop database ${name} with (force)`);
      await client.end();
      await rm(folder, { recursive: true, force: true });
    },
  };
}
