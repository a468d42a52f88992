import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';

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

/** Work promised inside a state change, done afterwards. */
export const jobs = sqliteTable(
  'jobs',
  {
    id: integer('id').primaryKey(),
    kind: text('kind').notNull(),
    payload: text('payload').notNull(),
    idempotencyKey: text('idempotency_key').notNull(),
    state: text('state', { enum: ['waiting', 'running', 'done', 'dead'] }).notNull(),
    runAt: integer('run_at').notNull(),
    attempts: integer('attempts').notNull().default(0),
    lastError: text('last_error'),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [
    uniqueIndex('jobs_idempotency_key').on(t.idempotencyKey),
    index('jobs_state_run_at').on(t.state, t.runAt),
  ],
);
