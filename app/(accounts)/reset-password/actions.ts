'use server';
import { after } from 'next/server';
import { z } from 'zod';
import { readForm } from '@/app/_server/read-form';
import { sendResetLink } from '@/app/_server/send-reset-link';
import { doneForm, type FormState } from '@/components/accounts/form-state';
import { emailField } from '@/lib/access/account-fields';

const fields = z.object({ email: emailField });

/** Answers the same, and as fast, whether or not there is an account: the mail is written afterwards. */
export async function askForReset(_previous: FormState, form: FormData): Promise<FormState> {
  const read = readForm(fields, form);
  if (!read.ok) return read.error;
  const { email } = read.value;
  after(() => sendResetLink(email));
  return doneForm(
    `If ${email} has an account here, a mail with a link is on its way. It works for one hour.`,
  );
}
