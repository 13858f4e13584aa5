import { randomBytes } from 'node:crypto';
import knex, { type Knex } from 'knex';
import { openDatabase } from '@/db/knex';
import { migrate } from '@/db/migrate';

/** An own database with the newest schema, empty. */
export interface AccountsDatabase {
  /** As the program connects: a role that owns nothing and is held by row-level security. */
  app: Knex;
  /** Sees everything; to prepare and to look afterwards. */
  superuser: Knex;
  appUrl: string;
  drop: () => Promise<void>;
}

export async function createAccountsDatabase(): Promise<AccountsDatabase> {
  const serverUrl = process.env.TEST_DATABASE_SUPERUSER_URL;
  if (!serverUrl) throw new Error('TEST_DATABASE_SUPERUSER_URL is not set: run npm run test:integration.');
  const name = `accounts_${randomBytes(6).toString('hex')}`;
  const server = knex({ client: 'pg', connection: serverUrl, pool: { min: 0, max: 1 } });
  for (const role of ['spinstead_owner', 'spinstead_app']) {
    const { rows } = await server.raw<{ rows: unknown[] }>('select 1 from pg_roles where rolname = ?', [
      role,
    ]);
    if (rows.length === 0) await server.raw(`create role ${role} login`);
  }
  await server.raw(`create database ${name} owner spinstead_owner`);
  const url = (user: string | null) => {
    const wanted = new URL(serverUrl);
    if (user) {
      wanted.username = user;
      wanted.password = '';
    }
    wanted.pathname = name;
    return wanted.href;
  };
  await migrate(url('spinstead_owner'));
  const appUrl = url('spinstead_app');
  const app = openDatabase(appUrl, 6);
  const superuser = knex({ client: 'pg', connection: url(null), pool: { min: 0, max: 2 } });
  return {
    app,
    superuser,
    appUrl,
    async drop() {
      await app.destroy();
      await superuser.destroy();
      await server.raw(`drop database ${name} with (force)`);
      await server.destroy();
    },
  };
}
