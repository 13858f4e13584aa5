import { evaluateSteps } from './evaluate-steps';
import { monteCarlo, type MonteCarloResult } from './monte-carlo';
import { propagateUncertainty } from './propagate-uncertainty';
import { uncertaintyBudget, type UncertaintyBudget } from './uncertainty-budget';
import type { InputQuantity, StepDefinition, WorkedStep } from './worked-step';

export interface WorkedCalculation {
  inputs: readonly InputQuantity[];
  steps: WorkedStep[];
  /** Value and standard uncertainty of a step; null where it has no real value or is not part of this calculation */
  result: (key: string) => { value: number; u: number } | null;
  /** Contributions to one step; null where it has no real value */
  budget: (key: string) => UncertaintyBudget | null;
  /** Monte Carlo propagation to one step, on demand */
  simulate: (key: string, options: { seed: number; draws?: number }) => MonteCarloResult | null;
}

const finiteOrNull = (value: number | undefined) =>
  value !== undefined && Number.isFinite(value) ? value : null;

/** Runs a chain of steps on inputs with uncertainty: every line gets its value, its numbers and its uncertainty. */
export function workedCalculation(
  inputs: readonly InputQuantity[],
  definitions: readonly StepDefinition[],
): WorkedCalculation {
  const uncertain = inputs.map(({ value, u }) => ({ value, u: u ?? 0 }));
  const f = (values: readonly number[]) => evaluateSteps(inputs, definitions, values).results;
  const propagated = propagateUncertainty(f, uncertain);
  const { at } = evaluateSteps(
    inputs,
    definitions,
    inputs.map((input) => input.value),
  );
  const place = (key: string) => definitions.findIndex((definition) => definition.key === key);
  const steps = definitions.map((definition, i): WorkedStep => {
    const value = finiteOrNull(propagated.values[i]);
    return {
      key: definition.key,
      symbol: definition.symbol,
      expression: definition.expression,
      numbers: definition.numbers(at),
      value,
      unit: definition.unit,
      u: value === null ? null : finiteOrNull(propagated.u[i]),
      source: definition.source,
    };
  });
  return {
    inputs,
    steps,
    result: (key) => {
      const step = steps[place(key)];
      return step && step.value !== null && step.u !== null ? { value: step.value, u: step.u } : null;
    },
    budget: (key) => {
      const sensitivities = propagated.sensitivities[place(key)];
      return sensitivities?.every(Number.isFinite) ? uncertaintyBudget(inputs, sensitivities) : null;
    },
    simulate: (key, options) => monteCarlo(f, uncertain, options)[place(key)] ?? null,
  };
}
