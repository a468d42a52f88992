import type { FragileReason, WordingState } from './wording-state';
import type { ClaimKind } from '@/lib/domain/sheet';
import type { Mode, Population } from '@/lib/domain/vocabulary';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { ComparableItem } from '@/lib/findings/comparability';
import type { DeffSource, SecondTest } from '@/lib/findings/check-types';
import type { ReleaseUntestedReason } from '@/lib/findings/judge-types';

/**
 * Everything one language can say about a poll, as ICU messages. A message is a whole sentence, headline or title;
 * lines of several sentences choose among them, so that no sentence is put together from pieces.
 * Plain data: it is kept, hashed and edited as JSON.
 */
export type LanguagePack = {
  headline: ClaimMessages;
  body: ClaimMessages;
  chartTitle: ClaimMessages;
  /** The finding in one sentence that stands in any line: standfirst, newsletter, change sentence, spoken. */
  told: ClaimMessages;
  range: Record<ClaimKind, string>;
  detectable: string;
  fragile: Record<FragileReason | 'as-printed', string>;
  /** The same reasons, each a short sentence of its own. */
  fragileShort: Record<FragileReason, string>;
  untested: Record<ReleaseUntestedReason | 'no-sign-of-error' | 'independent-margin', string>;
  context: Record<ContextSentence, string>;
  caveat: Record<CaveatSentence, string>;
  /** The last sentence of the short caveat; its first ones are those of the full one. */
  caveatShort: Record<MarginCase, string>;
  oneBreath: Record<MarginCase, string>;
  methodNote: Record<MethodSentence, string>;
  comparison: Record<'latest' | 'latest-comparable' | 'unknown' | 'override', string>;
  altText: Record<'intro' | 'title' | 'range' | 'wider' | 'fieldwork', string>;
  spoken: Record<'fieldwork' | MarginCase, string>;
  newsletter: Record<'line', string>;
  correction: Record<CorrectionSentence, string>;
  terms: Terms;
};

/** States in which a kind of claim can be: only a change of one share is ever called little changed. */
export type StateOf<K extends ClaimKind> = K extends 'change'
  ? WordingState
  : Exclude<WordingState, 'little-changed'>;

export type ClaimMessages = { [K in ClaimKind]: Record<StateOf<K>, string> };

/** What a reader has to know of what is compared, after the finding itself. */
export type ContextSentence = 'others' | 'bloc' | 'shared-waves' | 'groups';

/** What a short text says of the margin: ours, the pollster's alone, none, or why there is none of sampling error. */
export type MarginCase = 'margin' | 'stated-only' | 'none' | 'not-random' | 'modelled' | 'comparison';

export type CorrectionSentence =
  'intro' | 'share' | 'earlier-share' | 'group-share' | 'sample-size' | 'dates' | 'now' | 'weaker';

export type CaveatSentence =
  | 'fieldwork'
  | 'earlier'
  | 'not-disclosed'
  | 'not-recorded'
  | 'sample-random'
  | 'sample-not-random'
  | 'sample-modelled'
  | 'sample-comparison'
  | 'margin'
  | 'margin-stated-only'
  | 'twice-margin'
  | 'small-shares'
  | 'margin-none'
  | 'errors-before-a-vote'
  | 'errors'
  | 'errors-without-margin';

export type MethodSentence =
  | 'compared-with'
  | 'shared-waves'
  | 'rebased'
  | 'bloc'
  | 'net-score'
  | 'question'
  | 'no-choice'
  | DeffSource
  | 'stated-margin-like-unweighted'
  | 'one-deff'
  | 'test'
  | 'family'
  | 'second-test'
  | 'rounding'
  | 'breaking-deff'
  | 'breaking-factor'
  | 'lower-deff'
  | 'detectable'
  | 'little-changed'
  | 'exaggerated'
  | 'untested'
  | 'source'
  | 'engine'
  | 'before-a-vote'
  | 'opinion';

/** Words for closed lists. Each fills a slot of a message as a unit: a noun with its number, an adverbial phrase. */
export type Terms = {
  percent: string;
  perCent: string;
  quoted: string;
  /** What a subgroup is set against where it is the rest of its sample. */
  everyoneElse: string;
  /** One figure in a list: a name with its share. */
  figure: string;
  /** The poll compared with, named in the middle of a sentence. */
  earlierPoll: string;
  notDisclosed: string;
  /** How the desk calls itself, and the rule of a comparison basis, where the house style's words are of another language. */
  newsroom?: string;
  comparisonRule?: string;
  /** Field dates in the middle of a sentence, where a bare range would not stand there: of one day, of several. */
  days?: { one: string; several: string };
  half: string;
  threshold: string;
  numbers: string[];
  population: Record<Population | 'unknown', string>;
  /** Whom a poll was taken of, as a phrase after "a poll"; for languages that do not say it with the noun alone. */
  ofWhom?: Record<Population | 'unknown', string>;
  mode: Record<Mode, string>;
  sample: Record<ReleaseFacts['sampleSource'], string>;
  secondTest: Record<SecondTest['name'], string>;
  comparable: Record<ComparableItem, string>;
  particular: Record<'sponsor' | 'population' | 'n' | 'mode', string>;
  spoken: SpokenWords;
};

/** How numbers and dates are said aloud: no digits, no symbols. */
export type SpokenWords = {
  /** Zero to ninety-nine. */
  small: string[];
  /** An empty text, then one hundred to nine hundred: alone, and before a rest. */
  hundreds: string[];
  hundredsBefore: string[];
  hundredsAndRest: string;
  thousands: string;
  thousandsAndRest: string;
  millions: string;
  millionsAndRest: string;
  decimal: string;
  minus: string;
  plus: string;
  /** An empty text, then the first to the thirty-first. */
  ordinals: string[];
  day: string;
  days: string;
  year: string;
  /** Forms of the last words before a noun, where they follow its gender. */
  beforeNoun?: Partial<
    Record<
      'points' | 'people' | 'percent',
      Partial<Pick<SpokenWords, 'small' | 'hundreds' | 'hundredsBefore'>>
    >
  >;
};
