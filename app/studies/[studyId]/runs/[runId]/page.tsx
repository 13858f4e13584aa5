import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { requirePermission } from '@/app/_server/actor';
import { readExcerpt } from '@/app/_server/read-excerpt';
import { requireStudy } from '@/app/_server/read-study';
import { signOut } from '@/app/_server/session-actions';
import { LeafHead } from '@/components/ledger/leaf-head';
import { OutputExcerpt } from '@/components/ledger/output-excerpt';
import { StudyFrame } from '@/components/study/study-frame';
import { Notice } from '@/components/ui/notice';
import { StructureViewer } from '@/components/viewer/structure-viewer';
import { asTenant, database } from '@/db/knex';
import { findRun } from '@/db/repositories/runs';
import { findStructureOfRun } from '@/db/repositories/structures';
import { PopulationTables } from './population-tables';
import { RecordGroups } from './record-groups';

export const metadata: Metadata = { title: 'Run' };

const lineSchema = z.coerce.number().int().min(1).max(1e9).optional().catch(undefined);

export default async function RunPage({
  params,
  searchParams,
}: PageProps<'/studies/[studyId]/runs/[runId]'>) {
  const actor = await requirePermission('read');
  const { studyId, runId } = await params;
  const study = await requireStudy(actor, studyId);
  if (!z.uuid().safeParse(runId).success) notFound();
  const [run, structure] = await asTenant(database(), actor, async (trx) => [
    await findRun(trx, actor, runId),
    await findStructureOfRun(trx, actor, runId),
  ]);
  if (!run || run.studyId !== study.id) notFound();
  const line = lineSchema.parse((await searchParams).line);
  const excerpt = line === undefined ? null : await readExcerpt(actor, run, line);
  const viewed = structure && {
    title: structure.title,
    elements: structure.elements,
    positionsAngstrom: structure.positionsAngstrom,
    centres: structure.centres.map(({ atomIndex, description }) => ({
      index: atomIndex,
      donors: description.donors,
    })),
  };
  return (
    <StudyFrame
      actor={actor}
      study={study}
      tab="runs"
      signOut={signOut}
      heading={
        <>
          <h1 className="text-title break-all">{run.fileName}</h1>
          <p className="mt-2 text-ink-2">
            {run.program} {run.programVersion}, {run.record.lines.toLocaleString('en-GB')} lines, read by
            reader {run.readerVersion}
            {run.matchedBy ? (
              <> · {matchWords(run.matchedBy)}</>
            ) : (
              ' · belongs to no complex of this study yet'
            )}
            {run.complexId ? (
              <>
                {' '}
                · <a href={`/studies/${study.id}/complexes/${run.complexId}`}>open the complex</a>
              </>
            ) : null}{' '}
            · <a href={`/api/v1/runs/${run.id}/raw`}>download the raw file</a>
          </p>
        </>
      }
    >
      <div className="px-leaf py-6">
        {run.outcome === 'finished' ? null : (
          <Notice
            kind="error"
            title={`This run is ${run.outcome === 'failed' ? 'failed' : 'cut off'}: its numbers are no results`}
          >
            {run.record.failure
              ? `${run.record.failure.kind}: ${run.record.failure.message}`
              : 'The output stops without its closing line.'}
          </Notice>
        )}
        {run.record.warnings.length > 0 ? (
          <ul className="mt-3 text-small text-ink-2">
            {run.record.warnings.map((warning, index) => (
              <li key={index}>
                {warning.line === null ? '' : `Line ${warning.line}: `}
                {warning.message}
              </li>
            ))}
          </ul>
        ) : null}
        {excerpt ? (
          <div id="excerpt" className="my-5">
            <OutputExcerpt
              file={run.fileName}
              line={excerpt.line}
              lineCount={run.record.lines}
              firstLine={excerpt.firstLine}
              lines={excerpt.lines}
              sha256={run.sha256}
            />
          </div>
        ) : null}
        <RecordGroups record={run.record} />
        {viewed ? (
          <>
            <LeafHead note="last geometry with an energy">Structure</LeafHead>
            <StructureViewer structure={viewed} />
          </>
        ) : null}
        <PopulationTables record={run.record} />
      </div>
    </StudyFrame>
  );
}

function matchWords(matchedBy: string): string {
  return matchedBy === 'composition' ? 'matched by composition and charge' : `matched by ${matchedBy}`;
}
