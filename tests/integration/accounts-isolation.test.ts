import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { asPerson, asTenant, asTokenHolder } from '@/db/knex';
import { insertInvitation } from '@/db/repositories/invitations';
import { issuePasswordToken } from '@/db/repositories/accounts';
import { listSessions, revokeSession, startSession } from '@/db/repositories/sessions';
import type { Actor } from '@/lib/access/actor';
import { givenGroup, givenMember, givenPerson } from './support/account-rows';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

let database: AccountsDatabase;
let db: Knex;
let ada: Actor;
let bertil: Actor;
const later = () => new Date(Date.now() + 3_600_000);

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
  await insertInvitation(db, ada, {
    email: 'new@group.example',
    role: 'guest',
    tokenHash: 'hash of ada',
    expiresAt: later(),
  });
  await insertInvitation(db, bertil, {
    email: 'new@group.example',
    role: 'guest',
    tokenHash: 'hash of bertil',
    expiresAt: later(),
  });
});
afterAll(() => database.drop());

describe('the application’s role', () => {
  it('owns nothing and cannot step around row-level security', async () => {
    const { rows } = await db.raw(
      `select rolsuper, rolbypassrls, rolcreaterole, rolcreatedb,
              (select count(*)::int from pg_class where relowner = pg_roles.oid) as owned
       from pg_roles where rolname = current_user`,
    );
    expect(rows).toEqual([
      { rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false, owned: 0 },
    ]);
  });

  it('sees no row of any account table without a scope', async () => {
    for (const table of ['users', 'sessions', 'groups', 'memberships', 'invitations', 'events']) {
      const rows = await db(table).select(table === 'users' ? 'id' : db.raw('1'));
      expect(rows, table).toEqual([]);
    }
  });

  it('cannot read password hashes, password tokens or attempts at all', async () => {
    const refused = expect.objectContaining({ code: '42501' }); // insufficient_privilege
    await expect(asPerson(db, ada.userId, (trx) => trx('users').select('password_hash'))).rejects.toEqual(
      refused,
    );
    await expect(db('password_tokens').select()).rejects.toEqual(refused);
    await expect(db('attempts').select()).rejects.toEqual(refused);
  });

  it('cannot write accounts or start sessions past their functions', async () => {
    const refused = expect.objectContaining({ code: '42501' });
    await expect(
      asPerson(db, ada.userId, (trx) =>
        trx('users').where({ id: ada.userId }).update({ email: 'x@y.example' }),
      ),
    ).rejects.toEqual(refused);
    await expect(
      asPerson(db, ada.userId, (trx) => trx('sessions').insert({ user_id: ada.userId, expires_at: later() })),
    ).rejects.toEqual(refused);
  });
});

describe('a group', () => {
  it('sees its own name, members, invitations and history only', async () => {
    await asTenant(db, ada, async (trx) => {
      expect(await trx('groups').pluck('name')).toEqual(['Salts']);
      expect(await trx('memberships').pluck('user_id')).toEqual([ada.userId]);
      expect(await trx('invitations').pluck('token_hash')).toEqual(['hash of ada']);
      expect(await trx('users').pluck('name')).toEqual(['Ada']);
      expect(await trx('events').pluck('group_id')).toEqual([ada.groupId]);
    });
  });

  it('cannot change or delete rows of another group', async () => {
    await asTenant(db, ada, async (trx) => {
      expect(await trx('groups').where({ id: bertil.groupId }).update({ name: 'Mine' })).toBe(0);
      expect(await trx('memberships').where({ group_id: bertil.groupId }).update({ role: 'guest' })).toBe(0);
      expect(await trx('memberships').where({ group_id: bertil.groupId }).delete()).toBe(0);
      expect(
        await trx('invitations').where({ group_id: bertil.groupId }).update({ withdrawn_at: new Date() }),
      ).toBe(0);
    });
  });

  it.each(['memberships', 'invitations', 'events'])(
    'cannot write a row of %s into another group',
    async (table) => {
      const rows: Record<string, object> = {
        memberships: { group_id: bertil.groupId, user_id: ada.userId, role: 'PI' },
        invitations: {
          group_id: bertil.groupId,
          email: 'me@group.example',
          role: 'PI',
          token_hash: 'forged',
          invited_by: ada.userId,
          expires_at: later(),
        },
        events: { group_id: bertil.groupId, actor_id: ada.userId, subject: 'member', kind: 'joined' },
      };
      await expect(asTenant(db, ada, (trx) => trx(table).insert(rows[table] ?? {}))).rejects.toThrow(
        'violates row-level security policy',
      );
    },
  );

  it('cannot move its own membership into another group', async () => {
    await expect(
      asTenant(db, ada, (trx) =>
        trx('memberships').where({ user_id: ada.userId }).update({ group_id: bertil.groupId }),
      ),
    ).rejects.toThrow('violates row-level security policy');
  });
});

describe('a person', () => {
  it('sees their own memberships and group names, and may change neither outside the group', async () => {
    await asPerson(db, ada.userId, async (trx) => {
      expect(await trx('groups').pluck('name')).toEqual(['Salts']);
      expect(await trx('memberships').pluck('group_id')).toEqual([ada.groupId]);
      expect(await trx('memberships').where({ user_id: ada.userId }).update({ role: 'guest' })).toBe(0);
    });
  });

  it('sees and ends their own sessions only', async () => {
    const hers = await startSession(db, ada.userId, 'one', later());
    const his = await startSession(db, bertil.userId, 'two', later());
    expect((await listSessions(db, ada.userId)).map(({ id }) => id)).toEqual([hers]);
    expect(await revokeSession(db, ada.userId, his)).toBe(false);
    expect(await revokeSession(db, bertil.userId, his)).toBe(true);
  });
});

describe('the holder of an invitation', () => {
  it('sees that invitation and the name of its group, and changes nothing', async () => {
    await asTokenHolder(db, 'hash of ada', async (trx) => {
      expect(await trx('groups').pluck('name')).toEqual(['Salts']);
      expect(await trx('invitations').pluck('token_hash')).toEqual(['hash of ada']);
      expect(await trx('memberships').pluck('user_id')).toEqual([]);
      expect(await trx('invitations').update({ role: 'PI' })).toBe(0);
    });
  });

  it('sees nothing with a token of another kind', async () => {
    await issuePasswordToken(db, {
      tokenHash: 'reset of ada',
      userId: ada.userId,
      purpose: 'reset',
      expiresAt: later(),
    });
    await asTokenHolder(db, 'reset of ada', async (trx) => {
      expect(await trx('invitations').select('id')).toEqual([]);
      expect(await trx('groups').select('id')).toEqual([]);
      expect(await trx('users').select('id')).toEqual([]);
    });
  });
});
