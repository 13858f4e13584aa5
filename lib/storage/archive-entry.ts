import { safeEntryName } from './safe-entry-name';

/** One file out of an archive: its bytes, or why it is refused. Read `stream` to its end before the next entry. */
export type ArchiveEntry =
  | { name: string; stream: AsyncIterable<Uint8Array> }
  | { name: string; refused: { code: string; message: string } };

/** Files that systems add by themselves and nobody means to send. */
export function isSystemFile(name: string): boolean {
  return name.startsWith('__MACOSX/') || /(^|\/)(\.DS_Store|Thumbs\.db|\._[^/]*)$/.test(name);
}

/** Decides by its name whether an entry may be unpacked. */
export function nameEntry(name: string): { name: string } | { refused: ArchiveEntry } {
  const safe = safeEntryName(name);
  if ('name' in safe) return safe;
  // The name is shown to a person: without what made it unsafe to show.
  const shown =
    name.replace(/[\u0000-\u001f\u007f\u200e\u200f\u202a-\u202e\u2066-\u2069]/g, '·').slice(0, 300) ||
    '(no name)';
  const message = `this entry ${safe.refused}; it was left out and nothing of it was stored. Pack the folder again with plain relative names`;
  return { refused: { name: shown, refused: { code: 'unsafe path', message } } };
}
