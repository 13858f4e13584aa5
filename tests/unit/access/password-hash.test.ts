import { describe, expect, it } from 'vitest';
import { hashPassword, isPassword } from '@/lib/access/password-hash';

describe('password hashes', () => {
  it('are Argon2id with 19 MiB and two passes (OWASP Password Storage Cheat Sheet)', async () => {
    expect(await hashPassword('green crystals on tuesday')).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it('have their own salt each', async () => {
    expect(await hashPassword('same words twice')).not.toBe(await hashPassword('same words twice'));
  });

  it('belong to one password, to the letter', async () => {
    const stored = await hashPassword('green crystals on tuesday');
    expect(await isPassword(stored, 'green crystals on tuesday')).toBe(true);
    expect(await isPassword(stored, 'Green crystals on tuesday')).toBe(false);
    expect(await isPassword(stored, '')).toBe(false);
  });

  it('never match where there is no account, not even the stand-in’s own words', async () => {
    expect(await isPassword(null, 'no account has this password')).toBe(false);
  });

  it('take about as long to refuse where there is no account', async () => {
    const stored = await hashPassword('green crystals on tuesday');
    const fastest = async (hash: string | null) => {
      const times: number[] = [];
      for (let i = 0; i < 5; i += 1) {
        const start = performance.now();
        await isPassword(hash, 'wrong words altogether');
        times.push(performance.now() - start);
      }
      return Math.min(...times);
    };
    const ratio = (await fastest(null)) / (await fastest(stored));
    // An answer without the hash would be some thousand times faster; a busy machine may well double a time.
    expect(ratio).toBeGreaterThan(0.3);
    expect(ratio).toBeLessThan(3);
  });
});
