import { cite } from '../cite';
import { frequenciesOf } from '../vibrations';
import { addStep } from '../step-list';
import { warn } from '../warnings';
import type { Outcome } from '../record';
import type { Psi4State } from './state';

/** Closes the step at hand and completes it by what was printed once for the whole run. */
export function closeStep(state: Psi4State, outcome: Outcome): void {
  const { current, version, cores, jobKey } = state;
  if (!current) return;
  const { step, point } = current;
  step.outcome = outcome;
  step.failure = outcome === 'failed' ? state.failure : null;
  if (version) {
    step.version = version.text;
    cite(step, 'version', version.line);
  }
  if (cores) {
    step.resources.cores = cores.count;
    cite(step, 'resources.cores', cores.line);
  }
  if (jobKey) {
    step.jobKey = jobKey.text;
    cite(step, 'jobKey', jobKey.line);
  }
  if (step.tasks.length === 0) step.tasks.push('single point');
  if (point.energyHartree === null && state.iterationLine) {
    point.scf = { converged: false, iterations: state.iterations };
    cite(point, 'scf.converged', state.iterationLine);
  }
  saveFrequencies(state);
  addStep(state.steps, current.finish());
  state.current = null;
  state.iterations = null;
  state.iterationLine = null;
  state.scfConverged = null;
  state.optimiserMoved = false;
  state.optimiserDone = false;
  state.displacements = null;
}

/** A list in which one wavenumber is unreadable is left out whole: its lowest value could be the one. */
function saveFrequencies(state: Psi4State): void {
  const { current, modesCm1, modesLine } = state;
  state.modesCm1 = [];
  state.modesLine = null;
  if (!current || !modesLine) return;
  const values = modesCm1.filter((value) => value !== null);
  if (values.length < modesCm1.length) {
    warn(current.step, 'table-damaged', modesLine.number);
    return;
  }
  current.step.frequencies = frequenciesOf(values);
  cite(current.step, 'frequencies', modesLine);
}
