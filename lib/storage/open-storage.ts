import { DiskStorage } from './disk-storage';
import type { ObjectStorage } from './object-storage';
import { S3Storage } from './s3-storage';

/** The storage of the environment: an S3 bucket when S3_BUCKET is set, else the folder STORAGE_DIR. */
export function openStorage(environment: NodeJS.ProcessEnv = process.env): ObjectStorage {
  const { S3_BUCKET, S3_ENDPOINT, S3_REGION, S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY, STORAGE_DIR } =
    environment;
  if (S3_BUCKET) {
    if (!S3_ACCESS_KEY_ID || !S3_SECRET_ACCESS_KEY) {
      throw new Error('S3_BUCKET is set: S3_ACCESS_KEY_ID and S3_SECRET_ACCESS_KEY must be set too.');
    }
    return new S3Storage({
      bucket: S3_BUCKET,
      endpoint: S3_ENDPOINT,
      region: S3_REGION ?? 'us-east-1',
      accessKeyId: S3_ACCESS_KEY_ID,
      secretAccessKey: S3_SECRET_ACCESS_KEY,
    });
  }
  if (!STORAGE_DIR)
    throw new Error('Neither S3_BUCKET nor STORAGE_DIR is set: say where uploaded files are kept.');
  return new DiskStorage(STORAGE_DIR);
}
