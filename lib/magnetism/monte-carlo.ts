import type { UncertainInput } from './propagate-uncertainty';
import { seededRandom } from './seeded-random';

export interface MonteCarloResult {
  mean: number;
  /** Standard deviation of the draws: the Monte Carlo standard uncertainty */
  u: number;
  /** Shortest-to-read interval: equal tails outside `level` */
  interval: { low: number; high: number };
  level: number;
  /** Draws with a real value; the others (root of a negative number) are counted in `undefinedDraws` */
  draws: number;
  undefinedDraws: number;
  seed: number;
}

/**
 * Monte Carlo propagation: every input drawn from a normal distribution, independently.
 * @param f - from input values to result values
 * @param options - seed (whole number), draws (≥ 100), level of the interval
 * @returns one entry per result; null where fewer than half of the draws have a real value
 * Source: JCGM 101:2008, clause 7, with a fixed number of trials. Deterministic for a given seed.
 */
export function monteCarlo(
  f: (values: readonly number[]) => number[],
  inputs: readonly UncertainInput[],
  { seed, draws = 20_000, level = 0.95 }: { seed: number; draws?: number; level?: number },
): (MonteCarloResult | null)[] {
  if (!Number.isInteger(draws) || draws < 100)
    throw new RangeError(`draws must be a whole number of at least 100, received ${draws}`);
  const random = seededRandom(seed);
  const columns: number[][] = [];
  for (let i = 0; i < draws; i += 1) {
    const results = f(inputs.map(({ value, u }) => (u === 0 ? value : value + u * random.normal())));
    results.forEach((result, r) => (columns[r] ??= []).push(result));
  }
  return columns.map((column) => {
    const real = column.filter(Number.isFinite).sort((a, b) => a - b);
    if (real.length < draws / 2) return null;
    const mean = real.reduce((sum, value) => sum + value, 0) / real.length;
    const variance = real.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (real.length - 1);
    const quantile = (p: number) => real[Math.min(real.length - 1, Math.floor(p * real.length))] ?? mean;
    return {
      mean,
      u: Math.sqrt(variance),
      interval: { low: quantile((1 - level) / 2), high: quantile((1 + level) / 2) },
      level,
      draws: real.length,
      undefinedDraws: draws - real.length,
      seed,
    };
  });
}
