import type { Line } from '../landmark';
import type { Failure, Geometry, Step, Task } from '../record';
import { StepDraft } from '../step-draft';
import type { OrbitalList } from './orbitals';

/** A geometry as printed, with the nuclear repulsion energy that tells which energy belongs to it. */
export interface PrintedGeometry {
  name: string;
  geometry: Geometry;
  line: Line;
  repulsionHartree: number | null;
}

/** What is known of one file so far. */
export interface NwchemState {
  version: { text: string; line: Line } | null;
  cores: { count: number; line: Line } | null;
  title: { text: string; line: Line } | null;
  jobKey: { text: string; line: Line } | null;
  basis: { text: string; line: Line } | null;
  relativity: { text: string; line: Line } | null;
  /** The geometry name in force at each task of the echoed deck. */
  taskGeometries: string[];
  taskTitles: NwchemState['title'][];
  geometryName: string;
  geometries: Map<string, PrintedGeometry>;
  latest: PrintedGeometry | null;
  /** Since the last SCF started: its iterations, whether it failed, whether its energy has come. */
  iterations: number | null;
  iterationLine: Line | null;
  alreadyConverged: boolean;
  scfFailed: Line | null;
  afterEnergy: boolean;
  repulsionHartree: number | null;
  alphaElectrons: number | null;
  /** Between the report of an optimisation step and the next printed geometry. */
  trial: boolean;
  orbitalSpin: 'alpha' | 'beta' | null;
  orbitals: { alpha: OrbitalList; beta: OrbitalList | null } | null;
  modesCm1: (number | null)[];
  modesLine: Line | null;
  steps: Step[];
  current: StepDraft | null;
  /** The text between two rules that may turn out to be an error message. */
  ruled: Line | null;
  optimiserGaveUp: Line | null;
  failure: Failure | null;
  closed: boolean;
  wall: { seconds: number; line: Line } | null;
}

export function startNwchem(): NwchemState {
  return {
    version: null,
    cores: null,
    title: null,
    jobKey: null,
    basis: null,
    relativity: null,
    taskGeometries: [],
    taskTitles: [],
    geometryName: 'geometry',
    geometries: new Map(),
    latest: null,
    iterations: null,
    iterationLine: null,
    alreadyConverged: false,
    scfFailed: null,
    afterEnergy: false,
    repulsionHartree: null,
    alphaElectrons: null,
    trial: false,
    orbitalSpin: null,
    orbitals: null,
    modesCm1: [],
    modesLine: null,
    steps: [],
    current: null,
    ruled: null,
    optimiserGaveUp: null,
    failure: null,
    closed: false,
    wall: null,
  };
}

/** The step at hand; the first module heading of a task opens it. */
export function openStep(state: NwchemState): StepDraft {
  if (state.current) return state.current;
  const draft = new StepDraft('NWChem');
  state.current = draft;
  state.iterations = null;
  state.iterationLine = null;
  state.alreadyConverged = false;
  state.scfFailed = null;
  state.afterEnergy = false;
  state.trial = false;
  state.orbitals = null;
  state.modesCm1 = [];
  state.optimiserGaveUp = null;
  return draft;
}

export function addTask(state: NwchemState, task: Task): void {
  const { step } = openStep(state);
  if (!step.tasks.includes(task)) step.tasks.push(task);
}
