import { pascalSolvents } from './pascal-solvents';

/** Mass susceptibility of a solvent, cgs-emu. */
export interface SolventSusceptibility {
  name: string;
  /** cm³/g, negative */
  chiGCm3PerGram: number;
  molarMassGramPerMole: number;
  chiMCm3PerMol: number;
  tag: 'handbook' | 'soft';
  source: string;
}

/** Names that people also write; deuterated solvents take the value per mole of the ordinary one. */
const aliases: Readonly<Record<string, { name: string; molarMassGramPerMole?: number }>> = {
  chloroform: { name: 'CHCl3' },
  CDCl3: { name: 'CHCl3', molarMassGramPerMole: 120.38 },
  dichloromethane: { name: 'CH2Cl2' },
  CD2Cl2: { name: 'CH2Cl2', molarMassGramPerMole: 86.94 },
  methanol: { name: 'CH3OH' },
  CD3OD: { name: 'CH3OH', molarMassGramPerMole: 36.067 },
  ethanol: { name: 'C2H5OH' },
  acetonitrile: { name: 'CH3CN' },
  CD3CN: { name: 'CH3CN', molarMassGramPerMole: 44.071 },
  'acetone-d6': { name: 'acetone', molarMassGramPerMole: 64.117 },
  C6D6: { name: 'benzene', molarMassGramPerMole: 84.152 },
  'toluene-d8': { name: 'toluene', molarMassGramPerMole: 100.191 },
};

/** Names for pickers: table entries, water, and the aliases. */
export function listSolvents(): string[] {
  return ['water', ...pascalSolvents.map(([name]) => name), ...Object.keys(aliases)];
}

/**
 * Mass susceptibility of a solvent by name, from its molar susceptibility and molar mass.
 * @returns undefined when the solvent is in no table (then enter its χ_g)
 * Source: Bain & Berry, J. Chem. Educ. 2008, 85, 532, table 6; water: International Critical Tables.
 */
export function findSolventSusceptibility(name: string): SolventSusceptibility | undefined {
  if (name === 'water' || name === 'H2O' || name === 'D2O') {
    const molarMassGramPerMole = name === 'D2O' ? 20.028 : 18.015;
    // D2O takes the molar value of H2O, −12.97·10⁻⁶, as the deuterated organic solvents do.
    const chiMCm3PerMol = -0.72e-6 * 18.015;
    return {
      name,
      chiGCm3PerGram: chiMCm3PerMol / molarMassGramPerMole,
      molarMassGramPerMole,
      chiMCm3PerMol,
      tag: name === 'D2O' ? 'soft' : 'handbook',
      source: 'International Critical Tables, −0.72·10⁻⁶ cm³/g',
    };
  }
  const alias = aliases[name];
  const row = pascalSolvents.find(([rowName]) => rowName === (alias?.name ?? name));
  if (!row) return undefined;
  const [, micro, tag, tableMass] = row;
  const molarMassGramPerMole = alias?.molarMassGramPerMole ?? tableMass;
  return {
    name,
    chiGCm3PerGram: (micro * 1e-6) / molarMassGramPerMole,
    molarMassGramPerMole,
    chiMCm3PerMol: micro * 1e-6,
    tag: alias?.molarMassGramPerMole ? 'soft' : tag,
    source: 'Bain & Berry, J. Chem. Educ. 2008, 85, 532, table 6',
  };
}
