import { cite } from '../cite';
import { findJobKey } from '../job-key-pattern';
import type { Line, Section } from '../landmark';
import { integerAfter, readNumber, words } from '../numbers';
import { defineProgram, type LandmarkMap, type ProgramResult } from '../program';
import { closeStep } from './close-step';
import { derivativeLandmarks } from './derivatives';
import { failureLandmarks } from './failures';
import { scfLandmarks } from './scf';
import { startPsi4, type Psi4State } from './state';
import { tableLandmarks } from './tables';

/** The banner of a run; inside a derivative by finite differences every displacement prints it again. */
function readBanner(_: Line, state: Psi4State): void {
  if (state.displacements) return;
  closeStep(state, state.closed ? 'finished' : state.failure ? 'failed' : 'cut off');
  const { steps } = state;
  Object.assign(state, { ...startPsi4(), steps });
}

/** The echoed input stands between two rules; its second one can follow the last word on the same line. */
function readInput(_: Line, state: Psi4State): Section {
  let rules = 0;
  let lines = 0;
  return {
    exclusive: true,
    take(line) {
      if (!state.jobKey) {
        const text = findJobKey(line.text);
        if (text !== null) state.jobKey = { text, line };
      }
      if (line.text.trimEnd().endsWith('-'.repeat(30))) rules++;
      return rules < 2 && ++lines < 100_000;
    },
  };
}

const runLandmarks: LandmarkMap<Psi4State> = {
  'Psi4: An Open-Source Ab Initio Electronic Structure Package': { always: true, read: readBanner },
  'PSI4: An Open-Source Ab Initio Electronic Structure Package': { always: true, read: readBanner },
  // Psi4 1.7 release   /   Psi4 undefined
  Psi4: (line, state) => {
    const row = words(line.text);
    if (row[0] === 'Psi4' && (row[2] === 'release' || row.length === 2)) {
      state.version ??= { text: row[1] ?? '', line };
    }
    readWallTime(line, state);
  },
  // PSI 4.0.0-beta5 Driver
  PSI: (line, state) => {
    const row = words(line.text);
    if (row[2] === 'Driver' && row[1] !== undefined) state.version ??= { text: row[1], line };
  },
  'Threads:': (line, state) => {
    const count = integerAfter(line.text, ':');
    if (count !== null) state.cores ??= { count, line };
  },
  '==> Input File <==': readInput,
  '*** Psi4 exiting successfully.': { evenUnended: true, read: readEnd },
  '*** PSI4 exiting successfully.': { evenUnended: true, read: readEnd },
  '*** Psi4 encountered an error.': { evenUnended: true, read: readError },
  '*** PSI4 encountered an error.': { evenUnended: true, read: readError },
};

function readEnd(_: Line, state: Psi4State): void {
  if (!state.displacements) state.closed = true;
}

function readError(line: Line, state: Psi4State): void {
  state.failure ??= { kind: 'other', message: line.text.trim().slice(0, 200), line: line.number };
}

// Psi4 wall time for execution: 0:20:17.93    or    1 day, 2:03:04.50
function readWallTime(line: Line, state: Psi4State): void {
  const text =
    /^Psi4 wall time for execution: (?:(\d{1,4}) days?, )?(\d{1,4}):(\d\d):(\d\d(?:\.\d{1,6})?)$/.exec(
      line.text.trim().slice(0, 120),
    );
  if (!text) return;
  const [days, hours, minutes, seconds] = text.slice(1, 5).map((part) => readNumber(part ?? '0'));
  const value = (((days ?? 0) * 24 + (hours ?? 0)) * 60 + (minutes ?? 0)) * 60 + (seconds ?? 0);
  state.wall = { seconds: Number(value.toFixed(2)), line };
}

function end(state: Psi4State): ProgramResult {
  const { closed, failure } = state;
  const outcome = closed ? 'finished' : failure ? 'failed' : 'cut off';
  // Displacements that never ended: the first one, not displaced, is all that can be said of the molecule.
  if (state.displacements?.first) {
    state.current = state.displacements.first;
    state.current.step.tasks = ['frequencies'];
  }
  closeStep(state, outcome);
  const { steps, wall } = state;
  const whole: ProgramResult['whole'] = {
    resources: { wallSeconds: outcome === 'cut off' ? null : (wall?.seconds ?? null), cores: null },
    evidence: {},
  };
  if (wall && outcome !== 'cut off') cite(whole, 'resources.wallSeconds', wall.line);
  return { steps, outcome, failure: outcome === 'failed' ? failure : null, whole };
}

/** Psi4 1.0 to 1.11, and the beta of 4.0.0. */
export const psi4 = defineProgram<Psi4State>({
  name: 'Psi4',
  marks: [
    'Psi4: An Open-Source Ab Initio Electronic Structure Package',
    'PSI4: An Open-Source Ab Initio Electronic Structure Package',
  ],
  start: startPsi4,
  landmarks: {
    ...runLandmarks,
    ...scfLandmarks,
    ...tableLandmarks,
    ...derivativeLandmarks,
    ...failureLandmarks,
  },
  end,
});
