// @ts-check
/** Lines of a step that takes long: what it is, and every ten seconds how long it has been going. */

/**
 * @template T
 * @param {string} what - the step in a few words
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withProgress(what, work) {
  const started = Date.now();
  const seconds = () => ((Date.now() - started) / 1000).toFixed(0);
  console.log(`${what} …`);
  const timer = setInterval(() => console.log(`${what} … ${seconds()} s`), 10_000);
  try {
    const result = await work();
    if (Date.now() - started > 2000) console.log(`${what}: done in ${seconds()} s`);
    return result;
  } finally {
    clearInterval(timer);
  }
}
