import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';
import { releases } from './releases';

/** The history: append-only, gapless, hash-chained. Triggers refuse UPDATE and DELETE. */
export const records = sqliteTable(
  'records',
  {
    seq: integer('seq').primaryKey(),
    at: integer('at').notNull(),
    /** Null where the system itself acted. */
    personId: integer('person_id'),
    action: text('action').notNull(),
    entity: text('entity').notNull(),
    entityId: text('entity_id').notNull(),
    before: text('before'),
    after: text('after'),
    reason: text('reason'),
    /** The release whose embargo hides before and after. */
    releaseId: integer('release_id'),
    /** SHA-256 of the canonical JSON of the state after the change. */
    rowHash: text('row_hash').notNull(),
    previousHash: text('previous_hash').notNull(),
    hash: text('hash').notNull(),
  },
  (t) => [index('records_entity').on(t.entity, t.entityId), index('records_release_id').on(t.releaseId)],
);

/** Work promised inside a state change, done afterwards by a process of its own. */
export const jobs = sqliteTable(
  'jobs',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    kind: text('kind').notNull(),
    payload: text('payload').notNull(),
    idempotencyKey: text('idempotency_key').notNull(),
    state: text('state', { enum: ['waiting', 'running', 'done', 'dead', 'cancelled'] }).notNull(),
    runAt: integer('run_at').notNull(),
    /** Begun so often since it last got further. */
    attempts: integer('attempts').notNull().default(0),
    lastError: text('last_error'),
    /** How far it came, as JSON of its kind: a crash resumes here. */
    cursor: text('cursor'),
    progressDone: integer('progress_done').notNull().default(0),
    progressTotal: integer('progress_total'),
    progressNote: text('progress_note'),
    /** Whose it is while it runs, and until when without a word from them. */
    leaseBy: text('lease_by'),
    leaseUntil: integer('lease_until'),
    /** The release whose embargo hides what it is about. */
    releaseId: integer('release_id').references(() => releases.id),
    askedBy: integer('asked_by').references(() => people.id),
    createdAt: integer('created_at').notNull(),
    startedAt: integer('started_at'),
    endedAt: integer('ended_at'),
    cancelRequestedAt: integer('cancel_requested_at'),
    cancelRequestedBy: integer('cancel_requested_by').references(() => people.id),
  },
  (t) => [
    uniqueIndex('jobs_public_id').on(t.publicId),
    uniqueIndex('jobs_idempotency_key').on(t.idempotencyKey),
    index('jobs_state_run_at').on(t.state, t.runAt),
    index('jobs_release_id').on(t.releaseId),
    index('jobs_asked_by').on(t.askedBy),
    index('jobs_cancel_requested_by').on(t.cancelRequestedBy),
  ],
);

/** One row: the process that runs jobs, and its last sign of life. */
export const jobProcess = sqliteTable('job_process', {
  id: integer('id').primaryKey(),
  pid: integer('pid').notNull(),
  startedAt: integer('started_at').notNull(),
  beatAt: integer('beat_at').notNull(),
});

/** What is to be told to people and programs, written in the change that it tells of. It never holds a figure. */
export const outbox = sqliteTable(
  'outbox',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    channel: text('channel', { enum: ['mail', 'webhook'] }).notNull(),
    kind: text('kind').notNull(),
    entity: text('entity').notNull(),
    entityId: text('entity_id').notNull(),
    /** The release whose embargo keeps it from whoever may not see that. */
    releaseId: integer('release_id').references(() => releases.id),
    /** Null: everybody who follows such things. */
    toPerson: integer('to_person').references(() => people.id),
    payload: text('payload').notNull(),
    createdAt: integer('created_at').notNull(),
    sentAt: integer('sent_at'),
  },
  (t) => [
    uniqueIndex('outbox_public_id').on(t.publicId),
    index('outbox_sent_at').on(t.sentAt, t.channel),
    index('outbox_release_id').on(t.releaseId),
    index('outbox_to_person').on(t.toPerson),
  ],
);
