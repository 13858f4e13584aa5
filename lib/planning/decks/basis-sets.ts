import { atomicNumber } from '../../chemistry/elements';
import type { Program } from '../../outputs/record';

/** A basis set: each program's spelling (null: not in its library) and which elements it covers. */
export interface BasisSet {
  names: Record<Program, string | null>;
  covers: (z: number, program: Program) => boolean;
  /** Elements from this atomic number on have a core potential with this basis; null for none. */
  potentialFrom: number | null;
  /** NWChem's name of the potential library. */
  nwchemPotential: string | null;
  /** Six Cartesian d functions, as the set was made. */
  cartesian: boolean;
}

const names = (orca: string, gaussian: string, nwchem: string, psi4: string | null) => ({
  ORCA: orca,
  Gaussian: gaussian,
  NWChem: nwchem,
  Psi4: psi4,
});

const notLanthanoid = (z: number): boolean => z <= 86 && !(z >= 58 && z <= 71);
/** def2 sets: H–Rn without Ce–Lu; core potentials from Rb on. Weigend and Ahlrichs, PCCP 2005, 7, 3297. */
const def2 = (suffix: string): BasisSet => ({
  names: names(
    `def2-${suffix}`,
    `Def2${suffix}`,
    `def2-${suffix.toLowerCase()}`,
    `def2-${suffix.toLowerCase()}`,
  ),
  covers: notLanthanoid,
  potentialFrom: 37,
  nwchemPotential: 'def2-ecp',
  cartesian: false,
});

/** Coverage from the papers of the sets and the programs' libraries; where in doubt the smaller range. */
export const basisSets: Readonly<Record<string, BasisSet>> = {
  'def2-SVP': def2('SVP'),
  'def2-TZVP': def2('TZVP'),
  'def2-TZVPP': def2('TZVPP'),
  'STO-3G': {
    names: names('STO-3G', 'STO-3G', 'sto-3g', 'sto-3g'),
    covers: (z) => z <= 53,
    potentialFrom: null,
    nwchemPotential: null,
    cartesian: false,
  },
  // Rassolov et al., J. Chem. Phys. 1998, 109, 1223 (K–Zn)
  '6-31G(d)': {
    names: names('6-31G(d)', '6-31G(d)', '6-31g*', '6-31g*'),
    covers: (z) => z <= 30,
    potentialFrom: null,
    nwchemPotential: null,
    cartesian: true,
  },
  // In three of the programs without the 3d metals.
  '6-311G(d,p)': {
    names: names('6-311G(d,p)', '6-311G(d,p)', '6-311g**', '6-311g**'),
    covers: (z, program) => z <= 20 || (z >= 31 && z <= 36) || (program === 'Gaussian' && z <= 36),
    potentialFrom: null,
    nwchemPotential: null,
    cartesian: false,
  },
  'cc-pVDZ': {
    names: names('cc-pVDZ', 'cc-pVDZ', 'cc-pvdz', 'cc-pvdz'),
    covers: (z) => z <= 36 && z !== 19,
    potentialFrom: null,
    nwchemPotential: null,
    cartesian: false,
  },
  // Hay and Wadt, J. Chem. Phys. 1985, 82, 270 and 299
  LANL2DZ: {
    names: names('LANL2DZ', 'LANL2DZ', 'Lanl2dz ECP', null),
    covers: (z) => z === 1 || (z >= 3 && z <= 9) || (z >= 11 && z <= 57) || (z >= 72 && z <= 83),
    potentialFrom: 11,
    nwchemPotential: 'Lanl2dz ECP',
    cartesian: false,
  },
};

/** Whether an element carries a core potential with a basis. */
export function hasPotential(basis: BasisSet, element: string): boolean {
  const z = atomicNumber(element);
  return z !== null && basis.potentialFrom !== null && z >= basis.potentialFrom;
}
