import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { firstStartLink } from '@/db/first-start-link';
import {
  createFirstGroup,
  findAccountForSignIn,
  findResetPerson,
  isFirstStartOpen,
  issuePasswordToken,
  resetPassword,
  setPassword,
} from '@/db/repositories/accounts';
import { listGroupsOfPerson } from '@/db/repositories/memberships';
import { findLiveSession, listSessions, startSession } from '@/db/repositories/sessions';
import { accessTokenHash, newAccessToken } from '@/lib/access/access-token';
import { givenPerson } from './support/account-rows';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

let database: AccountsDatabase;
let db: Knex;
const inHours = (hours: number) => new Date(Date.now() + hours * 3_600_000);

beforeAll(async () => {
  database = await createAccountsDatabase();
  db = database.app;
});
afterAll(() => database.drop());

describe('the first start', () => {
  const site = 'https://spins.university.example';
  const first = { groupName: 'Salts', name: 'Ada', email: 'first@group.example', passwordHash: 'a hash' };
  const hashOf = (link: string | null) =>
    accessTokenHash(new URL(link ?? '').pathname.split('/').at(-1) ?? '');

  it('lets one of two at once open the group, then shuts every link', async () => {
    await givenPerson(database.superuser, 'Demo', { demo: true }); // accounts of the demo do not count
    const links = [await firstStartLink(db, site), await firstStartLink(db, site)];
    expect(links[0]).toMatch(/^https:\/\/spins\.university\.example\/first-start\/[\w-]{43}$/);
    const hashes = links.map(hashOf);
    expect(await Promise.all(hashes.map((hash) => isFirstStartOpen(db, hash)))).toEqual([true, true]);

    const outcomes = await Promise.all([
      createFirstGroup(db, hashes[0] ?? '', first),
      createFirstGroup(db, hashes[0] ?? '', { ...first, email: 'second@group.example' }),
      createFirstGroup(db, hashes[1] ?? '', { ...first, email: 'third@group.example' }),
    ]);
    const opened = outcomes.filter((outcome) => outcome.ok);
    expect(opened).toHaveLength(1);
    expect(await listGroupsOfPerson(db, opened[0]?.value.userId ?? '')).toMatchObject([
      { groupName: 'Salts', role: 'PI' },
    ]);
    expect(await database.superuser('groups')).toHaveLength(1);
    expect(await Promise.all(hashes.map((hash) => isFirstStartOpen(db, hash)))).toEqual([false, false]);
    expect(await firstStartLink(db, site)).toBeNull();
  });

  it('cannot be had with a reset link, nor a reset with the link of the first start', async () => {
    const person = await givenPerson(database.superuser, 'Rune');
    const reset = newAccessToken().tokenHash;
    const start = newAccessToken().tokenHash;
    await issuePasswordToken(db, {
      tokenHash: reset,
      userId: person.userId,
      purpose: 'reset',
      expiresAt: inHours(1),
    });
    await issuePasswordToken(db, {
      tokenHash: start,
      userId: null,
      purpose: 'first PI',
      expiresAt: inHours(1),
    });
    expect(await isFirstStartOpen(db, reset)).toBe(false);
    expect(await findResetPerson(db, start)).toBeUndefined();
    expect(await resetPassword(db, start, 'new hash')).toEqual({ ok: false, error: 'link not valid' });
  });
});

describe('a reset link', () => {
  async function linkFor(userId: string, hours = 1): Promise<string> {
    const { tokenHash } = newAccessToken();
    await issuePasswordToken(db, { tokenHash, userId, purpose: 'reset', expiresAt: inHours(hours) });
    return tokenHash;
  }

  it('sets the password, ends every session and spends every other link of that person', async () => {
    const ada = await givenPerson(database.superuser, 'Ada', { passwordHash: 'old hash' });
    const session = await startSession(db, ada.userId, 'browser', inHours(8));
    const [link, other] = [await linkFor(ada.userId), await linkFor(ada.userId)];
    expect(await findResetPerson(db, link)).toEqual({ userId: ada.userId, email: ada.email });
    expect((await resetPassword(db, link, 'new hash')).ok).toBe(true);
    expect((await findAccountForSignIn(db, ada.email))?.passwordHash).toBe('new hash');
    expect(await findLiveSession(db, session)).toBeUndefined();
    expect(await findResetPerson(db, other)).toBeUndefined();
  });

  it('works for one of several uses at the same moment', async () => {
    const bertil = await givenPerson(database.superuser, 'Bertil');
    const link = await linkFor(bertil.userId);
    const outcomes = await Promise.all(
      ['one', 'two', 'three', 'four'].map(async (hash) => ({
        hash,
        ...(await resetPassword(db, link, hash)),
      })),
    );
    const winners = outcomes.filter(({ ok }) => ok);
    expect(winners).toHaveLength(1);
    expect((await findAccountForSignIn(db, bertil.email))?.passwordHash).toBe(winners[0]?.hash);
  });

  it('works no more once it has run out', async () => {
    const cleo = await givenPerson(database.superuser, 'Cleo', { passwordHash: 'old hash' });
    const link = await linkFor(cleo.userId, -1);
    expect(await findResetPerson(db, link)).toBeUndefined();
    expect(await resetPassword(db, link, 'new hash')).toEqual({ ok: false, error: 'link not valid' });
    expect((await findAccountForSignIn(db, cleo.email))?.passwordHash).toBe('old hash');
  });
});

describe('a session', () => {
  it('is live until it is over', async () => {
    const dora = await givenPerson(database.superuser, 'Dora');
    const live = await startSession(db, dora.userId, 'browser', inHours(8));
    const over = await startSession(db, dora.userId, 'browser', inHours(-1));
    expect(await findLiveSession(db, live)).toEqual({ ...dora, demo: false });
    expect(await findLiveSession(db, over)).toBeUndefined();
    expect((await listSessions(db, dora.userId)).map(({ id }) => id)).toEqual([live]);
  });

  it('from which the password was changed outlives the others', async () => {
    const eyvind = await givenPerson(database.superuser, 'Eyvind');
    const here = await startSession(db, eyvind.userId, 'here', inHours(8));
    const there = await startSession(db, eyvind.userId, 'there', inHours(8));
    await setPassword(db, eyvind.userId, 'new hash', here);
    expect(await findLiveSession(db, here)).toBeDefined();
    expect(await findLiveSession(db, there)).toBeUndefined();
  });
});
