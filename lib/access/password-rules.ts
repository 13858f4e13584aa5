import { commonPasswords } from './common-passwords';

export const shortestPassword = 12;
export const longestPassword = 200;

export type PasswordProblem = 'too short' | 'too long' | 'common' | 'is the e-mail';

/** What each problem is called beside the field. */
export const passwordProblemText: Record<PasswordProblem, string> = {
  'too short': `Use at least ${shortestPassword} characters. A sentence is easier to keep than a riddle.`,
  'too long': `Use at most ${longestPassword} characters.`,
  common: 'This one is among the first that guessers try. Choose another.',
  'is the e-mail': 'The password must not be the e-mail address or the name before its @.',
};

/**
 * The first rule that a password breaks. Length and a list of common ones, and no rule about kinds of
 * characters (NIST SP 800-63B, section 3.1.1.2; the list is common practice).
 * @returns null when the password may be used
 */
export function passwordProblem(password: string, email: string): PasswordProblem | null {
  const characters = [...password].length;
  if (characters < shortestPassword) return 'too short';
  if (characters > longestPassword) return 'too long';
  const plain = password.trim().toLowerCase();
  const address = email.trim().toLowerCase();
  if (plain === address || plain === address.split('@')[0]) return 'is the e-mail';
  // Digits and signs at the ends do not make a common word a good one.
  const core = plain.replace(/^[^\p{L}]+|[^\p{L}]+$/gu, '');
  if (new Set(plain).size < 5 || isRun(plain) || commonPasswords.has(core)) return 'common';
  return null;
}

/** Whether each character follows the one before it, upwards or downwards: 0123456789012, abcdefghijkl. */
function isRun(text: string): boolean {
  const digits = /^\d+$/.test(text);
  const codes = [...text].map((character) => character.codePointAt(0) ?? 0);
  return [1, -1].some((step) =>
    codes.every((code, index) => {
      if (index === 0) return true;
      const difference = code - (codes[index - 1] ?? 0);
      return difference === step || (digits && difference === -9 * step);
    }),
  );
}
