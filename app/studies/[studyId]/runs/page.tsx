import type { Metadata } from 'next';
import { z } from 'zod';
import { requirePermission } from '@/app/_server/actor';
import { requireStudy } from '@/app/_server/read-study';
import { signOut } from '@/app/_server/session-actions';
import { readUploadList } from '@/app/_server/upload-list';
import { LeafHead } from '@/components/ledger/leaf-head';
import { StudyFrame } from '@/components/study/study-frame';
import { UploadPanel } from '@/components/uploads/upload-panel';
import { asTenant, database } from '@/db/knex';
import { listRuns, runSortColumns } from '@/db/repositories/runs';
import { can } from '@/lib/access/permissions';
import { outcomeSchema } from '@/lib/outputs/record';
import { RunTable } from './run-table';

export const metadata: Metadata = { title: 'Runs' };

const PAGE_SIZE = 50;

// An address that somebody edited shows the first page instead of an error.
const querySchema = z.object({
  sort: z.enum(runSortColumns).catch('fileName'),
  down: z.enum(['0', '1']).catch('0'),
  page: z.coerce.number().int().min(0).max(100_000).catch(0),
  outcome: outcomeSchema.optional().catch(undefined),
  search: z.string().trim().max(100).optional().catch(undefined),
});

export default async function RunsPage({ params, searchParams }: PageProps<'/studies/[studyId]/runs'>) {
  const actor = await requirePermission('read');
  const study = await requireStudy(actor, (await params).studyId);
  const query = querySchema.parse(await searchParams);
  const [uploads, { runs, total }] = await Promise.all([
    readUploadList(actor, study.id),
    asTenant(database(), actor, (trx) =>
      listRuns(trx, actor, study.id, { ...query, descending: query.down === '1', pageSize: PAGE_SIZE }),
    ),
  ]);
  return (
    <StudyFrame
      actor={actor}
      study={study}
      tab="runs"
      signOut={signOut}
      heading={<h1 className="text-title">Runs</h1>}
    >
      <div className="px-leaf py-6">
        <UploadPanel
          studyId={study.id}
          initial={uploads}
          mayUpload={can(actor.role, 'upload files')}
          mayRetry={can(actor.role, 'retry reading')}
        />
        <LeafHead note={`${total} in this study`}>Runs read</LeafHead>
        <RunTable studyId={study.id} runs={runs} total={total} pageSize={PAGE_SIZE} query={query} />
      </div>
    </StudyFrame>
  );
}
