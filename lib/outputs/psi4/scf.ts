import { BOHR_ANGSTROM } from '../../chemistry/constants';
import { elementSymbol } from '../../chemistry/elements';
import { cite } from '../cite';
import type { Line, Section } from '../landmark';
import { after, integerAfter, numberAfter, readInteger, readNumber, readNumbers, words } from '../numbers';
import type { LandmarkMap, LandmarkReader } from '../program';
import type { Method } from '../record';
import { rowTable } from '../row-table';
import { warn } from '../warnings';
import { closeStep } from './close-step';
import { openStep, type Psi4State } from './state';

/** A new SCF: of the next displacement, of the next step of an optimisation, or of another calculation. */
function startScf(line: Line, state: Psi4State): void {
  // "SCF" stands alone in its box; "SCF GRAD" and the like are other modules.
  if (line.text.trim() !== 'SCF') return;
  const { current, displacements, optimiserMoved, optimiserDone } = state;
  const hasEnergy =
    current !== null && (current.point.energyHartree !== null || current.lastSettled !== null);
  if (displacements) {
    if (hasEnergy) {
      if (displacements.first) displacements.last = current;
      else displacements.first = current;
      state.current = null;
    }
  } else if (hasEnergy && (!optimiserMoved || optimiserDone)) closeStep(state, 'finished');
  if (state.gradientAnnounced && !displacements) {
    const { step } = openStep(state);
    if (step.tasks.length === 0) step.tasks.push('gradient');
  }
  state.gradientAnnounced = false;
  state.optimiserMoved = false;
  state.iterations = null;
  state.iterationLine = null;
  state.scfConverged = null;
  state.pending = [];
}

interface Atom {
  /** Null for a ghost atom, which has no nucleus. */
  element: string | null;
  position: (number | null)[];
}

//          CR          -0.005664582159     0.376672125525    -0.082900553740    51.940504714000
//     C           -1.416961893915     0.228265542399     0.000000000000        (1.0 without masses)
function readAtom(line: Line): Atom | null {
  const [symbol, ...rest] = words(line.text);
  if (symbol === undefined || symbol.startsWith('-') || symbol === 'Center') return null;
  const numbers = readNumbers(rest.join(' '));
  if (numbers.length < 3 || numbers.length > 4) return null;
  const ghost = /^(?:Gh\(|@|X$)/i.test(symbol);
  const element = ghost ? null : elementSymbol(/^[A-Za-z]{1,2}/.exec(symbol)?.[0] ?? '');
  return ghost || element !== null ? { element, position: numbers.slice(0, 3) } : null;
}

//    Geometry (in Angstrom), charge = 0, multiplicity = 1:
function readGeometry(heading: Line, state: Psi4State): Section | void {
  if (!state.geometryAnnounced) return;
  state.geometryAnnounced = false;
  const factor = heading.text.includes('(in Bohr)') ? BOHR_ANGSTROM : 1;
  const draft = openStep(state);
  return rowTable<Atom>({
    heading: 4,
    row: readAtom,
    save(rows) {
      const atoms = rows.filter(({ element }) => element !== null);
      const positions = atoms.map(({ position: [x, y, z] }): [number, number, number] | null =>
        typeof x === 'number' && typeof y === 'number' && typeof z === 'number'
          ? [x * factor, y * factor, z * factor]
          : null,
      );
      const whole = positions.filter((position) => position !== null);
      if (whole.length !== atoms.length || atoms.length === 0) {
        warn(draft.step, 'table-damaged', heading.number);
        return;
      }
      const elements = atoms.map(({ element }) => element ?? '');
      draft.setGeometry({ elements, positionsAngstrom: whole }, heading);
    },
  });
}

function setting(key: 'charge' | 'multiplicity' | 'electronCount'): LandmarkReader<Psi4State> {
  return (line, state) => {
    const value = readInteger(after(line.text, '='));
    if (value === null) return;
    const { step } = openStep(state);
    step[key] = value;
    cite(step, key, line);
  };
}

/** Of a mixed basis the name is made up ("anonymous…"); the blend names its parts. */
function readBasis(_: Line, state: Psi4State): Section {
  const { step } = openStep(state);
  let lines = 0;
  return {
    take(line) {
      const text = line.text.trim();
      const name = /^(Basis Set|Blend): (\S.{0,120})$/.exec(text)?.[2]?.trim();
      if (
        name !== undefined &&
        (step.method.basis === null ||
          text.startsWith('Basis Set') ||
          step.method.basis.startsWith('anonymous'))
      ) {
        step.method.basis = name;
        cite(step, 'method.basis', line);
      }
      return ++lines < 4;
    },
  };
}

//   => Composite Functional: B3LYP <=      and in the beta      => B3LYP Composite Functional <=
function readArrow(line: Line, state: Psi4State): void {
  const text = line.text.trim().slice(0, 200);
  const { step } = openStep(state);
  const functional =
    /^=> Composite Functional: (\S+) <=/.exec(text)?.[1] ??
    /^=> (\S+) Composite Functional <=/.exec(text)?.[1];
  if (functional !== undefined) {
    step.method.functional = functional;
    cite(step, 'method.functional', line);
  }
  //   => B3LYP-D3(BJ): Empirical Dispersion <=
  const dispersion = /^=> (\S{1,60}):? Empirical Dispersion <=/.exec(text)?.[1];
  if (dispersion !== undefined) {
    step.method.dispersion = dispersion.replace(/:$/, '');
    cite(step, 'method.dispersion', line);
  }
}

const references: Record<string, NonNullable<Method['reference']>> = {
  R: 'restricted',
  U: 'unrestricted',
  RO: 'restricted open-shell',
  CU: 'restricted open-shell',
};

//   @DF-UKS Final Energy:  -382.08410943870763
function readEnergy(line: Line, state: Psi4State): void {
  const energy = numberAfter(line.text, 'Final Energy:');
  const kind = /^@(?:DF-)?(RO|CU|R|U)(HF|KS) /.exec(line.text.trim());
  if (energy === null || !kind) return;
  const draft = openStep(state);
  // A second wavefunction at the same geometry, as after a stability analysis, takes the place of the first.
  if (draft.point.energyHartree !== null) draft.sameGeometryAgain();
  const { point, step } = draft;
  point.energyHartree = energy;
  cite(point, 'energyHartree', line);
  point.scf = { converged: state.scfConverged?.value ?? null, iterations: state.iterations };
  if (state.scfConverged) cite(point, 'scf.converged', state.scfConverged.line);
  if (state.iterationLine) cite(point, 'scf.iterations', state.iterationLine);
  step.method.reference = references[kind[1] ?? ''] ?? null;
  cite(step, 'method.reference', line);
  if (kind[2] === 'HF') {
    step.method.functional = 'HF';
    cite(step, 'method.functional', line);
    warn(step, 'not-dft', line.number);
  }
  for (const save of state.pending) save(point);
  state.pending = [];
}

//   @DF-UKS iter  11:  -382.08410943870763   -7.44251e-09   5.46142e-07 DIIS
function readIteration(line: Line, state: Psi4State): void {
  const count = integerAfter(line.text.replace(':', ' '), 'iter');
  state.iterationLine = line;
  if (count !== null) state.iterations = count;
}

function scfEnd(value: boolean): LandmarkReader<Psi4State> {
  return (line, state) => {
    state.scfConverged = { value, line };
  };
}

function spin(key: 's2' | 's2Ideal'): LandmarkReader<Psi4State> {
  return (line, state) => {
    const value = readNumber(words(line.text).at(-1));
    if (value === null) return;
    state.pending.push((point) => {
      point.spin[key] = value;
      cite(point, `spin.${key}`, line);
    });
  };
}

const kinds = ['RHF', 'UHF', 'ROHF', 'CUHF', 'RKS', 'UKS', 'ROKS', 'CUKS'].flatMap((kind) => [
  kind,
  `DF-${kind}`,
]);

export const scfLandmarks: LandmarkMap<Psi4State> = {
  SCF: startScf,
  '==> Geometry <==': (_, state) => {
    state.geometryAnnounced = true;
  },
  'Geometry (in': readGeometry,
  'Charge =': setting('charge'),
  'Multiplicity =': setting('multiplicity'),
  'Electrons =': setting('electronCount'),
  '==> Primary Basis <==': readBasis,
  '=>': readArrow,
  'Energy and wave function converged': scfEnd(true),
  'Energy converged.': scfEnd(true),
  'Energy and/or wave function did not converge, but proceeding anyway': scfEnd(false),
  'Energy did not converge, but proceeding anyway': scfEnd(false),
  '@S^2 Observed:': spin('s2'),
  '@S^2 Expected:': spin('s2Ideal'),
  ...Object.fromEntries(
    kinds.flatMap((kind) => [
      [`@${kind} Final Energy:`, readEnergy],
      [`@${kind} iter`, readIteration],
    ]),
  ),
};
