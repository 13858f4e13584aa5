import 'server-only';
import { z } from 'zod';
import { authoriseRequest, type ErrorBody } from './authorise-request';
import { asTenant, database } from '@/db/knex';
import { findStudy, type Study } from '@/db/repositories/studies';
import type { Actor } from '@/lib/access/actor';
import type { Permission } from '@/lib/access/permissions';
import { err, ok, type Result } from '@/lib/result';

/** Actor and study of a request, or the response that refuses it; another group's study is as missing as none. */
export async function studyOfRequest(
  request: Request,
  permission: Permission,
  studyId: string,
): Promise<Result<{ actor: Actor; study: Study }, Response>> {
  const access = await authoriseRequest(request, permission);
  if (!access.ok) return access;
  const actor = access.value;
  const study = z.uuid().safeParse(studyId).success
    ? await asTenant(database(), actor, (trx) => findStudy(trx, actor, studyId))
    : undefined;
  if (!study) return err(failure(404, 'no such study', 'Your group has no study with this address.'));
  return ok({ actor, study });
}

export function failure(status: number, code: string, message: string): Response {
  return Response.json({ error: { code, message } } satisfies ErrorBody, { status });
}
