import type { PackageFile } from './build-package';
import { crc32 } from './crc32';

/**
 * ZIP archive of a package, stored without compression (decks are small), Unix permissions kept so that
 * scripts stay executable. Up to 65,535 files and 4 GB. Source: PKWARE APPNOTE 6.3.10, sections 4.3 and 4.4.
 * @param modified - time stamp of all files, calendar fields as they shall be shown; year 1980 or later
 * Errors: throws RangeError beyond the limits (caller's bug).
 */
export function zipArchive(
  files: readonly PackageFile[],
  modified: { year: number; month: number; day: number; hour: number; minute: number },
): Uint8Array<ArrayBuffer> {
  if (files.length > 0xffff) throw new RangeError(`zipArchive takes up to 65535 files, got ${files.length}`);
  const encoder = new TextEncoder();
  const time = (modified.hour << 11) | (modified.minute << 5);
  const date = ((modified.year - 1980) << 9) | (modified.month << 5) | modified.day;
  const bodies: Uint8Array[] = [];
  const directory: Uint8Array[] = [];
  let offset = 0;
  for (const file of files) {
    const name = encoder.encode(file.path);
    const content = encoder.encode(file.text);
    // Shared by the local header and the directory: version 2.0, flag bit 11 (UTF-8 names), method 0 (stored).
    const common = [
      ...short(20),
      ...short(0x0800),
      ...short(0),
      ...short(time),
      ...short(date),
      ...long(crc32(content)),
      ...long(content.length),
      ...long(content.length),
      ...short(name.length),
      ...short(0),
    ];
    const header = Uint8Array.from([...long(0x04034b50), ...common]);
    bodies.push(header, name, content);
    directory.push(
      Uint8Array.from([
        ...long(0x02014b50),
        // Made by: Unix (3), version 2.0.
        ...short((3 << 8) | 20),
        ...common,
        // No comment, first disk, no internal attributes; mode of a regular file in the upper half.
        ...short(0),
        ...short(0),
        ...short(0),
        ...long(((file.executable ? 0o100755 : 0o100644) << 16) >>> 0),
        ...long(offset),
      ]),
      name,
    );
    offset += header.length + name.length + content.length;
  }
  const directorySize = directory.reduce((sum, part) => sum + part.length, 0);
  if (offset + directorySize > 0xffffffff) throw new RangeError('zipArchive takes up to 4 GB');
  const end = Uint8Array.from([
    ...long(0x06054b50),
    ...short(0),
    ...short(0),
    ...short(files.length),
    ...short(files.length),
    ...long(directorySize),
    ...long(offset),
    ...short(0),
  ]);
  const archive = new Uint8Array(offset + directorySize + end.length);
  let at = 0;
  for (const part of [...bodies, ...directory, end]) {
    archive.set(part, at);
    at += part.length;
  }
  return archive;
}

/** Little-endian 16 and 32 bits. */
const short = (value: number): number[] => [value & 255, (value >>> 8) & 255];
const long = (value: number): number[] => [...short(value & 0xffff), ...short(value >>> 16)];
