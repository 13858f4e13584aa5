import { describe, expect, it } from 'vitest';
import { accessTokenHash, newAccessToken } from '@/lib/access/access-token';

describe('access tokens', () => {
  it('carry 256 bits in characters that an address keeps as they are', () => {
    const { token } = newAccessToken();
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    expect(encodeURIComponent(token)).toBe(token);
  });

  it('are never the same twice', () => {
    expect(new Set(Array.from({ length: 200 }, () => newAccessToken().token)).size).toBe(200);
  });

  it('are stored as SHA-256 in hex', () => {
    // FIPS 180-4 example: SHA-256("abc").
    expect(accessTokenHash('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
    const { token, tokenHash } = newAccessToken();
    expect(accessTokenHash(token)).toBe(tokenHash);
  });
});
