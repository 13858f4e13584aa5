const THIN_SPACE = '\u2009';

const groupFromRight = (digits: string) => digits.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
const groupFromLeft = (digits: string) => digits.replace(/(\d{3})(?=\d)/g, `$1${THIN_SPACE}`);

/**
 * A number as it is printed: true minus, thin spaces between groups of three from five digits on
 * (ISO 80000-1:2022, 7.3.1), and no minus before a zero.
 * @param decimals - digits after the point, 0–20; left out: as many as the number has
 * Errors: throws RangeError when the value is not finite, since absent values are null here.
 */
export function formatNumber(value: number, decimals?: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`A printed number must be finite; received ${value}.`);
  const text = decimals === undefined ? String(Math.abs(value)) : Math.abs(value).toFixed(decimals);
  if (/e/.test(text)) return value < 0 ? `−${text}` : text;
  const [whole = '0', fraction = ''] = text.split('.');
  const isZero = !/[1-9]/.test(text);
  const groupedWhole = whole.length > 4 ? groupFromRight(whole) : whole;
  const groupedFraction = fraction.length > 4 ? groupFromLeft(fraction) : fraction;
  return `${value < 0 && !isZero ? '−' : ''}${groupedWhole}${fraction === '' ? '' : `.${groupedFraction}`}`;
}
