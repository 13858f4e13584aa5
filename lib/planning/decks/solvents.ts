import type { Program } from '../../outputs/record';

/** Relative permittivity near 25 °C and each program's word for the solvent (null: none known). */
export interface Solvent {
  permittivity: number;
  names: Record<Program, string | null>;
}

const solvent = (
  permittivity: number,
  orca: string,
  gaussian: string,
  nwchem: string | null,
  psi4: string | null,
): Solvent => ({ permittivity, names: { ORCA: orca, Gaussian: gaussian, NWChem: nwchem, Psi4: psi4 } });

/** Permittivities from memory (CRC Handbook); names from the programs' manuals. NWChem's column is for SMD. */
export const solvents: Readonly<Record<string, Solvent>> = {
  water: solvent(78.36, 'Water', 'Water', 'water', 'Water'),
  acetonitrile: solvent(35.69, 'Acetonitrile', 'Acetonitrile', 'acetntrl', 'Acetonitrile'),
  methanol: solvent(32.61, 'Methanol', 'Methanol', 'methanol', 'Methanol'),
  ethanol: solvent(24.85, 'Ethanol', 'Ethanol', 'ethanol', 'Ethanol'),
  dichloromethane: solvent(8.93, 'CH2Cl2', 'Dichloromethane', null, 'Methylene Chloride'),
  chloroform: solvent(4.71, 'Chloroform', 'Chloroform', null, 'Chloroform'),
  tetrahydrofuran: solvent(7.43, 'THF', 'TetraHydroFuran', 'thf', null),
  'dimethyl sulfoxide': solvent(46.83, 'DMSO', 'DiMethylSulfoxide', 'dmso', null),
  dimethylformamide: solvent(37.22, 'DMF', 'n,n-DiMethylFormamide', 'dmf', null),
  acetone: solvent(20.49, 'Acetone', 'Acetone', 'acetone', 'Acetone'),
  toluene: solvent(2.37, 'Toluene', 'Toluene', 'toluene', 'Toluene'),
  benzene: solvent(2.27, 'Benzene', 'Benzene', 'benzene', 'Benzene'),
};
