import { FILE_KIND_HEAD_BYTES, fileKind, type FileKind } from '../outputs/file-kind';
import { expandArchive } from './expand-archive';
import { peek } from './peek';
import { safeEntryName } from './safe-entry-name';
import { megabytes, UploadRefusal, type UploadLimits } from './upload-limits';

/** One file as it was received: stored under its SHA-256, or refused with the reason. */
export type ReceivedFile =
  | { fileName: string; sha256: string; bytes: number; kind: FileKind }
  | { fileName: string; refused: { code: string; message: string } };

/** Streams bytes to storage while their SHA-256 is computed; nothing is kept when the source throws. */
export type StoreBytes = (source: AsyncIterable<Uint8Array>) => Promise<{ sha256: string; bytes: number }>;

/**
 * Takes what a person sent under one name, unpacks it, tells each file by its content, and stores what is
 * readable. A refused file never loses the others of its archive; memory stays bounded by the head that decides.
 */
export async function* receiveFiles(
  name: string,
  source: AsyncIterable<Uint8Array>,
  store: StoreBytes,
  limits: UploadLimits,
): AsyncGenerator<ReceivedFile> {
  const safe = safeEntryName(name);
  const fileName = 'name' in safe ? safe.name : 'unnamed file';
  let files = 0;
  try {
    for await (const entry of expandArchive(fileName, source, limits)) {
      files++;
      if ('refused' in entry) yield { fileName: entry.name, refused: entry.refused };
      else yield await receiveOne(entry.name, entry.stream, store, limits.fileBytes);
    }
  } catch (error) {
    if (!(error instanceof UploadRefusal)) throw error;
    files++;
    yield { fileName, refused: { code: error.code, message: error.message } };
  }
  if (files === 0) yield { fileName, refused: { code: 'empty', message: 'the archive holds no files' } };
}

async function receiveOne(
  fileName: string,
  source: AsyncIterable<Uint8Array>,
  store: StoreBytes,
  maxBytes: number,
): Promise<ReceivedFile> {
  const { head, stream } = await peek(source, FILE_KIND_HEAD_BYTES);
  const answer = fileKind(head);
  if ('refused' in answer) {
    // The rest must still be taken off the wire, or the sender never hears the answer.
    for await (const _chunk of stream);
    return { fileName, refused: answer.refused };
  }
  const stored = await store(atMost(stream, maxBytes));
  return { fileName, kind: answer.kind, ...stored };
}

async function* atMost(source: AsyncIterable<Uint8Array>, maxBytes: number): AsyncGenerator<Uint8Array> {
  let bytes = 0;
  for await (const chunk of source) {
    bytes += chunk.length;
    if (bytes > maxBytes) {
      throw new UploadRefusal(
        'too large',
        `the file is larger than ${megabytes(maxBytes)}, the limit for one output`,
      );
    }
    yield chunk;
  }
}
