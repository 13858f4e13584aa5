/** Element symbols in order of atomic number; index 0 is empty so that `symbols[z]` is element z. IUPAC. */
export const elementSymbols = (
  ' H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr ' +
  'Rb Sr Y Zr Nb Mo Tc Ru Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu ' +
  'Hf Ta W Re Os Ir Pt Au Hg Tl Pb Bi Po At Rn Fr Ra Ac Th Pa U Np Pu Am Cm Bk Cf Es Fm Md No Lr ' +
  'Rf Db Sg Bh Hs Mt Ds Rg Cn Nh Fl Mc Lv Ts Og'
).split(' ');

const numberOf = new Map(elementSymbols.map((symbol, z) => [symbol.toLowerCase(), z]));
numberOf.delete('');

/**
 * Atomic number of an element symbol in any letter case.
 * @returns 1–118, or null when the text is no element symbol
 */
export function atomicNumber(symbol: string): number | null {
  return numberOf.get(symbol.toLowerCase()) ?? null;
}

/** The symbol as IUPAC writes it ("FE" → "Fe"), or null when the text is no element symbol. */
export function elementSymbol(text: string): string | null {
  const z = atomicNumber(text);
  return z === null ? null : (elementSymbols[z] ?? null);
}

/**
 * Whether the element is a metal. Metalloids (B, Si, Ge, As, Sb, Te, Po) count as non-metals:
 * in coordination chemistry they stand among the donors. Common practice.
 */
export function isMetal(symbol: string): boolean {
  const z = atomicNumber(symbol);
  if (z === null) return false;
  const nonMetals = new Set([
    1, 2, 5, 6, 7, 8, 9, 10, 14, 15, 16, 17, 18, 32, 33, 34, 35, 36, 51, 52, 53, 54, 84, 85, 86, 117, 118,
  ]);
  return !nonMetals.has(z);
}
