import type { Metadata } from 'next';
import { requirePermission } from '@/app/_server/actor';
import { readComparedStudy, requireStudy } from '@/app/_server/read-study';
import { signOut } from '@/app/_server/session-actions';
import { Foot } from '@/components/ledger/foot';
import { StudyLedger } from '@/components/ledger/study-ledger';
import { LinkMark, type LinkMarkKind } from '@/components/marks/link-mark';
import { StudyFrame } from '@/components/study/study-frame';
import { buttonClass } from '@/components/ui/button';
import { StatePanel } from '@/components/ui/state-panel';
import { can } from '@/lib/access/permissions';
import { groupBy } from '@/lib/group-by';
import { levelWords } from '@/lib/comparison/level-of-theory';
import { ledgerGroups, markKind } from './ledger-groups';

export const metadata: Metadata = { title: 'Study' };

export default async function StudyPage({ params }: PageProps<'/studies/[studyId]'>) {
  const actor = await requirePermission('read');
  const study = await requireStudy(actor, (await params).studyId);
  const { complexes } = await readComparedStudy(actor, study);
  const mayManage = can(actor.role, 'manage studies');
  const levels = new Set(
    complexes.flatMap(({ comparison }) => (comparison.level ? [levelWords(comparison.level)] : [])),
  );
  return (
    <StudyFrame
      actor={actor}
      study={study}
      tab="study"
      signOut={signOut}
      heading={
        <>
          <h1 className="text-title">{study.title}</h1>
          <p className="mt-2 max-w-[62ch] text-lead text-ink-2">{study.question}</p>
        </>
      }
      foot={
        <>
          <Tally kinds={complexes.map(({ comparison }) => markKind(comparison.agreement))}>
            {mayManage ? (
              <a className={buttonClass()} href={`/studies/${study.id}/complexes/new`}>
                Add a complex
              </a>
            ) : null}
          </Tally>
          <Foot notes={footNotes} />
        </>
      }
    >
      {complexes.length === 0 ? (
        <StatePanel picture={<LinkMark kind="one-ended calculated" decorative />} title="No complex yet">
          Add the complexes of this family; then drop the outputs of their calculations under Runs.
        </StatePanel>
      ) : (
        <StudyLedger
          groups={ledgerGroups(study.id, complexes)}
          calculatedNote={levels.size === 1 ? [...levels][0] : `${levels.size} levels of theory, never mixed`}
          measuredNote="± is expanded uncertainty, k = 2 (95 %)"
          shapeHead={
            <>
              τ₄ of four,
              <br />
              S(OC-6) of six
            </>
          }
        />
      )}
    </StudyFrame>
  );
}

const footNotes = [
  {
    lead: 'Handbook μ',
    text: 'is a room-temperature range for the favoured spin state and polyhedron, a soft limit; where no range is known the spin-only and free-ion limits stand. n is the spin-only equivalent of μ.',
  },
  {
    lead: 'Gaps',
    text: 'are compared only between runs of the same composition, charge and level of theory. † marks a state with a contaminated ⟨S²⟩: its gap is shown, not trusted.',
  },
  {
    lead: 'Care.',
    text: 'Follow your laboratory’s risk assessment, local codes and supervision by licensed or trained staff; this tool gives no handling advice. Calculated spin states are model results.',
  },
];

function Tally({ kinds, children }: { kinds: LinkMarkKind[]; children: React.ReactNode }) {
  const counts = groupBy(kinds, (kind) => kind);
  return (
    <div className="mx-edge mt-4 flex flex-wrap items-center gap-x-6 gap-y-2 text-small text-ink-2">
      {[...counts].map(([kind, of]) => (
        <span key={kind} className="flex items-center gap-2">
          <LinkMark kind={kind} width={44} decorative />
          <span>
            <b className="font-semibold text-ink">{of.length}</b> {kind}
          </span>
        </span>
      ))}
      <span className="ml-auto">{children}</span>
    </div>
  );
}
