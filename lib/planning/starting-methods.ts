import type { MethodInput } from './method';

/**
 * Levels of theory a group starts with; each is a proposal to be edited. Choice after the published
 * spin-state experience that a GGA leans to low spin, 20 % exact exchange towards high spin, and TPSSh
 * lies between (Gómez-Coca and Ruiz, Dalton Trans. 2024): a pair of functionals brackets the answer.
 */
export const startingMethods: readonly MethodInput[] = [
  {
    name: 'TPSSh/def2-SVP, optimisation',
    program: 'ORCA',
    functional: 'TPSSh',
    basis: 'def2-SVP',
    dispersion: 'D3(BJ)',
  },
  {
    name: 'TPSSh/def2-TZVP, energies',
    program: 'ORCA',
    functional: 'TPSSh',
    basis: 'def2-TZVP',
    dispersion: 'D3(BJ)',
  },
  {
    name: 'BP86/def2-SVP, low-spin leaning check',
    program: 'ORCA',
    functional: 'BP86',
    basis: 'def2-SVP',
    dispersion: 'D3(BJ)',
  },
  {
    name: 'B3LYP/def2-SVP',
    program: 'Gaussian',
    functional: 'B3LYP',
    basis: 'def2-SVP',
    dispersion: 'D3(BJ)',
  },
  {
    name: 'TPSSh/def2-TZVP in water',
    program: 'Gaussian',
    functional: 'TPSSh',
    basis: 'def2-TZVP',
    solvation: { model: 'SMD', solvent: 'water' },
  },
  { name: 'B3LYP/def2-SVP', program: 'NWChem', functional: 'B3LYP', basis: 'def2-SVP' },
  { name: 'PBE0/def2-SVP', program: 'Psi4', functional: 'PBE0', basis: 'def2-SVP' },
];
