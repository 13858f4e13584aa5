import { letter, type MailText } from './mail-layout';

interface ResetMail {
  name: string;
  href: string;
  minutesValid: number;
}

export function resetMail({ name, href, minutesValid }: ResetMail): MailText {
  return letter({
    subject: 'A new password for Spinstead',
    before: [
      `${name}, somebody asked for a new password for this address.`,
      'If it was you, choose one here:',
    ],
    link: { href, label: 'Choose a new password' },
    after: [
      `The link works once and for ${minutesValid} minutes. If it was not you, leave it: the old password stays.`,
    ],
  });
}
