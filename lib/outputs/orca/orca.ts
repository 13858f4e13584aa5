import { cite } from '../cite';
import { readInteger, words } from '../numbers';
import { defineProgram, type LandmarkMap, type ProgramResult } from '../program';
import { addStep } from '../step-list';
import type { Step } from '../record';
import { emptyDeck, type Cited } from './deck';
import { energyLandmarks } from './energy';
import { closeOpenStep, failureLandmarks } from './failures';
import { basisAtHand, deckAtHand, settingsLandmarks } from './settings';
import { openStep, startOrca, startScf, type OrcaState } from './state';
import { tableLandmarks } from './tables';

/** The functional: the keyword, Hartree-Fock where the output says so, else exchange and correlation by name. */
function functionalOf(state: OrcaState): Cited<string> | null {
  const { method, components } = state;
  const deck = deckAtHand(state);
  if (method && !method.isDft) return { value: 'HF', line: method.line };
  if (deck.functional) return deck.functional;
  if (deck.hartreeFock) return { value: 'HF', line: deck.hartreeFock.line };
  const { exchange, correlation } = components;
  if (!method || !exchange) return null;
  const names = [exchange.value, correlation?.value ?? ''].filter((name) => name !== '' && name !== 'NOX');
  return { value: names.join(' + '), line: exchange.line };
}

/** Closes the step at hand and completes it by what the echoed input says of its job. */
function closeStep(state: OrcaState): void {
  const { current, version, cores } = state;
  if (!current) return;
  const { step, point } = current;
  const deck = deckAtHand(state);
  const take = <Value>(
    path: string,
    cited: Cited<Value> | null,
    known: Value | null = null,
  ): Value | null => {
    if (known !== null || !cited) return known;
    cite(step, path, cited.line);
    return cited.value;
  };
  step.version = take('version', version);
  step.title = take('title', deck.title);
  step.jobKey = take('jobKey', deck.jobKey);
  step.charge = take('charge', deck.charge, step.charge);
  step.multiplicity = take('multiplicity', deck.multiplicity, step.multiplicity);
  step.method.functional = take('method.functional', functionalOf(state));
  step.method.basis = take('method.basis', basisAtHand(state, deck));
  // The keyword says more than the headings of the output: D3BJ, CPCM(water).
  if (step.method.dispersion === null || deck.dispersion)
    step.method.dispersion = take('method.dispersion', deck.dispersion);
  if (step.method.solvation === null || deck.solvation)
    step.method.solvation = take('method.solvation', deck.solvation);
  step.method.relativity = take('method.relativity', deck.relativity, step.method.relativity);
  step.resources.cores = take('resources.cores', cores ?? deck.cores);
  if (deck.transitionState)
    step.tasks = step.tasks.map((task) => (task === 'optimisation' ? 'transition state search' : task));
  if (step.tasks.length === 0) step.tasks.push('single point');
  if (state.scfRunning && point.scf.converged === null) {
    point.scf.converged = false;
    cite(point, 'scf.converged', state.scfRunning);
  }
  addStep(state.steps, current.finish());
  state.current = null;
  state.optimising = false;
  state.displaced = false;
  state.thermo = false;
  state.scfRunning = null;
  state.method = null;
  state.components = { exchange: null, correlation: null };
  startScf(state);
}

/** The next job of the same run starts: the one before it came to its end. */
function finishStep(state: OrcaState): void {
  if (!state.current) return;
  const { step }: { step: Step } = openStep(state);
  step.outcome = state.failure ? 'failed' : 'finished';
  step.failure = state.failure;
  closeStep(state);
}

const runLandmarks: LandmarkMap<OrcaState> = {
  // A second banner is another run appended to the same file.
  '* O R C A *': {
    always: true,
    read(_, state) {
      closeOpenStep(state);
      closeStep(state);
      Object.assign(state, { ...startOrca(), steps: state.steps });
    },
  },
  // Program Version 5.0.3-f.1 -  RELEASE  -
  'Program Version': (line, state) => {
    const value = words(line.text)[2];
    if (value !== undefined) state.version = { value, line };
  },
  // $$$$$$$$$$$$$$$$  JOB NUMBER  1 $$$$$$$$$$$$$$
  '$$$$$$$$$$$$$$$$ JOB NUMBER': (line, state) => {
    const row = words(line.text);
    const number = readInteger(row[row.indexOf('NUMBER') + 1]);
    finishStep(state);
    if (number !== null && number > 0) state.job = number - 1;
  },
  // COMPOUND JOB MainJOB   /   COMPOUND JOB  1
  'COMPOUND JOB': (line, state) => {
    finishStep(state);
    const name = words(line.text)[2];
    if (name === undefined) return;
    // The main input names charge, multiplicity and cores for all steps; its basis is of no calculation.
    if (name !== 'MainJOB' && state.inherited === null) state.inherited = state.decks[0] ?? null;
    state.decks = [emptyDeck()];
    state.job = 0;
    state.bases = []; // those of a step are announced below its echoed input
  },
  '****ORCA TERMINATED NORMALLY****': (_, state) => {
    state.failure = null;
    state.closed = true;
    finishStep(state);
  },
  // TOTAL RUN TIME: 0 days 0 hours 52 minutes 42 seconds 716 msec
  'TOTAL RUN TIME:': {
    evenUnended: true,
    read(line, state) {
      const row = words(line.text);
      const [days, hours, minutes, seconds, milliseconds] = [3, 5, 7, 9, 11].map((at) =>
        readInteger(row[at]),
      );
      if (typeof days !== 'number' || typeof hours !== 'number' || typeof minutes !== 'number') return;
      if (typeof seconds !== 'number' || typeof milliseconds !== 'number' || row[12] !== 'msec') return;
      const value = ((days * 24 + hours) * 60 + minutes) * 60 + seconds + milliseconds / 1000;
      state.wall = { value: Number(value.toFixed(3)), line };
    },
  },
};

function end(state: OrcaState): ProgramResult {
  closeOpenStep(state);
  const unfinished = state.current !== null;
  closeStep(state);
  const { steps, failure, closed, wall } = state;
  const whole: ProgramResult['whole'] = {
    resources: { wallSeconds: wall?.value ?? null, cores: null },
    evidence: {},
  };
  if (wall) cite(whole, 'resources.wallSeconds', wall.line);
  const outcome = closed && !unfinished ? 'finished' : failure ? 'failed' : 'cut off';
  return { steps, outcome, failure: outcome === 'finished' ? null : failure, whole };
}

/** ORCA 2.9 to 6.1. */
export const orca = defineProgram<OrcaState>({
  name: 'ORCA',
  marks: ['* O R C A *', '--- An Ab Initio, DFT and Semiempirical electronic structure package ---'],
  start: startOrca,
  landmarks: {
    ...runLandmarks,
    ...settingsLandmarks,
    ...energyLandmarks,
    ...tableLandmarks,
    ...failureLandmarks,
  },
  end,
});
