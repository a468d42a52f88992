import type { Population } from '@/lib/domain/vocabulary';
import type { Cue } from '../phrases';

/** Groups of phrases; what each claims is said where a rule uses it. */
export const CUE_GROUPS = [
  'leadStrong',
  'leadWeak',
  'leadStyle',
  'leadNoun',
  'trailStrong',
  'trailWeak',
  'second',
  'notional',
  'tied',
  'level',
  'up',
  'down',
  'dramatic',
  'momentum',
  'leadUp',
  'leadDown',
  'gap',
  'steady',
  'littleChanged',
  'raceWords',
  'majority',
  'most',
  'overHalf',
  'underHalf',
  'minority',
  'plurality',
  'aboveThreshold',
  'belowThreshold',
  'thresholdNoun',
  'intoAssembly',
  'outOfAssembly',
  'forecast',
  'proof',
  'shows',
  'recordWords',
  'recordHigh',
  'recordLow',
  'marginNoun',
  'plusMinus',
  'withinMargin',
  'outsideMargin',
  'noMargin',
  'subgroup',
  'amongst',
  'wholeSample',
  'everybody',
  'people',
  'voters',
  'likelyVoters',
  'registeredVoters',
  'adults',
  'statSignificant',
  'significant',
  'clear',
  'poll',
  'compare',
  'fieldworkWords',
  'publishedWords',
  'eventWords',
  'relativeDates',
  'earlierWords',
  'periodWords',
  'openers',
  'relatives',
  'withinWords',
  'outsideWords',
  'comparatives',
  'conditionals',
  'negators',
  'clauseBreaks',
  'pronouns',
  'objectMarkers',
  'backs',
  'sampleMarkers',
  'interviewed',
  'approximately',
  'almost',
  'decided',
  'percentWords',
  'pointWords',
  'sizeMarkers',
  'notShare',
  'ofWords',
  'rivals',
  'pollAsSubject',
  'everWords',
  'dateLinks',
  'heldWords',
  'beforeNoShare',
  'rangeWords',
  'shareLeads',
  'afterBareShare',
  'fromWords',
  'withWords',
  'ownsMargin',
  'orWords',
  'leadOrGap',
  'shareWords',
  'roundingWords',
  'beforeNoFraction',
  'afterNoFraction',
  'changeNouns',
  'countedPeople',
  'auxiliaries',
  'ownedNouns',
] as const;
export type CueGroup = (typeof CUE_GROUPS)[number];

export type Replacement =
  | 'isAheadUnsettled'
  | 'chanceGap'
  | 'untestedGap'
  | 'level'
  | 'higherUnsettled'
  | 'lowerUnsettled'
  | 'chanceChange'
  | 'untestedChange'
  | 'isUp'
  | 'isDown'
  | 'leads'
  | 'isAhead'
  | 'trails'
  | 'points'
  | 'suggests'
  | 'largerThanChance'
  | 'couldBeChance'
  | 'sameFigure'
  | 'atShare'
  | 'higherFigure'
  | 'aheadNow';

/** All that one language brings to the check: plain data, so that a language is added without touching a rule. */
export type Lexicon = {
  decimalMark: '.' | ',';
  /** As numbers of a replacement are written. */
  locale: string;
  /** Thousands may be parted by a space: "1 012". */
  groupsBySpace: boolean;
  /** Short words that end in an apostrophe and stand before a whole word: "l" of "l'avance". */
  elisions: readonly string[];
  /** Words before a full stop that end no sentence. */
  abbreviations: readonly string[];
  /** Numbers in words, of one word or several. */
  numbers: Readonly<Record<string, number>>;
  /** Articles that mean 1 before a unit and in "UN élu sur trois", and are no numbers elsewhere. */
  oneArticles: readonly string[];
  /** Fractions as phrases, with their value in percent. */
  fractions: Readonly<Record<string, number>>;
  /** "one IN three". */
  inEvery: readonly string[];
  /** Between the ends of a range, or two shares: "52 TO 38". */
  to: readonly string[];
  /** Months and weekdays are names, written with a capital. */
  datesAreNames: boolean;
  months: readonly (readonly string[])[];
  weekdays: readonly (readonly string[])[];
  /** A full stop after a day makes it an ordinal: "14. September". */
  ordinalDots?: true;
  /** A capital letter makes no name: every noun has one. */
  nounsHaveCapitals?: true;
  /** In subordinate clauses the verb comes last. */
  verbsComeLast?: true;
  /** What a name ends in where somebody has something: "Alders". */
  nameEndings?: readonly string[];
  /** Words after a verb that deny it: "führt NICHT". */
  negatorsAfter?: readonly string[];
  /** Nouns that stand for an option: "approval" for "Approve". */
  nameNouns: Readonly<Record<string, readonly string[]>>;
  /** Names of options that are common words, and count only in capitals and before one of `afterCommonName`. */
  commonNames: readonly string[];
  afterCommonName: readonly string[];
  /** Words of an option's name that people leave out. */
  genericNameWords: readonly string[];
  /** Capital letters at the start of a sentence that are no names. */
  notNames: readonly string[];
  cues: Readonly<Record<CueGroup, readonly Cue[]>>;
  /** Who was asked, as a replacement says it. */
  populations: Readonly<Record<Population, string>>;
  /** Supported words, with `{a}` `{b}` `{share}` for names and figures; null where the language has none yet. */
  replacements: Readonly<Record<Replacement, string | null>>;
};
