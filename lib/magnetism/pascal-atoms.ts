import type { PascalRow } from './pascal-row';

/**
 * Atoms in covalent species: diamagnetic susceptibility in 10⁻⁶ cm³/mol (cgs-emu), per atom, to be completed by the constitutive corrections of the molecule.
 * Source: G. A. Bain and J. F. Berry, J. Chem. Educ. 2008, 85, 532, table 1, recalled; rows marked handbook agree with
 * a reproduction that was read, rows marked soft were not seen again.
 */
export const pascalAtoms: readonly PascalRow[] = [
  ['Ag', -31, 'soft'],
  ['Al', -13, 'soft'],
  ['As(III)', -20.9, 'handbook'],
  ['As(V)', -43, 'handbook'],
  ['B', -7, 'handbook'],
  ['Bi', -192, 'soft'],
  ['Br', -30.6, 'handbook'],
  ['C', -6, 'handbook'],
  ['C (ring)', -6.24, 'handbook'],
  ['Ca', -15.9, 'soft'],
  ['Cl', -20.1, 'handbook'],
  ['F', -6.3, 'handbook'],
  ['H', -2.93, 'handbook'],
  ['Hg(II)', -33, 'soft'],
  ['I', -44.6, 'handbook'],
  ['K', -18.5, 'soft'],
  ['Li', -4.2, 'soft'],
  ['Mg', -10, 'soft'],
  ['N (ring)', -4.61, 'handbook'],
  ['N (open chain)', -5.57, 'handbook'],
  ['Na', -9.2, 'soft'],
  ['O', -4.6, 'handbook'],
  ['P', -26.3, 'handbook'],
  ['Pb(II)', -46, 'soft'],
  ['S', -15, 'handbook'],
  ['Sb(III)', -74, 'handbook'],
  ['Se', -23, 'handbook'],
  ['Si', -13, 'soft'],
  ['Sn(IV)', -30, 'soft'],
  ['Te', -37.3, 'soft'],
  ['Tl(I)', -40, 'soft'],
  ['Zn', -13.5, 'soft'],
];
