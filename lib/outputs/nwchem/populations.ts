import { elementOfTag } from '../element-of-tag';
import { keepTable } from '../kept-lines';
import type { Line, Section } from '../landmark';
import { readInteger, readNumber, words } from '../numbers';
import { addSpins, setPopulation } from '../population';
import type { LandmarkMap } from '../program';
import type { Population } from '../record';
import { rowTable } from '../row-table';
import type { Point } from '../step-draft';
import { warn } from '../warnings';
import type { NwchemState } from './state';

interface Row {
  index: number;
  element: string;
  nuclearCharge: number;
  /** Printed text, for its number of decimals. */
  value: string;
  line: Line;
}

//     1 Fe  26    26.00   2.00  2.00  6.00  2.00  6.02
function readRow(line: Line): Row | null {
  const [first, tag = '', charge, value] = words(line.text);
  const index = readInteger(first);
  const nuclearCharge = readInteger(charge);
  if (index === null || nuclearCharge === null || value === undefined) return null;
  const element = elementOfTag(tag, nuclearCharge);
  return element ? { index, element, nuclearCharge, value, line } : null;
}

function isWhole(rows: Row[]): boolean {
  return rows.every((row, i) => row.index === i + 1 && readNumber(row.value) !== null);
}

/** Net charge as printed populations allow: the nuclear charge less the electrons, to the same decimals. */
function netCharge({ nuclearCharge, value }: Row): number {
  const decimals = value.split('.')[1]?.length ?? 0;
  return Number((nuclearCharge - (readNumber(value) ?? 0)).toFixed(Math.min(decimals, 12)));
}

/** How far net charges may miss the charge of the molecule by rounding alone, per atom. */
const CHARGE_SUM_PER_ATOM = 0.006;

type Save = (rows: Row[], scheme: Population['scheme'], point: Point, charge: number | null) => void;

function saveTotal(...[rows, scheme, point, charge]: Parameters<Save>): void {
  const first = rows[0]?.line;
  if (!first) return;
  const atoms = rows.map((row) => ({ element: row.element, charge: netCharge(row), spin: null }));
  const sum = atoms.reduce((total, atom) => total + atom.charge, 0);
  // With core potentials the electrons of the core are missing: the difference is no net charge then.
  const adds = charge === null || Math.abs(sum - charge) < 0.05 + CHARGE_SUM_PER_ATOM * rows.length;
  if (!isWhole(rows) || !adds) warn(point, 'table-damaged', first.number);
  else
    setPopulation(
      point,
      { scheme, atoms },
      rows.map(({ line }) => line),
    );
}

function saveSpin(...[rows, scheme, point]: Parameters<Save>): void {
  const first = rows[0]?.line;
  if (!first) return;
  const spins = rows.map(({ element, value }) => ({ element, spin: readNumber(value) }));
  if (
    !isWhole(rows) ||
    !addSpins(
      point,
      scheme,
      spins,
      rows.map(({ line }) => line),
    )
  )
    warn(point, 'table-damaged', first.number);
}

/** Tables before the energy are those of the guess and are passed over. */
function table(save: Save, scheme: Population['scheme']) {
  return (heading: Line, state: NwchemState): Section | void => {
    if (!state.afterEnergy || !state.current) return;
    const draft = state.current;
    // A rule, a blank line, two lines of headings, the rows, a blank line.
    return keepTable(heading, 2, (kept) => {
      draft.defer(`populations.${scheme}.${save.name}`, (point) =>
        kept.replay(
          rowTable<Row>({
            heading: 6,
            row: readRow,
            save: (rows) => save(rows, scheme, point, draft.step.charge),
          }),
        ),
      );
    });
  };
}

export const populationLandmarks: LandmarkMap<NwchemState> = {
  'Total Density - Mulliken Population Analysis': table(saveTotal, 'Mulliken'),
  'Spin Density - Mulliken Population Analysis': table(saveSpin, 'Mulliken'),
  'Total Density - Lowdin Population Analysis': table(saveTotal, 'Löwdin'),
  'Spin Density - Lowdin Population Analysis': table(saveSpin, 'Löwdin'),
  'Mulliken analysis of the total density': table(saveTotal, 'Mulliken'),
  'Mulliken analysis of the spin density': table(saveSpin, 'Mulliken'),
};
