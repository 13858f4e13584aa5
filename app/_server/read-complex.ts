import 'server-only';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { asTenant, database } from '@/db/knex';
import { listCandidates } from '@/db/repositories/candidates';
import { findComplex, type Complex } from '@/db/repositories/complexes';
import { listMeasurements, type Measurement } from '@/db/repositories/measurements';
import { listRunsOfComplex, type Run } from '@/db/repositories/runs';
import { listStructuresOfComplex, type StoredStructure } from '@/db/repositories/structures';
import type { Actor } from '@/lib/access/actor';
import { compareComplex, type ComplexComparison } from '@/lib/comparison/complex-comparison';
import { measuredMoment, type MeasuredMoment } from '@/lib/comparison/measured-moment';

export interface ComplexDetail {
  complex: Complex;
  comparison: ComplexComparison<Run>;
  runs: Run[];
  structures: StoredStructure[];
  /** Newest first; withdrawn ones included, and never compared. */
  measurements: Measurement[];
  compared: { measurement: Measurement; moment: MeasuredMoment } | null;
}

/** Everything the complex page shows, in a fixed number of queries; the missing page for what the group does not have. */
export async function requireComplexDetail(
  actor: Actor,
  studyId: string,
  complexId: string,
): Promise<ComplexDetail> {
  if (!z.uuid().safeParse(complexId).success) notFound();
  return asTenant(database(), actor, async (trx) => {
    const complex = await findComplex(trx, actor, complexId);
    if (!complex || complex.studyId !== studyId) notFound();
    const candidates = await listCandidates(trx, actor, complexId);
    const runs = await listRunsOfComplex(trx, actor, complexId);
    const structures = await listStructuresOfComplex(trx, actor, complexId);
    const measurements = await listMeasurements(trx, actor, { complexId });
    const measurement = measurements.find(({ withdrawnAt }) => withdrawnAt === null);
    const moment = measurement && measuredMoment(measurement.replicatesBohr, measurement.uSystematicBohr);
    return {
      complex,
      comparison: compareComplex(complex, candidates, runs, moment ?? null),
      runs,
      structures,
      measurements,
      compared: measurement && moment ? { measurement, moment } : null,
    };
  });
}
