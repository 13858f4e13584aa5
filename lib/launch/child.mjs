// @ts-check
import { spawn } from 'node:child_process';
import { createWriteStream } from 'node:fs';

/**
 * @typedef {object} Child
 * @property {number | undefined} pid
 * @property {() => boolean} running
 * @property {Promise<number | null>} exited
 * @property {(signal: NodeJS.Signals, patienceMs?: number) => Promise<void>} stop - ends it, by force after the patience
 */

/**
 * Starts a process that dies with this one, even when this one is killed: the kernel sends it `onDeath` then.
 * It stands in a process group of its own, so that Ctrl-C reaches only this process, which stops the rest in order.
 * @param {string} command
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, cwd?: string, log: string, onDeath?: string, asUser?: string }} options
 * @returns {Child}
 */
export function startChild(command, args, { env = process.env, cwd, log, onDeath = 'KILL', asUser }) {
  const user = asUser ? [`--reuid=${asUser}`, `--regid=${asUser}`, '--init-groups'] : [];
  const child = spawn('setpriv', [...user, '--pdeathsig', onDeath, command, ...args], {
    env,
    cwd,
    detached: true,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const file = createWriteStream(log, { flags: 'a' });
  child.stdout?.pipe(file, { end: false });
  child.stderr?.pipe(file, { end: false });
  let running = true;
  /** @type {Promise<number | null>} */
  const exited = new Promise((resolve) => {
    const settle = (/** @type {number | null} */ code) => {
      running = false;
      file.end();
      resolve(code);
    };
    child.once('exit', (code) => settle(code));
    child.once('error', () => settle(127));
  });
  return {
    pid: child.pid,
    running: () => running,
    exited,
    async stop(signal, patienceMs = 8000) {
      if (!running) return;
      child.kill(signal);
      const timer = setTimeout(() => child.kill('SIGKILL'), patienceMs);
      await exited;
      clearTimeout(timer);
    },
  };
}
