/**
 * Separates the charge that ends a formula: "[Fe(CN)6]4-" → body "[Fe(CN)6]", −4; "SO42-" → "SO4", −2;
 * "NH4+" → "NH4", +1; "Cu2+" → "Cu", +2; "Fe^3+" and "Fe+3" → "Fe", +3.
 * @returns charge null when the text ends without one
 */
export function splitFormulaCharge(text: string): { body: string; charge: number | null } {
  const signOf = (sign: string) => (sign.startsWith('+') ? 1 : -1);
  const signFirst = /^(.*?)\^?([+-])(\d+)$/.exec(text);
  if (signFirst)
    return { body: signFirst[1] ?? '', charge: signOf(signFirst[2] ?? '+') * Number(signFirst[3]) };
  const match = /^(.*?)(\^?)(\d*)(\++|-+)$/.exec(text);
  if (!match) return { body: text, charge: null };
  const [, before = '', caret = '', digits = '', signs = ''] = match;
  const sign = signOf(signs);
  if (caret === '^' || before.endsWith(']') || digits === '' || signs.length > 1) {
    const size = digits === '' || signs.length > 1 ? signs.length : Number(digits);
    return { body: signs.length > 1 ? before + digits : before, charge: sign * size };
  }
  const isLoneElement = /^[A-Z][a-z]?$/.test(before);
  if (digits.length === 1)
    return isLoneElement
      ? { body: before, charge: sign * Number(digits) }
      : { body: before + digits, charge: sign };
  return { body: before + digits.slice(0, -1), charge: sign * Number(digits.slice(-1)) };
}
