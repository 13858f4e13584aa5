import { createHash, randomUUID } from 'node:crypto';
import { Readable } from 'node:stream';
import {
  CopyObjectCommand,
  DeleteObjectCommand,
  GetObjectCommand,
  HeadObjectCommand,
  NoSuchKey,
  NotFound,
  S3Client,
} from '@aws-sdk/client-s3';
import { Upload } from '@aws-sdk/lib-storage';
import { ObjectMissing, requireSha256, type ByteRange, type ObjectStorage } from './object-storage';

export interface S3Settings {
  bucket: string;
  endpoint?: string;
  region: string;
  accessKeyId: string;
  secretAccessKey: string;
}

/** Object storage over the S3 API: uploaded under a temporary key, copied to its SHA-256 when whole. */
export class S3Storage implements ObjectStorage {
  private readonly client: S3Client;
  private readonly bucket: string;

  constructor({ bucket, endpoint, region, ...credentials }: S3Settings) {
    this.bucket = bucket;
    this.client = new S3Client({ endpoint, region, credentials, forcePathStyle: endpoint !== undefined });
  }

  async store(source: AsyncIterable<Uint8Array>): Promise<{ sha256: string; bytes: number }> {
    const hash = createHash('sha256');
    let bytes = 0;
    async function* hashed() {
      for await (const chunk of source) {
        hash.update(chunk);
        bytes += chunk.length;
        yield chunk;
      }
    }
    const Key = `incoming/${randomUUID()}`;
    const upload = new Upload({
      client: this.client,
      params: { Bucket: this.bucket, Key, Body: Readable.from(hashed()) },
    });
    await upload.done();
    const sha256 = hash.digest('hex');
    await this.client.send(
      new CopyObjectCommand({
        Bucket: this.bucket,
        Key: this.keyOf(sha256),
        CopySource: `${this.bucket}/${Key}`,
      }),
    );
    await this.client.send(new DeleteObjectCommand({ Bucket: this.bucket, Key }));
    return { sha256, bytes };
  }

  async get(sha256: string, range?: ByteRange): Promise<AsyncIterable<Uint8Array>> {
    try {
      const { Body } = await this.client.send(
        new GetObjectCommand({
          Bucket: this.bucket,
          Key: this.keyOf(sha256),
          Range: range && `bytes=${range.start}-${range.end}`,
        }),
      );
      if (!(Body instanceof Readable)) throw new Error('The object store answered without a body.');
      return Body;
    } catch (error) {
      if (error instanceof NoSuchKey) throw new ObjectMissing(sha256);
      throw error;
    }
  }

  async has(sha256: string): Promise<boolean> {
    try {
      await this.client.send(new HeadObjectCommand({ Bucket: this.bucket, Key: this.keyOf(sha256) }));
      return true;
    } catch (error) {
      if (error instanceof NotFound) return false;
      throw error;
    }
  }

  private keyOf(sha256: string): string {
    return `objects/${requireSha256(sha256)}`;
  }
}
