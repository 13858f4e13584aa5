import { describe, expect, it } from 'vitest';
import { halfMolarMassCorrection, pascalCorrection } from '@/lib/magnetism/diamagnetic-correction';
import type { PascalTable } from '@/lib/magnetism/pascal-constants';

/**
 * Sums of Pascal's constants. The constants are those of Bain & Berry, J. Chem. Educ. 2008, 85, 532 as reproduced or
 * recalled (each entry carries its tag); the sums were calculated independently. 10⁻⁶ cm³/mol.
 */
const cases: [string, [PascalTable, string, number][], number][] = [
  [
    'benzene by atoms',
    [
      ['atoms', 'C (ring)', 6],
      ['atoms', 'H', 6],
      ['constitutive', 'benzene', 1],
    ],
    -56.42,
  ],
  [
    'CuSO4·5H2O',
    [
      ['cations', 'Cu2+', 1],
      ['anions', 'SO4^2-', 1],
      ['ligands', 'H2O', 5],
    ],
    -116.1,
  ],
  [
    'HgCo(NCS)4',
    [
      ['cations', 'Hg2+', 1],
      ['cations', 'Co2+', 1],
      ['anions', 'NCS-', 4],
    ],
    -176,
  ],
  [
    'K3[Fe(CN)6]',
    [
      ['cations', 'K+', 3],
      ['cations', 'Fe3+', 1],
      ['anions', 'CN-', 6],
    ],
    -132.7,
  ],
  [
    'CoCl2·6H2O',
    [
      ['cations', 'Co2+', 1],
      ['anions', 'Cl-', 2],
      ['ligands', 'H2O', 6],
    ],
    -136.8,
  ],
  [
    '[Cu2(CH3COO)4(H2O)2]',
    [
      ['cations', 'Cu2+', 2],
      ['anions', 'CH3COO-', 4],
      ['ligands', 'H2O', 2],
    ],
    -174,
  ],
  [
    '[Co(NH3)6]Cl3',
    [
      ['cations', 'Co3+', 1],
      ['ligands', 'NH3', 6],
      ['anions', 'Cl-', 3],
    ],
    -188.2,
  ],
];

describe('diamagnetic corrections', () => {
  it.each(cases)('%s', (_name, parts, expected) => {
    const sum = pascalCorrection(
      parts.map(([table, name, count]) => ({ kind: 'table', table, name, count })),
    );
    expect(sum.ok && sum.value.chiDiaCm3PerMol * 1e6).toBeCloseTo(expected, 2);
  });

  it('estimates half the molar mass by the rule of thumb', () => {
    // Bain & Berry give χ_dia ≈ −M/2·10⁻⁶; benzene, 78.11 g/mol.
    expect(halfMolarMassCorrection(78.11).chiDiaCm3PerMol * 1e6).toBeCloseTo(-39.055, 3);
  });

  it('names an entry it does not have', () => {
    const sum = pascalCorrection([{ kind: 'table', table: 'cations', name: 'Xy9+', count: 1 }]);
    expect(!sum.ok && sum.error.message).toContain('Xy9+');
  });
});
