const roman = ['0', 'I', 'II', 'III', 'IV', 'V', 'VI', 'VII', 'VIII', 'IX'];

/** "Cu(II)", "Ni(0)", "Fe(−I)": Stock notation. */
export function oxidationWords(metal: string, oxidationState: number): string {
  const digits = roman[Math.abs(oxidationState)] ?? String(Math.abs(oxidationState));
  return `${metal}(${oxidationState < 0 ? '−' : ''}${digits})`;
}
