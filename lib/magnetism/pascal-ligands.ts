import type { PascalRow } from './pascal-row';

/**
 * Common ligands taken whole: diamagnetic susceptibility in 10⁻⁶ cm³/mol (cgs-emu), per ligand.
 * Source: G. A. Bain and J. F. Berry, J. Chem. Educ. 2008, 85, 532, table 5, recalled; rows marked handbook agree with
 * a reproduction that was read, rows marked soft were not seen again.
 */
export const pascalLigands: readonly PascalRow[] = [
  ['acetylacetonate (acac-)', -52, 'handbook'],
  ["2,2'-bipyridine", -105, 'handbook'],
  ['CO', -10, 'soft'],
  ['C5H5-', -65, 'soft'],
  ['1,2-ethanediamine (en)', -46.5, 'handbook'],
  ['ethylene', -15, 'soft'],
  ['glycinate', -37, 'handbook'],
  ['H2O', -13, 'handbook'],
  ['hydrazine', -20, 'soft'],
  ['malonate', -45, 'soft'],
  ['NH3', -18, 'handbook'],
  ['1,10-phenanthroline', -128, 'handbook'],
  ['o-phenylenebis(dimethylarsine)', -194, 'soft'],
  ['phthalocyanine', -442, 'soft'],
  ['PPh3', -167, 'handbook'],
  ['pyrazine', -50, 'soft'],
  ['pyridine', -49, 'handbook'],
  ['salen2-', -182, 'soft'],
  ['tetraphenylporphyrin', -700, 'soft'],
  ['urea', -34, 'soft'],
];
