import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';
import { clearings, evidence, houseStyles, lines, lineVersions, sheets } from './sheets';

/** What somebody noted on a passage of a line, in the version it was made on. Never evidence, never public. */
export const lineComments = sqliteTable(
  'line_comments',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    lineId: integer('line_id')
      .notNull()
      .references(() => lines.id),
    lineVersionId: integer('line_version_id')
      .notNull()
      .references(() => lineVersions.id),
    /** Offsets in the words as they stood then, and those words themselves. */
    startAt: integer('start_at').notNull(),
    endAt: integer('end_at').notNull(),
    quote: text('quote').notNull(),
    body: text('body').notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    at: integer('at').notNull(),
    resolvedBy: integer('resolved_by').references(() => people.id),
    resolvedAt: integer('resolved_at'),
  },
  (t) => [
    uniqueIndex('line_comments_public_id').on(t.publicId),
    index('line_comments_line_id').on(t.lineId),
    index('line_comments_line_version_id').on(t.lineVersionId),
    index('line_comments_person_id').on(t.personId),
    index('line_comments_resolved_by').on(t.resolvedBy),
  ],
);

/** Why one line was sent back, beside what was said of the whole sheet. */
export const clearingLineReasons = sqliteTable(
  'clearing_line_reasons',
  {
    clearingId: integer('clearing_id')
      .notNull()
      .references(() => clearings.id),
    lineVersionId: integer('line_version_id')
      .notNull()
      .references(() => lineVersions.id),
    reason: text('reason').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.clearingId, t.lineVersionId] }),
    index('clearing_line_reasons_line_version_id').on(t.lineVersionId),
  ],
);

/** When a sheet is wanted, as typed and as an instant, and how long its words keep where it is not as house style says. */
export const sheetTerms = sqliteTable(
  'sheet_terms',
  {
    sheetId: integer('sheet_id')
      .primaryKey()
      .references(() => sheets.id),
    wantedAt: integer('wanted_at'),
    wantedLocal: text('wanted_local'),
    wantedZone: text('wanted_zone'),
    /** Days after the field dates. */
    shelfDays: integer('shelf_days'),
    setBy: integer('set_by')
      .notNull()
      .references(() => people.id),
    setAt: integer('set_at').notNull(),
  },
  (t) => [index('sheet_terms_wanted_at').on(t.wantedAt), index('sheet_terms_set_by').on(t.setBy)],
);

/** Who has a sheet open now: one row a person, renewed while the page is open. */
export const sheetPresence = sqliteTable(
  'sheet_presence',
  {
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    doing: text('doing', { enum: ['reading', 'writing'] }).notNull(),
    seenAt: integer('seen_at').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.sheetId, t.personId] }),
    index('sheet_presence_person_id').on(t.personId),
    index('sheet_presence_seen_at').on(t.seenAt),
  ],
);

/** The first time that somebody who may be the second reader opened a filing. */
export const sheetLooks = sqliteTable(
  'sheet_looks',
  {
    id: integer('id').primaryKey(),
    /** The filing that was looked at. */
    clearingId: integer('clearing_id')
      .notNull()
      .references(() => clearings.id),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    at: integer('at').notNull(),
  },
  (t) => [
    uniqueIndex('sheet_looks_clearing_person').on(t.clearingId, t.personId),
    index('sheet_looks_person_id').on(t.personId),
  ],
);

/** A sheet in another language changed, so this one needs another look until somebody gives it or files anew. */
export const sheetReviews = sqliteTable(
  'sheet_reviews',
  {
    id: integer('id').primaryKey(),
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    causeSheetId: integer('cause_sheet_id')
      .notNull()
      .references(() => sheets.id),
    cause: text('cause', { enum: ['changed', 'cleared', 'pulled'] }).notNull(),
    at: integer('at').notNull(),
    settledBy: integer('settled_by').references(() => people.id),
    settledAt: integer('settled_at'),
    settledAs: text('settled_as', { enum: ['reviewed', 'filed'] }),
  },
  (t) => [
    index('sheet_reviews_sheet_id').on(t.sheetId, t.settledAt),
    index('sheet_reviews_cause_sheet_id').on(t.causeSheetId),
    index('sheet_reviews_settled_by').on(t.settledBy),
  ],
);

/** An as-printed sheet that one editor released at night, until a second person has read it. */
export const oneReaderReleases = sqliteTable(
  'one_reader_releases',
  {
    evidenceId: integer('evidence_id')
      .primaryKey()
      .references(() => evidence.id),
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    /** The house style that allowed it. */
    houseStyleId: integer('house_style_id')
      .notNull()
      .references(() => houseStyles.id),
    /** The clock on the desk's wall then, and the night it fell into: `HH:MM`. */
    localTime: text('local_time').notNull(),
    nightFrom: text('night_from').notNull(),
    nightTo: text('night_to').notNull(),
    zone: text('zone').notNull(),
    at: integer('at').notNull(),
    secondPersonId: integer('second_person_id').references(() => people.id),
    secondAt: integer('second_at'),
  },
  (t) => [
    index('one_reader_releases_sheet_id').on(t.sheetId),
    index('one_reader_releases_person_id').on(t.personId),
    index('one_reader_releases_house_style_id').on(t.houseStyleId),
    index('one_reader_releases_second_person_id').on(t.secondPersonId),
  ],
);
