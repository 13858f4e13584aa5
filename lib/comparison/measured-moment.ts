import { replicateStatistics, type ReplicateStatistics } from '../magnetism/replicate-statistics';
import { unpairedFromMoment } from '../magnetism/unpaired-from-moment';

/** Coverage factor of every expanded uncertainty shown beside a calculated value (about 95 %). */
export const COVERAGE_FACTOR = 2;

export interface MeasuredMoment {
  muBohr: number;
  /** Standard uncertainty: scatter of the mean and systematic part in quadrature. */
  uMuBohr: number;
  unpaired: number;
  uUnpaired: number;
  statistics: ReplicateStatistics;
  /** A single value shows no scatter: the uncertainty is then the systematic part alone. */
  scatterKnown: boolean;
}

/**
 * Effective moment and number of unpaired electrons from replicates, μ_B.
 * u² = s²/n + u_sys², the type A part of the mean and what repeats do not show. Source: JCGM 100:2008, 5.1.2.
 * @param replicatesBohr - effective moments of the replicates, μ_B, at least one, each ≥ 0
 * @param uSystematicBohr - standard uncertainty common to all replicates, μ_B
 * @returns null when there is no usable replicate
 */
export function measuredMoment(
  replicatesBohr: readonly number[],
  uSystematicBohr: number,
): MeasuredMoment | null {
  const statistics = replicateStatistics(replicatesBohr);
  if (!statistics.ok) return null;
  const { mean, standardError } = statistics.value;
  const uMuBohr = Math.hypot(standardError ?? 0, uSystematicBohr);
  const { unpaired, uUnpaired } = unpairedFromMoment(mean, uMuBohr);
  return {
    muBohr: mean,
    uMuBohr,
    unpaired,
    uUnpaired: uUnpaired ?? 0,
    statistics: statistics.value,
    scatterKnown: standardError !== null,
  };
}
