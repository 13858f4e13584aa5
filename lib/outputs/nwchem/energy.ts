import { cite } from '../cite';
import type { Line } from '../landmark';
import { numberAfter, readInteger, readNumber, words } from '../numbers';
import type { LandmarkMap } from '../program';
import { warn } from '../warnings';
import { geometryOfEnergy } from './geometry';
import { saveOrbitals } from './orbitals';
import { openStep, type NwchemState } from './state';

function placeGeometry(state: NwchemState): void {
  const draft = openStep(state);
  const printed = geometryOfEnergy(state);
  draft.point.geometry = printed?.geometry ?? null;
  if (printed) cite(draft.point, 'geometry', printed.line);
  else delete draft.point.evidence.geometry;
}

/** An energy that is printed again unchanged is of the same wavefunction; another one opens a new point. */
function readEnergy(line: Line, state: NwchemState): void {
  const energy = numberAfter(line.text, '=');
  const draft = openStep(state);
  state.afterEnergy = true;
  if (energy === null) return;
  if (draft.point.energyHartree === energy) {
    if (!draft.point.geometry && !state.trial) {
      state.repulsionHartree = null;
      placeGeometry(state);
    }
    return;
  }
  saveOrbitals(state, false);
  draft.nextPoint();
  const { point } = draft;
  point.energyHartree = energy;
  cite(point, 'energyHartree', line);
  state.repulsionHartree = null;
  state.orbitals = null;
  placeGeometry(state);
  if (state.scfFailed) {
    point.scf = { converged: false, iterations: state.iterations };
    cite(point, 'scf.converged', state.scfFailed);
  } else if (state.iterations === null && !state.alreadyConverged && !line.text.includes('SCF')) {
    // Iterations of the SCF module are not read; it prints no energy without them.
    warn(
      point,
      'scf-skipped',
      line.number,
      'No SCF iterations are printed before this energy: it may be that of an initial guess.',
    );
  } else {
    point.scf = { converged: true, iterations: state.iterations };
    cite(point, 'scf.converged', line);
  }
  if (state.iterationLine) cite(point, 'scf.iterations', state.iterationLine);
}

/** A new SCF starts: what its guess prints is no result. */
export function startScf(state: NwchemState): void {
  state.iterations = null;
  state.scfFailed = null;
  state.afterEnergy = false;
  state.orbitalSpin = null;
}

//  d= 0,ls=0.0,diis     1  -3101.1361784483 -3.76D+03  6.38D-02  6.53D+00     8.6
function readIteration(line: Line, state: NwchemState): void {
  const [, count] = /\s(\d{1,6})\s{1,4}-?\d/.exec(line.text.slice(0, 60)) ?? [];
  const iterations = readInteger(count);
  if (iterations === null) return;
  state.iterations = iterations;
  state.iterationLine = line;
}

// @    2    -382.30826156 -1.2D-05  0.00014  0.00008  0.00412  0.00739    473.1
function readOptimisationStep(line: Line, state: NwchemState): void {
  const [, number, energyText, , largest, rms] = words(line.text);
  const index = readInteger(number);
  const energy = readNumber(energyText);
  if (index === null || energy === null) return;
  const draft = openStep(state);
  const history = (draft.step.optimisation ??= {
    converged: null,
    steps: 0,
    energiesHartree: [],
    history: [],
  });
  state.trial = true;
  // The line of the last step is printed a second time after convergence.
  if (history.history.length > index) return;
  const { energyHartree, evidence } = draft.point;
  const whole = energyHartree !== null && Math.abs(energyHartree - energy) < 1e-6 ? energyHartree : energy;
  history.history.push({
    energyHartree: whole,
    largestGradientHartreePerBohr: readNumber(largest),
    rmsGradientHartreePerBohr: readNumber(rms),
    line: line.number,
    geometryLine: evidence.geometry?.line ?? null,
  });
  history.energiesHartree.push(whole);
  history.steps = history.history.length;
  cite(draft.step, 'optimisation.energiesHartree', line);
}

export const energyLandmarks: LandmarkMap<NwchemState> = {
  'Total DFT energy =': readEnergy,
  'Total SCF energy =': readEnergy,
  // Nuclear repulsion energy =      656.903305597600
  'Nuclear repulsion energy =': (line, state) => {
    const { current, repulsionHartree } = state;
    if (!current || !state.afterEnergy || repulsionHartree !== null) return;
    state.repulsionHartree = numberAfter(line.text, '=');
    placeGeometry(state);
  },
  'The DFT is already converged': (_, state) => {
    state.alreadyConverged = true;
  },
  'd=': readIteration,
  'Calculation failed to converge': (line, state) => {
    state.scfFailed = line;
    const { current } = state;
    if (!current || !state.afterEnergy) return;
    current.point.scf.converged = false;
    cite(current.point, 'scf.converged', line);
  },
  // <S2> =      4.0088 (Exact =     0.0000)
  '<S2> =': (line, state) => {
    if (!state.current || !state.afterEnergy) return;
    const { point, step } = state.current;
    const s2 = numberAfter(line.text, '<S2> =');
    if (s2 === null) return;
    point.spin.s2 = s2;
    cite(point, 'spin.s2', line);
    // With beta electrons in excess the printed exact value is not that of the multiplicity.
    const excess = step.warnings.some(({ code }) => code === 'beta-excess');
    const ideal = excess ? null : readNumber(line.text.split('Exact =')[1]?.replace(')', ''));
    point.spin.s2Ideal = ideal;
    if (ideal !== null) cite(point, 'spin.s2Ideal', line);
  },
  '@': readOptimisationStep,
  'Optimization converged': (line, state) => {
    const optimisation = state.current?.step.optimisation;
    if (!state.current || !optimisation) return;
    optimisation.converged = true;
    cite(state.current.step, 'optimisation.converged', line);
  },
  'Failed to converge in maximum number of steps': (line, state) => {
    state.optimiserGaveUp = line;
    const optimisation = state.current?.step.optimisation;
    if (!state.current || !optimisation) return;
    optimisation.converged = false;
    cite(state.current.step, 'optimisation.converged', line);
  },
};
