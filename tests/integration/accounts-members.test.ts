import type { Knex } from 'knex';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { changeRole, listMembers, removeMember } from '@/db/repositories/memberships';
import type { Actor } from '@/lib/access/actor';
import { givenGroup, givenMember, givenPerson } from './support/account-rows';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

let database: AccountsDatabase;
let db: Knex;
let ada: Actor;
let bertil: Actor;
let outsider: Actor;
let round = 0;

beforeAll(async () => {
  database = await createAccountsDatabase();
  db = database.app;
});
afterAll(() => database.drop());

beforeEach(async () => {
  round += 1;
  const { superuser } = database;
  const salts = { id: await givenGroup(superuser, 'Salts'), name: 'Salts' };
  const oxides = { id: await givenGroup(superuser, 'Oxides'), name: 'Oxides' };
  ada = await givenMember(superuser, salts, await givenPerson(superuser, `Ada${round}`), 'PI');
  bertil = await givenMember(superuser, salts, await givenPerson(superuser, `Bertil${round}`), 'guest');
  outsider = await givenMember(superuser, oxides, await givenPerson(superuser, `Olle${round}`), 'PI');
});

const rolesNow = async () =>
  Object.fromEntries((await listMembers(db, ada)).map(({ userId, role }) => [userId, role]));

describe('the last PI of a group', () => {
  it('can neither be demoted nor removed', async () => {
    expect(await changeRole(db, ada, ada.userId, 'guest')).toEqual({ ok: false, error: 'last PI' });
    expect(await removeMember(db, ada, ada.userId)).toEqual({ ok: false, error: 'last PI' });
    expect((await rolesNow())[ada.userId]).toBe('PI');
  });

  it('may step down once there is another', async () => {
    expect((await changeRole(db, ada, bertil.userId, 'PI')).ok).toBe(true);
    expect(await changeRole(db, ada, ada.userId, 'guest')).toEqual({ ok: true, value: { changed: true } });
    expect(await rolesNow()).toEqual({ [ada.userId]: 'guest', [bertil.userId]: 'PI' });
  });

  it('remains when two PIs demote each other at the same moment', async () => {
    await changeRole(db, ada, bertil.userId, 'PI');
    const outcomes = await Promise.all([
      changeRole(db, ada, bertil.userId, 'guest'),
      changeRole(db, { ...bertil, role: 'PI' }, ada.userId, 'guest'),
    ]);
    expect(outcomes.filter(({ ok }) => ok)).toHaveLength(1);
    expect(Object.values(await rolesNow()).sort()).toEqual(['PI', 'guest']);
  });

  it('remains when one of two is removed while the other is demoted', async () => {
    await changeRole(db, ada, bertil.userId, 'PI');
    const outcomes = await Promise.all([
      removeMember(db, ada, bertil.userId),
      changeRole(db, { ...bertil, role: 'PI' }, ada.userId, 'guest'),
    ]);
    expect(outcomes.filter(({ ok }) => ok)).toHaveLength(1);
    expect(Object.values(await rolesNow())).toContain('PI');
  });
});

describe('a member', () => {
  it('of another group is out of reach', async () => {
    expect(await changeRole(db, ada, outsider.userId, 'guest')).toEqual({ ok: false, error: 'not a member' });
    expect(await removeMember(db, ada, outsider.userId)).toEqual({ ok: false, error: 'not a member' });
    expect(await listMembers(db, outsider)).toMatchObject([{ userId: outsider.userId, role: 'PI' }]);
  });

  it('keeps the account when removed, and the group keeps the history of both', async () => {
    await changeRole(db, ada, bertil.userId, 'experimentalist');
    expect(await removeMember(db, ada, bertil.userId)).toEqual({ ok: true, value: null });
    expect(await rolesNow()).toEqual({ [ada.userId]: 'PI' });
    expect(await database.superuser('users').where({ id: bertil.userId })).toHaveLength(1);
    const events = await database
      .superuser('events')
      .where({ group_id: ada.groupId, subject_id: bertil.userId })
      .orderBy('id')
      .select('kind', 'before', 'after', 'actor_id');
    expect(events).toEqual([
      {
        kind: 'role changed',
        before: { role: 'guest' },
        after: { role: 'experimentalist' },
        actor_id: ada.userId,
      },
      { kind: 'removed', before: { role: 'experimentalist' }, after: null, actor_id: ada.userId },
    ]);
  });

  it('given the role they have is left alone, without a line in the history', async () => {
    expect(await changeRole(db, ada, bertil.userId, 'guest')).toEqual({
      ok: true,
      value: { changed: false },
    });
    expect(await database.superuser('events').where({ group_id: ada.groupId })).toEqual([]);
  });
});
