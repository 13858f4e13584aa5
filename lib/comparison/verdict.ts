/** What a measurement says of a candidate. */
export type Verdict = 'consistent' | 'excluded' | 'cannot tell';

/** An interval in μ_B. */
export interface Interval {
  low: number;
  high: number;
}

/**
 * Verdict of a measured moment on a candidate's expected band: consistent when the value lies in the band,
 * excluded when the whole coverage interval lies outside, cannot tell when only a part of it reaches in.
 * @param muBohr - measured moment, μ_B
 * @param expandedUBohr - half the coverage interval (k = 2), μ_B, ≥ 0
 */
export function momentVerdict(muBohr: number, expandedUBohr: number, band: Interval): Verdict {
  if (muBohr >= band.low && muBohr <= band.high) return 'consistent';
  const outside = muBohr + expandedUBohr < band.low || muBohr - expandedUBohr > band.high;
  return outside ? 'excluded' : 'cannot tell';
}
