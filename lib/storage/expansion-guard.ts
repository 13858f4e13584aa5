import { megabytes, UploadRefusal, type UploadLimits } from './upload-limits';

const RATIO_FROM_BYTES = 64 * 1024 ** 2;

/** Counts what an archive unpacks to and stops an unpacking that no real archive of outputs needs. */
export class ExpansionGuard {
  packed = 0;
  private unpacked = 0;
  private entries = 0;

  constructor(private readonly limits: UploadLimits) {}

  /** Counts the bytes of the archive as they arrive. */
  async *countPacked(source: AsyncIterable<Uint8Array>): AsyncGenerator<Uint8Array> {
    for await (const chunk of source) {
      this.packed += chunk.length;
      if (this.packed > this.limits.archiveBytes) {
        throw new UploadRefusal(
          'too large',
          `the archive is larger than ${megabytes(this.limits.archiveBytes)}; split it`,
        );
      }
      yield chunk;
    }
  }

  /** Watches the bytes of one entry on their way out. */
  async *watch(source: AsyncIterable<Uint8Array>): AsyncGenerator<Uint8Array> {
    for await (const chunk of source) {
      this.unpacked += chunk.length;
      if (this.unpacked > this.limits.expandedBytes) {
        throw new UploadRefusal(
          'archive bomb',
          `the archive unpacks to more than ${megabytes(this.limits.expandedBytes)}; split it`,
        );
      }
      if (this.unpacked > RATIO_FROM_BYTES && this.unpacked > this.limits.ratio * this.packed) {
        throw new UploadRefusal(
          'archive bomb',
          `the archive unpacks to more than ${this.limits.ratio} times its size, which outputs never do; send the files unpacked`,
        );
      }
      yield chunk;
    }
  }

  countEntry(): void {
    this.entries += 1;
    if (this.entries > this.limits.entries) {
      throw new UploadRefusal(
        'too many files',
        `the archive holds more than ${this.limits.entries} files; split it`,
      );
    }
  }
}
