const MINUS = '−';
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

const superscript = (n: number) =>
  (n < 0 ? '⁻' : '') + [...String(Math.abs(n))].map((digit) => superscripts[Number(digit)] ?? '').join('');

/** Fixed decimals with a true minus sign and no negative zero; `decimals` below 0 rounds to tens, hundreds … */
function fixed(value: number, decimals: number): string {
  const text =
    decimals >= 0
      ? Math.abs(value).toFixed(Math.min(decimals, 100))
      : (Math.round(Math.abs(value) / 10 ** -decimals) * 10 ** -decimals).toFixed(0);
  return value < 0 && Number(text) !== 0 ? MINUS + text : text;
}

/**
 * Decimal place of the last digit kept: two digits of u when they read 10 to 19, otherwise one
 * (the "rule of 19" of crystallographic practice). 9.6 rounds up to 10 and so keeps two.
 */
function lastDecimal(u: number): number {
  const exponent = Math.floor(Math.log10(u) + 1e-12);
  const twoDigits = Math.round((u / 10 ** exponent) * 10);
  return twoDigits <= 19 ? 1 - exponent : -exponent;
}

export interface UncertaintyFormat {
  /** brackets: 2.083(5); plus-minus: 4.87 ± 0.06 */
  style?: 'brackets' | 'plus-minus';
  /** Significant digits shown when no uncertainty is known */
  digitsWithoutUncertainty?: number;
}

/**
 * A value with its standard uncertainty in the trade's notation, never with more digits than the uncertainty
 * supports: u keeps two digits when they read 10 to 19 and one digit otherwise, and the value ends at the same
 * place. Very small and very large values are written with a power of ten.
 * @param value - finite number, any unit
 * @param u - standard uncertainty in the same unit; null when unknown (then few digits and no uncertainty shown)
 * Errors: throws RangeError for non-finite or negative u (caller's bug).
 * Source: GUM (JCGM 100:2008) 7.2.2 for the two forms; rule of 19: common practice of crystallographic journals.
 */
export function formatWithUncertainty(
  value: number,
  u: number | null,
  { style = 'brackets', digitsWithoutUncertainty = 3 }: UncertaintyFormat = {},
): string {
  if (!Number.isFinite(value)) throw new RangeError(`value must be finite, received ${value}`);
  if (u !== null && (!Number.isFinite(u) || u < 0))
    throw new RangeError(`u must be a number ≥ 0 or null, received ${u}`);
  const size = Math.max(Math.abs(value), u ?? 0);
  const exponent = size === 0 ? 0 : Math.floor(Math.log10(size) + 1e-12);
  if (size !== 0 && (exponent < -3 || exponent > 5)) {
    const scale = 10 ** exponent;
    const power = `×10${superscript(exponent)}`;
    const text = formatWithUncertainty(value / scale, u === null ? null : u / scale, {
      style,
      digitsWithoutUncertainty,
    });
    return style === 'plus-minus' && u !== null && u > 0 ? `(${text})${power}` : `${text}${power}`;
  }
  // A value without evidence on its spread, or taken as exact, shows a stated small number of digits.
  if (u === null || u === 0) return fixed(value, Math.max(0, digitsWithoutUncertainty - 1 - exponent));
  const decimals = lastDecimal(u);
  if (style === 'plus-minus') return `${fixed(value, decimals)} ± ${fixed(u, decimals)}`;
  const digits = decimals >= 0 ? Math.round(u * 10 ** decimals) : Number(fixed(u, decimals));
  return `${fixed(value, decimals)}(${digits})`;
}
