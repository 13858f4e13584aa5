'use server';
import { redirect } from 'next/navigation';
import { database } from '@/db/knex';
import { endSession } from '@/db/repositories/sessions';
import { currentGroups, currentPerson } from './actor';
import { takeSessionCookie } from './browser-session';
import { rememberGroup } from './remember-group';

/** Ends this browser's session. */
export async function signOut(): Promise<void> {
  const person = await currentPerson();
  if (person) await endSession(database(), person.sessionId);
  await takeSessionCookie();
  redirect('/sign-in?notice=signed-out');
}

/** Makes another of the person's groups the one they work in; ignores a group they do not belong to. */
export async function switchGroup(form: FormData): Promise<void> {
  const wanted = (await currentGroups()).find(({ groupId }) => groupId === form.get('group'));
  if (wanted) await rememberGroup(wanted.groupId);
  redirect('/');
}
