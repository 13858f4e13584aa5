import 'server-only';
import { headers } from 'next/headers';
import { database } from '@/db/knex';
import { startSession } from '@/db/repositories/sessions';
import { giveSessionCookie } from './browser-session';
import { sessionSeconds } from './session-seconds';

/** Signs in somebody who has just proved who they are by other means: a new account of a one-time link. */
export async function openSession(userId: string): Promise<void> {
  const userAgent = (await headers()).get('user-agent') ?? '';
  const expiresAt = new Date(Date.now() + sessionSeconds * 1000);
  const sessionId = await startSession(database(), userId, userAgent, expiresAt);
  await giveSessionCookie({ userId, sessionId });
}
