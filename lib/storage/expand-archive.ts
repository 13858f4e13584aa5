import { Readable } from 'node:stream';
import { createGunzip } from 'node:zlib';
import type { ArchiveEntry } from './archive-entry';
import { ExpansionGuard } from './expansion-guard';
import { peek } from './peek';
import { tarEntries } from './tar-entries';
import { UploadRefusal, type UploadLimits } from './upload-limits';
import { zipEntries } from './zip-entries';

const TAR_MAGIC_AT = 257;

type Packing = 'zip' | 'gzip' | 'tar' | null;

/** How bytes are packed, by what they are and not by their name. */
export function packingOf(head: Uint8Array): Packing {
  const [a, b, c, d] = head;
  if (a === 0x50 && b === 0x4b && ((c === 3 && d === 4) || (c === 5 && d === 6))) return 'zip';
  if (a === 0x1f && b === 0x8b) return 'gzip';
  const magic = head.subarray(TAR_MAGIC_AT, TAR_MAGIC_AT + 5);
  if (String.fromCharCode(...magic) === 'ustar') return 'tar';
  return null;
}

/**
 * The files that were sent under one name: the file itself, or what a zip, gz, tar or tar.gz holds
 * (each of whose files may be gzipped once more). Archives inside archives are refused by name.
 * Throws {@link UploadRefusal} for what concerns the whole archive: damage, too large, a bomb.
 */
export async function* expandArchive(
  name: string,
  source: AsyncIterable<Uint8Array>,
  limits: UploadLimits,
): AsyncGenerator<ArchiveEntry> {
  const guard = new ExpansionGuard(limits);
  const { head, stream } = await peek(source, TAR_MAGIC_AT + 5);
  switch (packingOf(head)) {
    case 'zip':
      return yield* eachUnpacked(zipEntries(stream, guard));
    case 'tar':
      return yield* eachUnpacked(tarEntries(guard.countPacked(stream), guard));
    case 'gzip': {
      const inner = await peek(gunzip(guard.countPacked(stream)), TAR_MAGIC_AT + 5);
      const packing = packingOf(inner.head);
      if (packing === 'tar') return yield* eachUnpacked(tarEntries(inner.stream, guard));
      if (packing !== null) throw nested();
      return yield { name: withoutGz(name), stream: guard.watch(inner.stream) };
    }
    case null:
      yield { name, stream };
  }
}

async function* eachUnpacked(entries: AsyncIterable<ArchiveEntry>): AsyncGenerator<ArchiveEntry> {
  for await (const entry of entries) {
    if ('refused' in entry) {
      yield entry;
      continue;
    }
    const { head, stream } = await peek(entry.stream, TAR_MAGIC_AT + 5);
    const packing = packingOf(head);
    if (packing === null) yield { name: entry.name, stream };
    else if (packing === 'gzip') yield { name: withoutGz(entry.name), stream: gunzip(stream) };
    else {
      await drain(stream);
      const { code, message } = nested();
      yield { name: entry.name, refused: { code, message } };
    }
  }
}

async function* gunzip(source: AsyncIterable<Uint8Array>): AsyncGenerator<Uint8Array> {
  const input = Readable.from(source);
  const unpacked = createGunzip();
  input.on('error', (error) => unpacked.destroy(error));
  input.pipe(unpacked);
  try {
    for await (const chunk of unpacked) yield chunk as Uint8Array;
  } catch (error) {
    if (error instanceof UploadRefusal) throw error;
    const reason = error instanceof Error ? error.message : String(error);
    throw new UploadRefusal(
      'damaged archive',
      `the gzip data are damaged or cut short (${reason}); send the file again`,
    );
  } finally {
    input.destroy();
  }
}

function nested(): UploadRefusal {
  return new UploadRefusal(
    'nested archive',
    'this is an archive inside an archive; unpack the outer one and send it by itself',
  );
}

function withoutGz(name: string): string {
  return name.replace(/\.gz$/i, '').replace(/\.tgz$/i, '.tar');
}

async function drain(stream: AsyncIterable<Uint8Array>): Promise<void> {
  for await (const _chunk of stream);
}
