import type { Knex } from 'knex';
import * as ground from './0001-ground';

/** Every migration in order, imported statically so that names agree in the bundle and under tsx. */
const migrations: { name: string; migration: Knex.Migration }[] = [
  { name: '0001-ground', migration: ground },
];

export const migrationSource: Knex.MigrationSource<(typeof migrations)[number]> = {
  getMigrations: async () => migrations,
  getMigrationName: ({ name }) => name,
  getMigration: async ({ migration }) => migration,
};
