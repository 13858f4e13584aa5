import 'server-only';
import type { Actor } from '@/lib/access/actor';
import { can, type Permission } from '@/lib/access/permissions';
import { err, ok, type Result } from '@/lib/result';
import { findActor } from './actor';

/** Why a change was not made before it was even looked at. */
export interface AccessProblem {
  code: 'signed out' | 'not allowed';
  message: string;
}

/** The actor, if they may do this. For server actions, which answer instead of sending elsewhere. */
export async function authoriseAction(permission: Permission): Promise<Result<Actor, AccessProblem>> {
  const actor = await findActor();
  if (!actor) return err(signedOut);
  return can(actor.role, permission) ? ok(actor) : err(notAllowed(actor, permission));
}

export const signedOut: AccessProblem = {
  code: 'signed out',
  message:
    'You are signed out. Sign in again in another tab, then send this once more; nothing typed is lost.',
};

export function notAllowed(actor: Actor, permission: Permission): AccessProblem {
  return {
    code: 'not allowed',
    message: `As ${actor.role} of ${actor.groupName} you may not ${permission}.`,
  };
}
