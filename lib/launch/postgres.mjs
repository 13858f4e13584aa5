// @ts-check
import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chownSync, existsSync, mkdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import path from 'node:path';
import { startChild } from './child.mjs';
import { postgresBin } from './packages.mjs';
import { LaunchProblem, mustRun } from './run-command.mjs';

const USER = 'postgres';
const isRoot = process.getuid?.() === 0;

/**
 * Starts PostgreSQL on loopback with its data in a folder of ours.
 * @param {{ folder: string, port: number, throwAway?: boolean }} options - `throwAway` trades safety for speed (tests)
 */
export async function startPostgres({ folder, port, throwAway = false }) {
  const bin = postgresBin();
  if (bin === null)
    throw new LaunchProblem('PostgreSQL is not installed. Run: apt-get install -y postgresql');
  const base = reachableFolder(folder);
  const data = path.join(base, 'data');
  const sockets = path.join(base, 'sockets');
  // The way to the folders must be open to the user postgres; only the folders themselves are closed.
  mkdirSync(base, { recursive: true, mode: 0o755 });
  for (const own of [data, sockets]) {
    mkdirSync(own, { recursive: true, mode: 0o700 });
    if (isRoot) giveToPostgres(own);
  }
  if (!existsSync(path.join(data, 'PG_VERSION'))) {
    const initdb = [
      path.join(bin, 'initdb'),
      '-D',
      data,
      '-U',
      USER,
      '-A',
      'trust',
      '-E',
      'UTF8',
      '--locale=C.UTF-8',
      '--no-instructions',
      ...(throwAway ? ['--no-sync'] : []),
    ];
    const [command = '', ...args] = isRoot ? ['runuser', '-u', USER, '--', ...initdb] : initdb;
    await mustRun(command, args, { cwd: '/' });
  }
  await endOrphan(data);
  const fast = throwAway
    ? ['-c', 'fsync=off', '-c', 'synchronous_commit=off', '-c', 'full_page_writes=off']
    : [];
  const child = startChild(
    path.join(bin, 'postgres'),
    [
      '-D',
      data,
      '-p',
      String(port),
      '-c',
      'listen_addresses=127.0.0.1',
      '-c',
      `unix_socket_directories=${sockets}`,
      '-c',
      'max_connections=120',
      ...fast,
    ],
    { cwd: '/', log: path.join(folder, 'postgres.log'), onDeath: 'INT', asUser: isRoot ? USER : undefined },
  );
  const deadline = Date.now() + 60_000;
  while (
    spawnSync(path.join(bin, 'pg_isready'), ['-h', '127.0.0.1', '-p', String(port), '-q']).status !== 0
  ) {
    if (!child.running() || Date.now() > deadline) {
      const log = readFileSync(path.join(folder, 'postgres.log'), 'utf8')
        .trim()
        .split('\n')
        .slice(-4)
        .join('\n');
      throw new LaunchProblem(`PostgreSQL did not start; see ${path.join(folder, 'postgres.log')}:\n${log}`);
    }
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  return { child, superuserUrl: `postgres://${USER}@127.0.0.1:${port}/postgres` };
}

/**
 * Our folder, or one under /var/lib when the user postgres cannot reach it (a checkout in a closed home).
 * @param {string} folder
 */
function reachableFolder(folder) {
  mkdirSync(folder, { recursive: true });
  if (!isRoot) return path.join(folder, 'postgres');
  const reaches = spawnSync('runuser', ['-u', USER, '--', 'test', '-x', folder], { cwd: '/' }).status === 0;
  if (reaches) return path.join(folder, 'postgres');
  return `/var/lib/spinstead-${createHash('sha256').update(folder).digest('hex').slice(0, 12)}`;
}

/** @param {string} folder */
function giveToPostgres(folder) {
  const id = (/** @type {string} */ flag) => Number(execFileSync('id', [flag, USER]));
  if (statSync(folder).uid !== id('-u')) chownSync(folder, id('-u'), id('-g'));
}

/**
 * A server that outlived its launcher would hold the data folder: it is asked to stop, and a stale note of it goes.
 * @param {string} data
 */
async function endOrphan(data) {
  const note = path.join(data, 'postmaster.pid');
  if (!existsSync(note)) return;
  const pid = Number(readFileSync(note, 'utf8').split('\n')[0]);
  const alive = () =>
    existsSync(`/proc/${pid}`) && readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(data);
  if (!alive()) {
    rmSync(note, { force: true });
    return;
  }
  process.kill(pid, 'SIGINT');
  for (let n = 0; n < 100 && alive(); n++) await new Promise((resolve) => setTimeout(resolve, 100));
}
