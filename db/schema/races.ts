import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';

export const races = sqliteTable(
  'races',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    name: text('name').notNull(),
    kind: text('kind', { enum: ['candidate', 'party-list', 'referendum', 'approval', 'issue'] }).notNull(),
    createdAt: integer('created_at').notNull(),
    archivedAt: integer('archived_at'),
  },
  (t) => [uniqueIndex('races_public_id').on(t.publicId), uniqueIndex('races_name').on(t.name)],
);

export const raceOptions = sqliteTable(
  'race_options',
  {
    id: integer('id').primaryKey(),
    raceId: integer('race_id')
      .notNull()
      .references(() => races.id),
    name: text('name').notNull(),
    position: integer('position').notNull(),
  },
  (t) => [uniqueIndex('race_options_race_name').on(t.raceId, t.name)],
);

export const raceThresholds = sqliteTable(
  'race_thresholds',
  {
    id: integer('id').primaryKey(),
    raceId: integer('race_id')
      .notNull()
      .references(() => races.id),
    raceOptionId: integer('race_option_id')
      .notNull()
      .references(() => raceOptions.id),
    /** Percent as the rule states it, e.g. 5 or 50. */
    pct: real('pct').notNull(),
    base: text('base', { enum: ['votes-cast', 'valid-votes', 'registered-voters', 'answers'] }).notNull(),
  },
  (t) => [
    index('race_thresholds_race_id').on(t.raceId),
    index('race_thresholds_race_option_id').on(t.raceOptionId),
  ],
);

export const pollsters = sqliteTable(
  'pollsters',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    name: text('name').notNull(),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [uniqueIndex('pollsters_public_id').on(t.publicId), uniqueIndex('pollsters_name').on(t.name)],
);

export const sponsors = sqliteTable(
  'sponsors',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    name: text('name').notNull(),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [uniqueIndex('sponsors_public_id').on(t.publicId), uniqueIndex('sponsors_name').on(t.name)],
);
