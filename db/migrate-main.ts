import { migrate } from './migrate';

const url = process.env.MIGRATE_DATABASE_URL;
if (!url) {
  process.stderr.write('MIGRATE_DATABASE_URL is not set: give the connection of the owner role.\n');
  process.exit(1);
}
migrate(url).then(
  (names) =>
    process.stdout.write(names.length > 0 ? `migrated: ${names.join(', ')}\n` : 'schema is up to date\n'),
  (error: unknown) => {
    process.stderr.write(`migration failed: ${error instanceof Error ? error.message : String(error)}\n`);
    process.exit(1);
  },
);
