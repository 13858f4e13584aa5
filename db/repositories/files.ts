import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';

/** Byte offset of every `every`-th line, so that an excerpt can be read by range. */
export interface LineIndex {
  every: number;
  offsets: number[];
}

export interface StoredFile {
  sha256: string;
  bytes: number;
  lineIndex: LineIndex | null;
}

/** Notes stored bytes; `known` when the group already had exactly these. */
export async function ensureFile(
  trx: Knex.Transaction,
  tenant: Tenant,
  file: { sha256: string; bytes: number },
): Promise<{ known: boolean }> {
  const added = await trx('files')
    .insert({ groupId: tenant.groupId, ...file })
    .onConflict(['groupId', 'sha256'])
    .ignore()
    .returning('sha256');
  return { known: added.length === 0 };
}

export async function findFile(
  trx: Knex.Transaction,
  tenant: Tenant,
  sha256: string,
): Promise<StoredFile | undefined> {
  return trx('files').where({ groupId: tenant.groupId, sha256 }).first('sha256', 'bytes', 'lineIndex');
}

export async function setLineIndex(
  trx: Knex.Transaction,
  tenant: Tenant,
  sha256: string,
  lineIndex: LineIndex,
): Promise<void> {
  await trx('files')
    .where({ groupId: tenant.groupId, sha256 })
    .update({ lineIndex: JSON.stringify(lineIndex) });
}
