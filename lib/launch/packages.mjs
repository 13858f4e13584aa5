// @ts-check
import { existsSync, mkdirSync, readdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { withProgress } from './progress.mjs';
import { LaunchProblem, runCommand } from './run-command.mjs';

/** @type {{ name: string, present: () => boolean }[]} */
const services = [
  { name: 'postgresql', present: () => postgresBin() !== null },
  { name: 'redis-server', present: () => existsSync('/usr/bin/redis-server') },
];
/** @type {{ name: string, present: () => boolean }[]} */
const browser = [
  { name: 'chromium', present: () => existsSync('/usr/bin/chromium') },
  { name: 'fonts-liberation', present: () => existsSync('/usr/share/fonts/truetype/liberation') },
];

/** The folder with initdb and postgres of the newest version installed, or null. */
export function postgresBin() {
  const base = '/usr/lib/postgresql';
  if (!existsSync(base)) return null;
  const versions = readdirSync(base).sort((a, b) => Number(b) - Number(a));
  const version = versions.find((name) => existsSync(path.join(base, name, 'bin', 'initdb')));
  return version === undefined ? null : path.join(base, version, 'bin');
}

/**
 * Installs the Debian packages that are missing, as root or through sudo.
 * @param {{ withBrowser: boolean }} options
 */
export async function ensurePackages({ withBrowser }) {
  const wanted = withBrowser ? [...services, ...browser] : services;
  const missing = wanted.filter(({ present }) => !present()).map(({ name }) => name);
  if (missing.length === 0) return;
  const isRoot = process.getuid?.() === 0;
  const before = isRoot ? [] : ['sudo', '-n'];
  const byHand = `${isRoot ? '' : 'sudo '}apt-get update && ${isRoot ? '' : 'sudo '}apt-get install -y --no-install-recommends ${missing.join(' ')}`;
  if (isRoot) keepSystemClusterAway();
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const apt = (/** @type {string[]} */ args) => {
    const [command = 'apt-get', ...rest] = [...before, 'apt-get', ...args];
    return runCommand(command, rest, { env });
  };
  await withProgress(`Installing ${missing.join(', ')}`, async () => {
    const install = ['install', '-y', '--no-install-recommends', ...missing];
    try {
      await apt(['update']);
      const { code } = await apt(install);
      if (code !== 0) throw new Error(`code ${code}`);
    } catch {
      throw new LaunchProblem(`Missing: ${missing.join(', ')}. Run: ${byHand}`);
    }
  });
}

/** Debian's package starts a cluster of its own on installation unless told not to. */
function keepSystemClusterAway() {
  const folder = '/etc/postgresql-common';
  const file = path.join(folder, 'createcluster.conf');
  if (existsSync(file)) return;
  mkdirSync(folder, { recursive: true });
  writeFileSync(file, 'create_main_cluster = false\n');
}
