import { describe, expect, it } from 'vitest';
import { returnPath } from '@/lib/access/return-path';

describe('returnPath', () => {
  it.each(['/', '/studies/7?tab=runs#row-3', '/invitation/abc_D-1'])('keeps the path %s', (path) => {
    expect(returnPath(path)).toBe(path);
  });

  it.each([
    'https://elsewhere.example/',
    '//elsewhere.example/',
    '/\\elsewhere.example',
    '/\t/elsewhere.example',
    'javascript:alert(1)',
    'studies',
    '',
    null,
    undefined,
  ])('does not follow %j', (wanted) => {
    expect(returnPath(wanted)).toBe('/');
  });

  it('cannot be talked out of the site by dots', () => {
    expect(returnPath('/..//elsewhere.example')).toBe('/');
    expect(returnPath('/.//elsewhere.example')).toBe('/');
  });
});
