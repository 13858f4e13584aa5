import type { Line } from '../landmark';
import type { LandmarkMap } from '../program';
import type { FailureKind } from '../record';
import { openStep, type OrcaState } from './state';

const kinds: [RegExp, FailureKind][] = [
  [/no space|disk|cannot write|write error/i, 'out of disk'],
  [/memory|maxcore|std::bad_alloc/i, 'out of memory'],
  [/time limit|walltime/i, 'out of time'],
  [/linear(?:ly)? depend/i, 'linear dependence'],
  [/not (?:fully |yet )?converged|failed to converge|scf.{0,20}converge/i, 'scf not converged'],
  [/maximum number of optimization cycles/i, 'optimisation out of steps'],
  [
    /input|keyword|unrecognized|unknown|multiplicity|electrons|impossible|basis|coordinates|syntax|block|invalid/i,
    'input error',
  ],
];

function fail(state: OrcaState, message: string, line: Line, kind?: FailureKind): void {
  const found = kind ?? kinds.find(([pattern]) => pattern.test(message))?.[1] ?? 'other';
  // A reason that says something is kept against the general ones that follow it.
  if (state.failure && (state.failure.kind !== 'other' || found === 'other')) return;
  const unconverged = found === 'other' && state.current?.point.scf.converged === false;
  state.failure = {
    kind: unconverged ? 'scf not converged' : found,
    message: message.trim().slice(0, 200),
    line: line.number,
  };
}

function failure(kind?: FailureKind) {
  return (line: Line, state: OrcaState) => fail(state, line.text, line, kind);
}

export const failureLandmarks: LandmarkMap<OrcaState> = {
  // The box headed ERROR gives its reason in the lines below.
  ERROR: (heading, state) => {
    let lines = 0;
    return {
      take(line) {
        const text = line.text.trim();
        if (text === '' || /^-+$/.test(text)) return ++lines < 6;
        fail(state, heading.text.trim() === 'ERROR' ? text : `${heading.text.trim()} ${text}`, line);
        return false;
      },
    };
  },
  'Error :': failure(),
  'Error (': failure(),
  'ERROR :': failure(),
  'ERROR:': failure(),
  'INPUT ERROR': failure('input error'),
  'UNRECOGNIZED OR DUPLICATED KEYWORD': failure('input error'),
  'There are invalid': failure('input error'),
  'This SCF-wavefunction IS NOT FULLY CONVERGED!': failure('scf not converged'),
  'This wavefunction IS NOT FULLY CONVERGED!': failure('scf not converged'),
  'OUT OF MEMORY ERROR': failure('out of memory'),
  'Not enough memory': failure('out of memory'),
  'No space left on device': failure('out of disk'),
  'ORCA finished by error termination in': failure(),
  'aborting the run': failure(),
  'Aborting the run': failure(),
  '[file orca': failure(),
};

/** What the step at hand is when nothing closed it. */
export function closeOpenStep(state: OrcaState): void {
  if (!state.current) return;
  const { step } = openStep(state);
  step.outcome = state.failure ? 'failed' : 'cut off';
  step.failure = state.failure;
}
