import type { Program } from '../../outputs/record';

/** How a program spells a functional, or why it cannot run it. */
export type Spelling = { keyword: string } | { refusal: string };

const names = (orca: string, gaussian: string, nwchem: string, psi4: string): Record<Program, Spelling> => ({
  ORCA: { keyword: orca },
  Gaussian: { keyword: gaussian },
  NWChem: { keyword: nwchem },
  Psi4: { keyword: psi4 },
});

/**
 * Functionals by their usual name. B3LYP is the form with VWN's RPA fit (as Gaussian defines it): ORCA
 * spells that one B3LYP/G, its plain B3LYP takes VWN5. B3LYP* has 15 % exact exchange (Salomon, Reiher
 * and Hess, J. Chem. Phys. 2002, 117, 4729). Spellings: the programs' manuals (ORCA 5/6, Gaussian 16,
 * NWChem 7.0, Psi4 1.3); NWChem's and Psi4's are run in tests/integration/decks.test.ts as far as named there.
 */
export const functionalNames: Readonly<Record<string, Record<Program, Spelling>>> = {
  B3LYP: names('B3LYP/G', 'B3LYP', 'b3lyp', 'b3lyp'),
  'B3LYP*': {
    ORCA: { refusal: 'ORCA has no keyword for B3LYP*' },
    Gaussian: { refusal: 'Gaussian has no keyword for B3LYP*' },
    NWChem: { keyword: 'HFexch 0.15 slater 0.85 becke88 nonlocal 0.72 lyp 0.81 vwn_1_rpa 0.19' },
    Psi4: { refusal: 'Psi4 has no keyword for B3LYP*' },
  },
  PBE0: names('PBE0', 'PBE1PBE', 'pbe0', 'pbe0'),
  PBE: names('PBE', 'PBEPBE', 'xpbe96 cpbe96', 'pbe'),
  BP86: names('BP86', 'BP86', 'becke88 perdew86', 'bp86'),
  BLYP: names('BLYP', 'BLYP', 'becke88 lyp', 'blyp'),
  TPSS: names('TPSS', 'TPSSTPSS', 'xtpss03 ctpss03', 'tpss'),
  TPSSh: names('TPSSh', 'TPSSh', 'xctpssh', 'tpssh'),
  'M06-L': names('M06L', 'M06L', 'm06-l', 'm06-l'),
  M06: names('M06', 'M06', 'm06', 'm06'),
  r2SCAN: {
    ORCA: { keyword: 'r2SCAN' },
    Gaussian: { refusal: 'Gaussian 16 has no r2SCAN' },
    NWChem: { refusal: 'NWChem 7.0 has no r2SCAN' },
    Psi4: { refusal: 'Psi4 1.3 has no r2SCAN' },
  },
  'ωB97X-D': {
    ORCA: { refusal: 'ORCA has ωB97X-D3, which is another functional' },
    Gaussian: { keyword: 'wB97XD' },
    NWChem: { refusal: 'NWChem 7.0 has no ωB97X-D' },
    Psi4: { keyword: 'wb97x-d' },
  },
};

/** Meta-GGAs: second derivatives are taken numerically where a program has no analytic ones for them. */
export const isMetaGga = (functional: string): boolean =>
  ['TPSS', 'TPSSh', 'M06-L', 'M06', 'r2SCAN'].includes(functional);

export const isHybrid = (functional: string): boolean =>
  ['B3LYP', 'B3LYP*', 'PBE0', 'TPSSh', 'M06', 'ωB97X-D'].includes(functional);

/** Dispersion is part of the functional itself. */
export const hasOwnDispersion = (functional: string): boolean => functional === 'ωB97X-D';
