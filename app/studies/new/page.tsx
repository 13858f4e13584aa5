import type { Metadata } from 'next';
import { requirePermission } from '@/app/_server/actor';
import { signOut } from '@/app/_server/session-actions';
import { StudyForm } from '@/components/study/study-form';
import { Book } from '@/components/ledger/book';
import { SignedInMasthead } from '@/components/study/signed-in-masthead';
import { createStudy } from './actions';

export const metadata: Metadata = { title: 'New study' };

export default async function NewStudyPage() {
  const actor = await requirePermission('manage studies');
  const places = [{ name: actor.groupName, href: '/' }, { name: 'New study' }];
  return (
    <>
      <SignedInMasthead person={actor} places={places} signOut={signOut} />
      <main id="main">
        <h1 className="px-edge pt-7.5 pb-6 text-title">New study</h1>
        <Book>
          <div className="px-leaf py-6">
            <StudyForm action={createStudy} />
          </div>
        </Book>
      </main>
    </>
  );
}
