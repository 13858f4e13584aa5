import 'server-only';
import { database } from '@/db/knex';
import { insertInvitation } from '@/db/repositories/invitations';
import { newAccessToken } from '@/lib/access/access-token';
import type { Actor } from '@/lib/access/actor';
import type { Role } from '@/lib/access/roles';
import { sendMail } from '@/lib/mail/send-mail';
import { invitationMail } from '@/lib/mail/templates/invitation-mail';
import { err, ok, type Result } from '@/lib/result';
import { siteUrl } from './site-url';

const daysValid = 7;

export interface InviteByMailProblem {
  code: 'already a member' | 'mail not sent';
  message: string;
}

/**
 * Stores an invitation and mails its link. The link is known to the mail alone, so a mail that could not be
 * handed over is reported, and the invitation waits to be sent again.
 */
export async function inviteByMail(
  actor: Actor,
  email: string,
  role: Role,
): Promise<Result<null, InviteByMailProblem>> {
  const { token, tokenHash } = newAccessToken();
  const expiresAt = new Date(Date.now() + daysValid * 24 * 3_600_000);
  const stored = await insertInvitation(database(), actor, { email, role, tokenHash, expiresAt });
  if (!stored.ok) return err({ code: stored.error, message: `${email} is already in the group.` });
  const href = siteUrl(`/invitation/${token}`);
  const mail = invitationMail({ groupName: actor.groupName, invitedBy: actor.name, role, href, daysValid });
  try {
    await sendMail({ to: email, ...mail });
  } catch (error) {
    console.error('The invitation mail was not sent:', error);
    return err({
      code: 'mail not sent',
      message: `The invitation of ${email} is kept, but the mail server did not take the mail. Send it again from the list below.`,
    });
  }
  return ok(null);
}
