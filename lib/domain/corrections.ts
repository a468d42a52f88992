import type { LineText } from './sheet';

export const CORRECTION_SOURCES = ['ours', 'pollster', 'late-data'] as const;
export type CorrectionSource = (typeof CORRECTION_SOURCES)[number];

/** Whose correction it is, for staff. */
export const CORRECTION_SOURCE_NAMES: Record<CorrectionSource, string> = {
  ours: 'Ours: we logged it wrongly',
  pollster: 'The pollster’s: they published a revision',
  'late-data': 'Late data: the release was completed later',
};

/** The same for the public, without a figure. */
export const CORRECTION_SOURCE_NOTES: Record<CorrectionSource, string> = {
  ours: 'Figures behind this chart had been entered wrongly.',
  pollster: 'The pollster revised figures behind this chart.',
  'late-data': 'Figures behind this chart were completed later.',
};

export const CORRECTION_STATES = ['staged', 'applied', 'withdrawn'] as const;
export type CorrectionState = (typeof CORRECTION_STATES)[number];

export const CORRECTION_EFFECTS = ['pulled', 'flagged', 'replaced'] as const;
export type CorrectionEffect = (typeof CORRECTION_EFFECTS)[number];

export const CORRECTION_EFFECT_NAMES: Record<CorrectionEffect, string> = {
  pulled: 'Pulled',
  flagged: 'Stays: source corrected, same numbers',
  replaced: 'Replaced in the same moment',
};

/** What a correction does to one sheet in print, for whoever decides on it. */
export type Consequence = {
  sheetId: string;
  effect: CorrectionEffect;
  /** The sheet is of another release, which is compared with this one. */
  isComparison: boolean;
  race: string;
  pollster: string;
  fieldStartOn: string;
  fieldEndOn: string;
  language: string;
  /** The words in print. */
  lines: LineText[];
  embedId: string | null;
};
