import 'server-only';
import { database } from '@/db/knex';
import { countAttempt, findAccountForSignIn, forgetAttempts } from '@/db/repositories/accounts';
import { startSession } from '@/db/repositories/sessions';
import { isDemoMode } from '@/lib/access/demo-mode';
import { isPassword } from '@/lib/access/password-hash';
import { longestPassword } from '@/lib/access/password-rules';
import { err, ok, type Result } from '@/lib/result';
import { sessionSeconds } from './session-seconds';

export type SignInProblem = 'wrong' | 'too many attempts';

const failuresAllowed = 10;
export const failureWindowSeconds = 15 * 60;

/**
 * Checks an e-mail and a password and opens a session row.
 * An unknown address and a wrong password give the same answer after the same work.
 */
export async function signInWithPassword(
  email: string,
  password: string,
  userAgent: string,
): Promise<Result<{ userId: string; sessionId: string }, SignInProblem>> {
  const address = email.trim().toLowerCase().slice(0, 254);
  const db = database();
  // Counted before the check, so that many tries at once are no way round the limit.
  const attempt = `sign-in ${address}`;
  if ((await countAttempt(db, attempt, failureWindowSeconds)) > failuresAllowed)
    return err('too many attempts');

  const account = await findAccountForSignIn(db, address);
  const usable = account && (!account.demo || isDemoMode()) ? account : null;
  const matches = await isPassword(usable?.passwordHash ?? null, password.slice(0, longestPassword * 4));
  if (!usable || !matches) return err('wrong');

  await forgetAttempts(db, attempt);
  const expiresAt = new Date(Date.now() + sessionSeconds * 1000);
  const sessionId = await startSession(db, usable.userId, userAgent, expiresAt);
  return ok({ userId: usable.userId, sessionId });
}
