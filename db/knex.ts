import knex, { type Knex } from 'knex';
import pg from 'pg';
import type { Tenant } from '@/lib/access/actor';

let shared: Knex | undefined;

// Counts and byte sizes stay far below 2^53, so a bigint column may arrive as a number.
pg.types.setTypeParser(pg.types.builtins.INT8, Number);
// A date has no time zone: keep the text instead of a Date at somebody's midnight.
pg.types.setTypeParser(pg.types.builtins.DATE, (text) => text);

const toSnake = (name: string) => name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
const toCamel = (name: string) =>
  name.replace(/_([a-z0-9])/g, (_match, letter: string) => letter.toUpperCase());

/** Rows come back with the names the code uses: `group_id` → `groupId`. Values are left alone. */
function camelKeys(row: unknown): unknown {
  if (row === null || typeof row !== 'object' || Array.isArray(row) || row instanceof Date) return row;
  return Object.fromEntries(Object.entries(row).map(([key, value]) => [toCamel(key), value]));
}

/** Results of raw SQL carry `rows` and keep the names they were written with. */
function camelResult(result: unknown): unknown {
  if (Array.isArray(result)) return result.map(camelKeys);
  const raw = result !== null && typeof result === 'object' && 'rows' in result && 'command' in result;
  return raw ? result : camelKeys(result);
}

/** The application's connection pool (role `spinstead_app`), opened on first use. */
export function database(): Knex {
  if (!shared) {
    const url = process.env.DATABASE_URL;
    if (!url) throw new Error('DATABASE_URL is not set: give the connection of the role spinstead_app.');
    shared = openDatabase(url);
  }
  return shared;
}

export function openDatabase(url: string, max = 10): Knex {
  return knex({
    client: 'pg',
    connection: { connectionString: url, application_name: 'spinstead', statement_timeout: 30_000 },
    pool: { min: 0, max },
    wrapIdentifier: (name, quote) => (name === '*' ? name : quote(toSnake(name))),
    postProcessResponse: camelResult,
  });
}

export async function closeDatabase(): Promise<void> {
  await shared?.destroy();
  shared = undefined;
}

/** What the row-level policies look at, set for one transaction only. */
interface Scope {
  groupId?: string | null;
  userId?: string | null;
  tokenHash?: string | null;
}

async function scoped<T>(db: Knex, scope: Scope, work: (trx: Knex.Transaction) => Promise<T>): Promise<T> {
  return db.transaction(async (trx) => {
    await trx.raw(
      `select set_config('app.group_id', ?, true), set_config('app.user_id', ?, true), set_config('app.token_hash', ?, true)`,
      [scope.groupId ?? '', scope.userId ?? '', scope.tokenHash ?? ''],
    );
    return work(trx);
  });
}

/** A transaction that sees and changes only the rows of the tenant's group. */
export function asTenant<T>(
  db: Knex,
  tenant: Tenant,
  work: (trx: Knex.Transaction) => Promise<T>,
): Promise<T> {
  return scoped(db, { groupId: tenant.groupId, userId: tenant.userId }, work);
}

/** A transaction of a person outside any group: their own account, sessions and memberships. */
export function asPerson<T>(
  db: Knex,
  userId: string,
  work: (trx: Knex.Transaction) => Promise<T>,
): Promise<T> {
  return scoped(db, { userId }, work);
}

/** A transaction that sees only the invitation whose token hashes to this value. */
export function asTokenHolder<T>(
  db: Knex,
  tokenHash: string,
  work: (trx: Knex.Transaction) => Promise<T>,
): Promise<T> {
  return scoped(db, { tokenHash }, work);
}
