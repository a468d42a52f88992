import 'server-only';
import { type Db, getDb } from '@/db/client';
import { readSchemaVersion } from '@/db/queries/health';
import { appVersion } from '@/lib/env';
import { viewJobProcess } from '../jobs/job-process';

export type Health = {
  version: string;
  database: 'ok' | 'unreadable';
  /** The process that runs jobs; without it everything is served all the same. */
  jobs: 'answering' | 'silent';
};

const unreadable: Health = { version: appVersion, database: 'unreadable', jobs: 'silent' };

/** Anyone may ask, a load balancer above all, so that the answer says nothing else. */
export function checkHealth(now: number, open: () => Db = getDb): Health {
  try {
    const db = open();
    const isMigrated = readSchemaVersion(db) > 0;
    if (!isMigrated) return unreadable;
    const jobs = viewJobProcess(db, now).state === 'answering' ? 'answering' : 'silent';
    return { version: appVersion, database: 'ok', jobs };
  } catch {
    return unreadable;
  }
}
