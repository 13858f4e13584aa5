import { randomUUID } from 'node:crypto';
import type { Knex } from 'knex';
import { asPerson, asTenant } from '@/db/knex';
import { insertMemberEvent } from '@/db/repositories/member-events';
import { err, ok, type Result } from '@/lib/result';

/** What sign-in needs to know of an account. */
export interface SignInAccount {
  userId: string;
  name: string;
  email: string;
  passwordHash: string | null;
  demo: boolean;
}

export type PasswordTokenPurpose = 'reset' | 'first PI';

/** A link that is spent, too old or was never issued: one answer for all three. */
export type TokenProblem = 'link not valid';

export async function findAccountForSignIn(db: Knex, email: string): Promise<SignInAccount | undefined> {
  const { rows } = await db.raw<{ rows: SignInRow[] }>('select * from account_for_sign_in(?)', [email]);
  return rows[0] && toSignInAccount(rows[0]);
}

/** Whether anybody outside the demo has an account. */
export async function accountExists(db: Knex): Promise<boolean> {
  const { rows } = await db.raw<{ rows: { account_exists: boolean }[] }>('select account_exists()');
  return rows[0]?.account_exists ?? false;
}

/** Counts one more attempt at something; returns how many the current window holds. */
export async function countAttempt(db: Knex, key: string, windowSeconds: number): Promise<number> {
  const { rows } = await db.raw<{ rows: { count_attempt: number }[] }>('select count_attempt(?, ?)', [
    key,
    windowSeconds,
  ]);
  return rows[0]?.count_attempt ?? 0;
}

export async function forgetAttempts(db: Knex, key: string): Promise<void> {
  await db.raw('select forget_attempts(?)', [key]);
}

export async function issuePasswordToken(
  db: Knex,
  token: { tokenHash: string; userId: string | null; purpose: PasswordTokenPurpose; expiresAt: Date },
): Promise<void> {
  await db.raw('select issue_password_token(?, ?, ?, ?)', [
    token.tokenHash,
    token.userId,
    token.purpose,
    token.expiresAt,
  ]);
}

/** Whether the link of the first start would still work; does not spend it. */
export async function isFirstStartOpen(db: Knex, tokenHash: string): Promise<boolean> {
  const token = await findToken(db, tokenHash);
  return token?.purpose === 'first PI' && !(await accountExists(db));
}

/** Whose password a reset link would set; undefined when it no longer works. Does not spend it. */
export async function findResetPerson(
  db: Knex,
  tokenHash: string,
): Promise<{ userId: string; email: string } | undefined> {
  const token = await findToken(db, tokenHash);
  if (token?.purpose !== 'reset' || !token.user_id) return undefined;
  const userId = token.user_id;
  return asPerson(db, userId, (trx) =>
    trx('users')
      .where({ id: userId })
      .first<{ userId: string; email: string }>({ userId: 'id', email: 'email' }),
  );
}

/** Sets a new password and ends the person's other sessions. */
export async function setPassword(
  db: Knex,
  userId: string,
  passwordHash: string,
  keptSessionId: string | null,
): Promise<void> {
  await db.raw('select set_password(?, ?, ?)', [userId, passwordHash, keptSessionId]);
}

/** Spends a reset link and sets the password, or does neither. */
export function resetPassword(
  db: Knex,
  tokenHash: string,
  passwordHash: string,
): Promise<Result<{ userId: string }, TokenProblem>> {
  return db.transaction(async (trx) => {
    const row = await spendToken(trx, tokenHash, 'reset');
    if (!row?.user_id) return err('link not valid' as const);
    await setPassword(trx, row.user_id, passwordHash, null);
    return ok({ userId: row.user_id });
  });
}

/** Spends the link of the first start and creates the first group with its PI, or does neither. */
export async function createFirstGroup(
  db: Knex,
  tokenHash: string,
  first: { groupName: string; name: string; email: string; passwordHash: string },
): Promise<Result<{ userId: string; groupId: string }, TokenProblem | 'e-mail taken'>> {
  // The accounts of an earlier demo stay in the table.
  if (await findAccountForSignIn(db, first.email)) return err('e-mail taken');
  const groupId = randomUUID();
  return asTenant(db, { groupId, userId: null }, async (trx) => {
    // Two links may be open after two starts; the first one used shuts the door behind it.
    await trx.raw(`select pg_advisory_xact_lock(hashtext('first PI'))`);
    if (await accountExists(trx)) return err('link not valid' as const);
    if (!(await spendToken(trx, tokenHash, 'first PI'))) return err('link not valid' as const);
    const userId = await createAccount(trx, first);
    await trx('groups').insert({ id: groupId, name: first.groupName });
    await trx('memberships').insert({ group_id: groupId, user_id: userId, role: 'PI' });
    await insertMemberEvent(trx, { groupId, actorId: userId, userId, kind: 'joined', after: { role: 'PI' } });
    return ok({ userId, groupId });
  });
}

/** Creates an account inside a transaction that also gives it its place. */
export async function createAccount(
  trx: Knex.Transaction,
  account: { email: string; name: string; passwordHash: string; demo?: boolean },
): Promise<string> {
  const { rows } = await trx.raw<{ rows: { create_account: string }[] }>(
    'select create_account(?, ?, ?, ?)',
    [account.email, account.name, account.passwordHash, account.demo ?? false],
  );
  const userId = rows[0]?.create_account;
  if (!userId) throw new Error('create_account returned no id.');
  return userId;
}

async function findToken(db: Knex, tokenHash: string): Promise<TokenRow | undefined> {
  const { rows } = await db.raw<{ rows: TokenRow[] }>('select * from find_password_token(?)', [tokenHash]);
  return rows[0];
}

/** Of two at once, one gets the row and the other none. */
async function spendToken(
  trx: Knex.Transaction,
  tokenHash: string,
  purpose: PasswordTokenPurpose,
): Promise<TokenRow | undefined> {
  if ((await findToken(trx, tokenHash))?.purpose !== purpose) return undefined;
  const { rows } = await trx.raw<{ rows: TokenRow[] }>('select * from use_password_token(?)', [tokenHash]);
  return rows[0];
}

interface TokenRow {
  user_id: string | null;
  purpose: PasswordTokenPurpose;
}

interface SignInRow {
  id: string;
  name: string;
  email: string;
  password_hash: string | null;
  demo: boolean;
}

function toSignInAccount(row: SignInRow): SignInAccount {
  return {
    userId: row.id,
    name: row.name,
    email: row.email,
    passwordHash: row.password_hash,
    demo: row.demo,
  };
}
