import { Quantity } from '@/components/numbers/quantity';
import { Button } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import { Field } from '@/components/ui/field';
import { SortHead } from '@/components/ui/sort-head';
import type { RunSortColumn, RunSummary } from '@/db/repositories/runs';

interface RunTableQuery {
  sort: RunSortColumn;
  down: '0' | '1';
  page: number;
  outcome?: string;
  search?: string;
}

const heads: { column: RunSortColumn; words: string; numeric?: boolean }[] = [
  { column: 'fileName', words: 'File' },
  { column: 'program', words: 'Program' },
  { column: 'outcome', words: 'Outcome' },
  { column: 'formula', words: 'Formula' },
  { column: 'charge', words: 'Charge', numeric: true },
  { column: 'multiplicity', words: '2S + 1', numeric: true },
  { column: 'functional', words: 'Method' },
  { column: 'energyHartree', words: 'Energy, Eh', numeric: true },
  { column: 's2', words: '⟨S²⟩', numeric: true },
];

/** Runs of a study, sorted, searched and paged on the server; its state stands in the address. */
export function RunTable({
  studyId,
  runs,
  total,
  pageSize,
  query,
}: {
  studyId: string;
  runs: readonly RunSummary[];
  total: number;
  pageSize: number;
  query: RunTableQuery;
}) {
  const address = (change: Partial<RunTableQuery>) => {
    const wanted = { ...query, ...change };
    const entries = Object.entries(wanted).filter(([, value]) => value !== undefined && value !== '');
    return `/studies/${studyId}/runs?${new URLSearchParams(entries.map(([key, value]) => [key, String(value)]))}`;
  };
  const pages = Math.ceil(total / pageSize);
  return (
    <>
      <form className="mb-4 flex max-w-[460px] items-end gap-3" role="search">
        <Field
          label="Search file, formula, program"
          name="search"
          defaultValue={query.search ?? ''}
          maxLength={100}
        />
        <Button type="submit">Search</Button>
      </form>
      <DataTable caption="Runs read in this study">
        <thead>
          <tr>
            {heads.map(({ column, words, numeric }) => {
              const sorted =
                query.sort === column ? (query.down === '1' ? 'descending' : 'ascending') : undefined;
              return (
                <SortHead
                  key={column}
                  numeric={numeric}
                  sorted={sorted}
                  href={address({ sort: column, down: sorted === 'ascending' ? '1' : '0', page: 0 })}
                >
                  {words}
                </SortHead>
              );
            })}
          </tr>
        </thead>
        <tbody>
          {runs.map((run) => (
            <tr key={run.id}>
              <td>
                <a href={`/studies/${studyId}/runs/${run.id}`}>{run.fileName}</a>
              </td>
              <td>
                {run.program} {run.programVersion}
              </td>
              <td className={run.outcome === 'finished' ? '' : 'font-semibold text-dissent'}>
                {run.outcome}
              </td>
              <td>{run.formula ?? <i>absent</i>}</td>
              <td className="num">
                <Quantity value={run.charge} digits={0} />
              </td>
              <td className="num">
                <Quantity value={run.multiplicity} digits={0} />
              </td>
              <td>{[run.functional, run.basis].filter(Boolean).join('/') || <i>absent</i>}</td>
              <td className="num">
                <Quantity value={run.energyHartree} digits={6} />
              </td>
              <td className="num">
                <Quantity value={run.s2} digits={4} />
              </td>
            </tr>
          ))}
        </tbody>
      </DataTable>
      {pages > 1 ? (
        <nav aria-label="Pages of runs" className="mt-4 flex gap-4 text-small">
          {query.page > 0 ? <a href={address({ page: query.page - 1 })}>Previous</a> : null}
          <span>
            Page {query.page + 1} of {pages}
          </span>
          {query.page + 1 < pages ? <a href={address({ page: query.page + 1 })}>Next</a> : null}
        </nav>
      ) : null}
    </>
  );
}
