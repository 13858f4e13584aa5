// @ts-check
/**
 * Starts a service and starts it again when it ends by itself; clients wait for it or try again meanwhile.
 * @template {{ child: import('./child.mjs').Child }} Service
 * @param {string} name
 * @param {() => Promise<Service>} start
 * @param {NodeJS.Signals} signal - that asks it to stop in order
 */
export async function keepService(name, start, signal) {
  let service = await start();
  let stopped = false;
  const watch = () =>
    service.child.exited.then(async (code) => {
      for (let wait = 500; !stopped; wait = Math.min(2 * wait, 10_000)) {
        console.log(`${name} ended (code ${code}); starting it again`);
        try {
          service = await start();
          watch();
          return;
        } catch (error) {
          console.error(error instanceof Error ? error.message : error);
          await new Promise((resolve) => setTimeout(resolve, wait));
        }
      }
    });
  watch();
  return {
    first: service,
    async stop() {
      stopped = true;
      await service.child.stop(signal);
    },
  };
}
