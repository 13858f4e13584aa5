/**
 * A job key: the letters SP and eight characters of Crockford's base 32 in capitals (no I, L, O, U),
 * for example SP4F7KQ2MX. Planning writes it into the title line of a deck; readers find it again in title,
 * comment or echoed input. Source of the alphabet: D. Crockford, "Base 32", https://www.crockford.com/base32.html.
 */
export const jobKeyPattern = /\bSP[0-9A-HJKMNP-TV-Z]{8}\b/;

/** The first job key in a text, or null. */
export function findJobKey(text: string): string | null {
  return jobKeyPattern.exec(text)?.[0] ?? null;
}
