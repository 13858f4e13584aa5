import { DataTable } from '@/components/ui/data-table';
import { atomNames, sphereAngles, type ViewedStructure } from './viewed-structure';

/** The viewer in words: each centre's donors with distances, and every angle at the metal. */
export function SphereTable({ structure }: { structure: ViewedStructure }) {
  const names = atomNames(structure.elements);
  return (
    <div className="grid gap-5">
      {structure.centres.map((centre) => {
        const metal = names[centre.index] ?? '?';
        const mean =
          centre.donors.reduce((sum, donor) => sum + donor.distanceAngstrom, 0) / centre.donors.length;
        const angles = sphereAngles(structure, centre);
        return (
          <div key={centre.index} className="grid gap-5 sm:grid-cols-2">
            <DataTable caption={`Distances at ${metal}`} className="text-small">
              <thead>
                <tr>
                  <th scope="col">Donor</th>
                  <th scope="col" className="num">{`${metal}–donor, Å`}</th>
                </tr>
              </thead>
              <tbody>
                {centre.donors.map((donor) => (
                  <tr key={donor.index}>
                    <th scope="row">{names[donor.index]}</th>
                    <td className="num">{donor.distanceAngstrom.toFixed(3)}</td>
                  </tr>
                ))}
              </tbody>
              {centre.donors.length > 1 ? (
                <tfoot>
                  <tr>
                    <th scope="row">mean</th>
                    <td className="num font-semibold text-ink!">{mean.toFixed(3)}</td>
                  </tr>
                </tfoot>
              ) : null}
            </DataTable>
            <DataTable caption={`Angles at ${metal}`} className="text-small">
              <thead>
                <tr>
                  <th scope="col">Angle</th>
                  <th scope="col" className="num">
                    degrees
                  </th>
                </tr>
              </thead>
              <tbody>
                {angles.map(({ first, second, degrees }) => (
                  <tr key={`${first}-${second}`}>
                    <th scope="row">{`${names[first]}–${metal}–${names[second]}`}</th>
                    <td className="num">{degrees.toFixed(1)}</td>
                  </tr>
                ))}
              </tbody>
            </DataTable>
          </div>
        );
      })}
    </div>
  );
}
