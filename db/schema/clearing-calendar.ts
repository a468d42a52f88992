import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { people } from './people';
import { races } from './races';

/** The night list: who is on call, every week on one day or on one date, by the clocks of a zone. */
export const onCallShifts = sqliteTable(
  'on_call_shifts',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    /** 1 Monday to 7 Sunday, for a shift of every week; else the date is given. */
    weekday: integer('weekday'),
    onDay: text('on_day'),
    /** Wall times `HH:MM`; one that ends before it begins ends on the next day. */
    fromTime: text('from_time').notNull(),
    toTime: text('to_time').notNull(),
    zone: text('zone').notNull(),
    addedBy: integer('added_by')
      .notNull()
      .references(() => people.id),
    addedAt: integer('added_at').notNull(),
    removedBy: integer('removed_by').references(() => people.id),
    removedAt: integer('removed_at'),
  },
  (t) => [
    uniqueIndex('on_call_shifts_public_id').on(t.publicId),
    index('on_call_shifts_person_id').on(t.personId),
    index('on_call_shifts_removed_at').on(t.removedAt),
    index('on_call_shifts_added_by').on(t.addedBy),
    index('on_call_shifts_removed_by').on(t.removedBy),
  ],
);

/** A time in which a place bars the publication of poll figures, as the newsroom read its own law. */
export const publicationBans = sqliteTable(
  'publication_bans',
  {
    id: integer('id').primaryKey(),
    publicId: text('public_id').notNull(),
    jurisdiction: text('jurisdiction').notNull(),
    /** Null: every race that ends in a vote. */
    raceId: integer('race_id').references(() => races.id),
    /** `new-figures`: what was public before stays. `all-figures`: that is taken down meanwhile too. */
    bars: text('bars', { enum: ['new-figures', 'all-figures'] }).notNull(),
    fromAt: integer('from_at').notNull(),
    fromLocal: text('from_local').notNull(),
    toAt: integer('to_at').notNull(),
    toLocal: text('to_local').notNull(),
    zone: text('zone').notNull(),
    /** Where the rule stands, in the newsroom's own words. */
    rule: text('rule').notNull(),
    enteredBy: integer('entered_by')
      .notNull()
      .references(() => people.id),
    enteredAt: integer('entered_at').notNull(),
    endedBy: integer('ended_by').references(() => people.id),
    endedAt: integer('ended_at'),
    endReason: text('end_reason'),
  },
  (t) => [
    uniqueIndex('publication_bans_public_id').on(t.publicId),
    index('publication_bans_race_id').on(t.raceId),
    index('publication_bans_to_at').on(t.toAt),
    index('publication_bans_entered_by').on(t.enteredBy),
    index('publication_bans_ended_by').on(t.endedBy),
  ],
);
