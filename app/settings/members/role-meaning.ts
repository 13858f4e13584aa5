import type { Role } from '@/lib/access/roles';

/** What each role is for, in one line; the exact rights are the table in lib/access/permissions. */
export const roleMeaning: Record<Role, string> = {
  PI: 'May do everything: invites people, gives roles, settles disagreements, signs assignments.',
  'computational chemist': 'Plans calculations, uploads outputs and matches runs; may propose assignments.',
  experimentalist: 'Enters measurements and uploads files; may propose assignments.',
  guest: 'Reads; changes nothing.',
};
