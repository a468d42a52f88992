import { sql } from 'drizzle-orm';
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';
import { releases, releaseVersions } from './releases';

/** One correction of a release: whose it is, what was wrong, and from which version to which. */
export const corrections = sqliteTable(
  'corrections',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    releaseId: integer('release_id')
      .notNull()
      .references(() => releases.id),
    fromVersionId: integer('from_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    toVersionId: integer('to_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    whose: text('whose', { enum: ['ours', 'pollster', 'late-data'] }).notNull(),
    explanation: text('explanation').notNull(),
    /** The parts of the release that differ, as a JSON list. */
    changed: text('changed').notNull(),
    /** Staged: replacements are drafted and cleared against it, and nothing in print has changed yet. */
    state: text('state', { enum: ['staged', 'applied', 'withdrawn'] }).notNull(),
    createdBy: integer('created_by')
      .notNull()
      .references(() => people.id),
    createdAt: integer('created_at').notNull(),
    settledBy: integer('settled_by').references(() => people.id),
    settledAt: integer('settled_at'),
    /** The editor who let the notices go out. */
    noticesBy: integer('notices_by').references(() => people.id),
    noticesAt: integer('notices_at'),
  },
  (t) => [
    uniqueIndex('corrections_public_id').on(t.publicId),
    uniqueIndex('corrections_one_staged')
      .on(t.releaseId)
      .where(sql`${t.state} = 'staged'`),
    index('corrections_release_id').on(t.releaseId),
    index('corrections_from_version_id').on(t.fromVersionId),
    index('corrections_to_version_id').on(t.toVersionId),
    index('corrections_created_by').on(t.createdBy),
    index('corrections_settled_by').on(t.settledBy),
    index('corrections_notices_by').on(t.noticesBy),
  ],
);
