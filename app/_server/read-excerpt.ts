import 'server-only';
import { asTenant, database } from '@/db/knex';
import { findFile } from '@/db/repositories/files';
import type { Actor } from '@/lib/access/actor';
import { openStorage } from '@/lib/storage/open-storage';

const LINES_AROUND = 6;
/** The longest span read for an excerpt: a file without line ends must not be drawn into memory. */
const MOST_BYTES = 4 * 1024 ** 2;

export interface Excerpt {
  line: number;
  firstLine: number;
  lines: string[];
}

/**
 * The lines around one line of a stored output, read by range through the file's index of line offsets.
 * @param run - its SHA-256 names the stored file
 * @param line - 1-based
 * @returns null when the file has no such line or no index yet
 */
export async function readExcerpt(
  actor: Actor,
  run: { sha256: string },
  line: number,
): Promise<Excerpt | null> {
  const file = await asTenant(database(), actor, (trx) => findFile(trx, actor, run.sha256));
  const index = file?.lineIndex;
  if (!file || !index) return null;
  const firstLine = Math.max(1, line - LINES_AROUND);
  const block = Math.floor((firstLine - 1) / index.every);
  const start = index.offsets[block];
  if (start === undefined) return null;
  const wanted = line + LINES_AROUND - block * index.every;
  const end = Math.min(index.offsets[block + 2] ?? file.bytes, start + MOST_BYTES, file.bytes) - 1;
  const chunks: Uint8Array[] = [];
  for await (const chunk of await openStorage().get(run.sha256, { start, end })) chunks.push(chunk);
  const lines = new TextDecoder().decode(Buffer.concat(chunks)).split(/\r?\n/).slice(0, wanted);
  const skipped = firstLine - 1 - block * index.every;
  const shown = lines.slice(skipped).map((text) => text.slice(0, 300));
  return shown.length > line - firstLine ? { line, firstLine, lines: shown } : null;
}
