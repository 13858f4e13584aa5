import { pascalAnions } from './pascal-anions';
import { pascalAtoms } from './pascal-atoms';
import { pascalCations } from './pascal-cations';
import { pascalConstitutive } from './pascal-constitutive';
import { pascalLigands } from './pascal-ligands';
import type { PascalRow } from './pascal-row';
import { pascalSolvents } from './pascal-solvents';

export type PascalTable = 'atoms' | 'constitutive' | 'cations' | 'anions' | 'ligands' | 'solvents';

/** One diamagnetic contribution, 10⁻⁶ cm³/mol (cgs-emu, negative for diamagnetism). */
export interface PascalConstant {
  table: PascalTable;
  name: string;
  valueMicroCm3PerMol: number;
  /** handbook: agrees with a reproduction that was read; soft: recalled only */
  tag: 'handbook' | 'soft';
  source: string;
}

const tables: Record<PascalTable, { rows: readonly PascalRow[]; number: number }> = {
  atoms: { rows: pascalAtoms, number: 1 },
  constitutive: { rows: pascalConstitutive, number: 2 },
  cations: { rows: pascalCations, number: 3 },
  anions: { rows: pascalAnions, number: 4 },
  ligands: { rows: pascalLigands, number: 5 },
  solvents: { rows: pascalSolvents.map(([name, value, tag]) => [name, value, tag] as const), number: 6 },
};

function toConstant(table: PascalTable, [name, value, tag]: PascalRow): PascalConstant {
  const support = tag === 'handbook' ? 'agreeing reproduction read' : 'recalled';
  return {
    table,
    name,
    valueMicroCm3PerMol: value,
    tag,
    source: `Bain & Berry, J. Chem. Educ. 2008, 85, 532, table ${tables[table].number} (${support})`,
  };
}

/** Every entry of one table, in printed order, for the editor's pickers. */
export function listPascalConstants(table: PascalTable): PascalConstant[] {
  return tables[table].rows.map((row) => toConstant(table, row));
}

/** The entry of a table by its printed name, letter for letter; undefined when there is none. */
export function findPascalConstant(table: PascalTable, name: string): PascalConstant | undefined {
  const row = tables[table].rows.find(([rowName]) => rowName === name);
  return row && toConstant(table, row);
}
