import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';
import type { CentreDescription } from '@/lib/geometry/centre-description';
import type { OutputRecord } from '@/lib/outputs/record';
import { ensureCandidate, listCandidates } from '@/db/repositories/candidates';
import { listComplexesOfComposition } from '@/db/repositories/complexes';
import { insertEvent } from '@/db/repositories/events';
import { setRunMatch } from '@/db/repositories/runs';
import { setStructureComplex } from '@/db/repositories/structures';

/**
 * Finds the complex a run belongs to by composition and charge, and the candidate by multiplicity and nearest
 * polyhedron of the last geometry. Only an unambiguous match is made; it says that it was made by composition,
 * stands in the history, and can be changed by hand. A combination nobody planned becomes a candidate that says
 * so, once its geometry is a result: the end of a run that is cut off or not converged proves no polyhedron.
 */
export async function matchRun(
  trx: Knex.Transaction,
  tenant: Tenant,
  run: { studyId: string; runId: string; record: OutputRecord; centres: CentreDescription[] },
): Promise<void> {
  const { record } = run;
  if (record.formula === null) return;
  const complexes = await listComplexesOfComposition(trx, tenant, run.studyId, record.formula, record.charge);
  const complex = complexes.length === 1 ? complexes[0] : undefined;
  if (!complex) {
    await setRunMatch(trx, tenant, run.runId, null);
    return;
  }
  const candidateId = await findCandidate(trx, tenant, complex.id, run);
  await setRunMatch(trx, tenant, run.runId, { complexId: complex.id, candidateId, matchedBy: 'composition' });
  await setStructureComplex(trx, tenant, { runId: run.runId }, complex.id);
  await insertEvent(trx, tenant, {
    studyId: run.studyId,
    subject: 'run',
    subjectId: run.runId,
    kind: 'matched by composition',
    after: { complex: complex.formula, candidateId },
  });
}

async function findCandidate(
  trx: Knex.Transaction,
  tenant: Tenant,
  complexId: string,
  { record, centres }: { record: OutputRecord; centres: CentreDescription[] },
): Promise<string | null> {
  const nearest = centres.length === 1 ? centres[0]?.nearest : null;
  const { multiplicity } = record;
  if (!nearest || multiplicity === null) return null;
  const same = (await listCandidates(trx, tenant, complexId)).filter(
    (candidate) => candidate.geometry === nearest && candidate.multiplicity === multiplicity,
  );
  if (same.length > 0) return same.length === 1 ? (same[0]?.id ?? null) : null;
  if (record.outcome !== 'finished' || record.optimisation?.converged === false) return null;
  const { id } = await ensureCandidate(trx, tenant, {
    complexId,
    geometry: nearest,
    multiplicity,
    origin: 'from a returned output',
  });
  return id;
}
