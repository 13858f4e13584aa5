import { atomicNumber, elementSymbol } from '../chemistry/elements';

/**
 * The element of an atom's tag (Fe, fe, zn1, C_a, carbon) beside its printed nuclear charge. The charge decides
 * between one letter and two; where it fits neither (a core potential lowers it), the longer symbol is taken.
 * @returns null when the tag starts with no element's symbol
 */
export function elementOfTag(tag: string, nuclearCharge: number | null): string | null {
  const letters = /^[A-Za-z]{1,2}/.exec(tag)?.[0] ?? '';
  const symbols = [letters, letters.slice(0, 1)].map(elementSymbol).filter((symbol) => symbol !== null);
  const fitting = symbols.find((symbol) => atomicNumber(symbol) === nuclearCharge);
  return fitting ?? symbols[0] ?? null;
}
