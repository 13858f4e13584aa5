import type { At, InputQuantity, StepDefinition } from './worked-step';

/**
 * Evaluates steps in order for given input values.
 * @param inputs - the quantities, in the order of `values`
 * @param values - one number per input, in its unit
 * @returns one number per step; NaN where a formula has no real value
 * Errors: throws when a step names a key that is neither an input nor an earlier step (a bug).
 */
export function evaluateSteps(
  inputs: readonly InputQuantity[],
  steps: readonly StepDefinition[],
  values: readonly number[],
): { results: number[]; at: At } {
  const known = new Map<string, number>();
  inputs.forEach((input, i) => known.set(input.key, values[i] ?? Number.NaN));
  const at: At = (key) => {
    const value = known.get(key);
    if (value === undefined) throw new Error(`step refers to unknown key "${key}"`);
    return value;
  };
  const results = steps.map((step) => {
    const value = step.evaluate(at);
    known.set(step.key, value);
    return value;
  });
  return { results, at };
}
