import 'server-only';
import { cookies, headers } from 'next/headers';
import { forbidden, redirect } from 'next/navigation';
import { getServerSession } from 'next-auth';
import { cache } from 'react';
import { database } from '@/db/knex';
import { listGroupsOfPerson, type GroupOfPerson } from '@/db/repositories/memberships';
import { findLiveSession, type SessionPerson } from '@/db/repositories/sessions';
import type { Actor } from '@/lib/access/actor';
import { isDemoMode } from '@/lib/access/demo-mode';
import { can, type Permission } from '@/lib/access/permissions';
import { returnPath } from '@/lib/access/return-path';
import { authOptions } from './auth-options';

/** Names the group a person works in, for those who belong to several. */
export const groupCookie = 'group';

export interface CurrentPerson extends SessionPerson {
  sessionId: string;
}

/** Who is signed in, in a group or not; null when nobody is. Read once per request. */
export const currentPerson = cache(async (): Promise<CurrentPerson | null> => {
  const session = await getServerSession(authOptions);
  if (!session?.sessionId) return null;
  const person = await findLiveSession(database(), session.sessionId);
  if (!person || (person.demo && !isDemoMode())) return null;
  return { ...person, sessionId: session.sessionId };
});

/** The groups of the person who is signed in, the one they work in now first. */
export const currentGroups = cache(async (): Promise<GroupOfPerson[]> => {
  const person = await currentPerson();
  if (!person) return [];
  const groups = await listGroupsOfPerson(database(), person.userId);
  const wanted = (await cookies()).get(groupCookie)?.value;
  return [...groups].sort((a, b) => Number(b.groupId === wanted) - Number(a.groupId === wanted));
});

/** The signed-in person in their current group; null when signed out or in no group. */
export const findActor = cache(async (): Promise<Actor | null> => {
  const person = await currentPerson();
  const group = (await currentGroups())[0];
  if (!person || !group) return null;
  return { userId: person.userId, name: person.name, email: person.email, ...group };
});

/** The signed-in person; sends others to the sign-in page and back. For pages. */
export async function requirePerson(): Promise<CurrentPerson> {
  const person = await currentPerson();
  if (person) return person;
  const here = returnPath((await headers()).get('x-path'));
  redirect(here === '/' ? '/sign-in' : `/sign-in?to=${encodeURIComponent(here)}`);
}

/** The actor; sends the signed out to sign in and a person without a group to their account. For pages. */
export async function requireActor(): Promise<Actor> {
  await requirePerson();
  const actor = await findActor();
  if (!actor) redirect('/settings/account');
  return actor;
}

/** The actor, if their role may do this; otherwise the page answers 403. For pages. */
export async function requirePermission(permission: Permission): Promise<Actor> {
  const actor = await requireActor();
  if (!can(actor.role, permission)) forbidden();
  return actor;
}
