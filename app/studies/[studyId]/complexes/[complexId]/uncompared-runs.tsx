import type { ComplexDetail } from '@/app/_server/read-complex';
import { LeafHead } from '@/components/ledger/leaf-head';
import { isUsable } from '@/lib/comparison/complex-comparison';
import { levelWords } from '@/lib/comparison/level-of-theory';

/** Runs of this complex whose energies stand in no rung, each with the reason. */
export function UncomparedRuns({ studyId, detail }: { studyId: string; detail: ComplexDetail }) {
  const compared = new Set(detail.comparison.candidates.map(({ run }) => run?.id));
  const rest = detail.runs.filter(({ id }) => !compared.has(id));
  if (rest.length === 0) return null;
  return (
    <>
      <LeafHead>Other runs</LeafHead>
      <ul className="text-small">
        {rest.map((run) => (
          <li key={run.id} className="border-b border-rule py-1.5">
            <a href={`/studies/${studyId}/runs/${run.id}`}>{run.fileName}</a>
            <span className="text-ink-2"> — {reason(run)}</span>
          </li>
        ))}
      </ul>
    </>
  );
}

function reason(run: ComplexDetail['runs'][number]): string {
  if (run.outcome !== 'finished') return `${run.outcome}: its energy is no result`;
  if (!isUsable(run)) return 'not converged: its energy is no result';
  if (run.candidateId === null) return 'belongs to no candidate: its polyhedron or multiplicity is not clear';
  return `${levelWords(run)}: higher in energy, or another level of theory`;
}
