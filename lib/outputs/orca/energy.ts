import { cite } from '../cite';
import type { Line } from '../landmark';
import { integerAfter, numberAfter, readInteger, readNumber, words } from '../numbers';
import type { LandmarkMap } from '../program';
import { warn } from '../warnings';
import { addTask, openStep, startScf, type OrcaState } from './state';

// *           SCF CONVERGED AFTER  66 CYCLES          *
function endScf(converged: boolean) {
  return (line: Line, state: OrcaState) => {
    if (state.displaced) return;
    const draft = openStep(state);
    if (draft.point.scf.converged !== null) draft.sameGeometryAgain();
    startScf(state);
    state.scfRunning = null;
    draft.point.scf = { converged, iterations: integerAfter(line.text, 'AFTER') };
    cite(draft.point, 'scf.converged', line);
    cite(draft.point, 'scf.iterations', line);
  };
}

/** The energy without dispersion, in the block after the SCF; iteration blocks print an indented one. */
function readScfEnergy(_: Line, state: OrcaState) {
  let lines = 0;
  return {
    take(line: Line) {
      if (!line.text.startsWith('Total Energy')) return ++lines < 8;
      const value = numberAfter(line.text, ':');
      if (value !== null && !state.displaced) state.scfEnergy = { value, line };
      return false;
    },
  };
}

/** The energy that the record wants: of the ground state's SCF, with whatever dispersion it includes. */
function chooseEnergy(final: { value: number; line: Line }, state: OrcaState) {
  const { correlated, scfEnergy, groundEnergy, method } = state;
  if (correlated === 'excited state') return groundEnergy ?? scfEnergy;
  if (correlated === 'coupled cluster') return scfEnergy;
  // A double hybrid's perturbative part belongs to the functional; after Hartree-Fock it is another method.
  if (correlated === 'perturbation' && !method?.isDft) return scfEnergy;
  return final;
}

// FINAL SINGLE POINT ENERGY     -2821.903615435997   (SCF not fully converged!)
function readFinalEnergy(line: Line, state: OrcaState): void {
  const value = readNumber(words(line.text)[4]);
  if (value === null || state.displaced) return;
  const { point, step } = openStep(state);
  const chosen = chooseEnergy({ value, line }, state);
  point.energyHartree = chosen?.value ?? null;
  if (chosen) cite(point, 'energyHartree', chosen.line);
  if (chosen?.line !== line)
    warn(
      point,
      'energy-is-reference',
      line.number,
      `The final energy ${value} is that of ${state.correlated ?? 'another method'}; the record holds the SCF energy.`,
    );
  if (line.text.includes('not fully converged')) {
    point.scf.converged = false;
    cite(point, 'scf.converged', line);
  }
  if (!state.optimising || !step.optimisation) return;
  step.optimisation.history.push({
    energyHartree: value,
    largestGradientHartreePerBohr: null,
    rmsGradientHartreePerBohr: null,
    line: line.number,
    geometryLine: point.evidence.geometry?.line ?? null,
  });
  step.optimisation.energiesHartree.push(value);
  step.optimisation.steps = step.optimisation.history.length;
  cite(step, 'optimisation.energiesHartree', line);
}

/**
 * Cartesian gradients ("MAX gradient  ...  0.0012287748") are preferred; the convergence table
 * ("MAX gradient  0.0007463819  0.0003000000  NO", internal coordinates) stands in where they are not printed.
 */
function readGradient(key: 'largestGradientHartreePerBohr' | 'rmsGradientHartreePerBohr') {
  return (line: Line, state: OrcaState) => {
    const entry = state.current?.step.optimisation?.history.at(-1);
    if (!entry || state.displaced) return;
    const dots = words(line.text).indexOf('...');
    const value = readNumber(words(line.text)[dots < 0 ? 2 : dots + 1]);
    if (value !== null) entry[key] ??= value;
  };
}

function setOptimisation(converged: boolean) {
  return (line: Line, state: OrcaState) => {
    const optimisation = state.current?.step.optimisation;
    if (!state.current || !optimisation) return;
    optimisation.converged = converged;
    cite(state.current.step, 'optimisation.converged', line);
  };
}

function broken(
  key: 'highSpinEnergyHartree' | 'brokenSymmetryEnergyHartree' | 'highSpinS2' | 'brokenSymmetryS2',
) {
  return (line: Line, state: OrcaState) => {
    const value = numberAfter(line.text, '=');
    if (value === null || line.text.includes(')-E(')) return;
    const { step } = openStep(state);
    step.brokenSymmetry ??= {
      highSpinEnergyHartree: null,
      brokenSymmetryEnergyHartree: null,
      highSpinS2: null,
      brokenSymmetryS2: null,
    };
    step.brokenSymmetry[key] = value;
    cite(step, `brokenSymmetry.${key}`, line);
  };
}

function after(correlated: NonNullable<OrcaState['correlated']>) {
  return (_: Line, state: OrcaState) => {
    state.correlated = correlated;
  };
}

export const energyLandmarks: LandmarkMap<OrcaState> = {
  'SCF ITERATIONS': (line, state) => {
    state.scfRunning = line;
  },
  'ORCA LEAN-SCF': (line, state) => {
    state.scfRunning = line;
  },
  '* SCF CONVERGED AFTER': endScf(true),
  'SCF CONVERGED AFTER': endScf(true),
  '* SCF NOT CONVERGED AFTER': endScf(false),
  'SCF NOT CONVERGED AFTER': endScf(false),
  'The wavefunction IS NOT YET CONVERGED!': (line, state) => {
    const { point } = openStep(state);
    point.scf.converged = false;
    cite(point, 'scf.converged', line);
  },
  'TOTAL SCF ENERGY': readScfEnergy,
  'FINAL SINGLE POINT ENERGY': readFinalEnergy,
  'RMS gradient': readGradient('rmsGradientHartreePerBohr'),
  'MAX gradient': readGradient('largestGradientHartreePerBohr'),
  '* GEOMETRY OPTIMIZATION CYCLE': (_, state) => {
    const { step } = openStep(state);
    state.optimising = true;
    addTask(state, 'optimisation');
    step.optimisation ??= { converged: null, steps: 0, energiesHartree: [], history: [] };
  },
  '*** THE OPTIMIZATION HAS CONVERGED': setOptimisation(true),
  'The optimization did not converge but reached': setOptimisation(false),
  '* Energy+Gradient Calculation *': (_, state) => addTask(state, 'gradient'),
  'ORCA NUMERICAL FREQUENCIES': (_, state) => addTask(state, 'frequencies'),
  '<< Calculating gradient on displaced geometry': (_, state) => {
    state.displaced = true;
  },
  '<< Calculating on displaced geometry': (_, state) => {
    state.displaced = true;
  },
  'E(CCSD)': after('coupled cluster'),
  'ORCA-MATRIX DRIVEN CI': after('coupled cluster'),
  'MP2 TOTAL ENERGY': after('perturbation'),
  'RI-MP2 TOTAL ENERGY': after('perturbation'),
  'DLPNO-MP2 TOTAL ENERGY': after('perturbation'),
  'ORCA MP2 CALCULATION': after('perturbation'),
  'E(CCSD(T))': after('coupled cluster'),
  'DE(CIS) =': after('excited state'),
  // E(SCF)  =   -382.055107108 Eh
  'E(SCF) =': (line, state) => {
    const value = numberAfter(line.text, '=');
    if (value !== null) state.groundEnergy = { value, line };
  },
  'ORCA TD-DFT/TDA CALCULATION': (_, state) => addTask(state, 'excited states'),
  'ORCA CIS/TD-DFT CALCULATION': (_, state) => addTask(state, 'excited states'),
  'ORCA EPR/NMR CALCULATION': (_, state) => addTask(state, 'properties'),
  'RELAXED SURFACE SCAN': (_, state) => addTask(state, 'scan'),
  // Expectation value of <S**2>     :     2.992265
  'Expectation value of <S**2>': (line, state) => {
    const value = numberAfter(line.text, ':');
    if (value === null || state.displaced) return;
    const { point } = openStep(state);
    point.spin.s2 = value;
    cite(point, 'spin.s2', line);
  },
  // Ideal value S*(S+1) for S=1.0   :     2.000000
  'Ideal value S*(S+1) for': (line, state) => {
    const value = numberAfter(line.text, ':');
    if (value === null || state.displaced) return;
    const { point } = openStep(state);
    point.spin.s2Ideal = value;
    cite(point, 'spin.s2Ideal', line);
  },
  'SCF STABILITY ANALYSIS': (_, state) => addTask(state, 'stability'),
  'Stability Analysis indicates': (line, state) => {
    const { point } = openStep(state);
    point.stability = { stable: !/unstable/i.test(line.text), line: line.number };
    cite(point, 'stability', line);
  },
  // The charge block keeps the multiplicity of the high-spin state; the flip names the new one.
  'FLIP-SPIN BROKEN SYMMETRY': (_, state) => {
    addTask(state, 'broken symmetry');
    let lines = 0;
    return {
      take(line) {
        const value = /multiplicity/i.test(line.text) ? readInteger(words(line.text).at(-1)) : null;
        const { step } = openStep(state);
        if (value !== null && value > 0) {
          step.multiplicity = value;
          cite(step, 'multiplicity', line);
        }
        return ++lines < 20;
      },
    };
  },
  '<S**2>(High-Spin)': broken('highSpinS2'),
  '<S**2>(BrokenSym)': broken('brokenSymmetryS2'),
  'E(High-Spin)': broken('highSpinEnergyHartree'),
  'E(BrokenSym)': broken('brokenSymmetryEnergyHartree'),
};
