import type { Role } from '@/lib/access/roles';
import { letter, type MailText } from './mail-layout';

interface InvitationMail {
  groupName: string;
  invitedBy: string;
  role: Role;
  href: string;
  daysValid: number;
}

export function invitationMail({ groupName, invitedBy, role, href, daysValid }: InvitationMail): MailText {
  return letter({
    subject: `Invitation to ${groupName}`,
    before: [
      `${invitedBy} invites you to the group ${groupName} on Spinstead, where calculated spin states stand beside measured moments.`,
      `Your role there: ${role}.`,
    ],
    link: { href, label: 'See the invitation' },
    after: [
      `The link works once and for ${daysValid} days. If you do not know what this is about, leave it: nothing happens.`,
    ],
  });
}
