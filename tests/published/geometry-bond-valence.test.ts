import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { bondValenceParameters, findBondValenceParameter } from '@/lib/chemistry/bond-valence-parameters';
import { covalentRadiusAngstrom } from '@/lib/chemistry/covalent-radii';
import { cationRadii } from '@/lib/chemistry/ionic-radii';
import { bondValence, bondValenceSums, supportedOxidationState } from '@/lib/geometry/bond-valence-sum';

const file = path.resolve(process.cwd(), '../shared/reference/radii.json');
const present = existsSync(file);
const referenceSchema = z.object({
  covalent_radii: z.array(
    z.object({ element: z.string(), covalent_radius_angstrom: z.number(), state: z.string().optional() }),
  ),
  ionic_radii: z.array(
    z.object({
      ion: z.string(),
      coordination: z.string(),
      spin_state: z.string().optional(),
      effective_ionic_radius_angstrom: z.number(),
    }),
  ),
  spin_state_radius_change: z.array(
    z.object({ ion: z.string(), high_minus_low_spin_radius_VI_angstrom: z.number() }),
  ),
  bond_valence_parameters: z.array(
    z.object({
      cation: z.string(),
      oxidation_state: z.number(),
      anion: z.string(),
      R0_angstrom: z.number(),
      first_choice: z.boolean(),
    }),
  ),
  bond_valence_worked_cases: z.array(
    z.object({
      case: z.string(),
      cation: z.string(),
      formal_oxidation_state: z.number(),
      bonds: z.array(
        z.object({
          anion: z.string(),
          R0_angstrom: z.number(),
          b_angstrom: z.number(),
          bond_lengths_angstrom: z.array(z.number()),
        }),
      ),
      expected_bond_valence_sum_valence_units: z.number(),
      tolerance_valence_units: z.number(),
      source: z.string(),
    }),
  ),
});
const reference = present ? referenceSchema.parse(JSON.parse(readFileSync(file, 'utf8'))) : null;

describe.skipIf(!present)('radii and bond-valence tables', () => {
  it('gives the covalent radii of Cordero et al., Dalton Trans. 2008, 2832', () => {
    const expected = (reference?.covalent_radii ?? []).filter((entry) => !/^sp2?$/.test(entry.state ?? ''));
    expect(expected.length).toBeGreaterThan(95);
    for (const { element, state, covalent_radius_angstrom } of expected) {
      const spinState = state === 'high_spin' ? 'high' : 'low';
      expect(covalentRadiusAngstrom(element, spinState), `${element} ${state ?? ''}`).toBe(
        covalent_radius_angstrom,
      );
    }
  });

  it('gives the differences between high- and low-spin radii (Shannon, Acta Cryst. 1976, A32, 751)', () => {
    for (const { ion, high_minus_low_spin_radius_VI_angstrom } of reference?.spin_state_radius_change ?? []) {
      const [, element = '', charge = '1'] = /^([A-Z][a-z]?)(\d*)\+$/.exec(ion) ?? [];
      const [high, low] = (['high', 'low'] as const).map((spinState) =>
        cationRadii.find(
          (entry) =>
            entry.element === element &&
            entry.oxidationState === Number(charge || '1') &&
            entry.coordinationNumber === 6 &&
            entry.spinState === spinState,
        ),
      );
      const difference = (high?.radiusAngstrom ?? NaN) - (low?.radiusAngstrom ?? NaN);
      expect(difference, ion).toBeCloseTo(high_minus_low_spin_radius_VI_angstrom, 9);
    }
  });

  it('holds the first choice of every tabulated bond (Brown, accumulated table, with primary papers)', () => {
    const first = (reference?.bond_valence_parameters ?? []).filter((entry) => entry.first_choice);
    expect(bondValenceParameters).toHaveLength(first.length);
    for (const { cation, oxidation_state, anion, R0_angstrom } of first) {
      expect(findBondValenceParameter(cation, oxidation_state, anion)?.r0Angstrom).toBe(R0_angstrom);
    }
  });

  for (const entry of reference?.bond_valence_worked_cases ?? []) {
    it(`${entry.case}: ${entry.source}`, () => {
      let sum = 0;
      const donors: { element: string; distanceAngstrom: number }[] = [];
      let ownParameters = entry.cation !== 'any';
      for (const bond of entry.bonds) {
        const own = findBondValenceParameter(entry.cation, entry.formal_oxidation_state, bond.anion);
        ownParameters &&= own?.r0Angstrom === bond.R0_angstrom;
        for (const distanceAngstrom of bond.bond_lengths_angstrom) {
          sum += bondValence(bond.R0_angstrom, distanceAngstrom, bond.b_angstrom);
          donors.push({ element: bond.anion, distanceAngstrom });
        }
      }
      const tolerance = entry.tolerance_valence_units;
      expect(Math.abs(sum - entry.expected_bond_valence_sum_valence_units)).toBeLessThanOrEqual(tolerance);
      if (!ownParameters) return;
      const sums = bondValenceSums(entry.cation, donors);
      const tabulated = sums.find(
        (candidate) => candidate.oxidationState === entry.formal_oxidation_state,
      )?.sum;
      expect(
        Math.abs((tabulated ?? NaN) - entry.expected_bond_valence_sum_valence_units),
      ).toBeLessThanOrEqual(tolerance);
      expect(supportedOxidationState(sums)).toBe(entry.formal_oxidation_state);
    });
  }
});

describe('bond valence by definition', () => {
  it('is 1 at R₀ (Brown & Altermatt, Acta Cryst. 1985, B41, 244)', () => {
    expect(bondValence(1.7, 1.7)).toBe(1);
  });

  it('has no sum for a metal or a donor outside the tables', () => {
    expect(bondValenceSums('Ru', [{ element: 'N', distanceAngstrom: 2.05 }])).toEqual([]);
    expect(bondValenceSums('Cu', [{ element: 'P', distanceAngstrom: 2.25 }])).toEqual([]);
    expect(bondValenceSums('Cu', [])).toEqual([]);
  });
});
