// @ts-check
import { build } from 'esbuild';

/** Programs that run beside the web server, each one file under .build. */
const entryPoints = {
  worker: 'worker/main.ts',
  migrate: 'db/migrate-main.ts',
  seed: 'db/seed-main.ts',
  'first-start': 'db/first-start.ts',
  'mail-capture': 'lib/mail/capture-main.ts',
};

await build({
  entryPoints,
  outdir: '.build',
  outExtension: { '.js': '.mjs' },
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  packages: 'external',
  sourcemap: true,
  logLevel: 'warning',
});
