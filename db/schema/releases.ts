import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';
import { pollsters, races, sponsors } from './races';

const disclosure = (name: string) =>
  text(name, { enum: ['given', 'not-disclosed', 'not-entered', 'not-applicable'] });

export const releases = sqliteTable(
  'releases',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    raceId: integer('race_id')
      .notNull()
      .references(() => races.id),
    pollsterId: integer('pollster_id')
      .notNull()
      .references(() => pollsters.id),
    currentVersionId: integer('current_version_id'),
    /** The instant, and what was typed: local wall time and IANA zone. */
    embargoAt: integer('embargo_at'),
    embargoLocal: text('embargo_local'),
    embargoZone: text('embargo_zone'),
    embargoLiftedAt: integer('embargo_lifted_at'),
    createdBy: integer('created_by')
      .notNull()
      .references(() => people.id),
    createdAt: integer('created_at').notNull(),
    /** One key per form that was opened: a second submit of it makes no second release. */
    submissionKey: text('submission_key').notNull(),
    archivedAt: integer('archived_at'),
    version: integer('version').notNull().default(1),
  },
  (t) => [
    uniqueIndex('releases_public_id').on(t.publicId),
    uniqueIndex('releases_submission_key').on(t.submissionKey),
    index('releases_race_id').on(t.raceId),
    index('releases_pollster_id').on(t.pollsterId),
    index('releases_created_by').on(t.createdBy),
    index('releases_created_at').on(t.createdAt),
  ],
);

/** Immutable once a sheet that rests on it is filed. */
export const releaseVersions = sqliteTable(
  'release_versions',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    releaseId: integer('release_id')
      .notNull()
      .references(() => releases.id),
    number: integer('number').notNull(),
    sponsorStatus: disclosure('sponsor_status').notNull(),
    sponsorId: integer('sponsor_id').references(() => sponsors.id),
    modeStatus: disclosure('mode_status').notNull(),
    mode: text('mode', {
      enum: ['live-telephone', 'recorded-telephone', 'face-to-face', 'online', 'post', 'mixed'],
    }),
    sampleSource: text('sample_source', {
      enum: ['probability', 'quota', 'opt-in', 'blended', 'unknown'],
    }).notNull(),
    fieldStartOn: text('field_start_on').notNull(),
    fieldEndOn: text('field_end_on').notNull(),
    publishedOn: text('published_on').notNull(),
    sourceUrlStatus: disclosure('source_url_status').notNull(),
    sourceUrl: text('source_url'),
    methodNote: text('method_note'),
    createdBy: integer('created_by')
      .notNull()
      .references(() => people.id),
    createdAt: integer('created_at').notNull(),
    frozenAt: integer('frozen_at'),
  },
  (t) => [
    uniqueIndex('release_versions_public_id').on(t.publicId),
    uniqueIndex('release_versions_release_number').on(t.releaseId, t.number),
    index('release_versions_sponsor_id').on(t.sponsorId),
    index('release_versions_created_by').on(t.createdBy),
  ],
);

export const bases = sqliteTable(
  'bases',
  {
    id: integer('id').primaryKey(),
    releaseVersionId: integer('release_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    position: integer('position').notNull(),
    populationStatus: disclosure('population_status').notNull(),
    population: text('population', { enum: ['adults', 'registered-voters', 'likely-voters'] }),
    nStatus: disclosure('n_status').notNull(),
    n: integer('n'),
    design: text('design', { enum: ['weighted', 'unweighted', 'clustered', 'unknown'] }).notNull(),
    deffSource: text('deff_source', { enum: ['design', 'kish', 'stated'] }),
    deff: real('deff'),
    deffDf: integer('deff_df'),
    /** Margins as printed: decimal text, so that 3.50 keeps its digits. */
    statedMarginStatus: disclosure('stated_margin_status').notNull(),
    statedMarginPp: text('stated_margin_pp'),
    statedMarginUnit: text('stated_margin_unit'),
    statedMarginLevel: text('stated_margin_level'),
    modelledPp: text('modelled_pp'),
    modelledUnit: text('modelled_unit'),
    modelledLevel: text('modelled_level'),
  },
  (t) => [index('bases_release_version_id').on(t.releaseVersionId)],
);

export const questions = sqliteTable(
  'questions',
  {
    id: integer('id').primaryKey(),
    baseId: integer('base_id')
      .notNull()
      .references(() => bases.id),
    position: integer('position').notNull(),
    wordingStatus: disclosure('wording_status').notNull(),
    wording: text('wording'),
    /** A reporter's mark: the same question as this pollster's earlier ones, whatever the punctuation. */
    sameQuestion: integer('same_question', { mode: 'boolean' }).notNull().default(false),
    decimals: integer('decimals').notNull(),
  },
  (t) => [index('questions_base_id').on(t.baseId)],
);

export const shares = sqliteTable(
  'shares',
  {
    id: integer('id').primaryKey(),
    questionId: integer('question_id')
      .notNull()
      .references(() => questions.id),
    position: integer('position').notNull(),
    option: text('option').notNull(),
    status: disclosure('status').notNull(),
    /** Units of the question's last printed decimal. */
    units: integer('units'),
    isAnswer: integer('is_answer', { mode: 'boolean' }).notNull(),
    enteredBy: integer('entered_by')
      .notNull()
      .references(() => people.id),
  },
  (t) => [
    uniqueIndex('shares_question_option').on(t.questionId, t.option),
    index('shares_entered_by').on(t.enteredBy),
  ],
);

/** An editor's written reason to compare two versions that differ. */
export const comparisonOverrides = sqliteTable(
  'comparison_overrides',
  {
    id: integer('id').primaryKey(),
    releaseVersionId: integer('release_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    comparisonVersionId: integer('comparison_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    reason: text('reason').notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    at: integer('at').notNull(),
  },
  (t) => [
    uniqueIndex('comparison_overrides_release_version').on(t.releaseVersionId),
    index('comparison_overrides_comparison_version').on(t.comparisonVersionId),
    index('comparison_overrides_person').on(t.personId),
  ],
);

/** What a person has typed into a form and not yet saved. */
export const releaseDrafts = sqliteTable(
  'release_drafts',
  {
    id: integer('id').primaryKey(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    key: text('key').notNull(),
    body: text('body').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [uniqueIndex('release_drafts_person_key').on(t.personId, t.key)],
);

/** Who may read one embargoed release before its hour: a person, or the whole copy desk (person null). */
export const embargoList = sqliteTable(
  'embargo_list',
  {
    id: integer('id').primaryKey(),
    releaseId: integer('release_id')
      .notNull()
      .references(() => releases.id),
    personId: integer('person_id').references(() => people.id),
    addedBy: integer('added_by')
      .notNull()
      .references(() => people.id),
    addedAt: integer('added_at').notNull(),
  },
  (t) => [
    uniqueIndex('embargo_list_release_person').on(t.releaseId, t.personId),
    index('embargo_list_person_id').on(t.personId),
    index('embargo_list_added_by').on(t.addedBy),
  ],
);

/** Views of an embargoed release by somebody on its list. */
export const embargoViews = sqliteTable(
  'embargo_views',
  {
    id: integer('id').primaryKey(),
    releaseId: integer('release_id')
      .notNull()
      .references(() => releases.id),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    at: integer('at').notNull(),
    what: text('what').notNull(),
  },
  (t) => [index('embargo_views_release_id').on(t.releaseId), index('embargo_views_person_id').on(t.personId)],
);

/** Derived, for lists only; rebuildable, never shown as a number, never evidence. */
export const findingIndex = sqliteTable(
  'finding_index',
  {
    id: integer('id').primaryKey(),
    releaseVersionId: integer('release_version_id')
      .notNull()
      .references(() => releaseVersions.id),
    policyVersion: integer('policy_version').notNull(),
    engine: text('engine').notNull(),
    findingKey: text('finding_key').notNull(),
    verdict: text('verdict').notNull(),
    z: real('z'),
    p: real('p'),
  },
  (t) => [uniqueIndex('finding_index_key').on(t.releaseVersionId, t.policyVersion, t.engine, t.findingKey)],
);
