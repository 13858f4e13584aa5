import type { Line } from '../landmark';
import type { LandmarkMap } from '../program';
import type { FailureKind } from '../record';
import type { Psi4State } from './state';

const kinds: [RegExp, FailureKind][] = [
  [/converge.{0,20}(?:scf|iterations)|scfconvergence/i, 'scf not converged'],
  [/converge.{0,20}geometry|optimizationconvergence|did not converge/i, 'optimisation out of steps'],
  [/memory|bad_alloc/i, 'out of memory'],
  [/no space left|disk|psio/i, 'out of disk'],
  [/linear(?:ly)? depend/i, 'linear dependence'],
  [
    /basisset|validation|not available|unrecogni[sz]ed|inconsistent|syntax|nameerror|typeerror|option|multiplicity|molecule|charge/i,
    'input error',
  ],
];

function fail(line: Line, state: Psi4State): void {
  const message = line.text.trim().slice(0, 200);
  const kind = kinds.find(([pattern]) => pattern.test(message))?.[1] ?? 'other';
  // The first reason that says something is kept against general ones after it.
  if (state.failure && (state.failure.kind !== 'other' || kind === 'other')) return;
  state.failure = { kind, message, line: line.number };
}

export const failureLandmarks: LandmarkMap<Psi4State> = {
  'PsiException:': fail,
  'Fatal Error:': fail,
  'Fatal error:': fail,
  // psi4.driver.p4util.exceptions.SCFConvergenceError: Could not converge SCF iterations in 300 iterations.
  'psi4.driver.': fail,
  'qcelemental.': fail,
  'RuntimeError:': fail,
  'NameError:': fail,
  'TypeError:': fail,
  'SyntaxError:': fail,
  MemoryError: fail,
  'std::bad_alloc': fail,
  'Optimizer: Did not converge!': fail,
};
