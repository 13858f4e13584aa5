import type { Metadata } from 'next';
import { requirePermission } from '@/app/_server/actor';
import { readComparedStudy, requireStudy } from '@/app/_server/read-study';
import { signOut } from '@/app/_server/session-actions';
import { Formula } from '@/components/numbers/formula';
import { Quantity } from '@/components/numbers/quantity';
import { StudyFrame } from '@/components/study/study-frame';
import { DataTable } from '@/components/ui/data-table';
import { can } from '@/lib/access/permissions';
import { measuredMoment } from '@/lib/comparison/measured-moment';

export const metadata: Metadata = { title: 'Measurements' };

export default async function MeasurementsPage({ params }: PageProps<'/studies/[studyId]/measurements'>) {
  const actor = await requirePermission('read');
  const study = await requireStudy(actor, (await params).studyId);
  const { complexes } = await readComparedStudy(actor, study);
  const mayMeasure = can(actor.role, 'enter measurements');
  return (
    <StudyFrame
      actor={actor}
      study={study}
      tab="measurements"
      signOut={signOut}
      heading={<h1 className="text-title">Measurements</h1>}
    >
      <div className="px-leaf py-6">
        <p className="mb-4 max-w-[72ch] text-small text-ink-2">
          ± is standard uncertainty, k = 1. Calibrants, cryogens and strong magnets can hurt: follow your
          laboratory’s risk assessment, local codes and supervision by licensed or trained staff; this tool
          gives no handling advice.
        </p>
        <DataTable caption="Measurements of this study">
          <thead>
            <tr>
              <th scope="col">Complex</th>
              <th scope="col">Sample</th>
              <th scope="col">Technique</th>
              <th scope="col" className="num">
                T, K
              </th>
              <th scope="col" className="num">
                Replicates
              </th>
              <th scope="col" className="num">
                μ, μ<sub>B</sub>
              </th>
              <th scope="col" className="num">
                n
              </th>
              <th scope="col">By</th>
            </tr>
          </thead>
          <tbody>
            {complexes.flatMap(({ complex, measurements }) => {
              const href = `/studies/${study.id}/complexes/${complex.id}`;
              const rows = measurements.map((measurement) => {
                const moment = measuredMoment(measurement.replicatesBohr, measurement.uSystematicBohr);
                return (
                  <tr key={measurement.id}>
                    <td>
                      <a href={href}>
                        <Formula text={complex.formula} />
                      </a>
                    </td>
                    <td>{measurement.sampleCode}</td>
                    <td>
                      {measurement.technique}
                      {measurement.invented ? ' (invented)' : ''}
                    </td>
                    <td className="num">{measurement.temperatureK.toFixed(1)}</td>
                    <td className="num">{measurement.replicatesBohr.length}</td>
                    <td className="num">
                      <Quantity value={moment?.muBohr ?? null} uncertainty={moment?.uMuBohr ?? null} />
                    </td>
                    <td className="num">
                      <Quantity value={moment?.unpaired ?? null} uncertainty={moment?.uUnpaired ?? null} />
                    </td>
                    <td>
                      {measurement.enteredBy ?? '–'}, {measurement.measuredOn}
                    </td>
                  </tr>
                );
              });
              if (rows.length > 0) return rows;
              return [
                <tr key={complex.id}>
                  <td>
                    <a href={href}>
                      <Formula text={complex.formula} />
                    </a>
                  </td>
                  <td colSpan={7} className="text-ink-3">
                    not measured
                    {mayMeasure ? (
                      <>
                        {' '}
                        · <a href={`${href}/measure`}>enter a measurement</a>
                      </>
                    ) : (
                      ''
                    )}
                  </td>
                </tr>,
              ];
            })}
          </tbody>
        </DataTable>
      </div>
    </StudyFrame>
  );
}
