import { BOHR_ANGSTROM } from '../../chemistry/constants';
import type { Line } from '../landmark';
import { numberAfter, readInteger, readNumbers, words } from '../numbers';
import type { LandmarkMap } from '../program';
import { rowTable } from '../row-table';
import { cite } from '../cite';
import { elementOfTag } from '../element-of-tag';
import { warn } from '../warnings';
import type { NwchemState, PrintedGeometry } from './state';

interface Row {
  index: number;
  /** Null for a point charge or a ghost atom. */
  element: string | null;
  position: [number, number, number] | null;
}

//     1 Fe                  26.0000     0.00000000     0.00000000     1.99604500
function readRow(line: Line, factor: number): Row | null {
  const [first, tag, ...rest] = words(line.text);
  const index = readInteger(first);
  if (index === null || tag === undefined || index < 1) return null;
  const [charge, x, y, z, ...more] = readNumbers(rest.join(' '));
  if (charge === undefined || z === undefined || more.length > 0) return null;
  const isAtom = !/^(?:bq|x$)/i.test(tag) && charge !== null && Number.isInteger(charge);
  const whole = typeof x === 'number' && typeof y === 'number' && typeof z === 'number';
  return {
    index,
    element: isAtom ? elementOfTag(tag, charge) : null,
    position: whole ? [x * factor, y * factor, z * factor] : null,
  };
}

function saveGeometry(rows: Row[], heading: Line, state: NwchemState): void {
  const damaged = rows.some(
    (row, i) => row.index !== i + 1 || (row.element !== null && row.position === null),
  );
  if (damaged) {
    if (state.current) warn(state.current.step, 'table-damaged', heading.number);
    state.latest = null;
    return;
  }
  const atoms = rows.filter((row) => row.element !== null);
  const printed: PrintedGeometry = {
    name: state.geometryName,
    geometry: {
      elements: atoms.map((row) => row.element ?? ''),
      positionsAngstrom: atoms.map((row) => row.position ?? [NaN, NaN, NaN]),
    },
    line: heading,
    repulsionHartree: null,
  };
  if (atoms.length === 0) return;
  state.geometries.set(printed.name, printed);
  state.latest = printed;
  state.trial = false;
}

function readCoordinates(heading: Line, state: NwchemState) {
  const factor = heading.text.includes('a.u. (scale') ? BOHR_ANGSTROM : 1;
  return rowTable<Row>({
    heading: 4,
    row: (line) => readRow(line, factor),
    save: (rows) => saveGeometry(rows, heading, state),
  });
}

/** Two nuclear repulsion energies of one geometry differ by the printed digits only, hartree. */
const SAME_REPULSION_HARTREE = 1e-6;

/**
 * The printed geometry that an energy belongs to: the one of the same nuclear repulsion energy. The one in use
 * is preferred, then the one that the deck sets for this task, then the last printed.
 */
export function geometryOfEnergy(state: NwchemState): PrintedGeometry | null {
  const { repulsionHartree, latest } = state;
  const announced = state.taskGeometries[state.steps.length];
  const named = announced === undefined ? undefined : state.geometries.get(announced);
  const inOrder = [named, latest, ...[...state.geometries.values()].reverse()].filter(
    (printed) => printed !== undefined && printed !== null,
  );
  if (repulsionHartree === null) return state.trial ? null : (inOrder[0] ?? null);
  const fits = ({ repulsionHartree: own }: PrintedGeometry) =>
    own !== null && Math.abs(own - repulsionHartree) < SAME_REPULSION_HARTREE;
  const match = inOrder.find(fits);
  if (match) return match;
  // External charges add to the repulsion of the energy, so that no geometry fits a run that has but one.
  const isOptimising = state.current?.step.optimisation != null || state.trial;
  return state.geometries.size === 1 && !isOptimising ? (inOrder[0] ?? null) : null;
}

export const geometryLandmarks: LandmarkMap<NwchemState> = {
  // Geometry "Fe1Fe2" -> ""
  'Geometry "': (line, state) => {
    state.geometryName = line.text.split('"')[1]?.trim() ?? 'geometry';
  },
  'Output coordinates in': readCoordinates,
  //  Effective nuclear repulsion energy (a.u.)     121.6265640733
  'Effective nuclear repulsion energy (a.u.)': (line, state) => {
    const { latest, current } = state;
    if (!latest || latest.repulsionHartree !== null) return;
    latest.repulsionHartree = numberAfter(line.text, '(a.u.)');
    // The geometry at which a line search ended is printed after its energy.
    if (!current || current.point.energyHartree === null || current.point.geometry) return;
    const belongs = geometryOfEnergy(state);
    if (belongs !== latest) return;
    current.point.geometry = latest.geometry;
    cite(current.point, 'geometry', latest.line);
  },
};
