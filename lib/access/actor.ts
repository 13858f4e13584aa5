import type { Role } from './roles';

/** Who is asking, in which group: the first thing every entry point finds out and every repository takes. */
export interface Actor {
  userId: string;
  name: string;
  email: string;
  groupId: string;
  groupName: string;
  role: Role;
}

/** The worker acting for a group: it has no person and may do only what reading an upload needs. */
export interface GroupActor {
  groupId: string;
  userId: null;
}

/** What a repository needs to know: whose rows these are, and who changes them. */
export type Tenant = Pick<Actor, 'groupId' | 'userId'> | GroupActor;
