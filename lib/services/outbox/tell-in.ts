import 'server-only';
import type { Tx } from '@/db/client';
import { insertOutbox } from '@/db/queries/outbox';
import { canonicalJson } from '@/lib/security/canonical';
import { newId } from '@/lib/security/ids';

export const TOLD = [
  'embargo-ended',
  'shelf-ended',
  'filing-unread',
  'sheet-pulled',
  'style-in-force',
  'release-corrected',
  'correction-notices',
] as const;

export type News = {
  kind: (typeof TOLD)[number];
  entity: 'release' | 'sheet' | 'house style version';
  entityId: string;
  /** The release whose embargo keeps the news from whoever may not see it. */
  releaseId?: number;
  /** Null: everybody who follows such things. */
  toPerson?: number;
  /** Public ids and days; words and figures are read when it is sent. */
  refs?: Record<string, string | number>;
};

/** Writes down, inside the change itself, what is to be told of it by mail and to programs. */
export function tellIn(tx: Tx, news: News, now: number): void {
  const { kind, entity, entityId, releaseId = null, toPerson = null, refs = {} } = news;
  const row = { kind, entity, entityId, releaseId, toPerson, payload: canonicalJson(refs), createdAt: now };
  for (const channel of ['mail', 'webhook'] as const)
    insertOutbox(tx, { ...row, publicId: newId(), channel });
}
