import { createHash, randomBytes } from 'node:crypto';

/** A secret that a link carries, and the only form of it that is stored. */
export interface AccessToken {
  token: string;
  tokenHash: string;
}

/** A new token of 256 random bits, safe in an address. */
export function newAccessToken(): AccessToken {
  const token = randomBytes(32).toString('base64url');
  return { token, tokenHash: accessTokenHash(token) };
}

/** SHA-256 in hex. Slow hashing would add nothing: the token has no less entropy than the hash. */
export function accessTokenHash(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
