import { describe, expect, it } from 'vitest';
import { isOwnOrigin } from '@/lib/access/own-origin';

const site = 'https://spins.university.example/';
const from = (origin: string | null, host = 'inner:3000') =>
  new Headers({ host, ...(origin === null ? {} : { origin }) });

describe('isOwnOrigin', () => {
  it('lets reading requests come from anywhere', () => {
    for (const method of ['GET', 'HEAD', 'OPTIONS'])
      expect(isOwnOrigin(method, from('https://elsewhere.example'), site)).toBe(true);
  });

  it('lets a change come from the public address, or from the address that was asked for', () => {
    expect(isOwnOrigin('POST', from('https://spins.university.example'), site)).toBe(true);
    expect(isOwnOrigin('POST', from('http://127.0.0.1:3000', '127.0.0.1:3000'), site)).toBe(true);
  });

  it.each(['https://elsewhere.example', 'https://spins.university.example.elsewhere.example', 'null', null])(
    'refuses a change from %j',
    (origin) => {
      for (const method of ['POST', 'PUT', 'PATCH', 'DELETE'])
        expect(isOwnOrigin(method, from(origin), site)).toBe(false);
    },
  );
});
