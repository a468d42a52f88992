import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { corrections } from './corrections';
import { evidence, sheets } from './sheets';

/** What an applied correction did to one sheet whose cleared words rested on what it changed. */
export const correctionEffects = sqliteTable(
  'correction_effects',
  {
    correctionId: integer('correction_id')
      .notNull()
      .references(() => corrections.id),
    sheetId: integer('sheet_id')
      .notNull()
      .references(() => sheets.id),
    /** What the words rested on until then. */
    evidenceId: integer('evidence_id')
      .notNull()
      .references(() => evidence.id),
    effect: text('effect', { enum: ['pulled', 'flagged', 'replaced'] }).notNull(),
    replacementSheetId: integer('replacement_sheet_id').references(() => sheets.id),
    at: integer('at').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.correctionId, t.sheetId] }),
    index('correction_effects_sheet_id').on(t.sheetId),
    index('correction_effects_evidence_id').on(t.evidenceId),
    index('correction_effects_replacement_sheet_id').on(t.replacementSheetId),
  ],
);
