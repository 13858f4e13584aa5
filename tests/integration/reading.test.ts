import { randomUUID } from 'node:crypto';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { gunzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { asTenant } from '@/db/knex';
import { listStructuresOfComplex } from '@/db/repositories/structures';
import { findRun } from '@/db/repositories/runs';
import { listComplexes } from '@/db/repositories/complexes';
import {
  insertReceivedFile,
  listUploads,
  listWaitingUploads,
  requeueUpload,
} from '@/db/repositories/uploads';
import { listStudies } from '@/db/repositories/studies';
import { seedDemo } from '@/db/seeds/seed-demo';
import type { Tenant } from '@/lib/access/actor';
import { closeReadQueue } from '@/lib/queue/read-queue';
import { DiskStorage } from '@/lib/storage/disk-storage';
import { ObjectMissing } from '@/lib/storage/object-storage';
import { receiveFiles } from '@/lib/storage/receive-files';
import { defaultUploadLimits } from '@/lib/storage/upload-limits';
import { giveUpReading } from '@/worker/processors/give-up-reading';
import { readUpload } from '@/worker/processors/read-upload';
import { reconcile } from '@/worker/reconcile';
import { createAccountsDatabase, type AccountsDatabase } from './support/accounts-database';

let database: AccountsDatabase;
let storage: DiskStorage;
let folder: string;
let tenant: Tenant;
let studyId: string;
let reported = 0;
const context = () => ({
  db: database.app,
  storage,
  report: async () => {
    reported++;
  },
});

beforeAll(async () => {
  process.env.REDIS_URL = `${process.env.TEST_REDIS_URL}/5`;
  database = await createAccountsDatabase();
  folder = await mkdtemp(path.join(tmpdir(), 'spinstead-reading-'));
  storage = new DiskStorage(folder);
  const seeded = await seedDemo(database.app, storage, path.resolve('public/demo'));
  if (!seeded) throw new Error('The demo was not seeded.');
  tenant = { groupId: seeded.groupId, userId: null };
  const [study] = await asTenant(database.app, tenant, (trx) => listStudies(trx, tenant));
  if (!study) throw new Error('The demo has no study.');
  studyId = study.id;
});
afterAll(async () => {
  await closeReadQueue();
  await database?.drop();
  await rm(folder, { recursive: true, force: true });
});

async function upload(fileName: string, bytes: Uint8Array | string) {
  async function* source() {
    yield Buffer.from(bytes);
  }
  const rows = [];
  for await (const received of receiveFiles(
    fileName,
    source(),
    (content) => storage.store(content),
    defaultUploadLimits,
  )) {
    rows.push(
      await asTenant(database.app, tenant, (trx) =>
        insertReceivedFile(trx, tenant, { studyId, dropId: randomUUID() }, received),
      ),
    );
  }
  return rows;
}

const uploads = () => asTenant(database.app, tenant, (trx) => listUploads(trx, tenant, studyId));

describe('reading uploads', () => {
  it('reads every output of the demo, twice without a difference', async () => {
    const queued = (await uploads()).filter(({ state }) => state === 'queued');
    expect(queued.length).toBe(29);
    for (const { id } of queued) await readUpload(context(), tenant, id);
    const counts = async () => {
      const { rows } = await database.superuser.raw<{
        rows: { runs: number; structures: number; candidates: number }[];
      }>(
        'select (select count(*)::int from runs) runs, (select count(*)::int from structures) structures, (select count(*)::int from candidates) candidates',
      );
      return rows[0];
    };
    const first = await counts();
    // 22 outputs of NWChem and 7 of Psi4, three of which failed in their first SCF but print a geometry.
    expect(first).toMatchObject({ runs: 29, structures: 29 });
    await database.superuser('uploads').update({ state: 'queued' });
    for (const { id } of queued) await readUpload(context(), tenant, id);
    expect(await counts()).toEqual(first);
    expect(reported).toBeGreaterThan(50);
  });

  it('gives each run to its complex and its candidate, and says how it found them', async () => {
    const { rows } = await database.superuser.raw<{ rows: Record<string, unknown>[] }>(
      `select r.file_name, c.formula, k.geometry, k.multiplicity, k.origin, r.matched_by
       from runs r left join complexes c on c.id = r.complex_id left join candidates k on k.id = r.candidate_id
       where r.program = 'NWChem' order by r.file_name`,
    );
    expect(rows.every((row) => row.matched_by === 'composition' && row.origin === 'planned')).toBe(true);
    expect(rows).toContainEqual(
      expect.objectContaining({
        file_name: 'nwchem-nicl4_sp_m1.out',
        formula: '[NiCl4]2-',
        geometry: 'SP-4',
        multiplicity: 1,
      }),
    );
  });

  it('shows the failed outputs as failed with their reason', async () => {
    const failed = (await uploads()).filter(({ problem }) => problem?.code === 'failed');
    expect(failed.map(({ fileName }) => fileName).sort()).toEqual([
      'psi4-cocl4_m4.out',
      'psi4-fecl4_m5.out',
      'psi4-mncl4_m6.out',
    ]);
    expect(failed[0]?.problem?.message).toContain('Could not converge SCF');
  });

  it('notes bytes it knows, keeps one file, one run and one structure of them', async () => {
    const bytes = gunzipSync(await readFile('public/demo/nwchem-zncl4_m1.out.gz'));
    const [again] = await upload('copy-of-zinc.out', bytes);
    expect(again).toMatchObject({ known: true, state: 'queued' });
    await readUpload(context(), tenant, again?.id ?? '');
    const runs = await database.superuser('runs').where({ sha256: again?.sha256 });
    expect(runs).toHaveLength(1);
  });

  it('puts an XYZ file beside the runs of the complex of its composition', async () => {
    const [row] = await upload(
      'zinc.xyz',
      '5\nguess\nZn 0 0 0\nCl 1.3 1.3 1.3\nCl -1.3 -1.3 1.3\nCl 1.3 -1.3 -1.3\nCl -1.3 1.3 -1.3\n',
    );
    await readUpload(context(), tenant, row?.id ?? '');
    const complexes = await asTenant(database.app, tenant, (trx) => listComplexes(trx, tenant, studyId));
    const zinc = complexes.find(({ formula }) => formula === '[ZnCl4]2-');
    const structures = await asTenant(database.app, tenant, (trx) =>
      listStructuresOfComplex(trx, tenant, zinc?.id ?? ''),
    );
    const own = structures.find(({ title }) => title === 'zinc.xyz');
    expect(own?.centres[0]?.description).toMatchObject({
      element: 'Zn',
      coordinationNumber: 4,
      nearest: 'T-4',
    });
  });

  it('stores with the upload what is wrong with its file, and keeps the bytes', async () => {
    const [wrong] = await upload('wrong.xyz', '3\nwater\nO 0 0 0\nH 0 0 1\n');
    await readUpload(context(), tenant, wrong?.id ?? '');
    const row = (await uploads()).find(({ id }) => id === wrong?.id);
    expect(row).toMatchObject({ state: 'failed', problem: { code: 'too few atoms' } });
    expect(await storage.has(row?.sha256 ?? '')).toBe(true);
  });

  it('can be tried again after something around the file failed', async () => {
    const [lost] = await upload('lost.xyz', '1\nlost\nFe 0 0 0\n');
    const away = path.join(folder, 'objects', (lost?.sha256 ?? '').slice(0, 2), lost?.sha256 ?? '');
    const bytes = await readFile(away);
    await rm(away);
    await expect(readUpload(context(), tenant, lost?.id ?? '')).rejects.toBeInstanceOf(ObjectMissing);
    await giveUpReading(context(), tenant, lost?.id ?? '');
    expect((await uploads()).find(({ id }) => id === lost?.id)).toMatchObject({
      state: 'failed',
      problem: { code: 'reading failed' },
    });
    async function* again() {
      yield bytes;
    }
    await storage.store(again());
    await asTenant(database.app, tenant, (trx) => requeueUpload(trx, tenant, lost?.id ?? ''));
    await readUpload(context(), tenant, lost?.id ?? '');
    expect((await uploads()).find(({ id }) => id === lost?.id)).toMatchObject({
      state: 'read',
      problem: null,
    });
  });

  it('finds uploads that the queue has lost and rings for them again', async () => {
    const [forgotten] = await upload('forgotten.xyz', '1\nforgotten\nCo 0 0 0\n');
    await database
      .superuser('uploads')
      .where({ id: forgotten?.id })
      .update({ changed_at: database.superuser.raw(`now() - interval '1 hour'`) });
    expect(await listWaitingUploads(database.app, 15)).toEqual([
      { groupId: tenant.groupId, uploadId: forgotten?.id },
    ]);
    expect(await reconcile(database.app)).toBe(1);
  });

  it('keeps the line of every value it shows', async () => {
    const row = await database.superuser('runs').where({ file_name: 'nwchem-cucl4_m2.out' }).first('id');
    const run = await asTenant(database.app, tenant, (trx) =>
      findRun(trx, tenant, (row as { id: string }).id),
    );
    const text = gunzipSync(await readFile('public/demo/nwchem-cucl4_m2.out.gz'))
      .toString('latin1')
      .split('\n');
    const { line } = run?.record.evidence.energyHartree ?? { line: 0 };
    expect(text[line - 1]).toContain(String(run?.energyHartree));
  });
});
