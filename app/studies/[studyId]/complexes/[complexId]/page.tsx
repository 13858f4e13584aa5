import type { Metadata } from 'next';
import { requirePermission } from '@/app/_server/actor';
import { requireComplexDetail } from '@/app/_server/read-complex';
import { requireStudy } from '@/app/_server/read-study';
import { signOut } from '@/app/_server/session-actions';
import { AcrossPages } from '@/components/ledger/across-pages';
import { Foot } from '@/components/ledger/foot';
import { Spread } from '@/components/ledger/spread';
import { LinkMark } from '@/components/marks/link-mark';
import { MomentRuler } from '@/components/marks/moment-ruler';
import { Formula } from '@/components/numbers/formula';
import { oxidationWords } from '@/components/study/oxidation-words';
import { candidateWords } from '@/components/study/spin-and-shape';
import { StudyFrame } from '@/components/study/study-frame';
import { can } from '@/lib/access/permissions';
import { COVERAGE_FACTOR } from '@/lib/comparison/measured-moment';
import { markKind } from '../../ledger-groups';
import { CalculatedLeaf } from './calculated-leaf';
import { MeasuredLeaf } from './measured-leaf';

export const metadata: Metadata = { title: 'Complex' };

const verdictTitles = {
  joined: 'Calculation and measurement agree',
  broken: 'Calculation and measurement disagree',
  dotted: 'Cannot tell',
  'one-ended calculated': 'Not measured yet',
  'one-ended measured': 'Not calculated yet',
  nothing: 'Nothing here yet',
};

export default async function ComplexPage({ params }: PageProps<'/studies/[studyId]/complexes/[complexId]'>) {
  const actor = await requirePermission('read');
  const { studyId, complexId } = await params;
  const study = await requireStudy(actor, studyId);
  const detail = await requireComplexDetail(actor, study.id, complexId);
  const { complex, comparison, compared } = detail;
  return (
    <StudyFrame
      actor={actor}
      study={study}
      tab="study"
      signOut={signOut}
      heading={
        <div className="flex flex-wrap items-end justify-between gap-x-12 gap-y-4">
          <div>
            <h1 className="text-formula">
              <Formula text={complex.formula} />
            </h1>
            <p className="mt-3 text-lead text-ink-2">
              {[complex.name, `${oxidationWords(complex.metal, complex.oxidationState)}`]
                .filter(Boolean)
                .join('. ')}
              {comparison.dCount === null ? (
                ''
              ) : (
                <>
                  , d<sup>{comparison.dCount}</sup>
                </>
              )}
            </p>
          </div>
          <div className="flex max-w-[46ch] items-start gap-4" data-testid="agreement">
            <LinkMark kind={markKind(comparison.agreement)} decorative className="mt-1.5 shrink-0" />
            <div>
              <p className="font-serif text-head">{verdictTitles[comparison.agreement]}</p>
              <p className="mt-1 text-small text-ink-2">{comparison.sentence}</p>
            </div>
          </div>
        </div>
      }
      foot={<Foot notes={notes} />}
    >
      <Spread
        left={<CalculatedLeaf studyId={study.id} detail={detail} />}
        right={
          <MeasuredLeaf
            studyId={study.id}
            detail={detail}
            mayMeasure={can(actor.role, 'enter measurements')}
          />
        }
      />
      <AcrossPages
        id="ruler"
        title="Moment ruler"
        note="expected bands in blue, soft limits near room temperature; measured value and its 95 % interval in copper"
      >
        <MomentRuler
          bands={comparison.candidates.flatMap((row) =>
            row.band
              ? [
                  {
                    label: candidateWords(row.candidate),
                    low: row.band.low,
                    high: row.band.high,
                    favoured: row === comparison.favoured,
                    verdictWord: row.verdict ?? undefined,
                  },
                ]
              : [],
          )}
          measured={
            compared && {
              mu: compared.moment.muBohr,
              expandedU: COVERAGE_FACTOR * compared.moment.uMuBohr,
            }
          }
        />
      </AcrossPages>
    </StudyFrame>
  );
}

const notes = [
  {
    lead: 'Heuristic.',
    text: 'Expected bands are room-temperature ranges from handbooks, or spin-only and free-ion limits where none is known; they are never a hard pass or fail.',
  },
  {
    lead: 'Model.',
    text: 'Calculated spin states are results of one level of theory, named above; functionals have a known bias in spin gaps.',
  },
  {
    lead: 'Care.',
    text: 'Calibrants, cryogens and strong magnets can hurt: follow your laboratory’s risk assessment, local codes and supervision by licensed or trained staff; this tool gives no handling advice.',
  },
];
