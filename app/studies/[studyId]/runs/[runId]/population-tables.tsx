import { LeafHead } from '@/components/ledger/leaf-head';
import { DataTable } from '@/components/ui/data-table';
import { Disclosure } from '@/components/ui/disclosure';
import { Quantity } from '@/components/numbers/quantity';
import { isMetal } from '@/lib/chemistry/elements';
import type { OutputRecord } from '@/lib/outputs/record';

/** Charges and spin populations by scheme: metals at once, all atoms on demand. */
export function PopulationTables({ record }: { record: OutputRecord }) {
  if (record.populations.length === 0) return null;
  return (
    <>
      <LeafHead>Populations</LeafHead>
      {record.populations.map(({ scheme, atoms }) => {
        const rows = atoms.map((atom, index) => ({ ...atom, index }));
        return (
          <div key={scheme} className="mb-5 max-w-[560px]">
            <AtomRows caption={`${scheme}, metals`} rows={rows.filter(({ element }) => isMetal(element))} />
            <Disclosure summary={`${scheme}, all ${atoms.length} atoms`}>
              <AtomRows caption={`${scheme}, all atoms`} rows={rows} />
            </Disclosure>
          </div>
        );
      })}
    </>
  );
}

function AtomRows({
  caption,
  rows,
}: {
  caption: string;
  rows: { element: string; index: number; charge: number; spin: number | null }[];
}) {
  return (
    <DataTable caption={caption} captionShown>
      <thead>
        <tr>
          <th scope="col">Atom</th>
          <th scope="col" className="num">
            Charge, <i>e</i>
          </th>
          <th scope="col" className="num">
            Spin
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ element, index, charge, spin }) => (
          <tr key={index}>
            <td>
              {element}
              {index + 1}
            </td>
            <td className="num">
              <Quantity value={charge} digits={3} />
            </td>
            <td className="num">
              <Quantity value={spin} digits={3} />
            </td>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}
