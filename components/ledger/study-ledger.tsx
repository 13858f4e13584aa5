import type { ReactNode } from 'react';
import { SortHead, type SortDirection } from '@/components/ui/sort-head';
import { QuantitySymbol } from '@/components/numbers/quantity-symbol';
import { Unit } from '@/components/numbers/unit';
import { CalculatedCells, GutterCell, MeasuredCells } from './study-ledger-cells';
import type { StudyLedgerGroup, StudyLedgerSortKey } from './study-ledger-row';

export interface StudyLedgerProps {
  groups: readonly StudyLedgerGroup[];
  /** "B3LYP/def2-SVP, gas phase, NWChem 7.0.2 · 22 runs read, 22 finished" */
  calculatedNote?: ReactNode;
  /** "± is expanded uncertainty, k = 2 (95 %)" */
  measuredNote?: ReactNode;
  /** What the shape column holds: "τ4 dry" over "S(OC-6) damp". */
  shapeHead?: ReactNode;
  sort?: { key: StudyLedgerSortKey; direction: SortDirection };
  /** Addresses of the page sorted by each column. */
  sortLinks?: Partial<Record<StudyLedgerSortKey, string>>;
}

// Widths in px; the last column takes what is left.
const columnWidths = ['w-[136px]', 'w-[200px]', 'w-[94px]', 'w-[72px]', 'w-[94px]', 'w-[104px]', 'w-gutter'];
const measuredWidths = ['w-[112px]', 'w-[150px]', 'w-[94px]', 'w-[126px]', ''];

/**
 * The study's front page: one row per complex, calculated │ mark │ measured. On phones each row becomes a spread of
 * its own; the roles are written out because grid rows would lose them.
 */
export function StudyLedger({
  groups,
  calculatedNote,
  measuredNote,
  shapeHead = 'Shape index',
  sort,
  sortLinks = {},
}: StudyLedgerProps) {
  const head = (key: StudyLedgerSortKey) => ({
    href: sortLinks[key],
    sorted: sort?.key === key ? sort.direction : undefined,
  });
  const count = groups.reduce((sum, group) => sum + group.rows.length, 0);
  return (
    <div className="relative max-wide:overflow-x-auto max-book:overflow-visible">
      <table role="table" className="ledger">
        <caption className="sr-only">
          {`${count} ${count === 1 ? 'complex' : 'complexes'}: calculated on the left page, measured on the right page, link mark between`}
        </caption>
        <colgroup>
          {[...columnWidths, ...measuredWidths].map((width, index) => (
            <col key={index} className={width} />
          ))}
        </colgroup>
        <thead role="rowgroup">
          <tr role="row" className="running">
            <th role="columnheader" colSpan={6} scope="colgroup" className="border-calc!">
              <div className="page-head">
                <i className="text-calc">Calculated</i>
                <span>{calculatedNote}</span>
              </div>
            </th>
            <th role="columnheader" className="gutter-cell">
              <span className="sr-only">Link</span>
            </th>
            <th role="columnheader" colSpan={5} scope="colgroup" className="border-meas!">
              <div className="page-head">
                <i className="text-meas">Measured</i>
                <span>{measuredNote}</span>
              </div>
            </th>
          </tr>
          <tr role="row" className="columns">
            <SortHead className="complex" {...head('complex')}>
              Complex
            </SortHead>
            <SortHead {...head('candidate')}>Favoured candidate</SortHead>
            <SortHead numeric under={<Unit of="kJ mol-1" />} {...head('gap')}>
              Next state
            </SortHead>
            <SortHead numeric under="Å" {...head('distance')}>
              Mean M–L
            </SortHead>
            <SortHead numeric {...head('shape')}>
              {shapeHead}
            </SortHead>
            <SortHead numeric className="expected-head" under={<Unit of="muB" />}>
              Handbook <QuantitySymbol of="mu" />
            </SortHead>
            <th role="columnheader" className="gutter-cell">
              <span className="sr-only">Link mark</span>
            </th>
            <SortHead numeric under={<Unit of="muB" />} {...head('moment')}>
              <QuantitySymbol of="muEff" />
            </SortHead>
            <SortHead
              under={
                <>
                  ticks at <i>n</i> = 0 … 5
                </>
              }
            >
              Moment ruler
            </SortHead>
            <SortHead numeric under="spin-only" {...head('unpaired')}>
              <QuantitySymbol of="unpaired" />
            </SortHead>
            <SortHead under="samples">Technique</SortHead>
            <SortHead>Assignment</SortHead>
          </tr>
        </thead>
        {groups.map((group) => (
          <tbody key={group.id} role="rowgroup">
            <tr role="row" className="family">
              <th role="rowheader" colSpan={6} scope="rowgroup">
                <span className="font-serif text-group">{group.title}</span>
                {group.note === undefined ? null : <small>{group.note}</small>}
              </th>
              <td role="cell" className="gutter-cell" />
              <td role="cell" colSpan={5} className="tally">
                {group.tally}
              </td>
            </tr>
            {group.rows.map((row) => (
              <tr role="row" key={row.id} className="entry">
                <CalculatedCells row={row} />
                <GutterCell row={row} />
                <MeasuredCells row={row} />
              </tr>
            ))}
          </tbody>
        ))}
      </table>
    </div>
  );
}
