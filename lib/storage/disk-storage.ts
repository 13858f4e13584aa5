import { createHash, randomUUID } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { access, mkdir, open, rename, rm, stat } from 'node:fs/promises';
import path from 'node:path';
import { ObjectMissing, requireSha256, type ByteRange, type ObjectStorage } from './object-storage';

/** Object storage in a folder: `ab/cd…` under `objects`, written to `incoming` first and renamed when whole. */
export class DiskStorage implements ObjectStorage {
  constructor(private readonly folder: string) {}

  async store(source: AsyncIterable<Uint8Array>): Promise<{ sha256: string; bytes: number }> {
    const incoming = path.join(this.folder, 'incoming', randomUUID());
    await mkdir(path.dirname(incoming), { recursive: true });
    const hash = createHash('sha256');
    let bytes = 0;
    const file = await open(incoming, 'wx', 0o600);
    try {
      for await (const chunk of source) {
        hash.update(chunk);
        bytes += chunk.length;
        await file.writeFile(chunk);
      }
      await file.sync();
    } catch (error) {
      await file.close();
      await rm(incoming, { force: true });
      throw error;
    }
    await file.close();
    const sha256 = hash.digest('hex');
    const target = this.pathOf(sha256);
    await mkdir(path.dirname(target), { recursive: true });
    // Atomic, and harmless when the same bytes are there already.
    await rename(incoming, target);
    return { sha256, bytes };
  }

  async get(sha256: string, range?: ByteRange): Promise<AsyncIterable<Uint8Array>> {
    const file = this.pathOf(sha256);
    try {
      await stat(file);
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code === 'ENOENT') throw new ObjectMissing(sha256);
      throw error;
    }
    return createReadStream(file, { ...range, highWaterMark: 256 * 1024 });
  }

  async has(sha256: string): Promise<boolean> {
    return access(this.pathOf(sha256)).then(
      () => true,
      () => false,
    );
  }

  private pathOf(sha256: string): string {
    requireSha256(sha256);
    return path.join(this.folder, 'objects', sha256.slice(0, 2), sha256);
  }
}
