import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';
import { evidence, sheets } from './sheets';

export const embeds = sqliteTable(
  'embeds',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    createdBy: integer('created_by')
      .notNull()
      .references(() => people.id),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [
    uniqueIndex('embeds_public_id').on(t.publicId),
    uniqueIndex('embeds_sheet_id').on(t.sheetId),
    index('embeds_created_by').on(t.createdBy),
  ],
);

/** One cleared chart and its cleared lines, frozen in one evidence. */
export const embedVersions = sqliteTable(
  'embed_versions',
  {
    id: integer('id').primaryKey(),
    embedId: integer('embed_id')
      .notNull()
      .references(() => embeds.id),
    number: integer('number').notNull(),
    evidenceId: integer('evidence_id')
      .notNull()
      .references(() => evidence.id),
    state: text('state', { enum: ['live', 'superseded', 'pulled'] }).notNull(),
    createdAt: integer('created_at').notNull(),
    pulledAt: integer('pulled_at'),
    /** Pulled before its embargo ended: the public never saw it, so it answers 404. */
    pulledUnseen: integer('pulled_unseen', { mode: 'boolean' }).notNull().default(false),
  },
  (t) => [
    uniqueIndex('embed_versions_embed_number').on(t.embedId, t.number),
    index('embed_versions_evidence_id').on(t.evidenceId),
  ],
);
