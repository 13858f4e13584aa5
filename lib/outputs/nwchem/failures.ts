import type { Line } from '../landmark';
import type { LandmarkMap } from '../program';
import type { FailureKind } from '../record';
import { openStep, type NwchemState } from './state';

/** What NWChem's own words tell of the reason, most telling first. */
const kinds: [RegExp, FailureKind][] = [
  [/disk|no space|file system|write failed|sf_write/i, 'out of disk'],
  [/memory|ma_alloc|ma_push|ma_get|ga_create|nga_create|heap|stack|insufficient/i, 'out of memory'],
  [/time limit|out of time|insufficient time/i, 'out of time'],
  [/linear(?:ly)? depend/i, 'linear dependence'],
  [
    /maximum number of steps|driver: task_gradient failed|optimi[sz]ation failed/i,
    'optimisation out of steps',
  ],
  [
    /failed to converge|not reaching convergence|scf failed|dft.{0,20}failed|energy failed/i,
    'scf not converged',
  ],
  [
    /input|directive|unknown|unrecognized|keyword|basis|geometry|parse|multiplicity|electrons|charge/i,
    'input error',
  ],
];

function kindOf(message: string): FailureKind {
  return kinds.find(([pattern]) => pattern.test(message))?.[1] ?? 'other';
}

function fail(state: NwchemState, message: string, line: Line): void {
  if (state.failure) return;
  const kind = state.optimiserGaveUp
    ? 'optimisation out of steps'
    : state.scfFailed
      ? 'scf not converged'
      : kindOf(message);
  state.failure = { kind, message: message.trim().slice(0, 200), line: line.number };
}

/** The category that NWChem itself gives an error refines a reason that was not understood. */
function category(kind: FailureKind) {
  return (_: Line, state: NwchemState) => {
    if (state.failure?.kind === 'other') state.failure = { ...state.failure, kind };
  };
}

export const failureLandmarks: LandmarkMap<NwchemState> = {
  // The message of a fatal error stands between two rules, above "current input line".
  '------------------------------------------------------------------------': {
    onlyOutside: true,
    read: (_, state) => ({
      take(line) {
        const text = line.text.trim();
        if (text !== '' && !text.startsWith('---')) state.ruled = line;
        return false;
      },
    }),
  },
  'current input line :': (line, state) => {
    fail(state, state.ruled?.text ?? line.text, state.ruled ?? line);
  },
  'This type of error is most commonly associated with calculations not reaching convergence criteria':
    category('scf not converged'),
  'There is an error in the input file': category('input error'),
  'There is an error in the specified basis set': category('input error'),
  'There is an error related to the specified geometry': category('input error'),
  'insufficient memory': (line, state) => fail(state, line.text, line),
  'MA error:': (line, state) => fail(state, line.text, line),
  // 0:0: driver_energy_step: energy failed:: 0
  '0:0:': (line, state) => fail(state, line.text, line),
  '0: error': (line, state) => fail(state, line.text, line),
};

/** What the step at hand is when no "Task times" closed it. */
export function closeOpenStep(state: NwchemState): void {
  if (!state.current) return;
  const { step } = openStep(state);
  step.outcome = state.failure ? 'failed' : 'cut off';
  step.failure = state.failure;
}
