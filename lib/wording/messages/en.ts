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
  comparison: {
    latest: 'It is the latest poll of this series with earlier field dates.',
    'latest-comparable':
      '{count, plural, one {It is the latest earlier poll that can be compared; a later one differs in {items}.} other {It is the latest earlier poll that can be compared; # later ones differ in {items}.}}',
    unknown: 'Not known, and not taken as different: {items}.',
    override:
      '{differing, select, yes {The two polls differ in {items}; the desk compares them all the same: {reason}} other {The desk chose the poll to compare with: {reason}}}',
  },
  altText: {
    intro:
      '{claim, select, lead {Uncertainty chart of the difference between {a} and {b}, {race}.} change {Uncertainty chart of the change for {option}, {race}.} leadChange {Uncertainty chart of the change in the gap between {a} and {b}, {race}.} other {Uncertainty chart of {option} against {line}, {race}.}}',
    title: '{title}.',
    range:
      'The {level} range runs from {claim, select, lead {{span, select, across {{low} {lowCount, plural, one {point} other {points}} more for {b} to {high} {highCount, plural, one {point} other {points}} more for {a}.} other {{low} to {high} {highCount, plural, one {point} other {points}} more for {a}.}}} leadChange {{span, select, across {{low} {lowCount, plural, one {point} other {points}} towards {away} to {high} {highCount, plural, one {point} other {points}} towards {toward}.} other {{low} to {high} {highCount, plural, one {point} other {points}} towards {toward}.}}} change {{span, select, across {minus {low} to plus {high} {highCount, plural, one {point} other {points}}.} above {plus {low} to plus {high} {highCount, plural, one {point} other {points}}.} other {minus {high} to minus {low} {lowCount, plural, one {point} other {points}}.}}} other {{low} to {high}.}}',
    wider:
      '{basis, select, modelled {Within the rounding of the stated interval, it could run from} other {If {design, select, clustered {clustering} other {weighting}} cost more, it would run from}} {claim, select, lead {{widerSpan, select, across {{widerLow} {widerLowCount, plural, one {point} other {points}} more for {b} to {widerHigh} {widerHighCount, plural, one {point} other {points}} more for {a}.} other {{widerLow} to {widerHigh} {widerHighCount, plural, one {point} other {points}} more for {a}.}}} leadChange {{widerSpan, select, across {{widerLow} {widerLowCount, plural, one {point} other {points}} towards {away} to {widerHigh} {widerHighCount, plural, one {point} other {points}} towards {toward}.} other {{widerLow} to {widerHigh} {widerHighCount, plural, one {point} other {points}} towards {toward}.}}} change {{widerSpan, select, across {minus {widerLow} to plus {widerHigh} {widerHighCount, plural, one {point} other {points}}.} above {plus {widerLow} to plus {widerHigh} {widerHighCount, plural, one {point} other {points}}.} other {minus {widerHigh} to minus {widerLow} {widerLowCount, plural, one {point} other {points}}.}}} other {{widerLow} to {widerHigh}.}}',
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
    secondTest: {
      score: 'score test',
      'exact-sign': 'exact sign test',
      pooled: 'pooled test',
      newcombe: 'hybrid score interval',
      fisher: 'Fisher’s exact test',
      'exact-binomial': 'exact binomial test',
    },
    comparable: {
      pollster: 'the pollster',
      race: 'the race',
      'question-wording': 'the wording of the question',
      'answer-options': 'the answers offered',
      population: 'who was asked',
      'likely-voter-method': 'how likely voters were found',
      mode: 'how people were asked',
      'sample-source': 'how the sample was drawn',
      'sample-supplier': 'who supplied the sample',
      'weighting-scheme': 'the weighting',
      'sponsor-kind': 'the kind of sponsor',
      're-basing': 'whether people without a choice are left out',
      'question-order': 'the order of the questions',
      'field-dates': 'the field dates',
    },
    particular: {
      sponsor: 'the sponsor',
      population: 'who was asked',
      n: 'how many were asked',
      mode: 'how they were asked',
    },
  },
};
