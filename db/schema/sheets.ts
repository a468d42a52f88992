import { sql } from 'drizzle-orm';
import {
  type AnySQLiteColumn,
  blob,
  index,
  integer,
  primaryKey,
  sqliteTable,
  text,
  uniqueIndex,
} from 'drizzle-orm/sqlite-core';
import { corrections } from './corrections';
import { people } from './people';
import { questions, releases, releaseVersions } from './releases';

export const policies = sqliteTable('policies', {
  /** The version number of the desk's policy. */
  id: integer('id').primaryKey(),
  body: text('body').notNull(),
  createdAt: integer('created_at').notNull(),
});

export const houseStyles = sqliteTable('house_styles', {
  id: integer('id').primaryKey(),
  body: text('body').notNull(),
  createdAt: integer('created_at').notNull(),
});

/** One claim of one release question, in one language. */
export const sheets = sqliteTable(
  'sheets',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    releaseId: integer('release_id')
      .notNull()
      .references(() => releases.id),
    releaseVersionId: integer('release_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    questionId: integer('question_id')
      .notNull()
      .references(() => questions.id),
    claim: text('claim').notNull(),
    claimKey: text('claim_key').notNull(),
    language: text('language').notNull(),
    authorId: integer('author_id')
      .notNull()
      .references(() => people.id),
    createdAt: integer('created_at').notNull(),
    submissionKey: text('submission_key').notNull(),
    version: integer('version').notNull().default(1),
    /** The correction that its words wait for, or came in with. */
    correctionId: integer('correction_id').references(() => corrections.id),
    /** The sheet whose place it takes when that correction is applied. */
    replacesSheetId: integer('replaces_sheet_id').references((): AnySQLiteColumn => sheets.id),
  },
  (t) => [
    index('sheets_correction_id').on(t.correctionId),
    index('sheets_replaces_sheet_id').on(t.replacesSheetId),
    uniqueIndex('sheets_public_id').on(t.publicId),
    uniqueIndex('sheets_submission_key').on(t.submissionKey),
    index('sheets_release_id').on(t.releaseId),
    index('sheets_release_version_id').on(t.releaseVersionId),
    index('sheets_question_id').on(t.questionId),
    index('sheets_author_id').on(t.authorId),
  ],
);

const LINE_KIND = [
  'headline',
  'standfirst',
  'body',
  'change-sentence',
  'caveat',
  'caveat-short',
  'caveat-one-breath',
  'method-note',
  'chart-title',
  'alt-text',
  'spoken-line',
  'newsletter-line',
  'correction-notice',
] as const;
const LINE_STATE = ['draft', 'filed', 'sent-back', 'agreed', 'cleared', 'superseded', 'pulled'] as const;

export const lines = sqliteTable(
  'lines',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    kind: text('kind', { enum: LINE_KIND }).notNull(),
    /** Left out of this sheet by its author. */
    knockedOut: integer('knocked_out', { mode: 'boolean' }).notNull().default(false),
  },
  (t) => [
    uniqueIndex('lines_public_id').on(t.publicId),
    uniqueIndex('lines_sheet_kind').on(t.sheetId, t.kind),
  ],
);

export const lineVersions = sqliteTable(
  'line_versions',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    lineId: integer('line_id')
      .notNull()
      .references(() => lines.id),
    number: integer('number').notNull(),
    /** What house style drafted, for the difference. */
    draftText: text('draft_text').notNull(),
    text: text('text').notNull(),
    state: text('state', { enum: LINE_STATE }).notNull(),
    templateVersion: text('template_version').notNull(),
    changedBy: integer('changed_by')
      .notNull()
      .references(() => people.id),
    changedAt: integer('changed_at').notNull(),
    filedBy: integer('filed_by').references(() => people.id),
    pullReason: text('pull_reason'),
    version: integer('version').notNull().default(1),
  },
  (t) => [
    uniqueIndex('line_versions_public_id').on(t.publicId),
    uniqueIndex('line_versions_line_number').on(t.lineId, t.number),
    uniqueIndex('line_versions_one_cleared')
      .on(t.lineId)
      .where(sql`${t.state} = 'cleared'`),
    index('line_versions_state').on(t.state),
    index('line_versions_changed_by').on(t.changedBy),
    index('line_versions_filed_by').on(t.filedBy),
  ],
);

/** Immutable: a trigger refuses every UPDATE and DELETE. */
export const evidence = sqliteTable(
  'evidence',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    hash: text('hash').notNull(),
    bytes: blob('bytes', { mode: 'buffer' }).notNull(),
    engine: text('engine').notNull(),
    createdAt: integer('created_at').notNull(),
  },
  (t) => [uniqueIndex('evidence_public_id').on(t.publicId), index('evidence_sheet_id').on(t.sheetId)],
);

export const evidenceSources = sqliteTable(
  'evidence_sources',
  {
    evidenceId: integer('evidence_id')
      .notNull()
      .references(() => evidence.id),
    releaseVersionId: integer('release_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    part: text('part', { enum: ['release', 'comparison'] }).notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.evidenceId, t.releaseVersionId, t.part] }),
    index('evidence_sources_release_version_id').on(t.releaseVersionId),
  ],
);

/** One person's act on a sheet's line versions and chart, pointing at one evidence. */
export const clearings = sqliteTable(
  'clearings',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    evidenceId: integer('evidence_id').references(() => evidence.id),
    act: text('act', { enum: ['filed', 'cleared', 'sent-back', 'returned', 'pulled'] }).notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    /** Roles held at that moment, as a JSON list. */
    roles: text('roles').notNull(),
    comment: text('comment'),
    at: integer('at').notNull(),
  },
  (t) => [
    uniqueIndex('clearings_public_id').on(t.publicId),
    index('clearings_sheet_id').on(t.sheetId),
    index('clearings_person_id').on(t.personId),
    uniqueIndex('clearings_one_filed')
      .on(t.evidenceId)
      .where(sql`${t.act} = 'filed'`),
    uniqueIndex('clearings_one_cleared')
      .on(t.evidenceId)
      .where(sql`${t.act} = 'cleared'`),
  ],
);

export const clearingLines = sqliteTable(
  'clearing_lines',
  {
    clearingId: integer('clearing_id')
      .notNull()
      .references(() => clearings.id),
    lineVersionId: integer('line_version_id')
      .notNull()
      .references(() => lineVersions.id),
  },
  (t) => [
    primaryKey({ columns: [t.clearingId, t.lineVersionId] }),
    index('clearing_lines_line_version_id').on(t.lineVersionId),
  ],
);

/** Every copy from the copy desk, with its form. */
export const copies = sqliteTable(
  'copies',
  {
    id: integer('id').primaryKey(),
    lineVersionId: integer('line_version_id')
      .notNull()
      .references(() => lineVersions.id),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    form: text('form', { enum: ['plain', 'rich', 'markdown'] }).notNull(),
    underEmbargo: integer('under_embargo', { mode: 'boolean' }).notNull(),
    at: integer('at').notNull(),
  },
  (t) => [index('copies_line_version_id').on(t.lineVersionId), index('copies_person_id').on(t.personId)],
);
