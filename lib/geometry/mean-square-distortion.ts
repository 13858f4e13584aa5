/**
 * Mean-square relative bond-length distortion Δ = (1/n) Σ ((lᵢ − l̄)/l̄)²; often printed times 10³ or 10⁴,
 * here as it is.
 * @param distancesAngstrom - metal–donor distances, > 0
 * @returns 0 (all equal) upwards, without unit; null for no distance
 * Source: I. D. Brown & R. D. Shannon, Acta Cryst. 1973, A29, 266. Checked against:
 * tests/published/geometry.test.ts.
 */
export function meanSquareDistortion(distancesAngstrom: readonly number[]): number | null {
  const n = distancesAngstrom.length;
  if (n === 0) return null;
  const mean = distancesAngstrom.reduce((sum, d) => sum + d, 0) / n;
  return distancesAngstrom.reduce((sum, d) => sum + ((d - mean) / mean) ** 2, 0) / n;
}
