import { finishStep } from './finish-step';
import type { Step } from './record';
import { warn } from './warnings';

/** How many steps keep all their tables; a file with more is a record of a very long series. */
const FULL_STEPS = 200;

/** Paths of evidence that a step without tables still has. */
const isScalar = (path: string) =>
  !/^(?:geometry|populations|orbitals|frequencies|optimisation\.energies)/.test(path);

/**
 * Adds a step that is complete. Of more than 200 steps the earlier ones keep their numbers only, so that memory
 * does not grow with the file; the last ones, which the record's top level is made of, are whole.
 */
export function addStep(steps: Step[], step: Step): void {
  steps.push(finishStep(step));
  const long = steps[steps.length - 1 - FULL_STEPS];
  if (!long) return;
  warn(long, 'steps-abridged');
  long.geometry = null;
  long.populations = [];
  long.orbitals = null;
  if (long.frequencies) long.frequencies = { ...long.frequencies, valuesCm1: [] };
  if (long.optimisation) long.optimisation = { ...long.optimisation, energiesHartree: [], history: [] };
  long.evidence = Object.fromEntries(Object.entries(long.evidence).filter(([path]) => isScalar(path)));
}
