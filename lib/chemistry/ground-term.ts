/** What a ligand-field ground term says. `symbols` has several entries where states lie close together. */
export interface GroundTerm {
  symbols: readonly string[];
  /** First-order orbital contribution to the moment (T terms of OC-6 and T-4). */
  orbitalMoment: boolean;
}

const octahedral: Record<string, string> = {
  '0,0': '1A1g',
  '1,1': '2T2g',
  '2,2': '3T1g',
  '3,3': '4A2g',
  '4,4': '5Eg',
  '4,2': '3T1g',
  '5,5': '6A1g',
  '5,1': '2T2g',
  '6,4': '5T2g',
  '6,0': '1A1g',
  '7,3': '4T1g',
  '7,1': '2Eg',
  '8,2': '3A2g',
  '9,1': '2Eg',
  '10,0': '1A1g',
};
/** High spin; the electron–hole relation with the octahedral terms, without the parity letter. */
const tetrahedral: Record<string, string> = {
  '0,0': '1A1',
  '1,1': '2E',
  '2,2': '3A2',
  '3,3': '4T1',
  '4,4': '5T2',
  '5,5': '6A1',
  '6,4': '5E',
  '7,3': '4A2',
  '8,2': '3T1',
  '9,1': '2T2',
  '10,0': '1A1',
};
/** D4h; x2-y2 empty except for d9. Where π bonding decides the order, all the usual ones are listed. */
const squarePlanar: Record<string, readonly string[]> = {
  '4,4': ['5B1g'],
  '5,3': ['4A2g', '4Eg'],
  '5,5': ['6A1g'],
  '6,2': ['3A2g', '3Eg', '3B2g'],
  '7,1': ['2A1g', '2Eg', '2B2g'],
  '8,0': ['1A1g'],
  '9,1': ['2B1g'],
  '10,0': ['1A1g'],
};

/**
 * Ground term of a dⁿ ion in OC-6 (Oh), T-4 (Td) and SP-4 (D4h), where textbooks give one.
 * Sources: OC-6: Table 2 of J. Am. Chem. Soc. 2014, 136, 9453; T-4: electron–hole relation; SP-4: level
 * order of Krishnamurthy and Schaap 1969. Checked against: tests/published/electronic.test.ts.
 * @returns null where no standard term exists (other geometries, excited spin states)
 */
export function groundTerm(geometry: string, dElectrons: number, unpaired: number): GroundTerm | null {
  const key = `${dElectrons},${unpaired}`;
  if (geometry === 'SP-4') {
    const symbols = squarePlanar[key];
    return symbols ? { symbols, orbitalMoment: false } : null;
  }
  const table = geometry === 'OC-6' ? octahedral : geometry === 'T-4' ? tetrahedral : null;
  const symbol = table?.[key];
  return symbol === undefined ? null : { symbols: [symbol], orbitalMoment: symbol.includes('T') };
}
