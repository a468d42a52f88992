import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';

/** Files that were stored, each under the hash of its bytes. The bytes are on disk or in a bucket. */
export const files = sqliteTable(
  'files',
  {
    id: integer('id').primaryKey(),
    hash: text('hash').notNull(),
    size: integer('size').notNull(),
    type: text('type').notNull(),
    createdBy: integer('created_by')
      .notNull()
      .references(() => people.id),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [uniqueIndex('files_hash').on(t.hash), index('files_created_by').on(t.createdBy)],
);
