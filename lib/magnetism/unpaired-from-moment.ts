/** Number of unpaired electrons read from a moment by the spin-only formula; `u…` are standard uncertainties. */
export interface UnpairedElectrons {
  unpaired: number;
  uUnpaired: number | null;
  /** S = n/2 */
  spin: number;
  uSpin: number | null;
  /** The whole number of electrons nearest to n. */
  nearest: number;
}

/**
 * Unpaired electrons n = √(1 + μ²) − 1, the inverse of μ = √(n(n + 2)); orbital contributions are ignored, so n is
 * too high for ions with a large orbital part and too low below it. u(n) = μ u(μ)/√(1 + μ²) (GUM, first order).
 * @param muEff - effective moment, μ_B, ≥ 0
 * @param uMuEff - its standard uncertainty, μ_B; null when unknown
 * Errors: throws RangeError for negative or non-finite input (caller's bug).
 * Checked against: tests/published/magnetism-spin-only.test.ts.
 */
export function unpairedFromMoment(muEff: number, uMuEff: number | null): UnpairedElectrons {
  if (!Number.isFinite(muEff) || muEff < 0)
    throw new RangeError(`muEff must be a number ≥ 0, received ${muEff}`);
  if (uMuEff !== null && (!Number.isFinite(uMuEff) || uMuEff < 0))
    throw new RangeError(`uMuEff must be a number ≥ 0 or null, received ${uMuEff}`);
  const root = Math.hypot(1, muEff);
  const unpaired = root - 1;
  const uUnpaired = uMuEff === null ? null : (muEff / root) * uMuEff;
  return {
    unpaired,
    uUnpaired,
    spin: unpaired / 2,
    uSpin: uUnpaired === null ? null : uUnpaired / 2,
    nearest: Math.round(unpaired),
  };
}
