import 'server-only';
import { database } from '@/db/knex';
import { countAttempt, findAccountForSignIn, issuePasswordToken } from '@/db/repositories/accounts';
import { newAccessToken } from '@/lib/access/access-token';
import { isDemoMode } from '@/lib/access/demo-mode';
import { sendMail } from '@/lib/mail/send-mail';
import { resetMail } from '@/lib/mail/templates/reset-mail';
import { siteUrl } from './site-url';

const minutesValid = 60;
/** More than this many mails in an hour to one address would only be somebody's joke on its owner. */
const mailsAnHour = 5;

/** Mails a one-time link to the owner of an account; does nothing when there is none. */
export async function sendResetLink(email: string): Promise<void> {
  const db = database();
  if ((await countAttempt(db, `reset ${email}`, 3600)) > mailsAnHour) return;
  const account = await findAccountForSignIn(db, email);
  if (!account || (account.demo && !isDemoMode())) return;
  const { token, tokenHash } = newAccessToken();
  const expiresAt = new Date(Date.now() + minutesValid * 60_000);
  await issuePasswordToken(db, { tokenHash, userId: account.userId, purpose: 'reset', expiresAt });
  const href = siteUrl(`/reset-password/${token}`);
  await sendMail({ to: account.email, ...resetMail({ name: account.name, href, minutesValid }) });
}
