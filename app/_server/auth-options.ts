import 'server-only';
import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { database } from '@/db/knex';
import { endSession } from '@/db/repositories/sessions';
import { sessionSeconds } from './session-seconds';
import { signInWithPassword } from './sign-in-with-password';

const secure = process.env.NEXTAUTH_URL?.startsWith('https:') ?? false;

/** The cookie that carries the signed-in session's token. */
export const sessionCookie = {
  name: `${secure ? '__Secure-' : ''}spinstead-session`,
  options: { httpOnly: true, sameSite: 'lax', path: '/', secure },
} as const;

/**
 * The token names a row of `sessions` and nothing else that is believed: who it is, in which group, and with
 * which role is read from the database on each request, so a revoked session ends at once.
 */
export const authOptions: NextAuthOptions = {
  secret: process.env.NEXTAUTH_SECRET,
  session: { strategy: 'jwt', maxAge: sessionSeconds },
  cookies: { sessionToken: sessionCookie },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [
    CredentialsProvider({
      name: 'E-mail and password',
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(credentials, request) {
        const outcome = await signInWithPassword(
          credentials?.email ?? '',
          credentials?.password ?? '',
          String(request.headers?.['user-agent'] ?? ''),
        );
        // A message would end up in the address; "refused" and "wrong" are told apart by the form alone.
        return outcome.ok ? { id: outcome.value.userId, sessionId: outcome.value.sessionId } : null;
      },
    }),
  ],
  callbacks: {
    jwt({ token, user }) {
      return user ? { sub: user.id, sessionId: user.sessionId } : token;
    },
    session({ session, token }) {
      return { expires: session.expires, sessionId: token.sessionId ?? null };
    },
  },
  events: {
    async signOut({ token }) {
      if (token.sessionId) await endSession(database(), token.sessionId);
    },
  },
};
