import { describe, expect, it } from 'vitest';
import type { ComplexInput } from '@/lib/planning/complex';
import { proposeCandidates } from '@/lib/planning/propose-candidates';

const list = (input: ComplexInput) => {
  const result = proposeCandidates(input);
  if (!result.ok) throw new Error(result.error.message);
  return result.value;
};
const refused = (input: ComplexInput) => {
  const result = proposeCandidates(input);
  return result.ok ? null : result.error.code;
};
const aqua = (element: string, oxidationState = 2): ComplexInput => ({
  metals: [{ element, oxidationState }],
  ligands: [{ ligand: 'H2O', count: 6 }],
  charge: oxidationState,
});

describe('candidates of one metal', () => {
  it('are the textbook spin states of the six divalent hexaaqua ions', () => {
    const multiplicities = Object.fromEntries(
      ['Mn', 'Fe', 'Co', 'Ni', 'Cu', 'Zn'].map((metal) => [
        metal,
        list(aqua(metal)).candidates.map((candidate) => candidate.multiplicity),
      ]),
    );
    expect(multiplicities).toEqual({ Mn: [6, 2], Fe: [5, 1], Co: [4, 2], Ni: [3], Cu: [2], Zn: [1] });
  });

  it('count every electron: hexaaquairon(2+) has 26 + 6·10 − 2 = 84', () => {
    expect(list(aqua('Fe'))).toMatchObject({ electrons: 84, formula: 'FeH12O6' });
  });

  it('start copper(II) in OC-6 elongated and compressed and in T-4 flattened', () => {
    expect(list(aqua('Cu')).candidates[0]?.distortedStarts).toEqual(['elongated', 'compressed']);
    const chlorido = list({
      metals: [{ element: 'Cu', oxidationState: 2 }],
      ligands: [{ ligand: 'Cl', count: 4 }],
      charge: -2,
    });
    expect(chlorido.candidates.find((c) => c.geometries[0] === 'T-4')?.distortedStarts).toEqual([
      'flattened',
    ]);
  });

  it('leave out the tetrahedral low-spin cobalt(II) with the reason', () => {
    const { leftOut } = list({
      metals: [{ element: 'Co', oxidationState: 2 }],
      ligands: [{ ligand: 'Cl', count: 4 }],
      charge: -2,
    });
    expect(leftOut.find((left) => left.geometry === 'T-4' && left.unpaired === 1)?.reason).toMatch(
      /no practical low-spin form/,
    );
  });

  it('give nickel(II) with four donors a T-4 triplet and an SP-4 singlet', () => {
    const { candidates } = list({
      metals: [{ element: 'Ni', oxidationState: 2 }],
      ligands: [{ ligand: 'Cl', count: 4 }],
      charge: -2,
    });
    expect(candidates.map((c) => [c.geometries[0], c.multiplicity])).toEqual([
      ['T-4', 3],
      ['SP-4', 1],
    ]);
  });

  it('leave no tetrahedral form to platinum(II) and no high-spin form to ruthenium(II)', () => {
    const platinum = list({
      metals: [{ element: 'Pt', oxidationState: 2 }],
      ligands: [{ ligand: 'Cl', count: 4 }],
      charge: -2,
    });
    expect(platinum.candidates.map((c) => c.key)).toEqual(['SP-4/0']);
    const ruthenium = list({
      metals: [{ element: 'Ru', oxidationState: 2 }],
      ligands: [{ ligand: 'bpy', count: 3 }],
      charge: 2,
    });
    expect(ruthenium.candidates.map((c) => c.key)).toEqual(['OC-6/0']);
  });

  it('couple a radical ligand both ways and check its electron', () => {
    const { candidates, electrons } = list({
      metals: [{ element: 'Cr', oxidationState: 3 }],
      ligands: [{ ligand: 'sq', count: 3 }],
      charge: 0,
    });
    // 24 + 3 (6·8 + 14… C6H4O2 has 36 + 4 + 16 = 56, with its charge 57) − 3 = 192
    expect(electrons).toBe(192);
    expect(candidates.filter((c) => c.geometries[0] === 'OC-6').map((c) => c.multiplicity)).toEqual([
      7, 5, 3, 1,
    ]);
  });
});

describe('candidates of two metals', () => {
  it('of copper acetate are the ferromagnetic triplet and the broken-symmetry singlet with ⟨S²⟩ near 1', () => {
    const { candidates } = list({
      metals: [1, 2].map(() => ({
        element: 'Cu',
        oxidationState: 2,
        coordinationNumber: 5,
        geometry: 'SPY-5',
      })),
      ligands: [
        { ligand: 'OAc', count: 4 },
        { ligand: 'H2O', count: 2 },
      ],
      charge: 0,
    });
    expect(candidates.map((c) => [c.multiplicity, c.coupling, c.brokenSymmetry?.idealS2 ?? null])).toEqual([
      [3, 'ferromagnetic', null],
      [1, 'antiferromagnetic', 1],
    ]);
    expect(candidates[1]?.brokenSymmetry).toMatchObject({ flippedSites: [1], highSpinMultiplicity: 3 });
    expect(candidates[1]?.spinOnlyMomentBohrMagneton).toBeNull();
  });

  it('of different spins leave the difference: Mn(II)–Cu(II) gives multiplicities 7 and 5', () => {
    const { candidates } = list({
      metals: [
        { element: 'Mn', oxidationState: 2, coordinationNumber: 6, geometry: 'OC-6' },
        { element: 'Cu', oxidationState: 2, coordinationNumber: 4, geometry: 'SP-4' },
      ],
      ligands: [
        { ligand: 'ox', count: 3 },
        { ligand: 'H2O', count: 4 },
      ],
      charge: -2,
    });
    expect(candidates.filter((c) => c.sites[0]?.unpaired === 5).map((c) => c.multiplicity)).toEqual([7, 5]);
  });

  it('propose the mixed spin states of two equal iron(II) centres as rare', () => {
    const { candidates } = list({
      metals: [1, 2].map(() => ({
        element: 'Fe',
        oxidationState: 2,
        coordinationNumber: 6,
        geometry: 'OC-6',
      })),
      ligands: [{ ligand: 'py', count: 12 }],
      charge: 4,
    });
    expect(candidates.map((c) => [c.key, c.likelihood])).toEqual([
      ['OC-6+OC-6/4,4', 'usual'],
      ['OC-6+OC-6/4,-4', 'usual'],
      ['OC-6+OC-6/0,0', 'usual'],
      ['OC-6+OC-6/4,0', 'rare'],
    ]);
  });
});

describe('a complex is refused', () => {
  it.each<[string, ComplexInput]>([
    ['unknown element', { ...aqua('Xx') }],
    ['no d block metal', { ...aqua('Na', 1) }],
    ['impossible oxidation state', aqua('Zn', 1)],
    ['charge does not add up', { ...aqua('Fe'), charge: 3 }],
    ['unknown ligand', { ...aqua('Fe'), ligands: [{ ligand: 'h2o2h', count: 6 }] }],
    [
      'ligand parity',
      {
        ...aqua('Fe'),
        ligands: [{ ligand: { name: 'odd', formula: 'CH3', charge: 0, donors: ['C'] }, count: 6 }],
      },
    ],
    ['coordination number impossible', { ...aqua('Fe'), ligands: [{ ligand: 'H2O', count: 9 }] }],
    ['unknown geometry', { ...aqua('Fe'), metals: [{ element: 'Fe', oxidationState: 2, geometry: 'T-4' }] }],
    ['bad complex', { ...aqua('Fe'), metals: [] }],
    [
      'coordination number missing',
      {
        ...aqua('Fe'),
        metals: [
          { element: 'Fe', oxidationState: 2 },
          { element: 'Fe', oxidationState: 0 },
        ],
      },
    ],
  ])('for %s', (code, input) => {
    expect(refused(input)).toBe(code);
  });
});
