import { DEBYE_PER_AU, HARTREE_EV } from '../../chemistry/constants';
import { elementSymbol } from '../../chemistry/elements';
import { cite } from '../cite';
import { FrontierOrbitals } from '../frontier';
import type { Line, Section } from '../landmark';
import { numberAfter, readInteger, readNumber, readNumbers, words } from '../numbers';
import { setPopulation } from '../population';
import type { LandmarkMap } from '../program';
import type { Population } from '../record';
import { rowTable } from '../row-table';
import { warn } from '../warnings';
import type { Psi4State } from './state';

interface Lists {
  alpha: FrontierOrbitals;
  beta: FrontierOrbitals | null;
}

/**
 * "Orbital Energies [Eh]": lists headed Doubly Occupied, Singly Occupied, Virtual or Alpha/Beta Occupied/Virtual,
 * three of label and energy a line, each after a blank line and closed by one. Ends at "Final Occupation".
 */
function readOrbitals(_: Line, state: Psi4State): Section {
  const lists: Lists = { alpha: new FrontierOrbitals(), beta: null };
  let heading: string | null = null;
  let damaged = false;
  const add = (energy: number, line: Line) => {
    if (heading === null) return;
    const occupied = !heading.includes('Virtual');
    if (heading.startsWith('Beta')) (lists.beta ??= new FrontierOrbitals()).add(energy, occupied, line);
    else lists.alpha.add(energy, occupied, line);
  };
  return {
    take(line) {
      const text = line.text.trim();
      if (text === '' || text.startsWith('---')) return true;
      if (
        /^(?:Doubly Occupied|Singly Occupied|Virtual|Alpha Occupied|Alpha Virtual|Beta Occupied|Beta Virtual):$/.test(
          text,
        )
      ) {
        heading = text;
        return true;
      }
      const row = words(text);
      if (row.length % 2 === 0 && row.length <= 6 && /^\d{1,6}[A-Za-z]/.test(row[0] ?? '')) {
        for (let i = 1; i < row.length; i += 2) {
          const energy = readNumber(row[i]);
          if (energy === null) damaged = true;
          else add(energy, line);
        }
        return true;
      }
      if (!text.startsWith('Final Occupation') || damaged || lists.alpha.isEmpty) return false;
      state.pending.push((point) => {
        point.orbitals = {
          alpha: lists.alpha.read(point, 'alpha', HARTREE_EV),
          beta: lists.beta?.read(point, 'beta', HARTREE_EV) ?? null,
        };
      });
      return false;
    },
  };
}

interface Row {
  index: number;
  element: string;
  spin: number | null;
  charge: number | null;
  line: Line;
}

//       1     C     3.07861  2.86558  0.21303  0.05580
function readRow(line: Line): Row | null {
  const [first, symbol, ...rest] = words(line.text);
  const index = readInteger(first);
  const element = elementSymbol(/^[A-Za-z]{1,2}/.exec(symbol ?? '')?.[0] ?? '');
  const [, , spin, charge, ...more] = readNumbers(rest.join(' '));
  if (index === null || element === null || spin === undefined || charge === undefined || more.length > 0)
    return null;
  return { index, element, spin, charge, line };
}

function populations(scheme: Population['scheme']) {
  return (heading: Line, state: Psi4State): Section | void => {
    if (!state.current) return;
    const { point } = state.current;
    // Tables are printed after the energy, or asked for when everything else is done.
    if (point.energyHartree === null) return;
    return rowTable<Row>({
      heading: 2,
      row: readRow,
      save(rows) {
        if (rows.some(({ index, spin, charge }, i) => index !== i + 1 || spin === null || charge === null)) {
          warn(point, 'table-damaged', heading.number);
          return;
        }
        const atoms = rows.map(({ element, charge, spin }) => ({ element, charge: charge ?? 0, spin }));
        setPopulation(
          point,
          { scheme, atoms },
          rows.map(({ line }) => line),
        );
      },
    });
  };
}

function setDipole(state: Psi4State, debye: number | null, line: Line): void {
  const point = state.current?.point;
  if (!point || debye === null || point.energyHartree === null) return;
  point.dipoleDebye = debye;
  cite(point, 'dipoleDebye', line);
}

export const tableLandmarks: LandmarkMap<Psi4State> = {
  'Orbital Energies [Eh]': readOrbitals,
  'Orbital Energies (a.u.)': readOrbitals,
  'Mulliken Charges: (a.u.)': populations('Mulliken'),
  'Lowdin Charges: (a.u.)': populations('Löwdin'),
  // Dipole Moment: [D]
  //    X:     0.0000      Y:     0.0000      Z:     0.0000     Total:     0.0000
  'Dipole Moment: [D]': (_, state) => ({
    take(line) {
      setDipole(state, numberAfter(line.text, 'Total:'), line);
      return false;
    },
  }),
  // Magnitude           :                                                    0.0000000       (in e a0)
  'Magnitude :': (line, state) => {
    const magnitude = numberAfter(line.text, ':');
    if (state.current?.point.dipoleDebye !== null) return;
    setDipole(state, magnitude === null ? null : Number((magnitude * DEBYE_PER_AU).toFixed(7)), line);
  },
};
