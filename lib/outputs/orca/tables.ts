import { elementSymbol } from '../../chemistry/elements';
import { ATM_PA } from '../../chemistry/constants';
import { cite } from '../cite';
import { FrontierOrbitals } from '../frontier';
import { keepTable, type KeptLines } from '../kept-lines';
import type { Line, Section } from '../landmark';
import { numberAfter, readInteger, readNumber, readNumbers, words } from '../numbers';
import { setPopulation } from '../population';
import type { LandmarkMap } from '../program';
import type { Geometry, Population, Step } from '../record';
import { rowTable } from '../row-table';
import type { Point } from '../step-draft';
import { vibrationsOf } from '../vibrations';
import { warn } from '../warnings';
import { addTask, openStep, type OrcaState } from './state';

interface Atom {
  /** Null for embedding charges ("Ca>"), ghost atoms ("H:") and dummies. */
  element: string | null;
  position: (number | null)[];
}

//   Ni     0.000019    0.000005    0.000006
function readAtom(line: Line): Atom | null {
  const [symbol, ...rest] = words(line.text);
  if (symbol === undefined || rest.length === 0 || symbol.startsWith('-')) return null;
  const position = readNumbers(rest.join(' '));
  return position.length === 3 ? { element: elementSymbol(symbol), position } : null;
}

/** Reads a kept table of atoms; null when a number in it is none. */
function toGeometry(table: KeptLines): Geometry | null {
  const elements: string[] = [];
  const positionsAngstrom: Geometry['positionsAngstrom'] = [];
  let damaged = false;
  table.replay(
    rowTable<Atom>({
      heading: 2,
      row: readAtom,
      save(rows) {
        for (const { element, position } of rows) {
          const [x, y, z] = position;
          if (element === null) continue;
          if (typeof x === 'number' && typeof y === 'number' && typeof z === 'number') {
            elements.push(element);
            positionsAngstrom.push([x, y, z]);
          } else damaged = true;
        }
      },
    }),
  );
  return damaged || elements.length === 0 ? null : { elements, positionsAngstrom };
}

function readGeometry(heading: Line, state: OrcaState): Section {
  return keepTable(heading, 1, (table) => {
    if (state.displaced) return;
    openStep(state).setGeometryLater(table, heading, (point) => {
      const geometry = toGeometry(table);
      if (!geometry) warn(point, 'table-damaged', heading.number);
      return geometry;
    });
  });
}

interface PopulationRow {
  index: number;
  element: string;
  values: (number | null)[];
  line: Line;
}

//    0 Ni:    0.465700    1.581450      (Mulliken, Löwdin)
//    0 Ni   0.465700    1.581450        (Hirshfeld)
function readPopulation(line: Line): PopulationRow | null {
  const match = /^\s{0,8}(\d{1,6})\s{0,4}([A-Z][a-z]?)\s{0,4}:?\s/.exec(line.text.slice(0, 40));
  const index = readInteger(match?.[1]);
  const element = elementSymbol(match?.[2] ?? '');
  if (!match || index === null || element === null) return null;
  const values = readNumbers(line.text.slice(match[0].length));
  return values.length === 1 || values.length === 2 ? { index, element, values, line } : null;
}

/** Sums are printed to seven decimals of populations of six: half a digit for every atom, and some. */
function isSum(rows: PopulationRow[], closing: Line): boolean {
  if (!closing.text.startsWith('Sum of atomic charges')) return true;
  const printed = numberAfter(closing.text, ':');
  const sum = rows.reduce((total, { values }) => total + (values[0] ?? 0), 0);
  return printed !== null && Math.abs(sum - printed) < 1e-5 + 1e-6 * rows.length;
}

function populationTable(scheme: Population['scheme'], point: Point): Section {
  return rowTable<PopulationRow>({
    heading: 7,
    row: readPopulation,
    save(rows, closing) {
      const first = rows[0]?.line;
      const whole = rows.every(
        ({ index, values }, i) => index === i && values.every((value) => value !== null),
      );
      if (!first) return;
      if (!whole || !isSum(rows, closing)) {
        warn(point, 'table-damaged', first.number);
        return;
      }
      const atoms = rows.map(({ element, values }) => ({
        element,
        charge: values[0] ?? 0,
        spin: values[1] ?? null,
      }));
      setPopulation(
        point,
        { scheme, atoms },
        rows.map(({ line }) => line),
      );
    },
  });
}

/** @param blanks - how many blank lines stand above the table's end, that one included */
function populations(scheme: Population['scheme'], blanks: number) {
  return (heading: Line, state: OrcaState): Section | void => {
    if (state.displaced || state.otherDensity) return;
    return keepTable(heading, blanks, (table) => {
      openStep(state).defer(`populations.${scheme}`, (point) => table.replay(populationTable(scheme, point)));
    });
  };
}

/**
 * Columns NO, OCC, E(Eh), E(eV) and sometimes an irreducible representation; the list of one spin counts once
 * an empty orbital has been seen below the occupied ones and its end has come.
 */
function readOrbitals(_: Line, state: OrcaState): Section | void {
  if (state.displaced || state.otherDensity) return;
  let spin: 'alpha' | 'beta' = 'alpha';
  let list = new FrontierOrbitals();
  let rows = 0;
  let others = 0;
  const save = () => {
    const { point } = openStep(state);
    if (spin === 'alpha') point.orbitals = { alpha: list.read(point, 'alpha'), beta: null };
    else if (point.orbitals) point.orbitals = { ...point.orbitals, beta: list.read(point, 'beta') };
  };
  return {
    take(line) {
      const text = line.text.trim();
      if (text === 'SPIN DOWN ORBITALS') {
        spin = 'beta';
        list = new FrontierOrbitals();
        rows = 0;
        others = 0;
        return true;
      }
      const row = words(text);
      const occupation = readNumber(row[1]);
      const energyEv = readNumber(row[3]);
      const isNext = readInteger(row[0]) === rows && (rows === 0 || others === 0);
      if (isNext && row.length >= 4 && occupation !== null && energyEv !== null) {
        list.add(energyEv, occupation > 0.5, line);
        rows++;
        others = 0;
        return true;
      }
      if (rows > 0 && others === 0) save();
      return ++others < 6;
    },
  };
}

//     6:      43.87 cm**-1    2-Au
//     0:    -123.45 cm**-1 ***imaginary mode***
function readMode(line: Line): { index: number; value: number | null } | null {
  const [label, value, unit] = words(line.text);
  const index = readInteger(label?.endsWith(':') ? label.slice(0, -1) : undefined);
  return index === null || unit === undefined || !unit.startsWith('cm**-1')
    ? null
    : { index, value: readNumber(value) };
}

function readFrequencies(heading: Line, state: OrcaState): Section {
  return rowTable({
    heading: 12,
    row: readMode,
    save(rows) {
      state.displaced = false;
      addTask(state, 'frequencies');
      const { point } = openStep(state);
      const values = rows.map(({ value }) => value).filter((value) => value !== null);
      const inOrder = rows.every(({ index }, i) => index === i) && values.length === rows.length;
      if (!inOrder || rows.length % 3 !== 0) {
        warn(point, 'table-damaged', heading.number);
        return;
      }
      point.frequencies = vibrationsOf(values);
      cite(point, 'frequencies', heading);
    },
  });
}

type Thermochemistry = NonNullable<Step['thermochemistry']>;

function thermal(key: keyof Thermochemistry, factor = 1) {
  return (line: Line, state: OrcaState) => {
    if (!state.thermo) return;
    const row = words(line.text);
    const dots = row.indexOf('...');
    const value = readNumber(row[dots + 1]);
    const { point } = openStep(state);
    point.thermochemistry ??= {
      temperatureK: null,
      pressurePa: null,
      zeroPointHartree: null,
      enthalpyHartree: null,
      gibbsHartree: null,
    };
    if (dots < 0 || value === null || point.thermochemistry[key] !== null) return;
    point.thermochemistry[key] = value * factor;
    cite(point, `thermochemistry.${key}`, line);
  };
}

export const tableLandmarks: LandmarkMap<OrcaState> = {
  'CARTESIAN COORDINATES (ANGSTROEM)': readGeometry,
  'MULLIKEN ATOMIC CHARGES': populations('Mulliken', 1),
  'LOEWDIN ATOMIC CHARGES': populations('Löwdin', 1),
  'HIRSHFELD ANALYSIS': populations('Hirshfeld', 3),
  'ORCA POPULATION ANALYSIS': (_, state) => {
    state.otherDensity = state.correlated !== null;
  },
  'ORBITAL ENERGIES': readOrbitals,
  'VIBRATIONAL FREQUENCIES': readFrequencies,
  'THERMOCHEMISTRY AT': (_, state) => {
    // A second temperature prints a second section; the first one is kept.
    state.thermo = openStep(state).point.thermochemistry === null;
  },
  'Temperature ...': thermal('temperatureK'),
  'Pressure ...': thermal('pressurePa', ATM_PA),
  'Zero point energy ...': thermal('zeroPointHartree'),
  'Total Enthalpy ...': thermal('enthalpyHartree'),
  'Total enthalpy ...': thermal('enthalpyHartree'),
  'Final Gibbs free energy ...': thermal('gibbsHartree'),
  'Final Gibbs free enthalpy ...': thermal('gibbsHartree'),
  // Magnitude (Debye)      :      3.20245
  'Magnitude (Debye)': (line, state) => {
    const value = numberAfter(line.text, ':');
    const { point } = openStep(state);
    if (value === null || state.displaced || (state.correlated !== null && point.dipoleDebye !== null))
      return;
    point.dipoleDebye = value;
    cite(point, 'dipoleDebye', line);
  },
};
