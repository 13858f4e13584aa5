/** Crockford's base 32: no I, L, O or U, so that a key can be read aloud and typed again. */
const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

/**
 * A job key anywhere in a text: "SP" and eight base-32 characters, for example "SP7K2M9QXA". Letters and
 * digits only, so that it survives the title rules of every program (Gaussian forbids # ! - _ @ \ there).
 */
export const jobKeyPattern = /\bSP[0-9A-HJKMNP-TV-Z]{8}\b/;

/**
 * Job key from random bytes: seven random characters (35 bits) and a check character.
 * @param bytes - at least 7 random bytes; the lowest 5 bits of each are used
 * Errors: throws RangeError for fewer bytes (caller's bug).
 */
export function jobKey(bytes: Uint8Array): string {
  if (bytes.length < 7) throw new RangeError(`jobKey needs at least 7 bytes, got ${bytes.length}`);
  const body = Array.from(bytes.slice(0, 7), (byte) => alphabet[byte & 31] ?? '').join('');
  return `SP${body}${checkCharacter(body)}`;
}

/** Whether a text is a job key with the right check character. */
export function isJobKey(text: string): boolean {
  if (text.length !== 10 || !jobKeyPattern.test(text)) return false;
  return checkCharacter(text.slice(2, 9)) === text[9];
}

/** First valid job key in a text, upper case or not (NWChem writes some names in lower case); or null. */
export function findJobKey(text: string): string | null {
  for (const match of text.toUpperCase().matchAll(new RegExp(jobKeyPattern, 'g')))
    if (isJobKey(match[0])) return match[0];
  return null;
}

/**
 * Σ (2i + 1)·value mod 32. Odd weights are invertible modulo 32, so every single wrong character is
 * found; two neighbours exchanged are found unless their values differ by 16.
 */
function checkCharacter(body: string): string {
  let sum = 0;
  for (let index = 0; index < body.length; index++)
    sum += (2 * index + 1) * alphabet.indexOf(body[index] ?? '');
  return alphabet[sum % 32] ?? '';
}
