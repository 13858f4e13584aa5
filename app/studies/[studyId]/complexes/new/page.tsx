import type { Metadata } from 'next';
import { requirePermission } from '@/app/_server/actor';
import { requireStudy } from '@/app/_server/read-study';
import { signOut } from '@/app/_server/session-actions';
import { ComplexForm } from '@/components/complexes/complex-form';
import { StudyFrame } from '@/components/study/study-frame';
import { addComplex } from './actions';

export const metadata: Metadata = { title: 'Add a complex' };

export default async function NewComplexPage({ params }: PageProps<'/studies/[studyId]/complexes/new'>) {
  const actor = await requirePermission('manage studies');
  const study = await requireStudy(actor, (await params).studyId);
  return (
    <StudyFrame
      actor={actor}
      study={study}
      tab="study"
      signOut={signOut}
      heading={<h1 className="text-title">Add a complex</h1>}
    >
      <div className="px-leaf py-6">
        <ComplexForm action={addComplex.bind(null, study.id)} />
      </div>
    </StudyFrame>
  );
}
