import { DeleteObjectCommand, GetObjectCommand, HeadObjectCommand, PutObjectCommand, S3Client } from '@aws-sdk/client-s3';
import { createPresignedPost, type PresignedPost } from '@aws-sdk/s3-presigned-post';
import { getSignedUrl } from '@aws-sdk/s3-request-presigner';

export interface StorageSettings {
  endpoint: string;
  region: string;
  bucket: string;
  accessKey: string;
  secretKey: string;
}

export interface StoredObject {
  bytes: number;
  mediaType: string;
}

/** Files in S3-compatible storage. Keys begin with the organisation's id. */
export interface Storage {
  put(key: string, body: Uint8Array, mediaType: string): Promise<void>;
  get(key: string): Promise<Uint8Array | undefined>;
  /** The same as it comes, for what is only passed on. */
  open(key: string): Promise<ReadableStream<Uint8Array> | undefined>;
  /** What arrived. A presigned upload's limits are checked against this as well: not every server keeps them. */
  head(key: string): Promise<StoredObject | undefined>;
  remove(key: string): Promise<void>;
  /** Lets a browser upload one file directly, up to `maxBytes`, for ten minutes. */
  presignUpload(key: string, limits: { maxBytes: number; mediaType: string }): Promise<PresignedPost>;
  /** Lets a browser read one file for ten minutes. */
  presignRead(key: string): Promise<string>;
}

const TEN_MINUTES_S = 600;

const isAbsent = (error: unknown) => error instanceof Error && (error.name === 'NoSuchKey' || error.name === 'NotFound');

export function createStorage({ endpoint, region, bucket: Bucket, accessKey, secretKey }: StorageSettings): Storage {
  const client = new S3Client({
    endpoint,
    region,
    credentials: { accessKeyId: accessKey, secretAccessKey: secretKey },
    // Most S3-compatible servers know buckets by path, and not all of them the SDK's newer checksums.
    forcePathStyle: true,
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  });

  const orAbsent = async <T>(work: Promise<T>): Promise<T | undefined> => {
    try {
      return await work;
    } catch (error) {
      if (isAbsent(error)) return undefined;
      throw error;
    }
  };

  return {
    async put(Key, Body, ContentType) {
      await client.send(new PutObjectCommand({ Bucket, Key, Body, ContentType }));
    },
    async get(Key) {
      const found = await orAbsent(client.send(new GetObjectCommand({ Bucket, Key })));
      return found?.Body?.transformToByteArray();
    },
    async open(Key) {
      const found = await orAbsent(client.send(new GetObjectCommand({ Bucket, Key })));
      // The SDK knows several kinds of stream; in Node it is always this one.
      return found?.Body?.transformToWebStream() as ReadableStream<Uint8Array> | undefined;
    },
    async head(Key) {
      const found = await orAbsent(client.send(new HeadObjectCommand({ Bucket, Key })));
      return found && { bytes: found.ContentLength ?? 0, mediaType: found.ContentType ?? 'application/octet-stream' };
    },
    async remove(Key) {
      await client.send(new DeleteObjectCommand({ Bucket, Key }));
    },
    presignUpload: (Key, { maxBytes, mediaType }) =>
      createPresignedPost(client, {
        Bucket,
        Key,
        Conditions: [['content-length-range', 1, maxBytes], ['eq', '$Content-Type', mediaType]],
        Fields: { 'Content-Type': mediaType },
        Expires: TEN_MINUTES_S,
      }),
    presignRead: (Key) => getSignedUrl(client, new GetObjectCommand({ Bucket, Key }), { expiresIn: TEN_MINUTES_S }),
  };
}
