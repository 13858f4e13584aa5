/** A span of bytes; `end` is the last byte, included. */
export interface ByteRange {
  start: number;
  end: number;
}

/** Where raw files are kept: every object under the SHA-256 of its bytes, never changed. */
export interface ObjectStorage {
  /**
   * Streams bytes into storage while their SHA-256 is computed, in constant memory. Same bytes twice are one
   * object. Nothing is left behind when the source throws.
   */
  store(source: AsyncIterable<Uint8Array>): Promise<{ sha256: string; bytes: number }>;
  /** The bytes, whole or a range; throws {@link ObjectMissing} when there is no such object. */
  get(sha256: string, range?: ByteRange): Promise<AsyncIterable<Uint8Array>>;
  has(sha256: string): Promise<boolean>;
}

export class ObjectMissing extends Error {
  constructor(readonly sha256: string) {
    super(`No stored file has the SHA-256 ${sha256}.`);
  }
}

/** Refuses keys that are not a SHA-256 before they reach a path or an address. */
export function requireSha256(key: string): string {
  if (!/^[0-9a-f]{64}$/.test(key))
    throw new Error(`"${key.slice(0, 80)}" is not a SHA-256 in lower-case hexadecimal.`);
  return key;
}
