import type { Metadata } from 'next';
import { requirePermission } from '@/app/_server/actor';
import { requireComplexDetail } from '@/app/_server/read-complex';
import { requireStudy } from '@/app/_server/read-study';
import { signOut } from '@/app/_server/session-actions';
import { Formula } from '@/components/numbers/formula';
import { MeasurementForm } from '@/components/measurements/measurement-form';
import { StudyFrame } from '@/components/study/study-frame';
import { Notice } from '@/components/ui/notice';
import { techniques } from '@/db/repositories/measurements';
import { enterMeasurement } from './actions';

export const metadata: Metadata = { title: 'Enter a measurement' };

export default async function MeasurePage({
  params,
}: PageProps<'/studies/[studyId]/complexes/[complexId]/measure'>) {
  const actor = await requirePermission('enter measurements');
  const { studyId, complexId } = await params;
  const study = await requireStudy(actor, studyId);
  const { complex } = await requireComplexDetail(actor, study.id, complexId);
  return (
    <StudyFrame
      actor={actor}
      study={study}
      tab="measurements"
      signOut={signOut}
      heading={
        <h1 className="text-title">
          Enter a measurement of <Formula text={complex.formula} />
        </h1>
      }
    >
      <div className="grid gap-8 px-leaf py-6">
        <Notice title="Before you measure">
          Calibrants (mercury and cobalt salts), cryogens and strong magnets can hurt, and complexes and
          solvents can be toxic. Follow your laboratory’s risk assessment, local codes and supervision by
          licensed or trained staff; this tool gives no handling advice.
        </Notice>
        <MeasurementForm action={enterMeasurement.bind(null, study.id, complex.id)} techniques={techniques} />
      </div>
    </StudyFrame>
  );
}
