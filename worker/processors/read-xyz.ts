import type { Tenant } from '@/lib/access/actor';
import { hillFormula } from '@/lib/chemistry/formula';
import { describeCentres } from '@/lib/geometry/describe-centres';
import { readXyz as readXyzText } from '@/lib/structures/read-xyz';
import { asTenant } from '@/db/knex';
import { listComplexesOfComposition } from '@/db/repositories/complexes';
import { insertEvent } from '@/db/repositories/events';
import { saveStructure } from '@/db/repositories/structures';
import { failReading, finishReading, type Upload } from '@/db/repositories/uploads';
import type { ReadContext } from './read-context';

/** An XYZ file is read whole; a trajectory beyond this belongs cut into pieces. */
const XYZ_MAX_BYTES = 64 * 1024 ** 2;

/** Reads an XYZ file and saves its last frame as a structure, in the complex of its composition if there is one. */
export async function readXyz(
  { db, storage }: ReadContext,
  tenant: Tenant,
  upload: Upload & { sha256: string },
): Promise<void> {
  const { studyId, sha256, fileName } = upload;
  const fail = (code: string, message: string, line: number | null = null) =>
    asTenant(db, tenant, (trx) => failReading(trx, tenant, upload.id, { code, message, line }));
  if (upload.bytes > XYZ_MAX_BYTES) {
    return fail(
      'too large',
      'an XYZ file of more than 64 MB is not read; send the frame that counts by itself',
    );
  }
  const decoder = new TextDecoder();
  let text = '';
  for await (const chunk of await storage.get(sha256)) text += decoder.decode(chunk, { stream: true });
  const read = readXyzText(text + decoder.decode());
  if (!read.ok) return fail(read.error.code, read.error.message, read.error.line);
  const frame = read.value.at(-1);
  if (!frame) throw new Error('An XYZ file was read without an error and without a frame.');
  const centres = describeCentres(frame);
  await asTenant(db, tenant, async (trx) => {
    const formula = hillFormula(frame.elements);
    // The charge is not in the file: a composition that stands for one complex only is enough to propose it.
    const complexes = await listComplexesOfComposition(trx, tenant, studyId, formula, null);
    const structureId = await saveStructure(trx, tenant, {
      studyId,
      runId: null,
      complexId: complexes.length === 1 ? (complexes[0]?.id ?? null) : null,
      sha256,
      frame: read.value.length - 1,
      title: fileName,
      formula,
      elements: frame.elements,
      positionsAngstrom: frame.positionsAngstrom,
      centres: centres.map((description) => ({
        atomIndex: description.index,
        spinPopulation: null,
        description,
      })),
    });
    const warning = frame.warnings[0];
    await finishReading(trx, tenant, upload.id, warning ?? null);
    await insertEvent(trx, tenant, {
      studyId,
      subject: 'upload',
      subjectId: upload.id,
      kind: 'structure read',
      after: { fileName, structureId, frames: read.value.length },
    });
  });
}
