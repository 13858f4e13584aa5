import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptInvitation,
  findInvitation,
  insertInvitation,
  listOpenInvitations,
  withdrawInvitation,
} from '@/db/repositories/invitations';
import { listGroupsOfPerson, listMembers } from '@/db/repositories/memberships';
import { newAccessToken } from '@/lib/access/access-token';
import type { Actor } from '@/lib/access/actor';
import type { Role } from '@/lib/access/roles';
import { givenGroup, givenMember, givenPerson } from './support/account-rows';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

let database: AccountsDatabase;
let db: Knex;
let ada: Actor;
let bertil: Actor;

beforeAll(async () => {
  database = await createAccountsDatabase();
  db = database.app;
  const salts = { id: await givenGroup(database.superuser, 'Salts'), name: 'Salts' };
  const oxides = { id: await givenGroup(database.superuser, 'Oxides'), name: 'Oxides' };
  ada = await givenMember(database.superuser, salts, await givenPerson(database.superuser, 'Ada'), 'PI');
  bertil = await givenMember(
    database.superuser,
    oxides,
    await givenPerson(database.superuser, 'Bertil'),
    'PI',
  );
});
afterAll(() => database.drop());

async function invited(email: string, role: Role = 'experimentalist', hours = 1): Promise<string> {
  const { tokenHash } = newAccessToken();
  const expiresAt = new Date(Date.now() + hours * 3_600_000);
  const stored = await insertInvitation(db, ada, { email, role, tokenHash, expiresAt });
  expect(stored.ok).toBe(true);
  return tokenHash;
}

const cleo = { name: 'Cleo', passwordHash: 'a hash' };

describe('an invitation', () => {
  it('shows its holder the group, the role and whether an account waits', async () => {
    const link = await invited('shown@group.example', 'guest');
    expect(await findInvitation(db, link)).toMatchObject({
      groupName: 'Salts',
      email: 'shown@group.example',
      role: 'guest',
      hasAccount: false,
    });
  });

  it('brings somebody new an account and the membership, and is then spent', async () => {
    const link = await invited('cleo@group.example');
    const joined = await acceptInvitation(db, link, cleo);
    if (!joined.ok) throw new Error(joined.error);
    expect(await listGroupsOfPerson(db, joined.value.userId)).toEqual([
      { groupId: ada.groupId, groupName: 'Salts', role: 'experimentalist' },
    ]);
    expect((await listMembers(db, ada)).map(({ name, role }) => [name, role])).toContainEqual([
      'Cleo',
      'experimentalist',
    ]);
    expect(await findInvitation(db, link)).toBeUndefined();
    expect(await acceptInvitation(db, link, cleo)).toEqual({ ok: false, error: 'link not valid' });
  });

  it('brings somebody with an account into a second group once they are signed in with that e-mail', async () => {
    const link = await invited(bertil.email, 'guest');
    expect((await findInvitation(db, link))?.hasAccount).toBe(true);
    expect(await acceptInvitation(db, link, cleo)).toEqual({ ok: false, error: 'account exists' });
    expect(await acceptInvitation(db, link, { userId: ada.userId, email: ada.email })).toEqual({
      ok: false,
      error: 'other e-mail',
    });
    const joined = await acceptInvitation(db, link, { userId: bertil.userId, email: bertil.email });
    expect(joined.ok).toBe(true);
    expect(await listGroupsOfPerson(db, bertil.userId)).toEqual([
      { groupId: bertil.groupId, groupName: 'Oxides', role: 'PI' },
      { groupId: ada.groupId, groupName: 'Salts', role: 'guest' },
    ]);
  });

  it('lets one in when its link is used twice at once', async () => {
    const link = await invited('dora@group.example');
    const dora = { name: 'Dora', passwordHash: 'a hash' };
    const outcomes = await Promise.all([1, 2, 3, 4].map(() => acceptInvitation(db, link, dora)));
    expect(outcomes.filter(({ ok }) => ok)).toHaveLength(1);
    const accounts = await database.superuser('users').where({ email: 'dora@group.example' });
    expect(accounts).toHaveLength(1);
  });

  it('works no more once it has run out', async () => {
    const link = await invited('late@group.example', 'guest', -1);
    expect(await findInvitation(db, link)).toBeUndefined();
    expect(await acceptInvitation(db, link, cleo)).toEqual({ ok: false, error: 'link not valid' });
  });

  it('works no more once it is withdrawn, which only its own group can do', async () => {
    const link = await invited('eyvind@group.example');
    const open = (await listOpenInvitations(db, ada)).find(({ email }) => email === 'eyvind@group.example');
    expect(await withdrawInvitation(db, bertil, open?.id ?? '')).toBeUndefined();
    expect(await findInvitation(db, link)).toBeDefined();
    expect(await withdrawInvitation(db, ada, open?.id ?? '')).toEqual({ email: 'eyvind@group.example' });
    expect(await acceptInvitation(db, link, cleo)).toEqual({ ok: false, error: 'link not valid' });
  });

  it('replaces an open one to the same address, whose link stops working', async () => {
    const first = await invited('twice@group.example', 'guest');
    const second = await invited('twice@group.example', 'experimentalist');
    expect(await findInvitation(db, first)).toBeUndefined();
    expect((await findInvitation(db, second))?.role).toBe('experimentalist');
    const open = (await listOpenInvitations(db, ada)).filter(({ email }) => email === 'twice@group.example');
    expect(open).toHaveLength(1);
  });

  it('is refused for somebody who is in the group already', async () => {
    const outcome = await insertInvitation(db, ada, {
      email: ada.email,
      role: 'guest',
      tokenHash: newAccessToken().tokenHash,
      expiresAt: new Date(Date.now() + 1000),
    });
    expect(outcome).toEqual({ ok: false, error: 'already a member' });
  });

  it('is kept in the group’s history from the inviting to the joining', async () => {
    const events = await database
      .superuser('events')
      .where({ group_id: ada.groupId })
      .orderBy('id')
      .select('kind', 'actor_id', 'after');
    expect(events).toContainEqual({
      kind: 'invited',
      actor_id: ada.userId,
      after: { email: 'cleo@group.example', role: 'experimentalist' },
    });
    const cleosAccount = await database.superuser('users').where({ email: 'cleo@group.example' }).first('id');
    expect(events).toContainEqual({
      kind: 'joined',
      actor_id: cleosAccount.id,
      after: { role: 'experimentalist' },
    });
  });
});
