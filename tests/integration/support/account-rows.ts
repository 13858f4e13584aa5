import type { Knex } from 'knex';
import type { Actor } from '@/lib/access/actor';
import type { Role } from '@/lib/access/roles';

/** Puts a group into the database, past every policy. */
export async function givenGroup(superuser: Knex, name: string): Promise<string> {
  const [row] = await superuser('groups').insert({ name }).returning<{ id: string }[]>('id');
  if (!row) throw new Error('no group');
  return row.id;
}

/** Puts a person into the database, past every policy. */
export async function givenPerson(
  superuser: Knex,
  name: string,
  more: { passwordHash?: string; demo?: boolean } = {},
): Promise<{ userId: string; name: string; email: string }> {
  const email = `${name.toLowerCase()}@group.example`;
  const [row] = await superuser('users')
    .insert({ name, email, password_hash: more.passwordHash ?? null, demo: more.demo ?? false })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('no person');
  return { userId: row.id, name, email };
}

/** Puts a person into a group and returns them as the actor there. */
export async function givenMember(
  superuser: Knex,
  group: { id: string; name: string },
  person: { userId: string; name: string; email: string },
  role: Role,
): Promise<Actor> {
  await superuser('memberships').insert({ group_id: group.id, user_id: person.userId, role });
  return { ...person, groupId: group.id, groupName: group.name, role };
}
