import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { CheckAnswer, Policy } from '@/lib/findings/check-types';
import type { Comparability } from '@/lib/findings/comparability';
import type { HouseStyle } from '../house-style';

/** What a mark is about that figures are held against; one file of rules each. */
export const WORDING_RULES = [
  'lead',
  'level',
  'change',
  'no-change',
  'majority',
  'plurality',
  'threshold',
  'forecast',
  'proof',
  'record',
  'figure',
  'date',
  'percent-points',
  'margin',
  'margin-basis',
  'not-comparable',
  'subgroup',
  'population',
  'missing',
  'by-eye',
  'significance',
] as const;
/** What the desk decided about its own words; no figures are needed to judge by them. */
export const HOUSE_RULES = ['house-phrase', 'house-print', 'one-poll'] as const;
export type WordingRule = (typeof WORDING_RULES)[number] | (typeof HOUSE_RULES)[number];

/**
 * `wrong` contradicts the figures or the trade's facts, `not-supported` is more than the numbers carry, `house-style`
 * is the desk's taste, `cannot-judge` a claim that the given figures cannot settle.
 */
export const WORDING_GRADES = ['wrong', 'not-supported', 'house-style', 'cannot-judge'] as const;
export type WordingGrade = (typeof WORDING_GRADES)[number];

export const WORDING_LANGUAGES = ['en', 'es', 'fr', 'de'] as const;
export type WordingLanguage = (typeof WORDING_LANGUAGES)[number];

/** Lines of a sheet need not carry what the sheet's caveat carries; a headline may rest on one poll, speech prints nothing. */
export const TEXT_PARTS = ['whole', 'line', 'headline', 'spoken'] as const;
export type TextPart = (typeof TEXT_PARTS)[number];

export type WordingMark = {
  /** UTF-16 offsets in the text. */
  start: number;
  end: number;
  phrase: string;
  rule: WordingRule;
  grade: WordingGrade;
  /** Inside quotation marks: somebody else's words, never graded wrong. */
  quoted: boolean;
  /** Index into the releases of the input; null where it rests on none. */
  release: number | null;
  /** Claim key of the finding it rests on. */
  claim: string | null;
  message: string;
  /** Supported words for the place of the phrase, in the language of the text; null where there are none. */
  replacement: string | null;
};

export type WordingCheck = {
  marks: WordingMark[];
  /** What was not judged at all, as sentences. */
  cannotJudge: string[];
};

export type CheckedSubgroup = {
  name: string;
  /** Too few were asked for figures of its own to be shown. */
  isBelowStandard: boolean;
};

/** A release with everything a claim about it is judged by; made by checkedReleaseOf. */
export type CheckedRelease = {
  facts: ReleaseFacts;
  previous: ReleaseFacts | null;
  /** null where there is no earlier release. */
  comparability: (Comparability & { isOverridden: boolean }) | null;
  answer: CheckAnswer;
  subgroups: readonly CheckedSubgroup[];
};

export type WordingCheckInput = {
  text: string;
  language: WordingLanguage;
  releases: readonly CheckedRelease[];
  /** Without its sentences, so that a browser can be handed the rest. */
  houseStyle: Omit<HouseStyle, 'messages'>;
  policy: Policy;
  /** What the text is. Default: it stands alone. */
  part?: TextPart;
  /** How many polls a headline rests on. Default: as many as releases are given. */
  polls?: number;
};
