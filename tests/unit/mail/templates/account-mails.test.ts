import { describe, expect, it } from 'vitest';
import { invitationMail } from '@/lib/mail/templates/invitation-mail';
import { resetMail } from '@/lib/mail/templates/reset-mail';

const href = 'https://spins.university.example/invitation/abc?a=1&b=2';

describe('account mails', () => {
  const invitation = invitationMail({
    groupName: 'Salts & <b>Sons</b>',
    invitedBy: 'Ada "Spin" Lovering',
    role: 'experimentalist',
    href,
    daysValid: 7,
  });

  it('say in both forms who invites, to what, as what, where and for how long', () => {
    for (const words of ['experimentalist', '7 days']) {
      expect(invitation.text).toContain(words);
      expect(invitation.html).toContain(words);
    }
    expect(invitation.text).toContain('Ada "Spin" Lovering invites you to the group Salts & <b>Sons</b>');
    expect(invitation.text.split('\n')).toContain(href);
  });

  it('let nothing that people wrote become markup', () => {
    expect(invitation.html).toContain('Salts &amp; &lt;b&gt;Sons&lt;/b&gt;');
    expect(invitation.html).not.toContain('<b>');
    expect(invitation.html).toContain('href="https://spins.university.example/invitation/abc?a=1&amp;b=2"');
  });

  it('fetch nothing when they are opened', () => {
    expect(invitation.html).not.toMatch(/<(img|link|script|iframe)|url\(/i);
  });

  it('tell the owner of an account what to do when it was somebody else', () => {
    const reset = resetMail({ name: 'Ada Lovering', href, minutesValid: 60 });
    expect(reset.text).toContain('the old password stays');
    expect(reset.html).toContain('60 minutes');
  });
});
