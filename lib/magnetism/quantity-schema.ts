import { z } from 'zod';
import { replicateStatistics } from './replicate-statistics';

/** A number with what is known of its spread. */
export interface Quantity {
  value: number;
  /** Standard uncertainty in the same unit; null when none is stated */
  u: number | null;
  /** n − 1 when u comes from replicates; null otherwise */
  degreesOfFreedom: number | null;
}

export interface QuantityRule {
  /** What the field is, in words, for messages */
  label: string;
  unit: string;
  range: 'above zero' | 'zero or more' | 'any';
  /** What usually lies behind a value out of range, and what to do */
  advice?: string;
  /** Largest value allowed */
  most?: number;
}

function fault(value: unknown, rule: QuantityRule): string | null {
  if (value === undefined || value === null || value === '')
    return `The ${rule.label} is missing: enter it in ${rule.unit}.`;
  if (typeof value === 'string')
    return /^[\s\d.,+\-−eE]+$/.test(value)
      ? `The ${rule.label} came as text ("${value}"): write a number with a decimal point, such as ${
          value.includes(',') && !value.includes('.') ? value.replace(',', '.') : '0.25'
        }.`
      : `The ${rule.label} ("${value}") is not a number: enter it in ${rule.unit}.`;
  if (typeof value !== 'number' || !Number.isFinite(value))
    return `The ${rule.label} must be a number in ${rule.unit}.`;
  const advice = rule.advice ? ` ${rule.advice}` : '';
  if (rule.range === 'above zero' && value <= 0)
    return `The ${rule.label} must be above 0 ${rule.unit}, not ${value}.${advice}`;
  if (rule.range === 'zero or more' && value < 0)
    return `The ${rule.label} must be 0 ${rule.unit} or more, not ${value}.${advice}`;
  if (rule.most !== undefined && value > rule.most)
    return `The ${rule.label} must be at most ${rule.most} ${rule.unit}, not ${value}.${advice}`;
  return null;
}

/**
 * Schema of a quantity. Accepts a plain number (no uncertainty stated), `{ value, u }` with the standard
 * uncertainty, or `{ replicates: [...], u }`, which becomes the mean with the standard error of the replicates and
 * the instrument's own u combined in quadrature.
 */
export function quantitySchema(rule: QuantityRule) {
  return z
    .unknown()
    .transform((raw, ctx): Quantity => {
      const issue = (message: string) => {
        ctx.addIssue({ code: 'custom', message });
        return z.NEVER;
      };
      const given: Record<string, unknown> =
        typeof raw === 'object' && raw !== null ? (raw as Record<string, unknown>) : { value: raw };
      const u = given.u ?? null;
      if (u !== null && (typeof u !== 'number' || !Number.isFinite(u) || u < 0))
        return issue(`The uncertainty of the ${rule.label} must be a number of ${rule.unit}, 0 or more.`);
      if (given.replicates === undefined) {
        const problem = fault(given.value, rule);
        return problem ? issue(problem) : { value: Number(given.value), u, degreesOfFreedom: null };
      }
      if (!Array.isArray(given.replicates) || given.replicates.length === 0)
        return issue(`The replicates of the ${rule.label} must be a list of numbers in ${rule.unit}.`);
      const replicates: unknown[] = given.replicates;
      for (const [i, value] of replicates.entries()) {
        const problem = fault(value, { ...rule, label: `${rule.label}, replicate ${i + 1},` });
        if (problem) return issue(problem);
      }
      const statistics = replicateStatistics(replicates.map(Number));
      if (!statistics.ok) return issue(statistics.error.message);
      const { mean, standardError, degreesOfFreedom } = statistics.value;
      if (standardError === null) return { value: mean, u, degreesOfFreedom: null };
      return { value: mean, u: Math.hypot(standardError, u ?? 0), degreesOfFreedom };
    })
    .meta({
      description: `${rule.label}, ${rule.unit}, ${rule.range}: number | { value, u } | { replicates, u }`,
    });
}
