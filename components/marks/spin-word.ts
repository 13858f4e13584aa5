const words = [
  '',
  'singlet',
  'doublet',
  'triplet',
  'quartet',
  'quintet',
  'sextet',
  'septet',
  'octet',
  'nonet',
];

/** The trade's word for a spin multiplicity: 6 → "sextet"; past nine the number itself. */
export function spinWord(multiplicity: number): string {
  return words[multiplicity] ?? `multiplicity ${multiplicity}`;
}
