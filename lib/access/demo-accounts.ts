import { z } from 'zod';
import accounts from './demo-accounts.json';
import { roleSchema, type Role } from './roles';

export interface DemoAccount {
  name: string;
  email: string;
  role: Role;
  password: string;
}

/**
 * The people of the invented group. Their passwords are no secret: the rows carry `demo`, and sign-in
 * refuses such rows outside demo mode. The seed creates them, the sign-in page and the launcher announce them;
 * the launcher reads the JSON file itself, for it runs before anything is built.
 */
export const demoAccounts: readonly DemoAccount[] = z
  .array(z.object({ name: z.string(), email: z.string(), role: roleSchema, password: z.string() }))
  .parse(accounts);
