import type { Metadata } from 'next';
import Link from 'next/link';
import { requirePermission } from './_server/actor';
import { readComparedStudy } from './_server/read-study';
import { signOut } from './_server/session-actions';
import { Book } from '@/components/ledger/book';
import { LinkMark } from '@/components/marks/link-mark';
import { SignedInMasthead } from '@/components/study/signed-in-masthead';
import { buttonClass } from '@/components/ui/button';
import { StatePanel } from '@/components/ui/state-panel';
import { asTenant, database } from '@/db/knex';
import { listStudies } from '@/db/repositories/studies';
import { can } from '@/lib/access/permissions';
import { groupBy } from '@/lib/group-by';
import { markKind } from './studies/[studyId]/ledger-groups';

export const metadata: Metadata = { title: 'Studies' };

/** The group's home: its studies with their link marks. */
export default async function HomePage() {
  const actor = await requirePermission('read');
  const studies = await asTenant(database(), actor, (trx) => listStudies(trx, actor));
  const compared = await Promise.all(studies.map((study) => readComparedStudy(actor, study)));
  const newStudy = can(actor.role, 'manage studies') ? (
    <Link className={buttonClass('main')} href="/studies/new">
      New study
    </Link>
  ) : null;
  return (
    <>
      <SignedInMasthead person={actor} places={[{ name: actor.groupName }]} signOut={signOut} />
      <main id="main">
        <div className="flex flex-wrap items-end justify-between gap-4 px-edge pt-7.5 pb-6">
          <h1 className="text-title">{actor.groupName}</h1>
          {newStudy}
        </div>
        <Book>
          {compared.length === 0 ? (
            <StatePanel
              picture={<LinkMark kind="one-ended calculated" decorative />}
              title="No study yet"
              actions={newStudy}
            >
              A study is one question about one family of complexes.
            </StatePanel>
          ) : (
            <ul className="px-leaf py-3">
              {compared.map(({ study, complexes }) => (
                <li key={study.id} className="border-b border-rule py-5 last:border-0">
                  <h2 className="text-section">
                    <a href={`/studies/${study.id}`}>{study.title}</a>
                  </h2>
                  <p className="mt-1 max-w-[70ch] text-ink-2">{study.question}</p>
                  <p className="mt-3 flex flex-wrap gap-x-6 gap-y-1 text-small text-ink-2">
                    <span>
                      {complexes.length} {complexes.length === 1 ? 'complex' : 'complexes'}
                    </span>
                    {[...groupBy(complexes, ({ comparison }) => markKind(comparison.agreement))].map(
                      ([kind, of]) => (
                        <span key={kind} className="flex items-center gap-2">
                          <LinkMark kind={kind} width={36} decorative /> {of.length} {kind}
                        </span>
                      ),
                    )}
                  </p>
                </li>
              ))}
            </ul>
          )}
        </Book>
      </main>
      <div className="h-12" />
    </>
  );
}
