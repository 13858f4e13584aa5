import { describe, expect, it } from 'vitest';
import { dBlockGroup, dElectronCount, dSeries } from '@/lib/chemistry/electron-configuration';
import { electronCount, multiplicityFits } from '@/lib/chemistry/electron-count';
import { commonOxidationStates } from '@/lib/chemistry/oxidation-states';

describe('d electrons', () => {
  // Textbook d counts, for example Greenwood and Earnshaw, Chemistry of the Elements.
  it.each([
    ['Ti', 3, 1],
    ['Cr', 3, 3],
    ['Mn', 2, 5],
    ['Fe', 3, 5],
    ['Fe', 2, 6],
    ['Co', 3, 6],
    ['Ni', 2, 8],
    ['Cu', 1, 10],
    ['Zn', 2, 10],
    ['Pd', 4, 6],
    ['Pt', 2, 8],
    ['La', 3, 0],
  ])('of %s(%i) are %i', (element, state, count) => {
    expect(dElectronCount(element, state)).toBe(count);
  });

  it('do not exist outside the d block or beyond ten', () => {
    expect([
      dElectronCount('Na', 1),
      dElectronCount('Eu', 3),
      dElectronCount('Zn', 1),
      dElectronCount('Sc', 4),
    ]).toEqual([null, null, null, null]);
    expect([dBlockGroup('Hg'), dSeries('Hg'), dSeries('Ru'), dSeries('Cl')]).toEqual([12, 5, 4, null]);
  });

  it('leave every common oxidation state a count between 0 and 10', () => {
    for (const element of ['Sc', 'Ti', 'V', 'Cr', 'Mn', 'Fe', 'Co', 'Ni', 'Cu', 'Zn'])
      for (const state of commonOxidationStates(element) ?? [NaN])
        expect(dElectronCount(element, state)).not.toBeNull();
    expect(commonOxidationStates('Pt')).toBeNull();
  });
});

describe('electrons and multiplicity', () => {
  it('count nuclear charges less charge and refuse what is no element or more than all electrons', () => {
    expect(electronCount(['Fe', 'Cl', 'Cl', 'Cl', 'Cl'], -2)).toBe(96);
    expect(electronCount(['Xx'], 0)).toBeNull();
    expect(electronCount(['H'], 2)).toBeNull();
  });

  it('must have one parity, and no more unpaired electrons than electrons', () => {
    expect([multiplicityFits(96, 5), multiplicityFits(96, 4), multiplicityFits(97, 4)]).toEqual([
      true,
      false,
      true,
    ]);
    expect([
      multiplicityFits(1, 2),
      multiplicityFits(1, 4),
      multiplicityFits(0, 1),
      multiplicityFits(2, 0),
    ]).toEqual([true, false, true, false]);
  });
});
