import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { signInWithPassword } from '@/app/_server/sign-in-with-password';
import { closeDatabase } from '@/db/knex';
import { endSession, findLiveSession } from '@/db/repositories/sessions';
import { hashPassword } from '@/lib/access/password-hash';
import { givenPerson } from './support/account-rows';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

// The marker throws outside Next.js, by design.
vi.mock('server-only', () => ({}));

let database: AccountsDatabase;
const password = 'green crystals on tuesday';

beforeAll(async () => {
  database = await createAccountsDatabase();
  vi.stubEnv('DATABASE_URL', database.appUrl);
  const passwordHash = await hashPassword(password);
  await givenPerson(database.superuser, 'Ada', { passwordHash });
  await givenPerson(database.superuser, 'Bertil', { passwordHash });
  await givenPerson(database.superuser, 'Hanne', { passwordHash, demo: true });
  await givenPerson(database.superuser, 'Nopass');
});
afterAll(async () => {
  await closeDatabase();
  await database.drop();
  vi.unstubAllEnvs();
});
beforeEach(async () => {
  vi.stubEnv('SPINSTEAD_DEMO', '');
  await database.superuser('attempts').delete();
});

const wrong = { ok: false, error: 'wrong' };

describe('signing in', () => {
  it('opens a live session, whatever the case of the e-mail and the blanks around it', async () => {
    const outcome = await signInWithPassword('  ADA@group.example ', password, 'Browser/1.0');
    if (!outcome.ok) throw new Error(outcome.error);
    expect(await findLiveSession(database.app, outcome.value.sessionId)).toMatchObject({ name: 'Ada' });
  });

  it('opens a session that ends at once when it is revoked', async () => {
    const outcome = await signInWithPassword('ada@group.example', password, '');
    if (!outcome.ok) throw new Error(outcome.error);
    await endSession(database.app, outcome.value.sessionId);
    expect(await findLiveSession(database.app, outcome.value.sessionId)).toBeUndefined();
  });

  it('gives one answer to a wrong password, an unknown e-mail and an account without a password', async () => {
    expect(await signInWithPassword('ada@group.example', 'green crystals on monday', '')).toEqual(wrong);
    expect(await signInWithPassword('nobody@group.example', password, '')).toEqual(wrong);
    expect(await signInWithPassword('nopass@group.example', '', '')).toEqual(wrong);
    expect(await signInWithPassword('', '', '')).toEqual(wrong);
  });

  it('takes demo accounts in demo mode and never outside it', async () => {
    expect(await signInWithPassword('hanne@group.example', password, '')).toEqual(wrong);
    vi.stubEnv('SPINSTEAD_DEMO', '1');
    expect((await signInWithPassword('hanne@group.example', password, '')).ok).toBe(true);
  });

  it('stops after ten failures in a row, for known and unknown e-mails alike, even when all come at once', async () => {
    for (const email of ['bertil@group.example', 'nobody@group.example']) {
      const outcomes = await Promise.all(
        Array.from({ length: 13 }, () => signInWithPassword(email, 'not this one at all', '')),
      );
      const codes = outcomes.map((outcome) => (outcome.ok ? 'in' : outcome.error));
      expect(codes.filter((code) => code === 'wrong')).toHaveLength(10);
      expect(codes.filter((code) => code === 'too many attempts')).toHaveLength(3);
    }
    expect(await signInWithPassword('bertil@group.example', password, '')).toEqual({
      ok: false,
      error: 'too many attempts',
    });
    expect((await signInWithPassword('ada@group.example', password, '')).ok).toBe(true);
  });

  it('counts failures anew after a success and after the window', async () => {
    for (let i = 0; i < 9; i += 1) await signInWithPassword('ada@group.example', 'not this one', '');
    expect((await signInWithPassword('ada@group.example', password, '')).ok).toBe(true);
    for (let i = 0; i < 10; i += 1) await signInWithPassword('ada@group.example', 'not this one', '');
    await database.superuser('attempts').update({ window_ends_at: new Date(Date.now() - 1000) });
    expect((await signInWithPassword('ada@group.example', password, '')).ok).toBe(true);
  });
});
