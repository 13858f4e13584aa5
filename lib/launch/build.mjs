// @ts-check
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { withProgress } from './progress.mjs';
import { mustRun } from './run-command.mjs';

const STAMP = '.build/sources';
const sources = [
  'app',
  'components',
  'lib',
  'worker',
  'db',
  'public',
  'proxy.ts',
  'next.config.mjs',
  'tailwind.config.ts',
  'postcss.config.mjs',
  'tsconfig.json',
  'package-lock.json',
];

/** Builds the web server and the programs beside it when a source changed since the last build. */
export async function ensureBuild() {
  const wanted = hashOfSources();
  if (existsSync(STAMP) && existsSync('.next/BUILD_ID') && readFileSync(STAMP, 'utf8') === wanted) return;
  const env = { ...process.env, NODE_ENV: /** @type {const} */ ('production'), NEXT_TELEMETRY_DISABLED: '1' };
  await withProgress('Building (about a minute)', async () => {
    await mustRun('node', ['node_modules/next/dist/bin/next', 'build'], { env });
    await mustRun('node', ['lib/launch/bundle.mjs'], { env });
  });
  mkdirSync('.build', { recursive: true });
  writeFileSync(STAMP, wanted);
}

function hashOfSources() {
  const hash = createHash('sha256');
  const visit = (/** @type {string} */ name) => {
    if (!existsSync(name)) return;
    if (statSync(name).isDirectory()) {
      for (const entry of readdirSync(name).sort()) visit(path.join(name, entry));
    } else hash.update(name).update('\0').update(readFileSync(name)).update('\0');
  };
  sources.forEach(visit);
  return hash.digest('hex');
}
