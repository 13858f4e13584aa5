import { z } from 'zod';

/** "2.08", "2,08", "1.5e-3" with blanks around; a comma counts as the decimal sign. */
const decimalText = /^\s*[-+]?(\d+([.,]\d*)?|[.,]\d+)([eE][-+]?\d+)?\s*$/;

function toNumber(text: string): number | null {
  if (!decimalText.test(text)) return null;
  const value = Number(text.replace(',', '.'));
  return Number.isFinite(value) ? value : null;
}

/**
 * A form field with one number, decimal point or comma.
 * @param name - begins the message, for example "The temperature in kelvin"
 */
export function decimal(name: string) {
  return z.string().transform((text, context) => {
    const value = toNumber(text);
    if (value !== null) return value;
    context.addIssue({ code: 'custom', message: `${name} is a number, for example 2.08 or 2,08.` });
    return z.NEVER;
  });
}

/**
 * A form field with several numbers, one a line or separated by semicolons or blanks; blank lines do not count.
 * @param most - how many values are taken
 */
export function decimals(name: string, most: number) {
  return z.string().transform((text, context) => {
    const parts = text.split(/[\s;]+/).filter((part) => part !== '');
    const values = parts.map(toNumber);
    const bad = values.indexOf(null);
    const message =
      parts.length === 0
        ? `${name}: give at least one value, one a line.`
        : bad >= 0
          ? `${name}: value ${bad + 1} (“${(parts[bad] ?? '').slice(0, 20)}”) is no number.`
          : parts.length > most
            ? `${name}: at most ${most} values.`
            : null;
    if (message === null) return values as number[];
    context.addIssue({ code: 'custom', message });
    return z.NEVER;
  });
}
