import { startCaptureServer } from './capture-server';

const { MAIL_CAPTURE_DIR, MAIL_CAPTURE_PORT } = process.env;
if (!MAIL_CAPTURE_DIR || !MAIL_CAPTURE_PORT) {
  process.stderr.write('mail capture: set MAIL_CAPTURE_DIR and MAIL_CAPTURE_PORT.\n');
  process.exit(1);
}
startCaptureServer(MAIL_CAPTURE_DIR, Number(MAIL_CAPTURE_PORT)).then(
  (server) => {
    for (const signal of ['SIGINT', 'SIGTERM'] as const) {
      process.on(signal, () => server.close(() => process.exit(0)));
    }
  },
  (error: unknown) => {
    process.stderr.write(`mail capture: ${error instanceof Error ? error.message : String(error)}\n`);
    process.exit(1);
  },
);
