/**
 * Spin-only effective moment μ_so = √(n(n + 2)) = 2√(S(S + 1)), in Bohr magnetons (g = 2, no orbital part).
 * @param unpaired - number of unpaired electrons n, ≥ 0 (a real number is allowed)
 * Errors: throws RangeError for a negative or non-finite n (caller's bug).
 * Source: textbook formula, e.g. Figgis & Lewis in Modern Coordination Chemistry (1960).
 * Checked against: tests/published/magnetism-spin-only.test.ts.
 */
export function spinOnlyMoment(unpaired: number): number {
  if (!Number.isFinite(unpaired) || unpaired < 0)
    throw new RangeError(`unpaired must be a number ≥ 0, received ${unpaired}`);
  return Math.sqrt(unpaired * (unpaired + 2));
}
