import { formatNumber } from './format-number';

export type UncertaintyNotation = 'plus-minus' | 'parentheses';

export interface UncertainText {
  value: string;
  /** "0.06" after ±, "5" between parentheses; null when none is claimed. */
  uncertainty: string | null;
}

/**
 * How many decimals an uncertainty earns: its three leading digits 100–354 keep two significant digits,
 * 355–949 one, 950–999 round up to the next power of ten and keep two.
 * Source: Particle Data Group, Review of Particle Physics, Introduction, "Rounding" (rule cited from memory).
 */
export function decimalsForUncertainty(uncertainty: number): number {
  const exponent = Math.floor(Math.log10(uncertainty));
  const leading = Math.round((uncertainty / 10 ** exponent) * 100);
  const significant = leading <= 354 ? 2 : 1;
  const carried = leading >= 950 ? exponent + 1 : exponent;
  return Math.max(0, (leading >= 950 ? 2 : significant) - 1 - carried);
}

/**
 * A value with its uncertainty, both cut to the digits that the evidence carries.
 * @param uncertainty - same unit as the value, > 0; null or 0 when none is claimed
 * @param decimals - overrides the number of decimals (taken up again when it would hide the uncertainty)
 */
export function formatUncertain(
  value: number,
  uncertainty: number | null,
  notation: UncertaintyNotation = 'plus-minus',
  decimals?: number,
): UncertainText {
  if (uncertainty === null || !(uncertainty > 0)) {
    return { value: formatNumber(value, decimals), uncertainty: null };
  }
  const earned = decimalsForUncertainty(uncertainty);
  const wanted = decimals ?? earned;
  const shown = Number(uncertainty.toFixed(wanted)) === 0 ? earned : wanted;
  if (notation === 'plus-minus') {
    return { value: formatNumber(value, shown), uncertainty: formatNumber(uncertainty, shown) };
  }
  // In parentheses the uncertainty counts units of the last digit, save where it reaches past the point.
  const inLastDigits = Math.round(uncertainty * 10 ** shown);
  const text = shown > 0 && uncertainty >= 1 ? uncertainty.toFixed(shown) : String(inLastDigits);
  return { value: formatNumber(value, shown), uncertainty: text };
}
