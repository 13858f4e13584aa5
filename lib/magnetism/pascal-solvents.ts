import type { PascalRow } from './pascal-row';

/**
 * Common solvents: diamagnetic susceptibility in 10⁻⁶ cm³/mol (cgs-emu), per molecule. The last number is the molar mass, g/mol.
 * Source: G. A. Bain and J. F. Berry, J. Chem. Educ. 2008, 85, 532, table 6, recalled; rows marked handbook agree with
 * a reproduction that was read, rows marked soft were not seen again.
 */
export const pascalSolvents: readonly (readonly [...PascalRow, number])[] = [
  ['CCl4', -66.8, 'handbook', 153.811],
  ['CHCl3', -58.9, 'handbook', 119.369],
  ['CH2Cl2', -46.6, 'soft', 84.927],
  ['CH3Cl', -32, 'soft', 50.485],
  ['CH3NO2', -21, 'soft', 61.04],
  ['CH3OH', -21.4, 'soft', 32.042],
  ['CCl3COOH', -73, 'soft', 163.378],
  ['CF3COOH', -43.3, 'soft', 114.022],
  ['CH3CN', -27.8, 'soft', 41.053],
  ['1,2-C2H4Cl2', -59.6, 'soft', 98.954],
  ['CH3COOH', -31.8, 'handbook', 60.052],
  ['C2H5OH', -33.7, 'soft', 46.069],
  ['HOCH2CH2OH', -38.9, 'soft', 62.068],
  ['C2H5SH', -44.9, 'soft', 62.13],
  ['acetone', -33.8, 'handbook', 58.08],
  ['acetic anhydride', -52.8, 'soft', 102.089],
  ['C3H7CN', -50.4, 'soft', 69.107],
  ['ethyl acetate', -54.1, 'soft', 88.106],
  ['C4H9OH (n)', -56.4, 'soft', 74.123],
  ['diethyl ether', -55.5, 'handbook', 74.123],
  ['n-pentane', -61.5, 'soft', 72.151],
  ['o-C6H4Cl2', -84.4, 'soft', 146.998],
  ['benzene', -54.8, 'handbook', 78.114],
  ['cyclohexane', -68, 'handbook', 84.162],
  ['n-hexane', -74.1, 'soft', 86.178],
  ['triethylamine', -83.3, 'soft', 101.193],
  ['benzonitrile', -65.2, 'soft', 103.124],
  ['toluene', -65.6, 'soft', 92.141],
  ['isooctane', -99.1, 'soft', 114.232],
  ['naphthalene', -91.6, 'soft', 128.174],
];
