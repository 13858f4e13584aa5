import type { Role } from './roles';

/**
 * What each role may do: the one table that every page, action, route and test reads.
 * "read" covers every page and download of the group's studies.
 */
export const permissions = {
  read: ['PI', 'computational chemist', 'experimentalist', 'guest'],
  'manage studies': ['PI', 'computational chemist', 'experimentalist'],
  'upload files': ['PI', 'computational chemist', 'experimentalist'],
  'retry reading': ['PI', 'computational chemist', 'experimentalist'],
  'match runs': ['PI', 'computational chemist'],
  'enter measurements': ['PI', 'experimentalist'],
  'propose assignments': ['PI', 'computational chemist', 'experimentalist'],
  'sign assignments': ['PI'],
  'manage members': ['PI'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof permissions;

/** Whether a role may do something. */
export function can(role: Role, permission: Permission): boolean {
  return (permissions[permission] as readonly Role[]).includes(role);
}
