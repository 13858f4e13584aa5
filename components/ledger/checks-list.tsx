import type { ReactNode } from 'react';
import { CheckMark, type CheckState } from '@/components/marks/check-mark';
import { DataTable } from '@/components/ui/data-table';

export interface CheckLine {
  key: string;
  state: CheckState;
  name: ReactNode;
  finding: ReactNode;
  /** File and line, threshold, or what to plan. */
  where?: ReactNode;
}

/** Rules that were evaluated by themselves, each with its state, finding and place. */
export function ChecksList({ caption = 'Checks', lines }: { caption?: string; lines: readonly CheckLine[] }) {
  return (
    <DataTable caption={caption}>
      <thead className="sr-only">
        <tr>
          <th scope="col">State</th>
          <th scope="col">Check</th>
          <th scope="col">Finding</th>
          <th scope="col">Where</th>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <tr key={line.key}>
            <td className="w-7 align-middle!">
              <CheckMark state={line.state} />
            </td>
            <th scope="row" className="font-semibold! whitespace-nowrap max-book:whitespace-normal">
              {line.name}
            </th>
            <td className="text-small">{line.finding}</td>
            <td className="text-note text-ink-3 max-book:hidden">{line.where}</td>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
