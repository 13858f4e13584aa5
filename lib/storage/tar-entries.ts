import { Readable } from 'node:stream';
import { extract } from 'tar-stream';
import { type ArchiveEntry, isSystemFile, nameEntry } from './archive-entry';
import type { ExpansionGuard } from './expansion-guard';
import { UploadRefusal } from './upload-limits';

/** The files of a tar archive, in its order, streamed. */
export async function* tarEntries(
  source: AsyncIterable<Uint8Array>,
  guard: ExpansionGuard,
): AsyncGenerator<ArchiveEntry> {
  const unpacked = extract();
  const input = Readable.from(source);
  input.on('error', (error) => unpacked.destroy(error));
  input.pipe(unpacked);
  try {
    for await (const entry of unpacked) {
      const { name, type } = entry.header;
      if (type === 'directory' || isSystemFile(name)) {
        entry.resume();
        continue;
      }
      guard.countEntry();
      const named = nameEntry(name);
      if ('refused' in named) {
        entry.resume();
        yield named.refused;
      } else if (type !== 'file' && type !== 'contiguous-file') {
        entry.resume();
        yield {
          name: named.name,
          refused: {
            code: 'link',
            message: `this entry is a ${type ?? 'special file'}, not a file; send the file itself`,
          },
        };
      } else {
        yield { name: named.name, stream: guard.watch(entry as AsyncIterable<Uint8Array>) };
      }
    }
  } catch (error) {
    if (error instanceof UploadRefusal) throw error;
    const reason = error instanceof Error ? error.message : String(error);
    throw new UploadRefusal(
      'damaged archive',
      `the tar archive is damaged (${reason}); the files before the damage were taken. Pack it again`,
    );
  } finally {
    input.destroy();
  }
}
