// @ts-check
import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { ensureBuild } from './build.mjs';
import { keepRunning } from './keep-running.mjs';
import { lock } from './lock.mjs';
import { ensureModules } from './modules.mjs';
import { ensurePackages } from './packages.mjs';
import { startPostgres } from './postgres.mjs';
import { startRedis } from './redis.mjs';
import { ports, secrets } from './remembered.mjs';
import { LaunchProblem, mustRun } from './run-command.mjs';

const folder = path.resolve('.data');
const logs = path.join(folder, 'logs');

/** What has been started, in its order; stopped in reverse. @type {(() => Promise<void>)[]} */
const stops = [];
let stopping = false;

async function main() {
  const held = lock(folder);
  stops.push(async () => held.release());
  mkdirSync(logs, { recursive: true });
  await ensurePackages({ withBrowser: false });
  await ensureModules();
  const [port, secret] = [await ports(folder), await secrets(folder)];
  const postgres = await startPostgres({ folder: path.join(folder, 'services'), port: port.postgres });
  stops.push(() => postgres.child.stop('SIGINT'));
  const redis = await startRedis({ folder: path.join(folder, 'services'), port: port.redis });
  stops.push(() => redis.child.stop('SIGTERM'));
  // Needs the node modules, which may have been missing when this file was loaded.
  const { prepareDatabase } = await import('./prepare-database.mjs');
  const { ownerUrl, appUrl } = await prepareDatabase(postgres.superuserUrl, secret);
  await ensureBuild();

  const url = `http://127.0.0.1:${port.web}`;
  const demo = process.env.SPINSTEAD_DEMO !== '0';
  /** @type {NodeJS.ProcessEnv} */
  const env = {
    ...process.env,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    DATABASE_URL: appUrl,
    REDIS_URL: redis.url,
    NEXTAUTH_URL: process.env.NEXTAUTH_URL ?? url,
    NEXTAUTH_SECRET: secret.nextauth,
    STORAGE_DIR: path.join(folder, 'storage'),
    SMTP_URL: process.env.SMTP_URL ?? `smtp://127.0.0.1:${port.mail}`,
    MAIL_CAPTURE_DIR: path.join(folder, 'mail'),
    MAIL_CAPTURE_PORT: String(port.mail),
    SPINSTEAD_DEMO: demo ? '1' : '0',
  };
  console.log(
    (
      await mustRun('node', ['.build/migrate.mjs'], { env: { ...env, MIGRATE_DATABASE_URL: ownerUrl } })
    ).trim(),
  );
  if (demo) console.log((await mustRun('node', ['.build/seed.mjs'], { env })).trim());
  const run = (/** @type {string} */ name, /** @type {string[]} */ args) => {
    const kept = keepRunning(name, args, { env, log: path.join(logs, `${name}.log`) });
    stops.push(() => kept.stop());
  };
  if (!process.env.SMTP_URL) run('mail-capture', ['.build/mail-capture.mjs']);
  run('worker', ['.build/worker.mjs']);
  run('web', ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(port.web)]);
  await untilAnswers(url);
  held.setUrl(url);
  console.log(`\nSpinstead runs at ${url}\n`);
  if (demo) await announceDemo();
  else {
    const link = (await mustRun('node', ['.build/first-start.mjs'], { env })).trim();
    if (link) console.log(`Create the first group and its PI (works once): ${link}\n`);
  }
  console.log('Ctrl-C stops everything.');
}

/** @param {string} url */
async function untilAnswers(url) {
  for (let n = 0; n < 300; n++) {
    const answer = await fetch(`${url}/sign-in`).catch(() => null);
    if (answer?.ok) return;
    if (stopping) return;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new LaunchProblem(`The web server does not answer at ${url}; see ${path.join(logs, 'web.log')}`);
}

async function announceDemo() {
  const { readFileSync } = await import('node:fs');
  const accounts = JSON.parse(readFileSync('lib/access/demo-accounts.json', 'utf8'));
  console.log('Demo mode: an invented group with invented measurements. Demo accounts:');
  for (const { email, password, role } of accounts)
    console.log(`  ${email.padEnd(26)} ${password.padEnd(20)} ${role}`);
  console.log('Without the demo: SPINSTEAD_DEMO=0 npm start\n');
}

/** @param {number} code */
async function stopAll(code) {
  if (stopping) return;
  stopping = true;
  for (const stop of stops.reverse()) await stop();
  process.exit(code);
}

for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
  process.on(signal, () => {
    console.log('\nStopping …');
    void stopAll(0);
  });
}
main().catch((error) => {
  if (!stopping) console.error(error instanceof LaunchProblem ? error.message : error);
  void stopAll(1);
});
