import type { ReactNode } from 'react';
import { Book } from '@/components/ledger/book';
import { IndexTabs } from '@/components/ledger/index-tabs';
import { SignedInMasthead } from './signed-in-masthead';

export type StudyTab = 'study' | 'runs' | 'measurements';

/** The frame of every page of a study: masthead, heading, index tabs, and the book around the page. */
export function StudyFrame({
  actor,
  study,
  tab,
  heading,
  foot,
  signOut,
  children,
}: {
  actor: { name: string; role: string; groupName: string };
  study: { id: string; title: string; notice: string };
  tab: StudyTab;
  heading: ReactNode;
  foot?: ReactNode;
  signOut: () => Promise<void>;
  children: ReactNode;
}) {
  const base = `/studies/${study.id}`;
  const places = [
    { name: actor.groupName, href: '/' },
    { name: study.title, href: base },
  ];
  return (
    <>
      <SignedInMasthead person={actor} places={places} signOut={signOut} />
      <main id="main">
        <div className="px-edge pt-7.5 max-book:pt-5">{heading}</div>
        {study.notice ? (
          <p role="note" className="mx-edge mt-4 border-l-2 border-ink-3 pl-3 text-note text-ink-2">
            {study.notice}
          </p>
        ) : null}
        <IndexTabs
          tabs={[
            { href: base, label: 'Study', current: tab === 'study' },
            { href: `${base}/runs`, label: 'Runs', current: tab === 'runs' },
            { href: `${base}/measurements`, label: 'Measurements', current: tab === 'measurements' },
          ]}
        />
        <Book>{children}</Book>
        {foot}
      </main>
      <div className="h-12" />
    </>
  );
}
