import type { FragileReason, WordingState } from './wording-state';
import type { Claim } from '@/lib/domain/sheet';
import type { Mode, Population } from '@/lib/domain/vocabulary';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { ComparableItem } from '@/lib/findings/comparability';
import type { DeffSource, SecondTest, UntestedReason } from '@/lib/findings/check-types';

/**
 * Everything one language can say about a poll, as ICU messages. A message is a whole sentence, headline or title;
 * lines of several sentences choose among them, so that no sentence is put together from pieces.
 * Plain data: it is kept, hashed and edited as JSON.
 */
export type LanguagePack = {
  headline: ClaimMessages;
  body: ClaimMessages;
  chartTitle: ClaimMessages;
  range: Record<Claim['kind'], string>;
  detectable: string;
  fragile: Record<FragileReason | 'as-printed', string>;
  untested: Record<UntestedReason | 'no-sign-of-error', string>;
  caveat: Record<CaveatSentence, string>;
  methodNote: Record<MethodSentence, string>;
  comparison: Record<'latest' | 'latest-comparable' | 'unknown' | 'override', string>;
  altText: Record<'intro' | 'title' | 'range' | 'wider' | 'fieldwork', string>;
  terms: Terms;
};

/** States in which a kind of claim can be: only a change of one share is ever called little changed. */
export type StateOf<K extends Claim['kind']> = K extends 'change'
  ? WordingState
  : Exclude<WordingState, 'little-changed'>;

export type ClaimMessages = { [K in Claim['kind']]: Record<StateOf<K>, string> };

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
  | 'margin-none'
  | 'errors-before-a-vote'
  | 'errors'
  | 'errors-without-margin';

export type MethodSentence =
  | 'compared-with'
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
  quoted: string;
  notDisclosed: string;
  half: string;
  threshold: string;
  numbers: string[];
  population: Record<Population | 'unknown', string>;
  mode: Record<Mode, string>;
  sample: Record<ReleaseFacts['sampleSource'], string>;
  secondTest: Record<SecondTest['name'], string>;
  comparable: Record<ComparableItem, string>;
  particular: Record<'sponsor' | 'population' | 'n' | 'mode', string>;
};
