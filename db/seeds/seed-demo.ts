import { randomUUID } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { readdir } from 'node:fs/promises';
import path from 'node:path';
import type { Knex } from 'knex';
import { demoAccounts } from '@/lib/access/demo-accounts';
import { hashPassword } from '@/lib/access/password-hash';
import type { Tenant } from '@/lib/access/actor';
import { complexIdentity } from '@/lib/chemistry/complex-identity';
import type { ObjectStorage } from '@/lib/storage/object-storage';
import { receiveFiles } from '@/lib/storage/receive-files';
import { defaultUploadLimits } from '@/lib/storage/upload-limits';
import { asTenant } from '../knex';
import { createAccount, findAccountForSignIn } from '../repositories/accounts';
import { ensureCandidate } from '../repositories/candidates';
import { insertComplex } from '../repositories/complexes';
import { ensureSample, insertMeasurement } from '../repositories/measurements';
import { insertStudy } from '../repositories/studies';
import { insertReceivedFile } from '../repositories/uploads';
import { demoComplexes, demoGroupName, demoStudy, type DemoComplex } from './demo-study';

const DEMO_OXIDATION_STATE = 2;

export interface SeededDemo {
  groupId: string;
  uploadIds: string[];
}

/**
 * Creates the invented group with its people, study, complexes, candidates and measurements, and queues its
 * outputs for reading. All in one transaction: a seed that was broken off left nothing.
 * @param outputs - folder of the demo's gzipped outputs
 * @returns null when the demo is there already
 */
export async function seedDemo(
  db: Knex,
  storage: ObjectStorage,
  outputs: string,
): Promise<SeededDemo | null> {
  const first = demoAccounts[0];
  if (!first || (await findAccountForSignIn(db, first.email))) return null;
  const groupId = randomUUID();
  return asTenant(db, { groupId, userId: null }, async (trx) => {
    await trx('groups').insert({ id: groupId, name: demoGroupName, demo: true });
    const people = new Map<string, string>();
    for (const { email, name, role, password } of demoAccounts) {
      const userId = await createAccount(trx, {
        email,
        name,
        passwordHash: await hashPassword(password),
        demo: true,
      });
      await trx('memberships').insert({ groupId, userId, role });
      people.set(role, userId);
    }
    const as = (role: string): Tenant => ({ groupId, userId: people.get(role) ?? null });
    const studyId = await insertStudy(trx, as('PI'), demoStudy);
    for (const [position, complex] of demoComplexes.entries()) {
      await seedComplex(trx, as, { studyId, position, complex });
    }
    const uploadIds = await seedOutputs(trx, as('computational chemist'), storage, { studyId, outputs });
    return { groupId, uploadIds };
  });
}

async function seedComplex(
  trx: Knex.Transaction,
  as: (role: string) => Tenant,
  { studyId, position, complex }: { studyId: string; position: number; complex: DemoComplex },
): Promise<void> {
  const { section, formula, name, metal, candidates, measured } = complex;
  const identity = complexIdentity(formula);
  if (!identity.ok) throw new Error(`Demo complex ${formula}: ${identity.error}`);
  const chemist = as('computational chemist');
  const { composition, charge } = identity.value;
  const oxidationState = DEMO_OXIDATION_STATE;
  const complexId = await insertComplex(trx, chemist, {
    studyId,
    position,
    section,
    formula,
    name,
    composition,
    charge,
    metal,
    oxidationState,
    note: '',
  });
  for (const [geometry, multiplicity] of candidates) {
    await ensureCandidate(trx, chemist, { complexId, geometry, multiplicity, origin: 'planned' });
  }
  if (!measured) return;
  const experimentalist = as('experimentalist');
  const { sample, technique, temperatureK, uSystematicBohr, measuredOn, replicatesBohr } = measured;
  const sampleId = await ensureSample(trx, experimentalist, {
    complexId,
    code: sample,
    description: 'invented batch',
  });
  await insertMeasurement(trx, experimentalist, {
    sampleId,
    technique,
    temperatureK,
    uTemperatureK: 0.5,
    uSystematicBohr,
    measuredOn,
    reference: '',
    note: '',
    invented: true,
    replicatesBohr: [...replicatesBohr],
  });
}

async function seedOutputs(
  trx: Knex.Transaction,
  tenant: Tenant,
  storage: ObjectStorage,
  { studyId, outputs }: { studyId: string; outputs: string },
): Promise<string[]> {
  const drop = { studyId, dropId: randomUUID() };
  const uploadIds: string[] = [];
  for (const name of (await readdir(outputs)).filter((file) => file.endsWith('.out.gz')).sort()) {
    const source = createReadStream(path.join(outputs, name));
    for await (const received of receiveFiles(
      name,
      source,
      (bytes) => storage.store(bytes),
      defaultUploadLimits,
    )) {
      const upload = await insertReceivedFile(trx, tenant, drop, received);
      if (upload.state === 'queued') uploadIds.push(upload.id);
    }
  }
  return uploadIds;
}
