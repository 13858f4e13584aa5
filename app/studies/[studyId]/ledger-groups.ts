import type { ComparedComplex } from '@/app/_server/read-study';
import type { LinkMarkKind } from '@/components/marks/link-mark';
import type { StudyLedgerGroup, StudyLedgerRow } from '@/components/ledger/study-ledger-row';
import { candidateWords } from '@/components/study/spin-and-shape';
import { oxidationWords } from '@/components/study/oxidation-words';
import type { Technique } from '@/db/repositories/measurements';
import type { Agreement } from '@/lib/comparison/complex-comparison';
import { groupBy } from '@/lib/group-by';
import { COVERAGE_FACTOR } from '@/lib/comparison/measured-moment';

/** A complex that nobody has calculated or measured shows the open end of the calculation that is to come. */
export function markKind(agreement: Agreement): LinkMarkKind {
  return agreement === 'nothing' ? 'one-ended measured' : agreement;
}

/** The study's complexes as rows of the ledger, under their section names in the order of the study. */
export function ledgerGroups(studyId: string, complexes: readonly ComparedComplex[]): StudyLedgerGroup[] {
  const sections = groupBy(complexes, ({ complex }) => complex.section);
  return [...sections].map(([section, members], index) => {
    const counts = groupBy(members, ({ comparison }) => markKind(comparison.agreement));
    return {
      id: `section-${index}`,
      title: section || 'Complexes',
      tally: [...counts].map(([kind, of]) => `${of.length} ${kind}`).join(' · '),
      rows: members.map((member) => ledgerRow(studyId, member)),
    };
  });
}

function ledgerRow(studyId: string, member: ComparedComplex): StudyLedgerRow {
  const { complex, comparison, measured, measurements, centre, assignment } = member;
  const { favoured, dCount, agreement, sentence } = comparison;
  const href = `/studies/${studyId}/complexes/${complex.id}`;
  const next = comparison.candidates[1];
  const octahedral = centre?.shapes?.find(({ symbol }) => symbol === 'OC-6')?.measure ?? null;
  const samples = new Set(measurements.map(({ sampleId }) => sampleId)).size;
  const replicates = measurements.reduce((sum, { replicatesBohr }) => sum + replicatesBohr.length, 0);
  return {
    id: complex.id,
    href,
    formula: complex.formula,
    metalWords: oxidationWords(complex.metal, complex.oxidationState),
    dCount,
    favoured: favoured && {
      geometry: favoured.candidate.geometry,
      multiplicity: favoured.candidate.multiplicity,
    },
    next: {
      gapKJPerMol: next?.gapKJPerMol ?? null,
      words: next ? candidateWords(next.candidate) : favoured ? 'one candidate' : 'not calculated',
      flag: next?.contaminated ? { href: `${href}#candidates`, words: '⟨S²⟩ is contaminated' } : undefined,
    },
    meanDistanceAngstrom: centre?.meanDistanceAngstrom ?? null,
    distanceHref: favoured?.run ? `/studies/${studyId}/runs/${favoured.run.id}` : undefined,
    shape:
      centre?.tau4 != null
        ? { index: 'tau4', value: centre.tau4 }
        : octahedral !== null
          ? { index: 'S(OC-6)', value: octahedral }
          : null,
    handbook: favoured?.band ?? null,
    mark: markKind(agreement),
    markSentence: `${markKind(agreement)}: ${sentence}`,
    moment: measured && { mu: measured.muBohr, expandedU: COVERAGE_FACTOR * measured.uMuBohr },
    unmeasuredWord: measured ? undefined : 'not measured',
    unpaired: measured && { count: measured.unpaired, expandedU: COVERAGE_FACTOR * measured.uUnpaired },
    technique: measurements[0]
      ? `${techniqueWords[measurements[0].technique]}, ${Math.round(measurements[0].temperatureK)} K`
      : null,
    samplesWords: measured
      ? `${samples} ${samples === 1 ? 'sample' : 'samples'} · ${replicates} replicates`
      : undefined,
    assignment: assignment
      ? {
          state: assignment.state,
          words: assignment.proposedBy ?? '',
          signedBy: assignment.signedBy ?? undefined,
        }
      : { state: 'open', words: 'no proposal' },
  };
}

/** Short enough for the ledger's narrow column. */
const techniqueWords: Record<Technique, string> = {
  'Gouy balance': 'Gouy',
  'susceptibility balance': 'Balance',
  'NMR shift': 'NMR shift',
  magnetometer: 'Magnetometer',
  'paper or another laboratory': 'Literature',
};
