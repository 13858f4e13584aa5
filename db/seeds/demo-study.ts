import type { Technique } from '../repositories/measurements';

/** One salt of the demo. Measured values are invented, near handbook ranges save two planted disagreements. */
export interface DemoComplex {
  section: string;
  formula: string;
  name: string;
  metal: string;
  candidates: readonly (readonly [geometry: string, multiplicity: number])[];
  measured: {
    sample: string;
    technique: Technique;
    temperatureK: number;
    uSystematicBohr: number;
    measuredOn: string;
    replicatesBohr: readonly number[];
  } | null;
}

export const demoGroupName = 'Fennick Label Works';

export const demoStudy = {
  title: 'Indicator inks: dry and damp salts',
  question:
    'Which spin state and which shape does each metal take when the ink is dry (chloride) and when it is damp (water)?',
  notice:
    'Demo: the group, its samples and every measured value are invented. Calculated values are real outputs of gas-phase ions with a small basis: they show the tool, not the chemistry.',
};

const dry = (
  metal: string,
  name: string,
  candidates: DemoComplex['candidates'],
  temperatureK: number,
  uSystematicBohr: number,
  replicatesBohr: readonly number[],
): DemoComplex => ({
  section: 'Dry salts',
  formula: `[${metal}Cl4]2-`,
  name,
  metal,
  candidates,
  measured: {
    sample: `FLW-${metal}-D1`,
    technique: 'susceptibility balance',
    temperatureK,
    uSystematicBohr,
    measuredOn: '2026-11-12',
    replicatesBohr,
  },
});

const damp = (
  metal: string,
  name: string,
  candidates: DemoComplex['candidates'],
  measured: readonly [uSystematicBohr: number, replicatesBohr: readonly number[]] | null,
): DemoComplex => ({
  section: 'Damp salts',
  formula: `[${metal}(OH2)6]2+`,
  name,
  metal,
  candidates,
  measured: measured && {
    sample: `FLW-${metal}-W1`,
    technique: 'NMR shift',
    temperatureK: 298.2,
    uSystematicBohr: measured[0],
    measuredOn: '2026-11-14',
    replicatesBohr: measured[1],
  },
});

export const demoComplexes: readonly DemoComplex[] = [
  dry(
    'Mn',
    'Tetrachloridomanganate(2−)',
    [
      ['T-4', 6],
      ['T-4', 4],
      ['T-4', 2],
    ],
    295.1,
    0.028,
    [5.89, 5.92, 5.93, 5.9],
  ),
  dry(
    'Fe',
    'Tetrachloridoferrate(2−)',
    [
      ['T-4', 5],
      ['T-4', 3],
      ['T-4', 1],
    ],
    295.0,
    0.036,
    [5.28, 5.33, 5.32, 5.31],
  ),
  dry(
    'Co',
    'Tetrachloridocobaltate(2−)',
    [
      ['T-4', 4],
      ['T-4', 2],
    ],
    295.2,
    0.023,
    [4.62, 4.64, 4.65, 4.61],
  ),
  // Planted: far below the tetrahedral range, as a batch would be that is partly square planar.
  dry(
    'Ni',
    'Tetrachloridonickelate(2−)',
    [
      ['T-4', 3],
      ['SP-4', 1],
    ],
    294.4,
    0.028,
    [2.96, 2.99, 2.95, 2.98],
  ),
  dry(
    'Cu',
    'Tetrachloridocuprate(2−)',
    [
      ['T-4', 2],
      ['SP-4', 2],
    ],
    295.2,
    0.018,
    [1.96, 1.98, 1.97, 1.97],
  ),
  dry('Zn', 'Tetrachloridozincate(2−)', [['T-4', 1]], 295.0, 0.05, [0.2, 0.24, 0.18]),
  damp('Mn', 'Hexaaquamanganese(2+)', [['OC-6', 6]], [0.033, [5.87, 5.9, 5.87]]),
  // Planted: above the octahedral range of high-spin iron(II), as after oxidation in air.
  damp(
    'Fe',
    'Hexaaquairon(2+)',
    [
      ['OC-6', 5],
      ['OC-6', 1],
    ],
    [0.033, [5.85, 5.88, 5.85]],
  ),
  damp(
    'Co',
    'Hexaaquacobalt(2+)',
    [
      ['OC-6', 4],
      ['OC-6', 2],
    ],
    [0.028, [4.9, 4.93, 4.9]],
  ),
  damp('Ni', 'Hexaaquanickel(2+)', [['OC-6', 3]], [0.028, [3.17, 3.2, 3.17]]),
  damp('Cu', 'Hexaaquacopper(2+)', [['OC-6', 2]], [0.018, [1.92, 1.94, 1.93]]),
  damp('Zn', 'Hexaaquazinc(2+)', [['OC-6', 1]], null),
];
