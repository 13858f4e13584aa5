import { describe, expect, it } from 'vitest';
import { findJobKey, isJobKey, jobKey, jobKeyPattern } from '@/lib/planning/job-key';

const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

describe('a job key', () => {
  it('has SP and eight characters of Crockford’s alphabet, for any bytes', () => {
    for (let seed = 0; seed < 256; seed++) {
      const key = jobKey(new Uint8Array(7).map((_, index) => (seed * 31 + index * 17) & 255));
      expect(key).toMatch(/^SP[0-9A-HJKMNP-TV-Z]{8}$/);
      expect(isJobKey(key)).toBe(true);
    }
  });

  it('betrays every single wrong character', () => {
    const key = jobKey(new Uint8Array([3, 141, 59, 26, 53, 58, 97]));
    for (let at = 2; at < 10; at++)
      for (const other of alphabet)
        if (other !== key[at]) expect(isJobKey(key.slice(0, at) + other + key.slice(at + 1))).toBe(false);
  });

  it('is found in a title, a path and lower case, and not inside a longer word', () => {
    expect(findJobKey('title "SP1234567W FeCl4"')).toBe('SP1234567W');
    expect(findJobKey('./sp1234567w.movecs')).toBe('SP1234567W');
    expect(findJobKey('XSP1234567W')).toBeNull();
    expect(findJobKey('SP1234567W2')).toBeNull();
    expect(findJobKey('SP1234567X then SP1234567W')).toBe('SP1234567W');
    expect(jobKeyPattern.test('SP1234567W')).toBe(true);
  });

  it('needs seven bytes', () => {
    expect(() => jobKey(new Uint8Array(6))).toThrow(RangeError);
  });
});
