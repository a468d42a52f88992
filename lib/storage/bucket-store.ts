import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadObjectCommand,
  paginateListObjectsV2,
  PutObjectCommand,
  S3Client,
  S3ServiceException,
} from '@aws-sdk/client-s3';
import { sha256 } from '@/lib/security/ids';
import { type FileStore, isHash, pathOf } from './file-store';

export type BucketSettings = {
  bucket: string;
  endpoint: string | undefined;
  region: string;
  key: string;
  secret: string;
};

const PREFIX = 'files/';

/** Files in an S3-compatible bucket. */
export function bucketStore({ bucket, endpoint, region, key, secret }: BucketSettings): FileStore {
  const client = new S3Client({
    endpoint,
    region,
    credentials: { accessKeyId: key, secretAccessKey: secret },
    forcePathStyle: true,
    // Stores that only speak the older protocol refuse checksums that were not asked for.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  });
  const at = (hash: string) => ({ Bucket: bucket, Key: PREFIX + pathOf(hash) });
  return {
    async put(bytes) {
      const hash = sha256(Buffer.from(bytes));
      await client.send(new PutObjectCommand({ ...at(hash), Body: bytes, ContentLength: bytes.byteLength }));
      return { hash };
    },
    async get(hash) {
      const found = await client.send(new GetObjectCommand(at(hash))).catch(absentIsNull);
      return found?.Body ? Buffer.from(await found.Body.transformToByteArray()) : null;
    },
    has: async (hash) => (await client.send(new HeadObjectCommand(at(hash))).catch(absentIsNull)) !== null,
    async *list() {
      for await (const page of paginateListObjectsV2({ client }, { Bucket: bucket, Prefix: PREFIX }))
        for (const { Key = '', LastModified } of page.Contents ?? []) {
          const hash = Key.split('/').at(-1) ?? '';
          if (isHash(hash)) yield { hash, changedAt: LastModified?.getTime() ?? 0 };
        }
    },
    async remove(hash) {
      await client.send(new DeleteObjectCommand(at(hash)));
    },
  };
}

function absentIsNull(error: unknown): null {
  if (error instanceof S3ServiceException && error.$metadata.httpStatusCode === 404) return null;
  throw error;
}
