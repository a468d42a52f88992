import 'server-only';
import { z } from 'zod';
import { findLastRecord, listRecords } from '@/db/queries/record';
import { type Actor, canReadHistory, canReadUnpublished } from '@/lib/domain/roles';
import { authorize, type Ctx, parse } from '../context';
import { recordEmbargoViews } from '../release/record-embargo-views';
import type { Head } from './head';
import { type HistoryMark, historyMarks } from './marks';

export const PAGE_SIZE = 50;

/** Who is written where no person acted. */
const THE_SYSTEM = 'Leadline';

export type HistoryEntry = {
  seq: number;
  at: number;
  person: string;
  action: string;
  entity: string;
  entityId: string;
  /** The person, or the race and pollster of the release, sheet or embed, as far as this reader may know them. */
  about: string | null;
  before: unknown;
  after: unknown;
  reason: string | null;
  /** An embargo keeps what changed, and why, from this reader for now. */
  hidden: boolean;
  /** What stands over its sheet or embed as it is now. */
  marks: HistoryMark[];
  hash: string;
};

export type HistoryPage = {
  entries: HistoryEntry[];
  /** What `before` is for the next older page; null on the last one. */
  older: number | null;
  head: Head | null;
};

const schema = z.strictObject({
  before: z.coerce.number().int().min(1).optional(),
  entity: z.string().min(1).max(40).optional(),
  entityId: z.string().min(1).max(64).optional(),
});

/** One page of the history, newest first; of one kind of thing, or of one thing, where the asker names it. */
export function listHistory(actor: Actor, input: unknown, ctx: Ctx): HistoryPage {
  authorize(canReadHistory(actor), 'The history is open to reporters, editors and administrators.');
  const { before = null, entity = null, entityId = null } = parse(schema, input);
  const asked = { before, entity, entityId, limit: PAGE_SIZE + 1 };
  const rows = listRecords(ctx.db, asked, actor, ctx.now);
  const page = rows.slice(0, PAGE_SIZE);
  recordViews(actor, page, ctx);
  const marks = historyMarks(ctx, page);
  const last = findLastRecord(ctx.db);
  return {
    entries: page.map((row) => entryOf(row, marks(row))),
    older: rows.length > PAGE_SIZE ? (page.at(-1)?.record.seq ?? null) : null,
    head: last ? { seq: last.seq, hash: last.hash } : null,
  };
}

function entryOf(row: ReturnType<typeof listRecords>[number], marks: HistoryMark[]): HistoryEntry {
  const { record, person, isVisible, ...names } = row;
  return {
    seq: record.seq,
    at: record.at,
    person: person ?? THE_SYSTEM,
    action: record.action,
    entity: record.entity,
    entityId: record.entityId,
    about: isVisible ? aboutOf(record.entity, names) : null,
    before: isVisible ? read(record.before) : null,
    after: isVisible ? read(record.after) : null,
    reason: isVisible ? record.reason : null,
    hidden: !isVisible,
    marks,
    hash: record.hash,
  };
}

/** Whoever reads held figures from an embargo list, and not by role, is written down. */
function recordViews(actor: Actor, page: ReturnType<typeof listRecords>, ctx: Ctx): void {
  if (canReadUnpublished(actor)) return;
  const read = page.filter(({ isVisible, isHeld }) => isVisible && isHeld);
  recordEmbargoViews(ctx, actor, new Set(read.map(({ record }) => record.releaseId!)), 'history');
}

const OF_A_RELEASE = ['release', 'sheet', 'embed'];

type Names = Pick<ReturnType<typeof listRecords>[number], 'subject' | 'race' | 'pollster'>;

function aboutOf(entity: string, { subject, race, pollster }: Names): string | null {
  if (!OF_A_RELEASE.includes(entity)) return subject;
  return race !== null && pollster !== null ? `${race}, ${pollster}` : null;
}

function read(json: string | null): unknown {
  return json === null ? null : (JSON.parse(json) as unknown);
}
