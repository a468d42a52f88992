import type { LanguagePack } from '@/lib/wording/language-pack';
import { EN_BODY } from './en-body';
import { EN_CAVEAT } from './en-caveat';
import { EN_CHART_TITLE } from './en-chart-title';
import { EN_HEADLINE } from './en-headline';
import { EN_LIMITS } from './en-limits';
import { EN_METHOD_NOTE } from './en-method-note';

/** English as the product ships it. */
export const EN: LanguagePack = {
  headline: EN_HEADLINE,
  body: EN_BODY,
  chartTitle: EN_CHART_TITLE,
  ...EN_LIMITS,
  caveat: EN_CAVEAT,
  methodNote: EN_METHOD_NOTE,
  altText: {
    intro:
      '{claim, select, lead {Uncertainty chart of the difference between {a} and {b}, {race}.} change {Uncertainty chart of the change for {option}, {race}.} leadChange {Uncertainty chart of the change in the gap between {a} and {b}, {race}.} other {Uncertainty chart of {option} against {line}, {race}.}}',
    title: '{title}.',
    range:
      '{claim, select, lead {{span, select, across {The {level} range runs from {low} {lowCount, plural, one {point} other {points}} more for {b} to {high} {highCount, plural, one {point} other {points}} more for {a}.} other {The {level} range runs from {low} to {high} {highCount, plural, one {point} other {points}} more for {a}.}}} leadChange {{span, select, across {The {level} range runs from {low} {lowCount, plural, one {point} other {points}} towards {away} to {high} {highCount, plural, one {point} other {points}} towards {toward}.} other {The {level} range runs from {low} to {high} {highCount, plural, one {point} other {points}} towards {toward}.}}} change {{span, select, across {The {level} range runs from minus {low} to plus {high} points.} above {The {level} range runs from plus {low} to plus {high} points.} other {The {level} range runs from minus {high} to minus {low} points.}}} other {The {level} range runs from {low} to {high}.}}',
    wider:
      '{claim, select, lead {{widerSpan, select, across {If weighting cost more, it would run from {widerLow} {widerLowCount, plural, one {point} other {points}} more for {b} to {widerHigh} {widerHighCount, plural, one {point} other {points}} more for {a}.} other {If weighting cost more, it would run from {widerLow} to {widerHigh} {widerHighCount, plural, one {point} other {points}} more for {a}.}}} leadChange {{widerSpan, select, across {If weighting cost more, it would run from {widerLow} {widerLowCount, plural, one {point} other {points}} towards {away} to {widerHigh} {widerHighCount, plural, one {point} other {points}} towards {toward}.} other {If weighting cost more, it would run from {widerLow} to {widerHigh} {widerHighCount, plural, one {point} other {points}} towards {toward}.}}} change {{widerSpan, select, across {If weighting cost more, it would run from minus {widerLow} to plus {widerHigh} points.} above {If weighting cost more, it would run from plus {widerLow} to plus {widerHigh} points.} other {If weighting cost more, it would run from minus {widerHigh} to minus {widerLow} points.}}} other {If weighting cost more, it would run from {widerLow} to {widerHigh}.}}',
    fieldwork:
      '{pollsterStart} surveyed {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}} {longSpan, select, day {on {startLong}} other {from {startShort} to {endLong}}}.',
  },
  terms: {
    percent: '{n} percent',
    quoted: '“{name}”',
    notDisclosed: 'not disclosed',
    half: 'half',
    threshold: 'the {pct} threshold',
    numbers: ['zero', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'],
    population: {
      adults: 'adults',
      'registered-voters': 'registered voters',
      'likely-voters': 'likely voters',
      unknown: 'people',
    },
    mode: {
      'live-telephone': 'by live telephone',
      'recorded-telephone': 'by recorded telephone calls',
      'face-to-face': 'face to face',
      online: 'online',
      post: 'by post',
      mixed: 'by a mix of modes',
    },
    sample: {
      probability: 'a probability sample',
      quota: 'a quota sample',
      'opt-in': 'an opt-in panel',
      blended: 'part random, part opt-in',
      unknown: 'not stated',
    },
    thresholdBase: {
      'votes-cast': 'all votes cast',
      'valid-votes': 'valid votes only',
      'registered-voters': 'all registered voters',
      answers: 'everyone asked',
    },
    secondTest: {
      score: 'score test',
      'exact-sign': 'exact sign test',
      pooled: 'pooled test',
      newcombe: 'hybrid score interval',
      fisher: 'Fisher’s exact test',
      'exact-binomial': 'exact binomial test',
    },
    particular: {
      sponsor: 'the sponsor',
      population: 'who was asked',
      n: 'how many were asked',
      mode: 'how they were asked',
    },
  },
};
