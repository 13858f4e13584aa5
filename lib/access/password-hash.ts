import { hash, verify } from '@node-rs/argon2';

/** Argon2id (the library's default kind), 19 MiB, two passes: OWASP Password Storage Cheat Sheet; about 65 ms a hash. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** Verified in place of the hash of an account that does not exist, so that both answers take as long. */
const nobodysHash = hash('no account has this password', cost);

/** The text to store for a password: algorithm, cost, salt and hash in PHC form. */
export function hashPassword(password: string): Promise<string> {
  return hash(password, cost);
}

/**
 * Whether a password belongs to a stored hash. Does the same work when there is no hash.
 * @param passwordHash - as stored; null when the account is unknown or has no password
 */
export async function isPassword(passwordHash: string | null, password: string): Promise<boolean> {
  const standIn = await nobodysHash;
  const matches = await verify(passwordHash ?? standIn, password);
  return passwordHash !== null && matches;
}
