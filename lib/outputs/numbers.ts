const isDigit = (code: number) => code >= 48 && code <= 57;

/**
 * A printed number: "-382.30", "1.0D-01" (Fortran exponent), "  6.". Only the whole text counts.
 * @returns null for stars (overflow), inf, nan, blanks and anything else that is no finite number
 */
export function readNumber(text: string | undefined): number | null {
  if (text === undefined || text.length > 64) return null;
  // Number() takes more than a program prints ("0x1F", "Infinity", ""), so the characters are looked at first.
  let hasDigit = false;
  let fortranExponent = false;
  for (let i = 0; i < text.length; i++) {
    const code = text.charCodeAt(i);
    if (isDigit(code)) hasDigit = true;
    else if (code === 68 || code === 100)
      fortranExponent = true; // D, d
    else if (code !== 43 && code !== 45 && code !== 46 && code !== 69 && code !== 101 && code !== 32)
      return null;
  }
  if (!hasDigit) return null;
  const value = Number(fortranExponent ? text.replace(/[dD]/, 'e') : text);
  return Number.isFinite(value) ? value + 0 : null; // -0 is printed for small negative values; it is 0
}

/** A printed whole number, or null. */
export function readInteger(text: string | undefined): number | null {
  const trimmed = text?.trim();
  return trimmed !== undefined && /^[+-]?\d{1,15}$/.test(trimmed) ? Number(trimmed) : null;
}

/** The text after the first occurrence of a mark ("=", ":", "...."), or undefined when there is none. */
export function after(text: string, mark: string): string | undefined {
  const at = text.indexOf(mark);
  return at < 0 ? undefined : text.slice(at + mark.length);
}

/** The blank-separated words of a line. */
export function words(text: string): string[] {
  return text.match(/\S+/g) ?? [];
}

/** The first word of a text. */
function firstWord(text: string): string | undefined {
  return /\S+/.exec(text)?.[0];
}

/** The first number after a mark, where text may follow it: `numberAfter("E = -1.5 Eh", "=")` is −1.5. */
export function numberAfter(text: string, mark: string): number | null {
  const rest = after(text, mark);
  return rest === undefined ? null : readNumber(firstWord(rest));
}

/** The first whole number after a mark. */
export function integerAfter(text: string, mark: string): number | null {
  const rest = after(text, mark);
  return rest === undefined ? null : readInteger(firstWord(rest));
}

/** The whole number that is all that stands after a mark, as in "Charge    ....   -1". */
export function soleIntegerAfter(text: string, mark: string): number | null {
  return readInteger(after(text, mark));
}

/**
 * Numbers of a fixed-width row in which a value too wide leaves no blank before it ("-256.04273-255.9"):
 * a minus sign that follows a digit starts a new number. Exponents ("1.0E-05") stay whole.
 * @returns null in the places of stars and other text
 */
export function readNumbers(text: string): (number | null)[] {
  const apart = /\d-/.test(text) ? text.replace(/(\d)-(?=\d*\.)/g, '$1 -') : text;
  return words(apart).map((word) => readNumber(word));
}
