import type { Line } from '../landmark';
import type { Failure, Step, Task } from '../record';
import { StepDraft } from '../step-draft';
import { emptyDeck, type Cited, type Deck } from './deck';

/** What is known of one file so far. */
export interface OrcaState {
  version: Cited<string> | null;
  /** Echoed inputs: one, or one for each job separated by $new_job; the open one is the last. */
  decks: Deck[];
  /** What a compound job's main input sets for all its steps. */
  inherited: Deck | null;
  /** Basis names printed since the banner or the last compound heading. */
  bases: Cited<string>[];
  /** Index of the job among those of $new_job. */
  job: number;
  cores: Cited<number> | null;
  steps: Step[];
  current: StepDraft | null;
  method: { isDft: boolean; line: Line } | null;
  components: { exchange: Cited<string> | null; correlation: Cited<string> | null };
  scfRunning: Line | null;
  scfEnergy: Cited<number> | null;
  /** A post-SCF treatment whose energy the final line then gives. */
  correlated: 'coupled cluster' | 'perturbation' | 'excited state' | null;
  /** The ground state's energy as an excited-state calculation repeats it. */
  groundEnergy: Cited<number> | null;
  /** The property part prints tables of another density after coupled cluster. */
  otherDensity: boolean;
  /** Displaced geometries of numerical derivatives are passed over. */
  displaced: boolean;
  optimising: boolean;
  /** Seen in the thermochemistry section: its values are read once. */
  thermo: boolean;
  errorLine: Line | null;
  failure: Failure | null;
  closed: boolean;
  wall: Cited<number> | null;
}

export function startOrca(): OrcaState {
  return {
    version: null,
    decks: [emptyDeck()],
    inherited: null,
    bases: [],
    job: 0,
    cores: null,
    steps: [],
    current: null,
    method: null,
    components: { exchange: null, correlation: null },
    scfRunning: null,
    scfEnergy: null,
    correlated: null,
    groundEnergy: null,
    otherDensity: false,
    displaced: false,
    optimising: false,
    thermo: false,
    errorLine: null,
    failure: null,
    closed: false,
    wall: null,
  };
}

/** The step at hand; whatever a calculation prints first opens it. */
export function openStep(state: OrcaState): StepDraft {
  state.current ??= new StepDraft('ORCA');
  return state.current;
}

export function addTask(state: OrcaState, task: Task): void {
  const { step } = openStep(state);
  if (!step.tasks.includes(task)) step.tasks.push(task);
}

/** A new wavefunction: nothing of the last one holds any more. */
export function startScf(state: OrcaState): void {
  state.scfEnergy = null;
  state.correlated = null;
  state.groundEnergy = null;
  state.otherDensity = false;
}
