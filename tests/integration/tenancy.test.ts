import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { asTenant } from '@/db/knex';
import { insertStudy, listStudies } from '@/db/repositories/studies';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

let database: AccountsDatabase;
beforeAll(async () => {
  database = await createAccountsDatabase();
});
afterAll(() => database?.drop());

/** Tables without a group: people and what belongs to them, counters of attempts, the list of migrations. */
const notOfAGroup = new Set([
  'users',
  'sessions',
  'password_tokens',
  'attempts',
  'migrations',
  'migrations_lock',
]);

describe('tenancy in the database', () => {
  it('forces row-level security on every table that the catalogue lists, save the accounts', async () => {
    const { rows } = await database.superuser.raw<{
      rows: { name: string; enabled: boolean; forced: boolean; policies: number }[];
    }>(
      `select c.relname as name, c.relrowsecurity as enabled, c.relforcerowsecurity as forced,
              (select count(*)::int from pg_policy p where p.polrelid = c.oid) as policies
       from pg_class c join pg_namespace n on n.oid = c.relnamespace
       where n.nspname = 'public' and c.relkind = 'r'`,
    );
    expect(rows.length).toBeGreaterThan(15);
    for (const { name, enabled, forced, policies } of rows.filter((row) => !notOfAGroup.has(row.name)))
      expect({ name, enabled, forced, has: policies > 0 }).toEqual({
        name,
        enabled: true,
        forced: true,
        has: true,
      });
  });

  it('connects the application as a role that owns nothing and cannot pass the policies by', async () => {
    const { rows } = await database.app.raw<{ rows: Record<string, unknown>[] }>(
      `select rolsuper, rolbypassrls, (select count(*)::int from pg_class where relowner = r.oid) as owns
       from pg_roles r where rolname = current_user`,
    );
    expect(rows[0]).toEqual({ rolsuper: false, rolbypassrls: false, owns: 0 });
  });

  it('shows a group its own rows only, even to a query without a condition', async () => {
    const groups = [randomUUID(), randomUUID()];
    for (const groupId of groups) {
      await database.superuser('groups').insert({ id: groupId, name: `Group ${groupId}` });
      const tenant = { groupId, userId: null };
      await asTenant(database.app, tenant, (trx) =>
        insertStudy(trx, tenant, { title: `Study of ${groupId}`, question: '' }),
      );
    }
    const [first = '', second = ''] = groups;
    const tenant = { groupId: first, userId: null };
    const seen = await asTenant(database.app, tenant, (trx) => trx('studies').select('title'));
    expect(seen).toEqual([{ title: `Study of ${first}` }]);
    expect(
      await asTenant(database.app, tenant, (trx) => listStudies(trx, { groupId: second, userId: null })),
    ).toEqual([]);
    const foreign = asTenant(database.app, tenant, (trx) =>
      insertStudy(trx, { groupId: second, userId: null }, { title: 'x', question: '' }),
    );
    await expect(foreign).rejects.toThrow(/row-level security/);
    expect(await database.app('studies').select('title')).toEqual([]);
  });

  it('keeps history append-only for the application', async () => {
    for (const change of ['update events set kind = $$x$$', 'delete from events', 'delete from files'])
      await expect(database.app.raw(change)).rejects.toThrow(/permission denied/);
  });
});
