import { describe, expect, it } from 'vitest';
import { passwordProblem } from '@/lib/access/password-rules';

const email = 'ada.lovering@group.example';

describe('passwordProblem', () => {
  it('takes a sentence, in any script', () => {
    expect(passwordProblem('green crystals on tuesday', email)).toBeNull();
    expect(passwordProblem('зелёные кристаллы', email)).toBeNull();
  });

  it('holds the bounds of the length, counted in characters and not in UTF-16 units', () => {
    expect(passwordProblem('ab3-ef6_hi9', email)).toBe('too short'); // 11
    expect(passwordProblem('ab3-ef6_hi9+', email)).toBeNull(); // 12
    expect(passwordProblem('🜁🜂🜃🜄🜅🜆', email)).toBe('too short'); // 6 characters, 12 units
    expect(passwordProblem(`${'abcdefghij'.repeat(19)}klmnopqrst`, email)).toBeNull(); // 200
    expect(passwordProblem(`${'abcdefghij'.repeat(20)}k`, email)).toBe('too long'); // 201
  });

  it('refuses the e-mail address and the name before its @, in any case', () => {
    expect(passwordProblem('Ada.Lovering@group.example', email)).toBe('is the e-mail');
    expect(passwordProblem('ADA.LOVERING', email)).toBe('is the e-mail');
  });

  it.each(['passwordpassword', 'Password1234!', '!!!letmeinplease', 'qwertyuiop123', 'Chemistry2026!'])(
    'refuses the common password %s, whatever signs stand at its ends',
    (password) => expect(passwordProblem(password, email)).toBe('common'),
  );

  it.each(['aaaaaaaaaaaaaaaa', 'abababababab', '123456789012', '987654321098', 'abcdefghijklmno'])(
    'refuses the run or repetition %s',
    (password) => expect(passwordProblem(password, email)).toBe('common'),
  );

  it('does not take a common word inside a longer sentence for a common password', () => {
    expect(passwordProblem('my chemistry set burnt down', email)).toBeNull();
  });
});
