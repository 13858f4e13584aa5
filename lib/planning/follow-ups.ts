import type { Step } from '../outputs/record';
import type { PlannedJob } from './homecoming/planned-job';
import type { DeckTask } from './method';

export interface FollowUp {
  task: DeckTask;
  multiplicity: number;
  /** Start from the last geometry of the run rather than from the plan's. */
  fromLastGeometry: boolean;
  reason: string;
}

/**
 * Jobs that a returned run suggests. Advice only: nothing is planned without a person's word.
 * The 10 % limit for ⟨S²⟩ is the usual rule of thumb (Young, Computational Chemistry, 2001, from memory);
 * it does not apply to broken-symmetry determinants, which deviate on purpose.
 * @param otherMultiplicities - of the same complex's other candidates, for vertical gaps
 */
export function followUps(job: PlannedJob, run: Step, otherMultiplicities: readonly number[]): FollowUp[] {
  const proposals: FollowUp[] = [];
  const propose = (task: DeckTask, reason: string, multiplicity = job.multiplicity) =>
    proposals.push({ task, multiplicity, fromLastGeometry: run.geometry !== null, reason });
  const converged = run.optimisation?.converged === true;
  if (run.failure?.kind === 'optimisation out of steps' || run.optimisation?.converged === false)
    propose(job.task, 'the optimisation ran out of steps: go on from the last geometry');
  else if (run.outcome === 'cut off' || run.failure?.kind === 'out of time')
    propose(job.task, 'the run was cut off: start again from the last geometry');
  if (converged && run.frequencies === null && run.outcome === 'finished')
    propose('frequencies', 'a stationary point is a minimum only when its frequencies say so');
  if ((run.frequencies?.imaginaryCount ?? 0) > 0)
    propose('optimisation', 'imaginary frequencies: follow the mode and optimise again');
  const { s2, s2Ideal } = run.spin;
  if (s2 !== null && s2Ideal !== null && job.task !== 'broken symmetry') {
    const excess = Math.abs(s2 - s2Ideal);
    if (excess > Math.max(0.1 * s2Ideal, 0.05))
      propose('stability', `⟨S²⟩ ${s2.toFixed(3)} is more than 10 % from ${s2Ideal.toFixed(2)}`);
  }
  if (converged)
    for (const multiplicity of new Set(otherMultiplicities))
      if (multiplicity !== job.multiplicity)
        propose(
          'single point',
          `vertical gap to multiplicity ${multiplicity} at this geometry`,
          multiplicity,
        );
  return proposals;
}
