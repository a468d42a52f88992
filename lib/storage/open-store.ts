import { join } from 'node:path';
import { type Env, readEnv } from '@/lib/env';
import { diskStore } from './disk-store';
import type { FileStore } from './file-store';

/** The store of this desk: a bucket where one is set, else a folder beside the database. */
export async function openStore(env: Env = readEnv()): Promise<FileStore> {
  const { LEADLINE_BUCKET: bucket, LEADLINE_BUCKET_KEY: key, LEADLINE_BUCKET_SECRET: secret } = env;
  if (bucket === undefined || key === undefined || secret === undefined)
    return diskStore(join(env.LEADLINE_DATA, 'files'));
  // Loaded only where it is used: it is large.
  const { bucketStore } = await import('./bucket-store');
  const { LEADLINE_BUCKET_ENDPOINT: endpoint, LEADLINE_BUCKET_REGION: region } = env;
  return bucketStore({ bucket, endpoint, region, key, secret });
}
