import type { ReactNode } from 'react';
import { DataTable } from '@/components/ui/data-table';

export interface BudgetLine {
  key: string;
  source: ReactNode;
  /** Relative standard uncertainty, percent. */
  relativePercent: number;
  /** Share of the variance, 0–1. */
  share: number;
}

/** Where the uncertainty comes from: each source with its share of the variance as a bar. */
export function UncertaintyBudget({ caption, lines }: { caption: string; lines: readonly BudgetLine[] }) {
  return (
    <DataTable caption={caption} className="text-small">
      <thead>
        <tr>
          <th scope="col">Source</th>
          <th scope="col" className="num">
            relative <i>u</i>, %
          </th>
          <th scope="col" className="w-[46%]">
            share of variance
          </th>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <tr key={line.key}>
            <th scope="row">{line.source}</th>
            <td className="num">{line.relativePercent.toFixed(1)}</td>
            <td>
              <span className="grid grid-cols-[minmax(0,1fr)_48px] items-center">
                <span aria-hidden="true">
                  <span
                    className="block h-2 border border-meas bg-meas-tint"
                    style={{ width: `${(Math.min(1, Math.max(0, line.share)) * 100).toFixed(1)}%` }}
                  />
                </span>
                <span className="text-right">{Math.round(line.share * 100)} %</span>
              </span>
            </td>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
