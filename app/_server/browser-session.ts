import 'server-only';
import { cookies } from 'next/headers';
import { encode } from 'next-auth/jwt';
import { sessionCookie } from './auth-options';
import { sessionSeconds } from './session-seconds';

/** Hands the browser the token of a session row that has just been opened. For actions and handlers only. */
export async function giveSessionCookie(session: { userId: string; sessionId: string }): Promise<void> {
  const secret = process.env.NEXTAUTH_SECRET;
  if (!secret) throw new Error('NEXTAUTH_SECRET is not set: give at least 32 random characters.');
  const token = await encode({
    token: { sub: session.userId, sessionId: session.sessionId },
    secret,
    maxAge: sessionSeconds,
  });
  (await cookies()).set(sessionCookie.name, token, { ...sessionCookie.options, maxAge: sessionSeconds });
}

export async function takeSessionCookie(): Promise<void> {
  (await cookies()).delete(sessionCookie.name);
}
