const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** A number inside a worked formula: up to six significant digits, "5.957×10⁻⁶" for very small or large ones. */
export function showNumber(value: number): string {
  if (!Number.isFinite(value)) return '?';
  if (value === 0) return '0';
  const size = Math.abs(value);
  if (size >= 1e-3 && size < 1e7) return String(Number(value.toPrecision(6))).replace('-', '−');
  const [mantissa = '', exponent = ''] = value.toExponential(5).split('e');
  const power = Number(exponent);
  const digits = [...String(Math.abs(power))].map((digit) => superscripts[Number(digit)] ?? '').join('');
  return `${String(Number(mantissa)).replace('-', '−')}×10${power < 0 ? '⁻' : ''}${digits}`;
}
