/**
 * Baur's bond-length distortion index D = (1/n) Σ |lᵢ − l̄| / l̄.
 * @param distancesAngstrom - metal–donor distances, > 0
 * @returns 0 (all equal) upwards, without unit; null for no distance
 * Source: W. H. Baur, Acta Cryst. 1974, B30, 1195. Checked against: tests/published/geometry.test.ts.
 */
export function baurDistortion(distancesAngstrom: readonly number[]): number | null {
  const n = distancesAngstrom.length;
  if (n === 0) return null;
  const mean = distancesAngstrom.reduce((sum, d) => sum + d, 0) / n;
  return distancesAngstrom.reduce((sum, d) => sum + Math.abs(d - mean), 0) / (n * mean);
}
