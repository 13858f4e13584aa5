import 'server-only';
import { cookies } from 'next/headers';
import { groupCookie } from './actor';

/** Makes a group the one this browser works in. For actions and handlers only. */
export async function rememberGroup(groupId: string): Promise<void> {
  (await cookies()).set(groupCookie, groupId, {
    httpOnly: true,
    sameSite: 'lax',
    path: '/',
    secure: process.env.NEXTAUTH_URL?.startsWith('https:') ?? false,
    maxAge: 365 * 24 * 3600,
  });
}
