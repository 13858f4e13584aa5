import { z } from 'zod';

/** The four roles of a member in a group. */
export const roleSchema = z.enum(['PI', 'computational chemist', 'experimentalist', 'guest']);
export type Role = z.infer<typeof roleSchema>;
export const roles = roleSchema.options;
