import { describe, expect, it } from 'vitest';
import { can, permissions, type Permission } from '@/lib/access/permissions';
import { roles } from '@/lib/access/roles';

/** Written out again from what each role is for, in the order PI, computational chemist, experimentalist, guest. */
const expected: Record<Permission, [boolean, boolean, boolean, boolean]> = {
  read: [true, true, true, true],
  'manage studies': [true, true, true, false],
  'upload files': [true, true, true, false],
  'retry reading': [true, true, true, false],
  'match runs': [true, true, false, false],
  'enter measurements': [true, false, true, false],
  'propose assignments': [true, true, true, false],
  'sign assignments': [true, false, false, false],
  'manage members': [true, false, false, false],
};

describe('permissions', () => {
  it.each(Object.entries(expected))('give "%s" to the roles that need it and no other', (permission, row) => {
    expect(roles.map((role) => can(role, permission as Permission))).toEqual(row);
  });

  it('leave a guest nothing but reading', () => {
    const granted = (Object.keys(permissions) as Permission[]).filter((each) => can('guest', each));
    expect(granted).toEqual(['read']);
  });

  it('leave nothing to nobody: a PI may do everything', () => {
    for (const permission of Object.keys(permissions) as Permission[])
      expect(can('PI', permission)).toBe(true);
  });
});
