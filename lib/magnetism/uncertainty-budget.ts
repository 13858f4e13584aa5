import type { InputQuantity } from './worked-step';
import { studentT } from './student-t';

/** One line of the budget: how much one input adds to the variance of the result. */
export interface BudgetLine {
  key: string;
  symbol: string;
  label: string;
  value: number;
  u: number;
  unit: string;
  /** ∂result/∂input, result unit per input unit */
  sensitivity: number;
  /** |sensitivity| × u, in the unit of the result */
  contribution: number;
  /** Share of the variance, 0–1 */
  share: number;
}

export interface UncertaintyBudget {
  lines: BudgetLine[];
  /** Combined standard uncertainty */
  u: number;
  /** ν_eff by Welch and Satterthwaite; null when every u is taken as well known (normal coverage factor) */
  effectiveDegreesOfFreedom: number | null;
  level: number;
  coverageFactor: number;
  expandedU: number;
}

/**
 * Budget of contributions with expanded uncertainty. Inputs whose u comes from n replicates carry n − 1 degrees of
 * freedom, stated uncertainties count as well known.
 * @param sensitivities - ∂result/∂input in the order of the inputs
 * @param level - coverage probability of the expanded uncertainty
 * Source: JCGM 100:2008 (GUM) 8 and G.4.1.
 */
export function uncertaintyBudget(
  inputs: readonly InputQuantity[],
  sensitivities: readonly number[],
  level = 0.95,
): UncertaintyBudget {
  const parts = inputs.map((input, i) => {
    const sensitivity = sensitivities[i] ?? 0;
    return { input, sensitivity, contribution: Math.abs(sensitivity) * (input.u ?? 0) };
  });
  const variance = parts.reduce((sum, part) => sum + part.contribution ** 2, 0);
  const u = Math.sqrt(variance);
  const weight = parts.reduce(
    (sum, { input, contribution }) =>
      input.degreesOfFreedom === null ? sum : sum + contribution ** 4 / input.degreesOfFreedom,
    0,
  );
  const effectiveDegreesOfFreedom = weight === 0 ? null : u ** 4 / weight;
  const coverageFactor = studentT(level, Math.max(1, effectiveDegreesOfFreedom ?? Infinity));
  const lines = parts
    .filter((part) => part.contribution > 0)
    .map(({ input, sensitivity, contribution }) => ({
      key: input.key,
      symbol: input.symbol,
      label: input.label,
      value: input.value,
      u: input.u ?? 0,
      unit: input.unit,
      sensitivity,
      contribution,
      share: variance === 0 ? 0 : contribution ** 2 / variance,
    }))
    .sort((a, b) => b.share - a.share);
  return { lines, u, effectiveDegreesOfFreedom, level, coverageFactor, expandedU: coverageFactor * u };
}
