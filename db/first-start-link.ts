import type { Knex } from 'knex';
import { accountExists, issuePasswordToken } from '@/db/repositories/accounts';
import { newAccessToken } from '@/lib/access/access-token';

const linkHours = 24;

/**
 * A one-time link with which the first PI opens the first group.
 * @param siteUrl - public address of the site, without a path
 * @returns null when somebody outside the demo already has an account
 */
export async function firstStartLink(db: Knex, siteUrl: string): Promise<string | null> {
  if (await accountExists(db)) return null;
  const { token, tokenHash } = newAccessToken();
  const expiresAt = new Date(Date.now() + linkHours * 3_600_000);
  await issuePasswordToken(db, { tokenHash, userId: null, purpose: 'first PI', expiresAt });
  return new URL(`/first-start/${token}`, siteUrl).href;
}
