import { dBlockGroup, dElectronCount } from '../chemistry/electron-configuration';
import { electronCount } from '../chemistry/electron-count';
import { atomicNumber, elementSymbol } from '../chemistry/elements';
import { hillFormula } from '../chemistry/formula';
import { ligandElectronCount, type Ligand } from '../chemistry/ligand';
import { ligandDictionary } from '../chemistry/ligand-dictionary';
import { formulaElements } from '../chemistry/formula-elements';
import { err, ok, type Result } from '../result';
import type { Complex } from './complex';

export interface ResolvedMetal {
  element: string;
  oxidationState: number;
  dElectrons: number;
  coordinationNumber: number;
  geometry: string | null;
}

/** A complex with its dictionary entries filled in, its sums checked and its electrons counted. */
export interface ResolvedComplex {
  metals: readonly ResolvedMetal[];
  ligands: readonly { ligand: Ligand; count: number }[];
  charge: number;
  elements: readonly string[];
  formula: string;
  electrons: number;
}

export interface ComplexProblem {
  code:
    | 'unknown element'
    | 'no d block metal'
    | 'impossible oxidation state'
    | 'unknown ligand'
    | 'bad ligand formula'
    | 'ligand parity'
    | 'charge does not add up'
    | 'coordination number missing'
    | 'coordination number impossible'
    | 'no electrons';
  message: string;
}

const problem = (code: ComplexProblem['code'], message: string) => err({ code, message });

/**
 * Look up the ligands of a complex, check its charges and electron counts and its coordination numbers.
 * Errors: see `ComplexProblem`; the first found is returned.
 */
export function resolveComplex(complex: Complex): Result<ResolvedComplex, ComplexProblem> {
  const ligands: { ligand: Ligand; count: number }[] = [];
  for (const { ligand: choice, count } of complex.ligands) {
    const ligand = typeof choice === 'string' ? ligandDictionary[choice] : choice;
    if (!ligand)
      return problem('unknown ligand', `no ligand "${String(choice)}" in the dictionary; give its formula`);
    const electrons = ligandElectronCount(ligand);
    if (electrons === null)
      return problem('bad ligand formula', `"${ligand.formula}" of ligand ${ligand.name} is no formula`);
    if ((electrons - ligand.unpairedElectrons) % 2 !== 0)
      return problem(
        'ligand parity',
        `ligand ${ligand.name} has ${electrons} electrons, which cannot leave ${ligand.unpairedElectrons} unpaired`,
      );
    ligands.push({ ligand, count });
  }

  const metals: ResolvedMetal[] = [];
  for (const metal of complex.metals) {
    const element = elementSymbol(metal.element);
    if (element === null || atomicNumber(element) === null)
      return problem('unknown element', `"${metal.element}" is no element`);
    const dElectrons = dElectronCount(element, metal.oxidationState);
    if (dElectrons === null) {
      return dBlockGroup(element) === null
        ? problem('no d block metal', `${element} has no d-electron count; the planner covers groups 3–12`)
        : problem(
            'impossible oxidation state',
            `${element} in oxidation state ${metal.oxidationState} leaves no d count between 0 and 10`,
          );
    }
    const coordinationNumber = metal.coordinationNumber ?? fromLigands(complex, ligands);
    if (coordinationNumber === null)
      return problem(
        'coordination number missing',
        'with several metals every metal needs its coordination number',
      );
    if (coordinationNumber < 2 || coordinationNumber > 8)
      return problem(
        'coordination number impossible',
        `${element} would have coordination number ${coordinationNumber}; 2 to 8 are covered`,
      );
    metals.push({
      element,
      oxidationState: metal.oxidationState,
      dElectrons,
      coordinationNumber,
      geometry: metal.geometry ?? null,
    });
  }

  const chargeSum =
    metals.reduce((sum, metal) => sum + metal.oxidationState, 0) +
    ligands.reduce((sum, { ligand, count }) => sum + ligand.charge * count, 0);
  if (chargeSum !== complex.charge)
    return problem(
      'charge does not add up',
      `oxidation states and ligand charges add up to ${chargeSum}, the complex says ${complex.charge}`,
    );

  const elements = [
    ...metals.map((metal) => metal.element),
    ...ligands.flatMap(({ ligand, count }) =>
      Array.from({ length: count }, () => formulaElements(ligand.formula) ?? []).flat(),
    ),
  ];
  const electrons = electronCount(elements, complex.charge);
  if (electrons === null) return problem('no electrons', 'the charge is larger than the nuclear charge');
  return ok({ metals, ligands, charge: complex.charge, elements, formula: hillFormula(elements), electrons });
}

function fromLigands(complex: Complex, ligands: readonly { ligand: Ligand; count: number }[]): number | null {
  if (complex.metals.length > 1) return null;
  return ligands.reduce((sum, { ligand, count }) => sum + ligand.donors.length * count, 0);
}
