// @ts-check
import { spawn } from 'node:child_process';

/**
 * Runs a command to its end.
 * @param {string} command
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, cwd?: string, show?: boolean }} [options] - `show` passes its output through
 * @returns {Promise<{ code: number, output: string }>}
 */
export function runCommand(command, args, { env = process.env, cwd, show = false } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { env, cwd, stdio: show ? 'inherit' : ['ignore', 'pipe', 'pipe'] });
    let output = '';
    child.stdout?.on('data', (text) => (output += text));
    child.stderr?.on('data', (text) => (output += text));
    child.on('error', reject);
    child.on('exit', (code, signal) => resolve({ code: code ?? (signal ? 1 : 0), output }));
  });
}

/**
 * Runs a command that must succeed; otherwise throws with the last lines it printed.
 * @param {string} command
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, cwd?: string, show?: boolean }} [options]
 */
export async function mustRun(command, args, options) {
  const { code, output } = await runCommand(command, args, options);
  if (code !== 0) {
    const last = output.trim().split('\n').slice(-15).join('\n');
    throw new LaunchProblem(`"${[command, ...args].join(' ')}" ended with code ${code}.\n${last}`);
  }
  return output;
}

/** Something a person can mend; shown without a stack trace. */
export class LaunchProblem extends Error {}
