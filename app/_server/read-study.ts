import 'server-only';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { asTenant, database } from '@/db/knex';
import { listStandingAssignments, type Assignment } from '@/db/repositories/assignments';
import { listCandidatesOfStudy } from '@/db/repositories/candidates';
import { listComplexes, type Complex } from '@/db/repositories/complexes';
import { listMeasurements, type Measurement } from '@/db/repositories/measurements';
import { listMatchedRuns, type RunSummary } from '@/db/repositories/runs';
import { listCentresOfStudy, type CentreSummary } from '@/db/repositories/structures';
import { findStudy, type Study } from '@/db/repositories/studies';
import type { Actor } from '@/lib/access/actor';
import { groupBy } from '@/lib/group-by';
import { compareComplex, type ComplexComparison } from '@/lib/comparison/complex-comparison';
import { measuredMoment, type MeasuredMoment } from '@/lib/comparison/measured-moment';

export interface ComparedComplex {
  complex: Complex;
  comparison: ComplexComparison<RunSummary>;
  /** Standing measurements, newest first; the first one is compared. */
  measurements: Measurement[];
  measured: MeasuredMoment | null;
  /** First metal centre of the favoured run. */
  centre: CentreSummary | null;
  assignment: Assignment | null;
}

export interface ComparedStudy {
  study: Study;
  complexes: ComparedComplex[];
}

/** The study of the address, or the page that says there is none (also for another group's). */
export async function requireStudy(actor: Actor, studyId: string): Promise<Study> {
  if (!z.uuid().safeParse(studyId).success) notFound();
  const study = await asTenant(database(), actor, (trx) => findStudy(trx, actor, studyId));
  return study ?? notFound();
}

/** A study with every complex compared, in a fixed number of queries. */
export async function readComparedStudy(actor: Actor, study: Study): Promise<ComparedStudy> {
  const read = await asTenant(database(), actor, async (trx) => ({
    complexes: await listComplexes(trx, actor, study.id),
    candidates: await listCandidatesOfStudy(trx, actor, study.id),
    runs: await listMatchedRuns(trx, actor, study.id),
    centres: await listCentresOfStudy(trx, actor, study.id),
    measurements: await listMeasurements(trx, actor, { studyId: study.id }),
    assignments: await listStandingAssignments(trx, actor, study.id),
  }));
  const candidates = groupBy(read.candidates, ({ complexId }) => complexId);
  const runs = groupBy(read.runs, ({ complexId }) => complexId);
  const measurements = groupBy(
    read.measurements.filter(({ withdrawnAt }) => withdrawnAt === null),
    ({ complexId }) => complexId,
  );
  const centreOf = new Map<string, CentreSummary>();
  for (const centre of read.centres) if (!centreOf.has(centre.runId)) centreOf.set(centre.runId, centre);
  const assignmentOf = new Map(read.assignments.map((assignment) => [assignment.complexId, assignment]));
  return {
    study,
    complexes: read.complexes.map((complex) => {
      const standing = measurements.get(complex.id) ?? [];
      const newest = standing[0];
      const measured = newest ? measuredMoment(newest.replicatesBohr, newest.uSystematicBohr) : null;
      const comparison = compareComplex(
        complex,
        candidates.get(complex.id) ?? [],
        runs.get(complex.id) ?? [],
        measured,
      );
      const favouredRun = comparison.favoured?.run;
      return {
        complex,
        comparison,
        measurements: standing,
        measured,
        centre: favouredRun ? (centreOf.get(favouredRun.id) ?? null) : null,
        assignment: assignmentOf.get(complex.id) ?? null,
      };
    }),
  };
}
