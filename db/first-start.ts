import { openDatabase } from './knex';
import { firstStartLink } from './first-start-link';

const { DATABASE_URL, NEXTAUTH_URL } = process.env;
if (!DATABASE_URL || !NEXTAUTH_URL) {
  process.stderr.write(
    'first-start: set DATABASE_URL (role spinstead_app) and NEXTAUTH_URL (address of the site).\n',
  );
  process.exit(1);
}
const db = openDatabase(DATABASE_URL, 1);
firstStartLink(db, NEXTAUTH_URL)
  .then(
    // Nothing is printed once there is an account: the launcher shows what it is given.
    (link) => {
      if (link) process.stdout.write(`${link}\n`);
    },
    (error: unknown) => {
      process.stderr.write(`first-start failed: ${error instanceof Error ? error.message : String(error)}\n`);
      process.exitCode = 1;
    },
  )
  .finally(() => db.destroy());
