import type { SoundingSpec } from './sounding-spec';
import type { ThemeChoice } from './tokens';

/** A moment, for machines and as it is printed. */
export type Dated = { iso: string; text: string };

export type EmbedRow = {
  option: string;
  isAnswer: boolean;
  /** The share with its interval; null where the release does not disclose it. */
  share: SoundingSpec | null;
};

/** All that a public chart shows: cleared words, and figures of the evidence they were cleared on. */
export type EmbedInput = {
  lang: string;
  theme: ThemeChoice;
  /** Cleared chart title. */
  chartTitle: string;
  /** Race, who was asked, how many, when: one line. */
  particulars: string;
  /** Cleared alt text. */
  altText: string;
  sounding: SoundingSpec;
  rows: readonly EmbedRow[];
  /** Cleared caveat; blank lines part paragraphs. */
  caveat: string;
  version: number;
  updated: Dated;
  source: { text: string; url: string | null } | null;
};

export type WithdrawalInput = {
  lang: string;
  theme: ThemeChoice;
  withdrawn: Dated;
  /** A cleared sentence, without the figures; null: the standing words alone. */
  note: string | null;
};
