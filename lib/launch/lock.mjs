// @ts-check
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { LaunchProblem } from './run-command.mjs';

/**
 * One start at a time in a checkout. The note of a start that was killed is recognised by its process being gone.
 * @param {string} folder
 */
export function lock(folder) {
  const file = path.join(folder, 'running.json');
  mkdirSync(folder, { recursive: true });
  if (existsSync(file)) {
    const { pid, url } = JSON.parse(readFileSync(file, 'utf8'));
    if (isStart(pid))
      throw new LaunchProblem(`Spinstead runs here already${url ? `: ${url}` : ''} (process ${pid}).`);
  }
  const write = (/** @type {string | null} */ url) =>
    writeFileSync(file, JSON.stringify({ pid: process.pid, url }));
  write(null);
  return { setUrl: write, release: () => rmSync(file, { force: true }) };
}

/** @param {number} pid */
function isStart(pid) {
  try {
    return pid !== process.pid && readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('launch/start.mjs');
  } catch {
    return false;
  }
}
