import type { Knex } from 'knex';
import type { Tenant } from '@/lib/access/actor';
import { hillFormula } from '@/lib/chemistry/formula';
import { describeCentres } from '@/lib/geometry/describe-centres';
import type { CentreDescription } from '@/lib/geometry/centre-description';
import type { OutputRecord } from '@/lib/outputs/record';
import { removeStructureOfRun, saveStructure } from '@/db/repositories/structures';

/** Saves the last geometry of a record with its described centres; returns the centres (none without a metal). */
export async function saveRunGeometry(
  trx: Knex.Transaction,
  tenant: Tenant,
  run: { studyId: string; runId: string; sha256: string; fileName: string; record: OutputRecord },
): Promise<CentreDescription[]> {
  const { geometry } = run.record;
  if (!geometry || geometry.elements.length === 0) {
    await removeStructureOfRun(trx, tenant, run.runId);
    return [];
  }
  const centres = describeCentres(geometry);
  await saveStructure(trx, tenant, {
    studyId: run.studyId,
    runId: run.runId,
    complexId: null,
    sha256: run.sha256,
    frame: 0,
    title: run.fileName,
    formula: hillFormula(geometry.elements),
    ...geometry,
    centres: centres.map((description) => ({
      atomIndex: description.index,
      spinPopulation: spinPopulation(run.record, description.index),
      description,
    })),
  });
  return centres;
}

/** Spin population of one atom: Mulliken as the scheme all four programs print, else Löwdin. */
function spinPopulation(record: OutputRecord, atomIndex: number): number | null {
  const scheme = (name: string) => record.populations.find((population) => population.scheme === name);
  return (scheme('Mulliken') ?? scheme('Löwdin'))?.atoms[atomIndex]?.spin ?? null;
}
