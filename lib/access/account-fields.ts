import { z } from 'zod';

/** The fields of an account as people type them; the limits are those of the table `users` and `groups`. */
export const emailField = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, 'Use at most 254 characters.')
  .pipe(z.email('Write an e-mail address, such as name@university.example.'));

export const nameField = z
  .string()
  .trim()
  .min(1, 'Write the name that others of the group shall see.')
  .max(120, 'Use at most 120 characters.');

export const groupNameField = z
  .string()
  .trim()
  .min(1, 'Give the group a name.')
  .max(120, 'Use at most 120 characters.');
