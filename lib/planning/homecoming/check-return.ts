import { hillFormula } from '../../chemistry/formula';
import type { Step } from '../../outputs/record';
import { canonicalFunctional } from './canonical-functional';
import { comparableBasis } from './comparable-basis';
import type { PlannedJob } from './planned-job';

export type ReturnVerdict = 'agrees' | 'differs' | 'not printed' | 'cannot tell';

export interface ReturnCheck {
  field:
    | 'outcome'
    | 'program'
    | 'functional'
    | 'basis'
    | 'charge'
    | 'multiplicity'
    | 'composition'
    | 'connectivity'
    | 'SCF convergence'
    | 'geometry convergence'
    | 'task';
  planned: string;
  returned: string | null;
  verdict: ReturnVerdict;
}

/**
 * Plan against return, field by field. Any "differs" makes the job's cell "needs attention".
 * @param sameConnectivity - whether the returned geometry has the bonds of the start; null when not known
 */
export function checkReturn(job: PlannedJob, run: Step, sameConnectivity: boolean | null): ReturnCheck[] {
  const { method } = job;
  const functional =
    run.method.functional === null || run.program === null
      ? null
      : canonicalFunctional(run.program, run.method.functional);
  const composition = run.formula ?? (run.geometry ? hillFormula(run.geometry.elements) : null);
  const optimises = job.task.startsWith('optimisation');
  const multiplicityFits = [job.multiplicity, job.highSpinMultiplicity].includes(
    run.multiplicity ?? undefined,
  );
  return [
    row('outcome', 'finished', run.outcome, run.outcome === 'finished'),
    row('program', method.program, run.program, run.program === method.program),
    row(
      'functional',
      method.functional,
      run.method.functional,
      functional === null ? null : functional === method.functional,
    ),
    row('basis', basisText(job), run.method.basis, comparableBasis(method, run.method.basis)),
    row('charge', String(job.charge), text(run.charge), run.charge === job.charge),
    row('multiplicity', String(job.multiplicity), text(run.multiplicity), multiplicityFits),
    row(
      'composition',
      hillFormula(job.structure.elements),
      composition,
      composition === hillFormula(job.structure.elements),
    ),
    row(
      'connectivity',
      'as in the start',
      sameConnectivity === null ? null : sameConnectivity ? 'as in the start' : 'bonds formed or broken',
      sameConnectivity,
    ),
    row('SCF convergence', 'converged', converged(run.scf.converged), run.scf.converged),
    ...(optimises
      ? [
          row(
            'geometry convergence',
            'converged',
            converged(run.optimisation?.converged ?? null),
            run.optimisation?.converged ?? null,
          ),
        ]
      : []),
    row('task', job.task, run.tasks.length === 0 ? null : run.tasks.join(', '), taskDone(job, run)),
  ];
}

const text = (value: number | null): string | null => (value === null ? null : String(value));
const converged = (value: boolean | null): string | null =>
  value === null ? null : value ? 'converged' : 'not converged';

function row(
  field: ReturnCheck['field'],
  planned: string,
  returned: string | null,
  agrees: boolean | null,
): ReturnCheck {
  const verdict =
    returned === null ? 'not printed' : agrees === null ? 'cannot tell' : agrees ? 'agrees' : 'differs';
  return { field, planned, returned, verdict };
}

function basisText({ method }: PlannedJob): string {
  const others = Object.entries(method.basisPerElement).map(([element, basis]) => `${element}: ${basis}`);
  return [method.basis, ...others].join(', ');
}

/** The parts of a task that leave a trace in the record must be there. */
function taskDone(job: PlannedJob, run: Step): boolean | null {
  const frequencies = run.frequencies !== null && run.frequencies.count > 0;
  const optimised = run.optimisation?.converged === true;
  switch (job.task) {
    case 'single point':
      return run.energyHartree !== null;
    case 'optimisation':
      return optimised;
    case 'frequencies':
      return frequencies;
    case 'optimisation and frequencies':
      return optimised && frequencies;
    case 'stability':
      return run.stability !== null;
    case 'broken symmetry':
      // Only ORCA prints that a determinant is a flipped one; elsewhere ⟨S²⟩ has to tell.
      return run.brokenSymmetry !== null || run.tasks.includes('broken symmetry')
        ? true
        : job.method.program === 'ORCA'
          ? false
          : null;
  }
}
