import { err, ok, type Result } from '../result';
import { studentT } from './student-t';

/** Mean, scatter and t-interval of repeated determinations, in the unit of the values. */
export interface ReplicateStatistics {
  count: number;
  mean: number;
  /** s with n − 1 in the denominator; null for a single value */
  sampleStandardDeviation: number | null;
  /** s/√n: the type A standard uncertainty of the mean; null for a single value */
  standardError: number | null;
  degreesOfFreedom: number;
  /** Coverage probability of `interval`, as asked for */
  level: number;
  /** Student's t for that level and these degrees of freedom; null for a single value */
  coverageFactor: number | null;
  interval: { low: number; high: number } | null;
}

export interface ReplicateError {
  code: 'no values' | 'not a number';
  message: string;
  /** 0-based place of the offending value; null when there are none */
  index: number | null;
}

/**
 * Statistics of replicates. No value is dropped. One value gives a mean and no scatter: the standard deviation is
 * then absent, not zero.
 * @param values - the replicates, all in one unit
 * @param level - coverage probability of the t-interval, between 0 and 1
 * Errors: as a Result for an empty list or a value that is no number; throws RangeError for an impossible level.
 * Source: JCGM 100:2008 (GUM) 4.2 and G.3. Checked against: GUM H.5-style arithmetic and table G.2 in tests.
 */
export function replicateStatistics(
  values: readonly number[],
  level = 0.95,
): Result<ReplicateStatistics, ReplicateError> {
  if (!(level > 0 && level < 1)) throw new RangeError(`level must lie between 0 and 1, received ${level}`);
  if (values.length === 0)
    return err({ code: 'no values', message: 'Enter at least one replicate.', index: null });
  const bad = values.findIndex((value) => !Number.isFinite(value));
  if (bad >= 0)
    return err({
      code: 'not a number',
      message: `Replicate ${bad + 1} is not a number: correct or remove it.`,
      index: bad,
    });
  const count = values.length;
  const mean = values.reduce((sum, value) => sum + value, 0) / count;
  const base = { count, mean, degreesOfFreedom: count - 1, level };
  if (count === 1)
    return ok({
      ...base,
      sampleStandardDeviation: null,
      standardError: null,
      coverageFactor: null,
      interval: null,
    });
  // Two passes: squares are summed about the mean so that close values keep their digits.
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  const sampleStandardDeviation = Math.sqrt(squares / (count - 1));
  const standardError = sampleStandardDeviation / Math.sqrt(count);
  const coverageFactor = studentT(level, count - 1);
  const half = coverageFactor * standardError;
  return ok({
    ...base,
    sampleStandardDeviation,
    standardError,
    coverageFactor,
    interval: { low: mean - half, high: mean + half },
  });
}
