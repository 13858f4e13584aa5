import 'server-only';
import type { Actor } from '@/lib/access/actor';
import type { Permission } from '@/lib/access/permissions';
import { isOwnOrigin } from '@/lib/access/own-origin';
import { err, type Result } from '@/lib/result';
import { authoriseAction } from './authorise-action';

/** The JSON body of every refusal of a route handler. */
export interface ErrorBody {
  error: { code: string; message: string };
}

/**
 * The actor of a request to a route handler, or the response that refuses it: 403 when it changes something
 * and comes from another site, 401 when signed out, 403 when the role may not.
 */
export async function authoriseRequest(
  request: Request,
  permission: Permission,
): Promise<Result<Actor, Response>> {
  if (!isOwnOrigin(request.method, request.headers, process.env.NEXTAUTH_URL))
    return err(
      refusal(403, 'foreign origin', 'A change must come from this site: send its address as Origin.'),
    );
  const actor = await authoriseAction(permission);
  if (actor.ok) return actor;
  return err(refusal(actor.error.code === 'signed out' ? 401 : 403, actor.error.code, actor.error.message));
}

function refusal(status: 401 | 403, code: string, message: string): Response {
  return Response.json({ error: { code, message } } satisfies ErrorBody, { status });
}
