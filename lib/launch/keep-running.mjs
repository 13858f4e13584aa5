// @ts-check
import { startChild } from './child.mjs';

/**
 * Starts a process and starts it again when it ends by itself, at most once a second; `stop` ends both.
 * @param {string} name
 * @param {string[]} args - of node
 * @param {{ env: NodeJS.ProcessEnv, log: string }} options
 */
export function keepRunning(name, args, { env, log }) {
  let stopped = false;
  const start = () => startChild(process.execPath, args, { env, log });
  let child = start();
  const watch = () =>
    child.exited.then(async (code) => {
      if (stopped) return;
      console.log(`${name} ended (code ${code}); starting it again. See ${log}`);
      await new Promise((resolve) => setTimeout(resolve, 1000));
      if (stopped) return;
      child = start();
      watch();
    });
  watch();
  return {
    async stop() {
      stopped = true;
      await child.stop('SIGTERM');
    },
  };
}
