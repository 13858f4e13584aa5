/**
 * Bond-valence parameters R₀ (Å) for s = exp((R₀ − R)/b) with b = 0.37 Å, one per cation, oxidation state
 * and donor element: the first choice of I. D. Brown's accumulated table (2016 issue), each taken with
 * the primary reference it names. For N donors the values derived from complexes are used where there
 * are any; nitride values give sums that are too high for amines.
 */
export const BOND_VALENCE_SOFTNESS_ANGSTROM = 0.37;

/** Primary references behind the source keys. */
export const bondValenceSources = {
  BA85: 'Brown & Altermatt, Acta Cryst. 1985, B41, 244',
  BO91: 'Brese & O’Keeffe, Acta Cryst. 1991, B47, 192',
  unchecked: 'private communication listed by I. D. Brown, marked unchecked there; low confidence',
  LT93: 'Liu & Thorp, Inorg. Chem. 1993, 32, 4102 (complexes)',
  HU14: 'S.-Z. Hu (2014), as listed by I. D. Brown; low confidence',
  SR00: 'Shields, Raithby, Allen & Motherwell, Acta Cryst. 2000, B56, 455 (complexes)',
  MA96: 'Mahapatra et al., J. Am. Chem. Soc. 1996, 118, 11555',
} as const;

export interface BondValenceParameter {
  cation: string;
  oxidationState: number;
  donor: string;
  r0Angstrom: number;
  source: keyof typeof bondValenceSources;
}

type Row = readonly [string, number, string, number, keyof typeof bondValenceSources];
const rows: readonly Row[] = [
  ['Sc', 3, 'O', 1.849, 'BA85'],
  ['Sc', 3, 'S', 2.321, 'BA85'],
  ['Sc', 3, 'F', 1.76, 'BO91'],
  ['Sc', 3, 'Cl', 2.23, 'BO91'],
  ['Sc', 3, 'N', 1.98, 'BO91'],
  ['Ti', 3, 'O', 1.791, 'BO91'],
  ['Ti', 3, 'F', 1.723, 'BO91'],
  ['Ti', 3, 'Cl', 2.17, 'BO91'],
  ['Ti', 3, 'S', 2.11, 'unchecked'],
  ['Ti', 4, 'O', 1.815, 'BA85'],
  ['Ti', 4, 'F', 1.76, 'BO91'],
  ['Ti', 4, 'Cl', 2.19, 'BO91'],
  ['Ti', 4, 'S', 2.29, 'unchecked'],
  ['V', 3, 'O', 1.743, 'BA85'],
  ['V', 3, 'S', 2.185, 'LT93'],
  ['V', 3, 'F', 1.702, 'BO91'],
  ['V', 3, 'Cl', 2.19, 'BO91'],
  ['V', 3, 'N', 1.813, 'LT93'],
  ['V', 4, 'O', 1.784, 'BA85'],
  ['V', 4, 'N', 1.875, 'LT93'],
  ['V', 5, 'O', 1.803, 'BA85'],
  ['Cr', 2, 'O', 1.73, 'BO91'],
  ['Cr', 2, 'F', 1.67, 'BO91'],
  ['Cr', 2, 'Cl', 2.09, 'BO91'],
  ['Cr', 2, 'N', 1.86, 'HU14'],
  ['Cr', 3, 'O', 1.724, 'BA85'],
  ['Cr', 3, 'S', 2.162, 'unchecked'],
  ['Cr', 3, 'F', 1.657, 'BA85'],
  ['Cr', 3, 'Cl', 2.08, 'BO91'],
  ['Cr', 3, 'N', 1.78, 'HU14'],
  ['Mn', 2, 'O', 1.79, 'BA85'],
  ['Mn', 2, 'S', 2.22, 'unchecked'],
  ['Mn', 2, 'F', 1.698, 'BA85'],
  ['Mn', 2, 'Cl', 2.133, 'BA85'],
  ['Mn', 2, 'N', 1.849, 'LT93'],
  ['Mn', 3, 'O', 1.76, 'BA85'],
  ['Mn', 3, 'F', 1.66, 'BO91'],
  ['Mn', 3, 'Cl', 2.14, 'BO91'],
  ['Mn', 3, 'N', 1.837, 'LT93'],
  ['Mn', 4, 'O', 1.753, 'BA85'],
  ['Mn', 4, 'N', 1.822, 'LT93'],
  ['Fe', 2, 'O', 1.734, 'BA85'],
  ['Fe', 2, 'S', 2.125, 'LT93'],
  ['Fe', 2, 'F', 1.65, 'BO91'],
  ['Fe', 2, 'Cl', 2.06, 'BO91'],
  ['Fe', 2, 'N', 1.769, 'LT93'],
  ['Fe', 3, 'O', 1.759, 'BA85'],
  ['Fe', 3, 'S', 2.149, 'BA85'],
  ['Fe', 3, 'F', 1.679, 'BA85'],
  ['Fe', 3, 'Cl', 2.09, 'BO91'],
  ['Fe', 3, 'N', 1.815, 'LT93'],
  ['Co', 2, 'O', 1.692, 'BA85'],
  ['Co', 2, 'S', 1.94, 'unchecked'],
  ['Co', 2, 'F', 1.64, 'BO91'],
  ['Co', 2, 'Cl', 2.033, 'BA85'],
  ['Co', 2, 'N', 1.72, 'HU14'],
  ['Co', 3, 'O', 1.7, 'BO91'],
  ['Co', 3, 'S', 2.02, 'unchecked'],
  ['Co', 3, 'F', 1.62, 'BO91'],
  ['Co', 3, 'Cl', 2.05, 'BO91'],
  ['Co', 3, 'N', 1.69, 'HU14'],
  ['Ni', 2, 'O', 1.654, 'BA85'],
  ['Ni', 2, 'S', 1.937, 'LT93'],
  ['Ni', 2, 'F', 1.596, 'BA85'],
  ['Ni', 2, 'Cl', 2.02, 'BO91'],
  ['Ni', 2, 'N', 1.647, 'LT93'],
  ['Ni', 3, 'O', 1.75, 'unchecked'],
  ['Ni', 3, 'S', 2.04, 'LT93'],
  ['Ni', 3, 'F', 1.58, 'unchecked'],
  ['Ni', 3, 'N', 1.731, 'LT93'],
  ['Cu', 1, 'O', 1.61, 'unchecked'],
  ['Cu', 1, 'S', 1.898, 'BA85'],
  ['Cu', 1, 'F', 1.6, 'BO91'],
  ['Cu', 1, 'Cl', 1.858, 'SR00'],
  ['Cu', 2, 'O', 1.679, 'BA85'],
  ['Cu', 2, 'S', 2.054, 'BA85'],
  ['Cu', 2, 'F', 1.594, 'BA85'],
  ['Cu', 2, 'Cl', 2.0, 'BO91'],
  ['Cu', 2, 'N', 1.751, 'LT93'],
  ['Cu', 3, 'O', 1.735, 'MA96'],
  ['Cu', 3, 'N', 1.768, 'SR00'],
  ['Cu', 3, 'Cl', 2.078, 'SR00'],
  ['Zn', 2, 'O', 1.704, 'BA85'],
  ['Zn', 2, 'S', 2.09, 'BO91'],
  ['Zn', 2, 'F', 1.62, 'BO91'],
  ['Zn', 2, 'Cl', 2.01, 'BO91'],
  ['Zn', 2, 'N', 1.77, 'BO91'],
];

export const bondValenceParameters: readonly BondValenceParameter[] = rows.map(
  ([cation, oxidationState, donor, r0Angstrom, source]) => ({
    cation,
    oxidationState,
    donor,
    r0Angstrom,
    source,
  }),
);

const byBond = new Map(bondValenceParameters.map((p) => [`${p.cation} ${p.oxidationState} ${p.donor}`, p]));

/** The parameter of one bond, or null when the tables have none for this pair and oxidation state. */
export function findBondValenceParameter(
  cation: string,
  oxidationState: number,
  donor: string,
): BondValenceParameter | null {
  return byBond.get(`${cation} ${oxidationState} ${donor}`) ?? null;
}

/** Oxidation states of a cation that the tables know, ascending; [] for elements outside them. */
export function bondValenceOxidationStates(cation: string): number[] {
  const states = new Set(
    bondValenceParameters.filter((p) => p.cation === cation).map((p) => p.oxidationState),
  );
  return [...states].sort((a, b) => a - b);
}
