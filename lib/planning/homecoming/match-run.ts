import { hillFormula } from '../../chemistry/formula';
import { elementSymbol } from '../../chemistry/elements';
import type { Step } from '../../outputs/record';
import { canonicalFunctional } from './canonical-functional';
import { comparableBasis } from './comparable-basis';
import type { PlannedJob } from './planned-job';
import { structureDistance } from './structure-distance';

export interface MatchSuggestion {
  jobKey: string;
  /** 0–1: share of the points that what is printed could earn. */
  score: number;
  /** What agrees and what does not, in words. */
  reasons: readonly string[];
}

export interface MatchResult {
  /** Set only by the job key, never by likeness. */
  matchedJobKey: string | null;
  /** The output carries a key that no planned job has. */
  unknownJobKey: string | null;
  suggestions: readonly MatchSuggestion[];
}

/**
 * Find the planned job of a returned run. The job key decides; without it jobs of the same composition are
 * proposed with a score and reasons, best first, for a person to choose. The weights are a rule of thumb.
 */
export function matchRun(run: Step, jobs: readonly PlannedJob[]): MatchResult {
  const byKey = run.jobKey === null ? undefined : jobs.find((job) => job.jobKey === run.jobKey);
  if (byKey) return { matchedJobKey: byKey.jobKey, unknownJobKey: null, suggestions: [] };
  const suggestions = jobs
    .flatMap((job) => {
      const suggestion = suggest(run, job);
      return suggestion ? [suggestion] : [];
    })
    .sort((a, b) => b.score - a.score);
  return { matchedJobKey: null, unknownJobKey: run.jobKey, suggestions };
}

function suggest(run: Step, job: PlannedJob): MatchSuggestion | null {
  const formula = run.formula ?? (run.geometry ? hillFormula(run.geometry.elements) : null);
  if (formula === null || formula !== hillFormula(job.structure.elements)) return null;
  const reasons = [`composition ${formula} agrees`];
  let earned = 3;
  let possible = 3;
  const weigh = (
    name: string,
    weight: number,
    planned: unknown,
    returned: unknown,
    agrees: boolean | null,
  ) => {
    if (agrees === null) return;
    possible += weight;
    if (agrees) earned += weight;
    reasons.push(
      agrees ? `${name} agrees` : `${name} differs: planned ${String(planned)}, returned ${String(returned)}`,
    );
  };
  weigh('charge', 2, job.charge, run.charge, run.charge === null ? null : run.charge === job.charge);
  const multiplicities = [job.multiplicity, job.highSpinMultiplicity];
  weigh(
    'multiplicity',
    3,
    job.multiplicity,
    run.multiplicity,
    run.multiplicity === null ? null : multiplicities.includes(run.multiplicity),
  );
  weigh(
    'program',
    2,
    job.method.program,
    run.program,
    run.program === null ? null : run.program === job.method.program,
  );
  const functional =
    run.program === null || run.method.functional === null
      ? null
      : canonicalFunctional(run.program, run.method.functional);
  weigh(
    'functional',
    2,
    job.method.functional,
    functional,
    functional === null ? null : functional === job.method.functional,
  );
  weigh('basis', 1, job.method.basis, run.method.basis, comparableBasis(job.method, run.method.basis));
  const distance = run.geometry
    ? structureDistance(job.structure, {
        elements: run.geometry.elements.map((element) => elementSymbol(element) ?? element),
        positionsAngstrom: run.geometry.positionsAngstrom,
      })
    : null;
  if (distance !== null) {
    // The printed geometry is the last one: an optimisation may have moved it some way from its start.
    const weight = 3;
    possible += weight;
    earned += weight * Math.max(0, 1 - distance / 0.8);
    reasons.push(`interatomic distances differ from the planned start by ${distance.toFixed(3)} Å (rms)`);
  }
  return { jobKey: job.jobKey, score: earned / possible, reasons };
}
