import { err, ok, type Result } from '../result';
import { isMetal } from './elements';
import { hillFormula } from './formula';
import { parseFormula } from './parse-formula';

/** What outputs of a complex are known by. */
export interface ComplexIdentity {
  /** Hill formula, as readers print it. */
  composition: string;
  charge: number;
  /** Metals of the formula, each once. */
  metals: string[];
}

/**
 * Composition, charge and metals of a complex ion written as a formula: "[CuCl4]2-", "[Fe(OH2)6]2+".
 * Errors: as a Result with a sentence on what is wrong and where.
 */
export function complexIdentity(formula: string): Result<ComplexIdentity, string> {
  const parsed = parseFormula(formula);
  if (!parsed.ok) return err(parsed.error.message);
  const elements: string[] = [];
  for (const [element, count] of Object.entries(parsed.value.composition)) {
    if (!Number.isInteger(count))
      return err(`the formula counts ${count} atoms of ${element}; give the complex without its solvate`);
    if (elements.length + count > 5000) return err('the formula holds more than 5,000 atoms');
    for (let n = 0; n < count; n++) elements.push(element);
  }
  const metals = Object.keys(parsed.value.composition).filter(isMetal);
  if (metals.length === 0) return err('the formula holds no metal');
  return ok({ composition: hillFormula(elements), charge: parsed.value.charge, metals });
}
