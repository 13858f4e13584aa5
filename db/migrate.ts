import knex from 'knex';
import { migrationSource } from './migrations/list';

/** Any fixed number; two processes that migrate at once wait for each other on it. */
const MIGRATION_LOCK = 5_417_320;

/**
 * Brings the database to the newest schema. Safe to run from several processes at once.
 * @param url - connection of the owner role `spinstead_owner`
 * @returns the names of the migrations that ran
 */
export async function migrate(url: string): Promise<string[]> {
  const db = knex({ client: 'pg', connection: url, pool: { min: 0, max: 2 } });
  try {
    return await db.transaction(async (lock) => {
      await lock.raw('select pg_advisory_xact_lock(?)', [MIGRATION_LOCK]);
      const [, names] = (await db.migrate.latest({ migrationSource, tableName: 'migrations' })) as [
        number,
        string[],
      ];
      return names;
    });
  } finally {
    await db.destroy();
  }
}
