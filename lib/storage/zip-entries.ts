import { randomUUID } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { type Entry, open, type ZipFile } from 'yauzl';
import { type ArchiveEntry, isSystemFile, nameEntry } from './archive-entry';
import type { ExpansionGuard } from './expansion-guard';
import { UploadRefusal } from './upload-limits';

const FILE_TYPE_MASK = 0o170000;
const SYMBOLIC_LINK = 0o120000;
const ENCRYPTED = 1;

/**
 * The files of a zip archive. The table of contents stands at a zip's end, so the archive is first
 * written to a temporary file, which is gone when the last entry has been taken.
 */
export async function* zipEntries(
  source: AsyncIterable<Uint8Array>,
  guard: ExpansionGuard,
): AsyncGenerator<ArchiveEntry> {
  const temporary = path.join(tmpdir(), `spinstead-${randomUUID()}.zip`);
  let zip: ZipFile | undefined;
  try {
    await pipeline(guard.countPacked(source), createWriteStream(temporary, { mode: 0o600 }));
    zip = await openZip(temporary);
    for (;;) {
      const entry = await nextEntry(zip);
      if (!entry) return;
      const raw = entry.fileName as unknown;
      // Names are checked here, one by one; the library's own check would end the whole archive.
      const fileName = raw instanceof Uint8Array ? new TextDecoder().decode(raw) : String(raw);
      if (fileName.endsWith('/') || isSystemFile(fileName)) continue;
      guard.countEntry();
      const named = nameEntry(fileName);
      if ('refused' in named) {
        yield named.refused;
      } else if (((entry.externalFileAttributes >>> 16) & FILE_TYPE_MASK) === SYMBOLIC_LINK) {
        yield {
          name: named.name,
          refused: { code: 'link', message: 'this entry is a link, not a file; send the file it points to' },
        };
      } else if (entry.generalPurposeBitFlag & ENCRYPTED) {
        yield {
          name: named.name,
          refused: { code: 'encrypted', message: 'this entry is encrypted; pack it without a password' },
        };
      } else {
        yield { name: named.name, stream: guard.watch(await openEntry(zip, entry)) };
      }
    }
  } finally {
    zip?.close();
    await rm(temporary, { force: true });
  }
}

function openZip(file: string): Promise<ZipFile> {
  return new Promise((resolve, reject) => {
    open(
      file,
      { lazyEntries: true, autoClose: false, decodeStrings: false, validateEntrySizes: true },
      (error, zip) => {
        if (error)
          reject(
            new UploadRefusal(
              'damaged archive',
              `the zip archive cannot be opened (${error.message}); pack it again`,
            ),
          );
        else resolve(zip);
      },
    );
  });
}

function nextEntry(zip: ZipFile): Promise<Entry | null> {
  return new Promise((resolve, reject) => {
    const settle = (result: () => void) => {
      zip.removeAllListeners('entry').removeAllListeners('end').removeAllListeners('error');
      result();
    };
    zip.once('entry', (entry: Entry) => settle(() => resolve(entry)));
    zip.once('end', () => settle(() => resolve(null)));
    zip.once('error', (error: Error) =>
      settle(() =>
        reject(
          new UploadRefusal(
            'damaged archive',
            `the zip archive is damaged (${error.message}); pack it again`,
          ),
        ),
      ),
    );
    zip.readEntry();
  });
}

function openEntry(zip: ZipFile, entry: Entry): Promise<Readable> {
  return new Promise((resolve, reject) => {
    zip.openReadStream(entry, (error, stream) => {
      if (error)
        reject(
          new UploadRefusal(
            'damaged archive',
            `an entry cannot be unpacked (${error.message}); pack it again`,
          ),
        );
      else resolve(stream);
    });
  });
}
