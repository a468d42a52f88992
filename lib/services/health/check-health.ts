import 'server-only';
import { type Db, getDb } from '@/db/client';
import { readSchemaVersion } from '@/db/queries/health';
import { appVersion } from '@/lib/env';

export type Health = { version: string; database: 'ok' | 'unreadable' };

/** Anyone may ask, a load balancer above all, so that the answer says nothing else. */
export function checkHealth(open: () => Db = getDb): Health {
  try {
    const isMigrated = readSchemaVersion(open()) > 0;
    return { version: appVersion, database: isMigrated ? 'ok' : 'unreadable' };
  } catch {
    return { version: appVersion, database: 'unreadable' };
  }
}
