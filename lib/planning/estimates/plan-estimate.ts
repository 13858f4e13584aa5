import type { Cluster } from '../cluster';
import type { WallTimeEstimate } from './wall-time-estimate';

export interface PlanEstimate {
  /** Sum over the jobs that could be estimated. */
  coreHours: number;
  estimated: number;
  notEstimated: number;
  warnings: readonly { jobKey: string; message: string }[];
}

/** Total core-hours of a plan and the jobs that may not end within the cluster's time. */
export function planEstimate(
  jobs: readonly { jobKey: string; estimate: WallTimeEstimate }[],
  cluster: Cluster,
): PlanEstimate {
  const allowed = Math.min(cluster.wallMinutes, cluster.limits.wallMinutes ?? Infinity) * 60;
  let coreHours = 0;
  let estimated = 0;
  const warnings: { jobKey: string; message: string }[] = [];
  for (const { jobKey, estimate } of jobs) {
    if (estimate.kind === 'no earlier runs') continue;
    estimated++;
    coreHours += estimate.coreHours;
    const hours = (seconds: number) => (seconds / 3600).toPrecision(2);
    if (estimate.wallSeconds > allowed)
      warnings.push({
        jobKey,
        message: `expected ${hours(estimate.wallSeconds)} h, the cluster gives ${hours(allowed)} h`,
      });
    else if ((estimate.wallSecondsHigh ?? 0) > allowed)
      warnings.push({
        jobKey,
        message: `may take up to ${hours(estimate.wallSecondsHigh ?? 0)} h, the cluster gives ${hours(allowed)} h`,
      });
  }
  return { coreHours, estimated, notEstimated: jobs.length - estimated, warnings };
}
