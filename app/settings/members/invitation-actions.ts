'use server';
import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { authoriseAction } from '@/app/_server/authorise-action';
import { inviteByMail } from '@/app/_server/invite-by-mail';
import { readForm } from '@/app/_server/read-form';
import { doneForm, failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { database } from '@/db/knex';
import { listOpenInvitations, withdrawInvitation } from '@/db/repositories/invitations';
import { emailField } from '@/lib/access/account-fields';
import { roleSchema } from '@/lib/access/roles';

const inviteFields = z.object({ email: emailField, role: roleSchema });
const invitationFields = z.object({ invitationId: z.uuid() });

const gone = failedForm('This invitation was accepted or withdrawn in the meantime. Load the page again.');

export async function invite(_previous: FormState, form: FormData): Promise<FormState> {
  const access = await authoriseAction('manage members');
  if (!access.ok) return failedForm(access.error.message, typedValues(form));
  const read = readForm(inviteFields, form);
  if (!read.ok) return read.error;
  const invited = await inviteByMail(access.value, read.value.email, read.value.role);
  revalidatePath('/settings/members');
  if (!invited.ok) return failedForm(invited.error.message, typedValues(form));
  return doneForm(`An invitation is on its way to ${read.value.email}.`);
}

/** A fresh link to the same address with the same role; the old link stops working. */
export async function sendAgain(_previous: FormState, form: FormData): Promise<FormState> {
  const access = await authoriseAction('manage members');
  if (!access.ok) return failedForm(access.error.message);
  const read = readForm(invitationFields, form);
  if (!read.ok) return read.error;
  const open = await listOpenInvitations(database(), access.value);
  const invitation = open.find(({ id }) => id === read.value.invitationId);
  if (!invitation) return gone;
  const invited = await inviteByMail(access.value, invitation.email, invitation.role);
  revalidatePath('/settings/members');
  return invited.ok ? doneForm(`Sent again to ${invitation.email}.`) : failedForm(invited.error.message);
}

export async function withdraw(_previous: FormState, form: FormData): Promise<FormState> {
  const access = await authoriseAction('manage members');
  if (!access.ok) return failedForm(access.error.message);
  const read = readForm(invitationFields, form);
  if (!read.ok) return read.error;
  const withdrawn = await withdrawInvitation(database(), access.value, read.value.invitationId);
  if (!withdrawn) return gone;
  revalidatePath('/settings/members');
  return doneForm(`The invitation of ${withdrawn.email} is withdrawn; its link no longer works.`);
}
