import type { ReactNode } from 'react';
import { DataTable } from '@/components/ui/data-table';
import { Absent } from '@/components/numbers/absent';
import { Trace } from '@/components/numbers/trace';

/** One value of one candidate; with `href` it opens its source. Null is printed as “absent”. */
export interface CandidateValue {
  text: ReactNode | null;
  href?: string;
  /** For screen readers: "−3480.762 348 hartree, show source". */
  label?: string;
}

export interface CandidateTableRow {
  key: string;
  /** Quantity with unit: "Energy, Eh". */
  head: ReactNode;
  /** In the order of the columns. */
  values: readonly CandidateValue[];
  /** Excerpt of the output, shown under the row. */
  slip?: ReactNode;
}

/** Candidates side by side, one quantity a row; every number that was read can be traced. */
export function CandidateTable({
  caption,
  columns,
  rows,
}: {
  caption: string;
  columns: readonly { key: string; head: ReactNode }[];
  rows: readonly CandidateTableRow[];
}) {
  return (
    <DataTable caption={caption} className="max-wide:table-fixed max-book:text-small">
      <thead>
        <tr>
          <td />
          {columns.map(({ key, head }) => (
            <th key={key} scope="col" className="num text-small! font-semibold! text-ink!">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.flatMap((row) => [
          <tr key={row.key}>
            <th scope="row">{row.head}</th>
            {row.values.map((value, index) => (
              <td key={columns[index]?.key ?? index} className="num max-book:whitespace-normal!">
                {value.text === null ? (
                  <Absent />
                ) : value.href === undefined ? (
                  value.text
                ) : (
                  <Trace href={value.href} label={value.label}>
                    {value.text}
                  </Trace>
                )}
              </td>
            ))}
          </tr>,
          row.slip === undefined ? null : (
            <tr key={`${row.key}-slip`}>
              <td colSpan={columns.length + 1} className="pt-0!">
                {row.slip}
              </td>
            </tr>
          ),
        ])}
      </tbody>
    </DataTable>
  );
}
