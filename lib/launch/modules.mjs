// @ts-check
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { withProgress } from './progress.mjs';
import { mustRun } from './run-command.mjs';

const STAMP = 'node_modules/.spinstead-lock';

/** Installs the node modules when the lock file asks for others than those that are there. */
export async function ensureModules() {
  const wanted = createHash('sha256').update(readFileSync('package-lock.json')).digest('hex');
  if (existsSync(STAMP) && readFileSync(STAMP, 'utf8') === wanted) return;
  await withProgress('Installing node modules', () => mustRun('npm', ['ci', '--no-audit', '--no-fund']));
  writeFileSync(STAMP, wanted);
}
