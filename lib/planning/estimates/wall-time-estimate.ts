import type { Program } from '../../outputs/record';
import type { DeckTask } from '../method';

/** An earlier run of the group: what it took and how large it was. */
export interface EarlierRun {
  program: Program;
  task: DeckTask;
  basisFunctions: number;
  wallSeconds: number;
  cores: number;
}

export type WallTimeEstimate =
  | { kind: 'no earlier runs' }
  | {
      kind: 'fitted';
      /** Core-seconds = prefactor · (basis functions)^exponent. */
      exponent: number;
      prefactor: number;
      /** Standard deviation of ln(core-seconds) about the fit; null when too few runs to tell. */
      spread: number | null;
      runs: number;
      /** false: too few runs or all of one size, so the exponent is the assumed one. */
      exponentFitted: boolean;
      /** The asked size lies outside the sizes of the earlier runs. */
      extrapolated: boolean;
      wallSeconds: number;
      /** Two standard deviations of a single prediction either way; null without a spread. */
      wallSecondsLow: number | null;
      wallSecondsHigh: number | null;
      coreHours: number;
    };

/** Formal scaling between density fitting and exact exchange. Assumption, used only where nothing can be fitted. */
const assumedExponent = 3;

/**
 * Expected wall time from the group's own runs of the same program and task: least squares of
 * ln(core-seconds) on ln(basis functions). Assumes that cores share the work evenly, which flatters large
 * core counts. Source: ordinary least squares with the usual prediction variance (any statistics text).
 * @param basisFunctions - of the planned job, > 0
 */
export function wallTimeEstimate(
  earlier: readonly EarlierRun[],
  wanted: { program: Program; task: DeckTask; basisFunctions: number; cores: number },
): WallTimeEstimate {
  const points = earlier
    .filter(
      (run) =>
        run.program === wanted.program &&
        run.task === wanted.task &&
        run.basisFunctions > 0 &&
        run.wallSeconds > 0 &&
        run.cores > 0,
    )
    .map((run) => ({ x: Math.log(run.basisFunctions), y: Math.log(run.wallSeconds * run.cores) }));
  const n = points.length;
  if (n === 0) return { kind: 'no earlier runs' };
  const meanX = points.reduce((sum, point) => sum + point.x, 0) / n;
  const meanY = points.reduce((sum, point) => sum + point.y, 0) / n;
  const sxx = points.reduce((sum, point) => sum + (point.x - meanX) ** 2, 0);
  const sxy = points.reduce((sum, point) => sum + (point.x - meanX) * (point.y - meanY), 0);
  // Sizes within a few per cent of each other tell nothing about scaling.
  const exponentFitted = n >= 3 && sxx / n > 0.01;
  const exponent = exponentFitted ? sxy / sxx : assumedExponent;
  const intercept = meanY - exponent * meanX;
  const freedom = n - (exponentFitted ? 2 : 1);
  const residual = points.reduce((sum, point) => sum + (point.y - intercept - exponent * point.x) ** 2, 0);
  const spread = freedom > 0 ? Math.sqrt(residual / freedom) : null;
  const x = Math.log(wanted.basisFunctions);
  const coreSeconds = Math.exp(intercept + exponent * x);
  const leverage = 1 + 1 / n + (exponentFitted ? (x - meanX) ** 2 / sxx : 0);
  const factor = spread === null ? null : Math.exp(2 * spread * Math.sqrt(leverage));
  const wallSeconds = coreSeconds / wanted.cores;
  const xs = points.map((point) => point.x);
  return {
    kind: 'fitted',
    exponent,
    prefactor: Math.exp(intercept),
    spread,
    runs: n,
    exponentFitted,
    extrapolated: x < Math.min(...xs) - 1e-9 || x > Math.max(...xs) + 1e-9,
    wallSeconds,
    wallSecondsLow: factor === null ? null : wallSeconds / factor,
    wallSecondsHigh: factor === null ? null : wallSeconds * factor,
    coreHours: coreSeconds / 3600,
  };
}
