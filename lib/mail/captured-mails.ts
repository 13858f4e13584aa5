import { readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import type { CapturedMail } from './capture-server';

/** Mails that the capture server kept, newest first; none when the folder does not exist yet. */
export async function listCapturedMails(folder: string, limit = 100): Promise<CapturedMail[]> {
  let names: string[];
  try {
    names = await readdir(folder);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return [];
    throw error;
  }
  const newest = names
    .filter((name) => name.endsWith('.json') && !name.startsWith('.'))
    .sort()
    .reverse()
    .slice(0, limit);
  return Promise.all(
    newest.map(async (name) => JSON.parse(await readFile(path.join(folder, name), 'utf8')) as CapturedMail),
  );
}
