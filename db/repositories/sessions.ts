import type { Knex } from 'knex';
import { asPerson } from '@/db/knex';

/** A signed-in browser, as its owner sees it in the list. */
export interface Session {
  id: string;
  userAgent: string;
  createdAt: Date;
  seenAt: Date;
  expiresAt: Date;
}

/** Whose session it is; absent once it is revoked or over. */
export interface SessionPerson {
  userId: string;
  name: string;
  email: string;
  demo: boolean;
}

export async function startSession(
  db: Knex,
  userId: string,
  userAgent: string,
  expiresAt: Date,
): Promise<string> {
  const { rows } = await db.raw<{ rows: { start_session: string }[] }>('select start_session(?, ?, ?)', [
    userId,
    userAgent,
    expiresAt,
  ]);
  const id = rows[0]?.start_session;
  if (!id) throw new Error('start_session returned no id.');
  return id;
}

export async function findLiveSession(db: Knex, sessionId: string): Promise<SessionPerson | undefined> {
  const { rows } = await db.raw<{ rows: SessionPersonRow[] }>('select * from live_session(?)', [sessionId]);
  const row = rows[0];
  return row && { userId: row.user_id, name: row.name, email: row.email, demo: row.demo };
}

export async function endSession(db: Knex, sessionId: string): Promise<void> {
  await db.raw('select end_session(?)', [sessionId]);
}

/** The person's live sessions, the one used last first. */
export async function listSessions(db: Knex, userId: string): Promise<Session[]> {
  const rows = await asPerson(db, userId, (trx) =>
    trx('sessions')
      .where({ user_id: userId, revoked_at: null })
      .where('expires_at', '>', trx.fn.now())
      .orderBy('seen_at', 'desc')
      .select<Session[]>('id', 'userAgent', 'createdAt', 'seenAt', 'expiresAt'),
  );
  return rows;
}

/** Ends one of the person's own sessions; false when it is not theirs or already over. */
export async function revokeSession(db: Knex, userId: string, sessionId: string): Promise<boolean> {
  const revoked = await asPerson(db, userId, (trx) =>
    trx('sessions')
      .where({ id: sessionId, user_id: userId, revoked_at: null })
      .update({ revoked_at: trx.fn.now() }),
  );
  return revoked > 0;
}

/** Ends every session of the person but one; returns how many ended. */
export function revokeOtherSessions(db: Knex, userId: string, keptSessionId: string): Promise<number> {
  return asPerson(db, userId, (trx) =>
    trx('sessions')
      .where({ user_id: userId, revoked_at: null })
      .whereNot({ id: keptSessionId })
      .update({ revoked_at: trx.fn.now() }),
  );
}

interface SessionPersonRow {
  user_id: string;
  name: string;
  email: string;
  demo: boolean;
}
