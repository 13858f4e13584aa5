import type { Line } from '../landmark';
import type { Failure, Step, Task } from '../record';
import { StepDraft, type Point } from '../step-draft';

/** What is known of one file so far. */
export interface Psi4State {
  version: { text: string; line: Line } | null;
  cores: { count: number; line: Line } | null;
  jobKey: { text: string; line: Line } | null;
  steps: Step[];
  current: StepDraft | null;
  /** Below "==> Geometry <==": the next table of atoms is the one being calculated. */
  geometryAnnounced: boolean;
  /** Since the last SCF started. */
  iterations: number | null;
  iterationLine: Line | null;
  scfConverged: { value: boolean; line: Line } | null;
  /** What the SCF prints between its last iteration and its energy: ⟨S²⟩ and orbitals, kept for that energy. */
  pending: ((point: Point) => void)[];
  /** The driver said that a gradient comes with the next SCF. */
  gradientAnnounced: boolean;
  /** The optimiser has taken the last energy into account: the next SCF belongs to the same optimisation. */
  optimiserMoved: boolean;
  optimiserDone: boolean;
  /** A derivative by finite differences is being taken: every SCF is of one displacement. */
  displacements: { first: StepDraft | null; last: StepDraft | null } | null;
  /** Another sub-run that may be the reference, should the printed energy say so. */
  otherReference: StepDraft | null;
  modesCm1: (number | null)[];
  modesLine: Line | null;
  failure: Failure | null;
  closed: boolean;
  wall: { seconds: number; line: Line } | null;
}

export function startPsi4(): Psi4State {
  return {
    version: null,
    cores: null,
    jobKey: null,
    steps: [],
    current: null,
    geometryAnnounced: false,
    iterations: null,
    iterationLine: null,
    scfConverged: null,
    pending: [],
    gradientAnnounced: false,
    optimiserMoved: false,
    optimiserDone: false,
    displacements: null,
    otherReference: null,
    modesCm1: [],
    modesLine: null,
    failure: null,
    closed: false,
    wall: null,
  };
}

/** The step at hand; whatever a calculation prints first opens it. */
export function openStep(state: Psi4State): StepDraft {
  state.current ??= new StepDraft('Psi4');
  return state.current;
}

export function addTask(state: Psi4State, task: Task): void {
  const { step } = openStep(state);
  if (!step.tasks.includes(task)) step.tasks.push(task);
}
