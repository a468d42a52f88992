import { sql } from 'drizzle-orm';
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';
import { houseStyles, policies } from './sheets';

const STYLE_STATE = ['draft', 'proposed', 'in-force', 'replaced', 'withdrawn'] as const;
const STYLE_ACT = ['proposed', 'put-in-force', 'sent-back', 'withdrawn'] as const;

/** A version of house style and policy on its way into force, in force, or before. One row from draft to the end. */
export const styleVersions = sqliteTable(
  'style_versions',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    /** Given when it comes into force. */
    number: integer('number'),
    origin: text('origin', { enum: ['desk', 'product'] }).notNull(),
    state: text('state', { enum: STYLE_STATE }).notNull(),
    /** Nobody, for the product's own wording that no editor has taken up. */
    authorId: integer('author_id').references(() => people.id),
    note: text('note').notNull().default(''),
    houseStyle: text('house_style').notNull(),
    policy: text('policy').notNull(),
    /** The wording as the product shipped it, where the version came from it: what later ones are told apart by. */
    shipped: text('shipped'),
    /** Typed and refused, by path: kept for the author, never part of the version. */
    typed: text('typed').notNull().default('{}'),
    basedOnId: integer('based_on_id'),
    /** Of house style, policy and note as agreed to; null while it is a draft. */
    hash: text('hash'),
    proposedBy: integer('proposed_by').references(() => people.id),
    proposedAt: integer('proposed_at'),
    putInForceBy: integer('put_in_force_by').references(() => people.id),
    inForceAt: integer('in_force_at'),
    houseStyleId: integer('house_style_id').references(() => houseStyles.id),
    policyId: integer('policy_id').references(() => policies.id),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
    version: integer('version').notNull().default(1),
  },
  (t) => [
    uniqueIndex('style_versions_public_id').on(t.publicId),
    uniqueIndex('style_versions_number').on(t.number),
    uniqueIndex('style_versions_one_in_force')
      .on(t.state)
      .where(sql`${t.state} = 'in-force'`),
    uniqueIndex('style_versions_one_proposed')
      .on(t.state)
      .where(sql`${t.state} = 'proposed'`),
    index('style_versions_state').on(t.state),
    index('style_versions_author_id').on(t.authorId),
    index('style_versions_based_on_id').on(t.basedOnId),
    index('style_versions_proposed_by').on(t.proposedBy),
    index('style_versions_put_in_force_by').on(t.putInForceBy),
    index('style_versions_house_style_id').on(t.houseStyleId),
    index('style_versions_policy_id').on(t.policyId),
  ],
);

/** One person's act on a version. Immutable: a trigger refuses every UPDATE and DELETE. */
export const styleActs = sqliteTable(
  'style_acts',
  {
    id: integer('id').primaryKey(),
    styleVersionId: integer('style_version_id')
      .notNull()
      .references(() => styleVersions.id),
    act: text('act', { enum: STYLE_ACT }).notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    /** Roles held at that moment, as a JSON list. */
    roles: text('roles').notNull(),
    hash: text('hash').notNull(),
    comment: text('comment'),
    at: integer('at').notNull(),
  },
  (t) => [
    index('style_acts_style_version_id').on(t.styleVersionId),
    index('style_acts_person_id').on(t.personId),
  ],
);

/** A native reader of the desk has read a language's sentences, or takes that back. Immutable likewise. */
export const languageSignatures = sqliteTable(
  'language_signatures',
  {
    id: integer('id').primaryKey(),
    language: text('language').notNull(),
    /** Of the language's messages: a changed sentence needs a new signature. */
    packHash: text('pack_hash').notNull(),
    houseStyleId: integer('house_style_id')
      .notNull()
      .references(() => houseStyles.id),
    act: text('act', { enum: ['signed', 'withdrawn'] }).notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    roles: text('roles').notNull(),
    /** What the person declared, in the words of the screen. */
    declaration: text('declaration').notNull(),
    at: integer('at').notNull(),
  },
  (t) => [
    index('language_signatures_language_hash').on(t.language, t.packHash),
    index('language_signatures_house_style_id').on(t.houseStyleId),
    index('language_signatures_person_id').on(t.personId),
  ],
);
