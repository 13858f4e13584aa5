/** What one upload may hold. Outputs compress about tenfold; a ratio far above that is no output. */
export interface UploadLimits {
  /** Bytes of one file, after unpacking. */
  fileBytes: number;
  /** Bytes of an archive as sent. */
  archiveBytes: number;
  /** Bytes of all files of one archive together, after unpacking. */
  expandedBytes: number;
  entries: number;
  /** Unpacked to packed; looked at once more than 64 MB have been unpacked. */
  ratio: number;
}

export const defaultUploadLimits: UploadLimits = {
  fileBytes: 2 * 1024 ** 3,
  archiveBytes: 4 * 1024 ** 3,
  expandedBytes: 16 * 1024 ** 3,
  entries: 20_000,
  ratio: 200,
};

/** A refusal that concerns one file (or, thrown while unpacking, the rest of its archive). */
export class UploadRefusal extends Error {
  constructor(
    readonly code: string,
    message: string,
  ) {
    super(message);
  }
}

export function megabytes(bytes: number): string {
  return `${(bytes / 1024 ** 2).toLocaleString('en-GB', { maximumFractionDigits: 1 })} MB`;
}
