import { cite } from '../cite';
import type { Line } from '../landmark';
import { numberAfter, readInteger, readNumber, words } from '../numbers';
import type { LandmarkMap } from '../program';
import { warn } from '../warnings';
import { closeStep } from './close-step';
import { addTask, openStep, type Psi4State } from './state';

/** Two prints of one energy, to eight decimals, hartree. */
const SAME_ENERGY_HARTREE = 6e-9;

/** The marks that say which criteria are met (* met, o not used) and the tilde at the end are no numbers. */
const withoutMarks = (text: string) =>
  words(text).filter((word) => word !== '*' && word !== 'o' && word !== '~');

//      1     -382.30822439   -3.82e+02      7.73e-04      3.38e-04 o    4.82e-03      1.64e-03 o  ~
function readOptimisationStep(line: Line, state: Psi4State): void {
  const row = withoutMarks(line.text);
  const index = readInteger(row[0]);
  const energy = readNumber(row[1]);
  if (index === null || energy === null || row.length < 5) return;
  const draft = openStep(state);
  const optimisation = (draft.step.optimisation ??= {
    converged: null,
    steps: 0,
    energiesHartree: [],
    history: [],
  });
  const { energyHartree, evidence } = draft.point;
  const whole =
    energyHartree !== null && Math.abs(energyHartree - energy) < SAME_ENERGY_HARTREE ? energyHartree : energy;
  optimisation.history.push({
    energyHartree: whole,
    largestGradientHartreePerBohr: readNumber(row[3]),
    rmsGradientHartreePerBohr: readNumber(row[4]),
    line: line.number,
    geometryLine: evidence.geometry?.line ?? null,
  });
  optimisation.energiesHartree.push(whole);
  optimisation.steps = optimisation.history.length;
  cite(draft.step, 'optimisation.energiesHartree', line);
  // The gradients were those of the optimisation.
  draft.step.tasks = draft.step.tasks.filter((task) => task !== 'gradient');
  addTask(state, 'optimisation');
  state.optimiserMoved = true;
}

/** The table of one step: two rules around its headings, criteria and a rule, then the row. */
function readConvergenceTable(_: Line, state: Psi4State) {
  let lines = 0;
  return {
    take(line: Line) {
      const first = withoutMarks(line.text)[0];
      if (readInteger(first) === null) return ++lines < 14;
      readOptimisationStep(line, state);
      return false;
    },
  };
}

/** Row headings of the summary after the last step are wider; it repeats what was read. */
function readStepTable(line: Line, state: Psi4State) {
  return state.optimiserDone ? undefined : readConvergenceTable(line, state);
}

function optimisationEnd(converged: boolean) {
  return (line: Line, state: Psi4State) => {
    const optimisation = state.current?.step.optimisation;
    if (!state.current || !optimisation) return;
    state.optimiserDone = true;
    if (optimisation.converged !== null) return;
    optimisation.converged = converged;
    cite(state.current.step, 'optimisation.converged', line);
  };
}

/** All displacements are done: what follows is of the reference geometry, the first (or, long ago, the last). */
function endDisplacements(state: Psi4State): void {
  const { displacements, current } = state;
  if (!displacements) return;
  const reference = displacements.first ?? current;
  state.otherReference = displacements.first ? (current ?? displacements.last) : null;
  state.displacements = null;
  state.current = reference;
}

//   Freq [cm^-1]                 46.6838             79.5765             889.1554i
function readFrequencies(line: Line, state: Psi4State): void {
  endDisplacements(state);
  addTask(state, 'frequencies');
  state.modesLine ??= line;
  for (const word of words(line.text.slice(line.text.indexOf(']') + 1))) {
    const imaginary = word.endsWith('i');
    const value = readNumber(imaginary ? word.slice(0, -1) : word);
    state.modesCm1.push(value !== null && imaginary ? -Math.abs(value) : value);
  }
}

function thermochemistry(key: 'enthalpyHartree' | 'gibbsHartree') {
  //   Total G, Free enthalpy at  298.15 [K]                               -382.16773449 [Eh]
  return (line: Line, state: Psi4State) => {
    if (!state.current) return;
    const value = numberAfter(line.text, '[K]');
    if (value === null) return;
    const { step } = state.current;
    const thermo = (step.thermochemistry ??= emptyThermochemistry());
    thermo[key] = value;
    cite(step, `thermochemistry.${key}`, line);
    const temperature = numberAfter(line.text, ' at ');
    if (temperature === null) return;
    thermo.temperatureK = temperature;
    cite(step, 'thermochemistry.temperatureK', line);
  };
}

function emptyThermochemistry() {
  return {
    temperatureK: null as number | null,
    pressurePa: null as number | null,
    zeroPointHartree: null as number | null,
    enthalpyHartree: null as number | null,
    gibbsHartree: null as number | null,
  };
}

export const derivativeLandmarks: LandmarkMap<Psi4State> = {
  '==> Convergence Check <==': readConvergenceTable,
  'Step Total Energy Delta E MAX Force': readStepTable,
  'Final optimized geometry and variables:': optimisationEnd(true),
  '**** Optimization is complete!': optimisationEnd(true),
  'Optimizer: Optimization complete!': optimisationEnd(true),
  'Optimizer: Did not converge!': optimisationEnd(false),
  'Could not converge geometry optimization': optimisationEnd(false),
  'gradient() will perform': (_, state) => {
    state.gradientAnnounced = true;
  },
  'Using finite-differences of': (_, state) => {
    // An optimisation or single point before it is a step of its own.
    const { current } = state;
    if (current && (current.point.energyHartree !== null || current.lastSettled))
      closeStep(state, 'finished');
    state.displacements ??= { first: null, last: null };
  },
  'Freq [cm^-1]': readFrequencies,
  'hessian() will perform analytic frequency computation': (_, state) => addTask(state, 'frequencies'),
  'Generating complete list of displacements': (_, state) => endDisplacements(state),
  // P = 101325.00 [Pa] stands at the end of this line
  'Translational S': (line, state) => {
    const pressure = numberAfter(line.text, 'P =');
    if (!state.current || pressure === null) return;
    (state.current.step.thermochemistry ??= emptyThermochemistry()).pressurePa = pressure;
    cite(state.current.step, 'thermochemistry.pressurePa', line);
  },
  //   Total E0, Electronic energy at well bottom at 0 [K]                 -382.31091156 [Eh]
  'Total E0, Electronic energy at well bottom': (line, state) => {
    const energy = numberAfter(line.text, '[K]');
    const { current, otherReference } = state;
    if (!current || energy === null) return;
    const fits = (draft: typeof otherReference) =>
      draft?.point.energyHartree != null &&
      Math.abs(draft.point.energyHartree - energy) < SAME_ENERGY_HARTREE;
    if (fits(current)) return;
    if (otherReference && fits(otherReference)) {
      otherReference.step.tasks = current.step.tasks;
      state.current = otherReference;
      return;
    }
    current.nextPoint();
    current.point.energyHartree = energy;
    cite(current.point, 'energyHartree', line);
    warn(current.step, 'energy-without-geometry', line.number);
  },
  //   Correction ZPE          111.126 [kcal/mol]      464.952 [kJ/mol]       0.17709102 [Eh]
  'Correction ZPE': (line, state) => {
    const value = numberAfter(line.text, '[kJ/mol]');
    if (!state.current || value === null || !line.text.includes('[Eh]')) return;
    (state.current.step.thermochemistry ??= emptyThermochemistry()).zeroPointHartree = value;
    cite(state.current.step, 'thermochemistry.zeroPointHartree', line);
  },
  'Total H, Enthalpy at': thermochemistry('enthalpyHartree'),
  'Total G, Free enthalpy at': thermochemistry('gibbsHartree'),
  'CCSD total energy': correlated,
  'CCSD(T) total energy': correlated,
  'MP2 Total Energy (a.u.)': correlated,
  'DF-MP2 Energies': correlated,
  'Wavefunction stable': stability(true),
  'Negative hessian eigenvalue detected': stability(false),
};

function correlated(line: Line, state: Psi4State): void {
  if (state.current) warn(state.current.step, 'energy-is-reference', line.number);
}

function stability(stable: boolean) {
  return (line: Line, state: Psi4State) => {
    if (!state.current) return;
    state.current.point.stability = { stable, line: line.number };
    addTask(state, 'stability');
  };
}
