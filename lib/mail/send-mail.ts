import { createTransport } from 'nodemailer';

export interface Mail {
  to: string;
  subject: string;
  text: string;
  html: string;
}

/** Hands a mail to the SMTP server of the environment (SMTP_URL); throws when it does not take it. */
export async function sendMail(mail: Mail): Promise<void> {
  const url = process.env.SMTP_URL;
  if (!url) throw new Error('SMTP_URL is not set: give the address of the mail server.');
  const transport = createTransport(url);
  try {
    await transport.sendMail({ from: process.env.MAIL_FROM ?? 'Spinstead <spinstead@localhost>', ...mail });
  } finally {
    transport.close();
  }
}
