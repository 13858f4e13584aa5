import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { expectedMoments } from '@/lib/magnetism/expected-moments';
import { freeIonMoments } from '@/lib/magnetism/free-ion-moments';
import { spinOnlyMoment } from '@/lib/magnetism/spin-only-moment';
import { unpairedFromMoment } from '@/lib/magnetism/unpaired-from-moment';

/** Exact arithmetic of μ = √(n(n + 2)); the same digits stand in every textbook table. */
const spinOnlyTable = [0, 1.7321, 2.8284, 3.873, 4.899, 5.9161, 6.9282, 7.9373];

describe('spin-only moments (textbook formula, four decimals)', () => {
  it.each(spinOnlyTable.map((mu, n) => [n, mu]))('n = %i gives %f', (n, mu) => {
    expect(spinOnlyMoment(n)).toBeCloseTo(mu, 4);
    expect(unpairedFromMoment(spinOnlyMoment(n), null).unpaired).toBeCloseTo(n, 12);
    expect(unpairedFromMoment(mu, null).nearest).toBe(n);
  });

  it('μ = 4.85 is n = 3.95202 (−1 + √(1 + μ²))', () => {
    const result = unpairedFromMoment(4.85, 0.06);
    expect(result.unpaired).toBeCloseTo(3.95202, 5);
    // dn/dμ = μ/√(1 + μ²) = 4.85/4.95202
    expect(result.uUnpaired).toBeCloseTo(0.06 * 0.979399, 6);
    expect(result.spin).toBeCloseTo(3.95202 / 2, 5);
  });
});

/** Ashcroft & Mermin, Solid State Physics (1976), pp. 657–658: spin-only and J moments of 3d ions, as read in a reproduction. */
const ashcroft: [string, number, number, number][] = [
  ['V4+', 1, 1.73, 1.55],
  ['V3+', 2, 2.83, 1.63],
  ['Cr3+', 3, 3.87, 0.77],
  ['Mn3+', 4, 4.9, 0],
  ['Mn2+', 5, 5.92, 5.92],
  ['Fe2+', 6, 4.9, 6.7],
  ['Ni2+', 8, 2.83, 5.59],
  ['Cu2+', 9, 1.73, 3.55],
];

describe('free-ion moments', () => {
  it.each(ashcroft)('%s (d%i): spin-only %f, J %f (Ashcroft & Mermin)', (_ion, d, spinOnly, j) => {
    const unpaired = d <= 5 ? d : 10 - d;
    const free = freeIonMoments(d, unpaired);
    expect(free?.spinOnly).toBeCloseTo(spinOnly, 1);
    expect(Math.abs((free?.totalJ ?? Number.NaN) - j)).toBeLessThan(0.011);
  });

  it('refuses a spin state that the d count cannot carry', () => {
    expect(freeIonMoments(9, 3)).toBeNull();
    expect(freeIonMoments(10, 1)).toBeNull();
    expect(freeIonMoments(6, 1)).toBeNull();
  });
});

interface Reference {
  spin_only: { unpaired_electrons: number; mu_spin_only_bohr_magneton: number }[];
  free_ions: {
    ion: string;
    d_electrons: number;
    spin_S: number;
    mu_spin_only_bohr_magneton: number;
    mu_S_plus_L_bohr_magneton: number;
    mu_J_hund_bohr_magneton: number;
  }[];
  room_temperature_ranges: {
    ion: string;
    d_electrons: number;
    geometry: string;
    unpaired_electrons: number;
    mu_eff_room_temperature_low_bohr_magneton: number;
    mu_eff_room_temperature_high_bohr_magneton: number;
    source: string;
  }[];
}

const referencePath = path.resolve(process.cwd(), '../shared/reference/spin_only.json');

describe.skipIf(!existsSync(referencePath))('the collected reference of moments', () => {
  const reference = existsSync(referencePath)
    ? (JSON.parse(readFileSync(referencePath, 'utf8')) as Reference)
    : { spin_only: [], free_ions: [], room_temperature_ranges: [] };

  it('agrees on every free ion to the printed digits (exact arithmetic)', () => {
    expect(reference.free_ions.length).toBeGreaterThan(20);
    for (const ion of reference.free_ions) {
      const free = freeIonMoments(ion.d_electrons, 2 * ion.spin_S);
      expect(free?.spinOnly, ion.ion).toBeCloseTo(ion.mu_spin_only_bohr_magneton, 3);
      expect(free?.spinPlusOrbit, ion.ion).toBeCloseTo(ion.mu_S_plus_L_bohr_magneton, 3);
      expect(free?.totalJ, ion.ion).toBeCloseTo(ion.mu_J_hund_bohr_magneton, 3);
    }
  });

  it('finds every handbook range (Figgis & Lewis 1960; Greenwood & Earnshaw; recalled, soft)', () => {
    expect(reference.room_temperature_ranges.length).toBeGreaterThan(30);
    for (const range of reference.room_temperature_ranges) {
      const [, element = '', charge = ''] = /([A-Z][a-z]?)(\d)\+\)?$/.exec(range.ion) ?? [];
      const geometries = range.geometry === 'any' ? ['T-4'] : (range.geometry.match(/[A-Z]+-\d/g) ?? []);
      expect(geometries.length).toBeGreaterThan(0);
      for (const geometry of geometries) {
        const band = expectedMoments(
          { element, oxidationState: Number(charge), dCount: range.d_electrons },
          range.unpaired_electrons + 1,
          geometry,
        );
        expect(band?.tag, `${range.ion} ${geometry}`).toBe('soft');
        expect(band?.low).toBe(range.mu_eff_room_temperature_low_bohr_magneton);
        // The closed shell prints 0.0; here small readings count as zero, as for other diamagnetic ions.
        if (range.source !== 'closed shell')
          expect(band?.high).toBe(range.mu_eff_room_temperature_high_bohr_magneton);
      }
    }
  });
});
