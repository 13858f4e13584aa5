import type { ProgramResult } from './program';
import { emptyStep, type OutputRecord, type Program, type Step } from './record';
import { isSameGeometry } from './step-draft';
import { warn } from './warnings';

/** Values that an earlier step may lend to a later one of the same method at the same geometry. */
const lendable = [
  'jobKey',
  'title',
  'charge',
  'multiplicity',
  'electronCount',
  'energyHartree',
  'optimisation',
  'frequencies',
  'thermochemistry',
  'orbitals',
  'dipoleDebye',
  'stability',
  'brokenSymmetry',
] as const satisfies readonly (keyof Step)[];

/** Two energies of one method at one geometry differ by no more than SCF noise, hartree. */
const SAME_ENERGY_HARTREE = 1e-5;

function isSameCalculation(a: Step, b: Step): boolean {
  const methods = Object.keys(a.method) as (keyof Step['method'])[];
  return (
    methods.every((key) => a.method[key] === b.method[key]) &&
    (a.charge === b.charge || a.charge === null || b.charge === null) &&
    (a.multiplicity === b.multiplicity || a.multiplicity === null || b.multiplicity === null) &&
    (a.energyHartree === null ||
      b.energyHartree === null ||
      Math.abs(a.energyHartree - b.energyHartree) < SAME_ENERGY_HARTREE) &&
    a.geometry !== null &&
    b.geometry !== null &&
    isSameGeometry(a.geometry, b.geometry)
  );
}

/** The evidence of a value and of its parts. */
function lendEvidence(from: Step, to: Step, value: string): void {
  for (const [path, evidence] of Object.entries(from.evidence))
    if (path === value || path.startsWith(`${value}.`)) to.evidence[path] ??= evidence;
}

function lend(from: Step, to: Step): void {
  const copy = <Key extends keyof Step>(key: Key) => {
    if (to[key] !== null || from[key] === null) return;
    to[key] = from[key];
    lendEvidence(from, to, key);
  };
  for (const key of lendable) copy(key);
  for (const population of from.populations) {
    if (to.populations.some(({ scheme }) => scheme === population.scheme)) continue;
    to.populations.push(population);
    const path = `populations.${population.scheme}`;
    lendEvidence(from, to, path);
  }
  if (to.spin.s2 === null && from.spin.s2 !== null) {
    to.spin = from.spin;
    lendEvidence(from, to, 'spin');
  }
  if (to.scf.converged === null && from.scf.converged !== null) {
    to.scf = from.scf;
    lendEvidence(from, to, 'scf');
  }
}

/**
 * The record of the whole file. The top level is the last step that finished (the last one if none did),
 * completed only by what an earlier step of the same method printed at the same geometry, so that values of
 * different levels of theory or geometries never stand together. Outcome and failure are the whole file's.
 */
export function mergeSteps(
  program: Program | null,
  { steps, outcome, failure, whole }: ProgramResult,
  size: { bytes: number; lines: number },
): OutputRecord {
  const lastFinished = steps.findLastIndex((step) => step.outcome === 'finished');
  const index = lastFinished < 0 ? steps.length - 1 : lastFinished;
  const last = steps[index] ?? emptyStep(program);
  const top: Step = {
    ...last,
    outcome,
    failure,
    tasks: [...last.tasks],
    populations: [...last.populations],
    resources: {
      wallSeconds: whole?.resources.wallSeconds ?? last.resources.wallSeconds,
      cores: whole?.resources.cores ?? last.resources.cores,
    },
    evidence: { ...last.evidence, ...whole?.evidence },
    warnings: [...last.warnings],
  };
  for (const earlier of steps.slice(0, Math.max(index, 0)).reverse()) {
    if (!isSameCalculation(earlier, last)) continue;
    lend(earlier, top);
    top.tasks = [...earlier.tasks.filter((task) => !top.tasks.includes(task)), ...top.tasks];
  }
  if (program === null) warn(top, 'unknown-program');
  else if (outcome === 'cut off') warn(top, 'cut-off');
  else if (outcome === 'failed') warn(top, 'failed', failure?.line ?? null);
  if (index < steps.length - 1) warn(top, 'later-step-unfinished');
  return { ...top, ...size, steps };
}
