import { ok, type Result } from '../../result';
import { applyRecipeStep } from './apply-recipe-step';
import { findClashes, type Clash } from './find-clashes';
import type { BondedStructure, RecipeProblem, RecipeStep } from './recipe';

export interface DerivedStructure extends BondedStructure {
  recipe: readonly RecipeStep[];
  clashes: readonly Clash[];
}

/** Apply a recipe step by step and look for clashes in the result. The first step that fails is the answer. */
export function deriveStructure(
  start: BondedStructure,
  recipe: readonly RecipeStep[],
  covalentRadiusAngstrom: (element: string) => number | null,
): Result<DerivedStructure, RecipeProblem> {
  let current = start;
  for (const step of recipe) {
    const next = applyRecipeStep(current, step);
    if (!next.ok) return next;
    current = next.value;
  }
  return ok({ ...current, recipe, clashes: findClashes(current, covalentRadiusAngstrom) });
}
