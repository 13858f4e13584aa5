/** The five d orbitals; z is the main axis, x and y point at in-plane donors where there are some. */
export type DOrbital = 'x2-y2' | 'z2' | 'xy' | 'xz' | 'yz';

/** A set of degenerate d orbitals. `energyDq` is on the scale of octahedral Dq, barycentre zero. */
export interface LigandFieldLevel {
  label: string;
  orbitals: readonly DOrbital[];
  energyDq: number;
}

const level = (label: string, energyDq: number, ...orbitals: DOrbital[]): LigandFieldLevel => ({
  label,
  orbitals,
  energyDq,
});

/**
 * Point-charge splitting patterns, lowest level first, by IUPAC polyhedral symbol. σ only: with π
 * donors or acceptors the lower levels may change places (in SP-4 above all), so the order is a model.
 * Source: R. Krishnamurthy and W. B. Schaap, J. Chem. Educ. 1969, 46, 799; numbers from memory, each
 * set checked to add up to zero within 0.02 Dq. Checked against: tests/published/electronic.test.ts.
 */
const levels: Record<string, readonly LigandFieldLevel[]> = {
  'L-2': [
    level('(xy,x2-y2)', -6.28, 'xy', 'x2-y2'),
    level('(xz,yz)', 1.14, 'xz', 'yz'),
    level('z2', 10.28, 'z2'),
  ],
  'TP-3': [
    level('(xz,yz)', -3.86, 'xz', 'yz'),
    level('z2', -3.21, 'z2'),
    level('(xy,x2-y2)', 5.46, 'xy', 'x2-y2'),
  ],
  'T-4': [level('e', -2.67, 'z2', 'x2-y2'), level('t2', 1.78, 'xy', 'xz', 'yz')],
  'SP-4': [
    level('(xz,yz)', -5.14, 'xz', 'yz'),
    level('z2', -4.28, 'z2'),
    level('xy', 2.28, 'xy'),
    level('x2-y2', 12.28, 'x2-y2'),
  ],
  'TBPY-5': [
    level('(xz,yz)', -2.72, 'xz', 'yz'),
    level('(xy,x2-y2)', -0.82, 'xy', 'x2-y2'),
    level('z2', 7.07, 'z2'),
  ],
  'SPY-5': [
    level('(xz,yz)', -4.57, 'xz', 'yz'),
    level('xy', -0.86, 'xy'),
    level('z2', 0.86, 'z2'),
    level('x2-y2', 9.14, 'x2-y2'),
  ],
  'OC-6': [level('t2g', -4, 'xy', 'xz', 'yz'), level('eg', 6, 'z2', 'x2-y2')],
  'TPR-6': [
    level('(xy,x2-y2)', -5.84, 'xy', 'x2-y2'),
    level('z2', 0.96, 'z2'),
    level('(xz,yz)', 5.36, 'xz', 'yz'),
  ],
  'PBPY-7': [
    level('(xz,yz)', -5.28, 'xz', 'yz'),
    level('(xy,x2-y2)', 2.82, 'xy', 'x2-y2'),
    level('z2', 4.93, 'z2'),
  ],
  'SAPR-8': [
    level('z2', -5.34, 'z2'),
    level('(xy,x2-y2)', -0.89, 'xy', 'x2-y2'),
    level('(xz,yz)', 3.56, 'xz', 'yz'),
  ],
};

/** Levels of a coordination polyhedron, lowest first; null when no splitting pattern is known here. */
export function ligandFieldLevels(geometry: string): readonly LigandFieldLevel[] | null {
  return levels[geometry] ?? null;
}
