import { cite } from '../cite';
import type { Line } from '../landmark';
import { integerAfter, readNumber } from '../numbers';
import { defineProgram, type LandmarkMap, type ProgramResult } from '../program';
import type { Task } from '../record';
import { addStep } from '../step-list';
import { warn } from '../warnings';
import { deckLandmarks } from './deck';
import { energyLandmarks, startScf } from './energy';
import { closeOpenStep, failureLandmarks } from './failures';
import { geometryLandmarks } from './geometry';
import { populationLandmarks } from './populations';
import { orbitalLandmarks, saveOrbitals } from './orbitals';
import { propertyLandmarks, saveFrequencies } from './properties';
import { settingsLandmarks } from './settings';
import { addTask, openStep, startNwchem, type NwchemState } from './state';

/** Closes the step at hand and completes it by what was printed once for the whole run. */
function closeStep(state: NwchemState): void {
  const { current, version, cores, jobKey, basis, relativity, latest } = state;
  if (!current) return;
  saveFrequencies(state);
  const { step, point } = current;
  saveOrbitals(state, step.outcome === 'cut off');
  const take = <Value>(known: { line: Line } | null, path: string, value: Value): Value | null => {
    if (known) cite(step, path, known.line);
    return known ? value : null;
  };
  step.version = take(version, 'version', version?.text ?? null);
  step.resources.cores = take(cores, 'resources.cores', cores?.count ?? null);
  const title = state.taskTitles[state.steps.length] ?? state.title;
  step.title = take(title, 'title', title?.text ?? null);
  step.jobKey = take(jobKey, 'jobKey', jobKey?.text ?? null);
  if (step.method.basis === null) step.method.basis = take(basis, 'method.basis', basis?.text ?? null);
  step.method.relativity = take(relativity, 'method.relativity', relativity?.text ?? null);
  if (step.tasks.length === 0) step.tasks.push('single point');
  if (point.energyHartree === null && point.geometry === null && latest && !current.lastSettled) {
    point.geometry = latest.geometry;
    cite(point, 'geometry', latest.line);
  }
  if (point.energyHartree === null && !current.lastSettled && state.iterationLine && !state.afterEnergy) {
    point.scf = { converged: false, iterations: state.iterations };
    cite(point, 'scf.converged', state.iterationLine);
  }
  addStep(state.steps, current.finish());
  state.current = null;
}

function task(name: Task | null) {
  return (_: Line, state: NwchemState) => {
    if (name === null) openStep(state);
    else addTask(state, name);
  };
}

const runLandmarks: LandmarkMap<NwchemState> = {
  // Northwest Computational Chemistry Package (NWChem) 7.0.2
  'Northwest Computational Chemistry Package (NWChem)': {
    always: true,
    read(line, state) {
      closeOpenStep(state);
      closeStep(state);
      state.closed = false;
      state.failure = null;
      const text = line.text.split('(NWChem)')[1]?.trim() ?? '';
      state.version = text === '' ? null : { text, line };
    },
  },
  // nproc           =        4
  'nproc =': (line, state) => {
    const count = integerAfter(line.text, '=');
    if (count !== null) state.cores = { count, line };
  },
  'NWChem DFT Module': (_, state) => {
    openStep(state);
    startScf(state);
  },
  'NWChem SCF Module': (line, state) => {
    const { step } = openStep(state);
    startScf(state);
    step.method.functional = 'HF';
    cite(step, 'method.functional', line);
    warn(step, 'not-dft', line.number);
  },
  'NWChem Geometry Optimization': task('optimisation'),
  'Transition State Search': task('transition state search'),
  'Saddle point search': task('transition state search'),
  'NWChem Nuclear Hessian and Frequency Analysis': task('frequencies'),
  'NWChem Finite-difference Hessian': task('frequencies'),
  'NWChem Property Module': task('properties'),
  'NWChem TDDFT Module': task('excited states'),
  'NWChem DFT Gradient Module': (_, state) => {
    if (state.current && state.current.step.tasks.length === 0) addTask(state, 'gradient');
  },
  'Total MP2 energy': (line, state) => {
    if (state.current) warn(state.current.step, 'energy-is-reference', line.number);
  },
  'Total CCSD energy': (line, state) => {
    if (state.current) warn(state.current.step, 'energy-is-reference', line.number);
  },
  'Total CCSD(T) energy': (line, state) => {
    if (state.current) warn(state.current.step, 'energy-is-reference', line.number);
  },
  //  Task  times  cpu:        9.7s     wall:       11.3s
  'Task times cpu:': (line, state) => {
    const { current } = state;
    if (!current) return;
    const seconds = readNumber(line.text.split('wall:')[1]?.trim().replace(/s$/, ''));
    current.step.outcome = state.failure ? 'failed' : 'finished';
    current.step.failure = state.failure;
    current.step.resources.wallSeconds = seconds;
    if (seconds !== null) cite(current.step, 'resources.wallSeconds', line);
    closeStep(state);
  },
  //  Total times  cpu:       13.3s     wall:       19.9s
  'Total times cpu:': {
    evenUnended: true,
    read(line, state) {
      const text = /wall: {0,20}(\d{1,15}\.\d)s$/.exec(line.text.trim())?.[1];
      const seconds = readNumber(text);
      if (seconds === null) return;
      state.closed = true;
      state.wall = { seconds, line };
    },
  },
};

function end(state: NwchemState): ProgramResult {
  closeOpenStep(state);
  const unfinished = state.current !== null;
  closeStep(state);
  const { steps, failure, closed, wall } = state;
  const whole: ProgramResult['whole'] = {
    resources: { wallSeconds: wall?.seconds ?? null, cores: null },
    evidence: {},
  };
  if (wall) cite(whole, 'resources.wallSeconds', wall.line);
  const outcome = failure ? 'failed' : closed && !unfinished ? 'finished' : 'cut off';
  return { steps, outcome, failure, whole };
}

/** NWChem 6.0 to 7.3. */
export const nwchem = defineProgram<NwchemState>({
  name: 'NWChem',
  marks: [
    'Northwest Computational Chemistry Package (NWChem)',
    '============================== echo of input deck',
  ],
  start: startNwchem,
  landmarks: {
    ...runLandmarks,
    ...deckLandmarks,
    ...settingsLandmarks,
    ...geometryLandmarks,
    ...energyLandmarks,
    ...populationLandmarks,
    ...orbitalLandmarks,
    ...propertyLandmarks,
    ...failureLandmarks,
  },
  end,
});
