import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { dOccupation } from '@/lib/chemistry/d-occupation';
import { groundTerm } from '@/lib/chemistry/ground-term';
import { jahnTeller } from '@/lib/chemistry/jahn-teller';
import { ligandFieldLevels } from '@/lib/chemistry/ligand-field-levels';
import { localSpinStates } from '@/lib/planning/local-spin-states';

/**
 * Against the reference table of d configurations. Its sources: OC-6 terms, Table 2 of J. Am. Chem. Soc.
 * 2014, 136, 9453; T-4 terms, electron–hole relation; SP-4 order and energies, Krishnamurthy and Schaap,
 * J. Chem. Educ. 1969, 46, 799; Jahn–Teller classes, textbook rule (E strong, T weak, A none in OC-6).
 */
const file = path.resolve(process.cwd(), '../shared/reference/electronic.json');

interface Row {
  d_electrons: number;
  unpaired_electrons: number;
  multiplicity: number;
  occupation?: string;
  ground_term?: string;
  usual_ground_term?: string;
  jahn_teller?: string;
  first_order_orbital_moment?: boolean;
  cfse_Dq?: number;
  cfse_Dq_octahedral?: number;
  cfse_Dq_octahedral_scale?: number;
  examples?: string;
}
interface Reference {
  octahedral: Row[];
  tetrahedral: Row[];
  square_planar: Row[];
  field_energies: { field: string; orbital_energies_Dq_octahedral: Record<string, number> }[];
}

describe.skipIf(!existsSync(file))('d configurations against the reference table', () => {
  const reference: Reference = existsSync(file)
    ? (JSON.parse(readFileSync(file, 'utf8')) as Reference)
    : { octahedral: [], tetrahedral: [], square_planar: [], field_energies: [] };

  it('covers the whole table', () => {
    expect([
      reference.octahedral.length,
      reference.tetrahedral.length,
      reference.square_planar.length,
    ]).toEqual([13, 9, 10]);
  });

  it.each(reference.octahedral)('OC-6 d$d_electrons with $unpaired_electrons unpaired', (row) => {
    const { d_electrons: n, unpaired_electrons: unpaired } = row;
    const state = localSpinStates('OC-6', n, 3).kept.find((kept) => kept.unpaired === unpaired);
    expect(state?.occupation).toBe(row.occupation);
    expect(state?.stabilisationDq).toBeCloseTo(row.cfse_Dq ?? NaN, 6);
    expect(groundTerm('OC-6', n, unpaired)).toEqual({
      symbols: [row.ground_term],
      orbitalMoment: row.first_order_orbital_moment,
    });
    expect(jahnTeller('OC-6', n, unpaired)?.strength).toBe(row.jahn_teller);
  });

  it('proposes for OC-6 exactly the spin states that the table lists', () => {
    for (let n = 1; n <= 9; n++) {
      const listed = reference.octahedral.filter((row) => row.d_electrons === n);
      expect(localSpinStates('OC-6', n, 3).kept.map((state) => state.unpaired)).toEqual(
        listed.map((row) => row.unpaired_electrons),
      );
    }
  });

  it.each(reference.tetrahedral)('T-4 d$d_electrons', (row) => {
    const { d_electrons: n, unpaired_electrons: unpaired } = row;
    const kept = localSpinStates('T-4', n, 3).kept;
    expect(kept.map((state) => state.unpaired)).toEqual([unpaired]);
    // The table writes "t2^0" and "e1"; so does dOccupation.
    expect(kept[0]?.occupation).toBe(row.occupation);
    // The levels are printed to 0.01 Dq, so up to nine electrons may add up to 0.05.
    expect(Math.abs((kept[0]?.stabilisationDq ?? NaN) - (row.cfse_Dq_octahedral_scale ?? NaN))).toBeLessThan(
      0.05,
    );
    expect(groundTerm('T-4', n, unpaired)).toEqual({
      symbols: [row.ground_term],
      orbitalMoment: row.first_order_orbital_moment,
    });
    const expected = row.jahn_teller?.startsWith('moderate (strong') ? 'strong' : row.jahn_teller;
    expect(jahnTeller('T-4', n, unpaired)?.strength).toBe(expected);
  });

  it.each(reference.square_planar)('SP-4 d$d_electrons with $unpaired_electrons unpaired', (row) => {
    const { d_electrons: n, unpaired_electrons: unpaired } = row;
    const states = localSpinStates('SP-4', n, 3);
    const state = states.kept.find((kept) => kept.unpaired === unpaired);
    if (row.examples?.includes('not a stable')) {
      expect(state).toBeUndefined();
      expect(states.leftOut.find((left) => left.unpaired === unpaired)?.reason).toMatch(/T-4/);
      return;
    }
    expect(state).toBeDefined();
    if (row.occupation !== undefined) expect(state?.occupation).toBe(row.occupation);
    if (row.cfse_Dq_octahedral !== undefined)
      expect(state?.stabilisationDq).toBeCloseTo(row.cfse_Dq_octahedral, 6);
    for (const symbol of groundTerm('SP-4', n, unpaired)?.symbols ?? [])
      if (row.usual_ground_term !== undefined) expect(row.usual_ground_term).toContain(symbol);
    expect(row.multiplicity).toBe(unpaired + 1);
  });

  it('has the splitting patterns of Krishnamurthy and Schaap', () => {
    const symbols: Record<string, string> = {
      octahedral: 'OC-6',
      tetrahedral: 'T-4',
      'square planar (xy plane)': 'SP-4',
      'trigonal bipyramid': 'TBPY-5',
      'square pyramid': 'SPY-5',
      'linear (z axis)': 'L-2',
      'trigonal prism': 'TPR-6',
    };
    expect(reference.field_energies.length).toBe(7);
    for (const { field, orbital_energies_Dq_octahedral: energies } of reference.field_energies) {
      const levels = ligandFieldLevels(symbols[field] ?? '') ?? [];
      const mine = levels.flatMap((level) => level.orbitals.map((orbital) => [orbital, level.energyDq]));
      expect(Object.fromEntries(mine)).toEqual(energies);
      expect(levels.map((level) => level.energyDq)).toEqual(
        levels.map((level) => level.energyDq).toSorted((a, b) => a - b),
      );
    }
  });
});

describe('occupations of d levels', () => {
  it('refuses more unpaired electrons than orbitals or of the wrong parity', () => {
    const levels = ligandFieldLevels('OC-6') ?? [];
    expect(dOccupation(levels, 8, 4)).toBeNull();
    expect(dOccupation(levels, 5, 2)).toBeNull();
  });
});
