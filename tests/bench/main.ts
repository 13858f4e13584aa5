/** `npm run bench -- NAME`: figures beside a yardstick of the same run. Each bench is one file that exports `run`. */
const benches: Record<string, () => Promise<{ run: () => Promise<void> | void }>> = {
  geometry: () => import('./geometry'),
  outputs: () => import('./outputs'),
};

const name = process.argv[2] ?? '';
const load = benches[name];
if (!load) {
  console.error(`No bench "${name}"; benches: ${Object.keys(benches).join(', ')}`);
  process.exit(1);
}
await (await load()).run();

export {};
