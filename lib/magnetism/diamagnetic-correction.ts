import { err, ok, type Result } from '../result';
import { findPascalConstant, type PascalTable } from './pascal-constants';

/** A line of the correction: a table entry, or a value measured on the free ligand or its salt. */
export type DiamagneticPart =
  | { kind: 'table'; table: PascalTable; name: string; count: number }
  | {
      kind: 'measured';
      name: string;
      count: number;
      valueMicroCm3PerMol: number;
      uMicroCm3PerMol: number | null;
      source: string;
    };

export interface DiamagneticLine {
  name: string;
  count: number;
  valueMicroCm3PerMol: number;
  subtotalMicroCm3PerMol: number;
  source: string;
  tag: 'handbook' | 'soft' | 'measured';
}

export interface DiamagneticCorrection {
  /** χ_dia of the formula unit, cm³/mol, cgs-emu; negative for diamagnetism */
  chiDiaCm3PerMol: number;
  uCm3PerMol: number;
  method: 'Pascal constants' | 'half molar mass';
  lines: DiamagneticLine[];
  note: string;
}

export interface DiamagneticError {
  code: 'unknown entry' | 'bad count' | 'no parts';
  message: string;
}

/** Relative standard uncertainty given to tabulated constants: compilations differ by up to this much (common practice). */
const TABLE_RELATIVE_U = 0.1;
/** Spread of the −M/2 rule for salts, as its own table of examples shows (about ±30 %). */
const RULE_RELATIVE_U = 0.3;

/**
 * Diamagnetic correction as a sum of Pascal's constants: χ_dia = Σ nᵢ χᵢ + Σ mₖ λₖ, ions and ligands taken whole.
 * u: 10 % of each tabulated value, added linearly since a compilation errs in one direction; the stated u of each
 * measured value, added in quadrature.
 * @param parts - lines of the editor; counts may be fractional for partial solvates
 * Errors: as a Result when a name is in no table, a count is negative or the list is empty.
 * Source: Bain & Berry, J. Chem. Educ. 2008, 85, 532. Checked against: tests/published/magnetism-diamagnetic.test.ts.
 */
export function pascalCorrection(
  parts: readonly DiamagneticPart[],
): Result<DiamagneticCorrection, DiamagneticError> {
  if (parts.length === 0)
    return err({ code: 'no parts', message: 'Add at least one ion, ligand or atom to the correction.' });
  const lines: DiamagneticLine[] = [];
  let tabulatedU = 0;
  let measuredVariance = 0;
  for (const part of parts) {
    if (!Number.isFinite(part.count) || part.count < 0)
      return err({ code: 'bad count', message: `The count of ${part.name} must be 0 or more.` });
    const found = part.kind === 'table' ? findPascalConstant(part.table, part.name) : undefined;
    if (part.kind === 'table' && !found)
      return err({
        code: 'unknown entry',
        message: `No entry "${part.name}" among the ${part.table}: pick one from the list or enter a measured value.`,
      });
    const value = part.kind === 'table' ? (found?.valueMicroCm3PerMol ?? 0) : part.valueMicroCm3PerMol;
    const subtotal = part.count * value;
    if (part.kind === 'measured') measuredVariance += (part.count * (part.uMicroCm3PerMol ?? 0)) ** 2;
    else tabulatedU += TABLE_RELATIVE_U * Math.abs(subtotal);
    lines.push({
      name: part.name,
      count: part.count,
      valueMicroCm3PerMol: value,
      subtotalMicroCm3PerMol: subtotal,
      source: part.kind === 'table' ? (found?.source ?? '') : part.source,
      tag: part.kind === 'table' ? (found?.tag ?? 'soft') : 'measured',
    });
  }
  const total = lines.reduce((sum, line) => sum + line.subtotalMicroCm3PerMol, 0);
  return ok({
    chiDiaCm3PerMol: total * 1e-6,
    uCm3PerMol: Math.hypot(tabulatedU, Math.sqrt(measuredVariance)) * 1e-6,
    method: 'Pascal constants',
    lines,
    note: 'u: 10 % of the tabulated values (common practice)',
  });
}

/**
 * Rule of thumb χ_dia ≈ −(M/2)·10⁻⁶ cm³/mol: an order of magnitude, about ±30 % for salts.
 * @param molarMassGramPerMole - > 0
 * Source: Bain & Berry, J. Chem. Educ. 2008, 85, 532 (given there as a simple estimate).
 */
export function halfMolarMassCorrection(molarMassGramPerMole: number): DiamagneticCorrection {
  if (!(molarMassGramPerMole > 0))
    throw new RangeError(`molarMassGramPerMole must be above 0, received ${molarMassGramPerMole}`);
  const chiDiaCm3PerMol = -0.5e-6 * molarMassGramPerMole;
  return {
    chiDiaCm3PerMol,
    uCm3PerMol: RULE_RELATIVE_U * Math.abs(chiDiaCm3PerMol),
    method: 'half molar mass',
    lines: [],
    note: 'rule of thumb −(M/2)·10⁻⁶, good to about 30 %',
  };
}
