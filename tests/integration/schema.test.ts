import { execFileSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

let database: AccountsDatabase;
beforeAll(async () => {
  database = await createAccountsDatabase();
});
afterAll(() => database?.drop());

/** The dump without what changes from server to server: versions, keys of the dump, settings. */
function schemaOf(url: string): string {
  const dump = execFileSync('pg_dump', ['--schema-only', '--no-owner', url], { encoding: 'utf8' });
  const lines = dump.split('\n').filter((line) => !/^(--|SET |SELECT pg_catalog|\\)/.test(line));
  return `${lines
    .join('\n')
    .replace(/\n{2,}/g, '\n\n')
    .trim()}\n`;
}

it('db/schema.sql is what the migrations make (write it anew with WRITE_SCHEMA=1)', () => {
  const superuser = new URL(process.env.TEST_DATABASE_SUPERUSER_URL ?? '');
  superuser.pathname = new URL(database.appUrl).pathname;
  const schema = schemaOf(superuser.href);
  if (process.env.WRITE_SCHEMA === '1') writeFileSync('db/schema.sql', schema);
  expect(schema).toContain('FORCE ROW LEVEL SECURITY');
  expect(schema).toBe(readFileSync('db/schema.sql', 'utf8'));
});
