import { env } from '@/lib/env';
import { createStorage, type Storage } from './index';

let opened: Storage | undefined;

/** The storage that the environment names, opened at first use. */
export function storage(): Storage {
  if (opened) return opened;
  const { S3_ENDPOINT, S3_REGION, S3_BUCKET, S3_ACCESS_KEY, S3_SECRET_KEY } = env();
  opened = createStorage({ endpoint: S3_ENDPOINT, region: S3_REGION, bucket: S3_BUCKET, accessKey: S3_ACCESS_KEY, secretKey: S3_SECRET_KEY });
  return opened;
}
