import type { LanguagePack } from '../language-pack';
import { EN_ALT_TEXT } from './en-alt-text';
import { EN_BODY } from './en-body';
import { EN_CAVEAT } from './en-caveat';
import { EN_CHART_TITLE } from './en-chart-title';
import { EN_HEADLINE } from './en-headline';
import { EN_LIMITS } from './en-limits';
import { EN_METHOD_NOTE } from './en-method-note';
import {
  EN_CAVEAT_SHORT,
  EN_CORRECTION,
  EN_FRAGILE_SHORT,
  EN_NEWSLETTER,
  EN_ONE_BREATH,
  EN_SPOKEN,
} from './en-short';
import { EN_SPOKEN_WORDS } from './en-spoken-words';
import { EN_TOLD } from './en-told';

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
  altText: EN_ALT_TEXT,
  told: EN_TOLD,
  fragileShort: EN_FRAGILE_SHORT,
  context: {
    others: 'Also in this poll: {others}.',
    bloc: '{bloc} counts {members} together.',
    'shared-waves':
      'The two polls share {shared} of their {window} waves; only the others make the difference between them.',
    groups:
      'The figures rest on {gSized, select, yes {{gN} interviews} other {an undisclosed number of interviews}} among {g} and {hSized, select, yes {{hN}} other {an undisclosed number}} among {h}.',
  },
  caveatShort: EN_CAVEAT_SHORT,
  oneBreath: EN_ONE_BREATH,
  spoken: EN_SPOKEN,
  newsletter: EN_NEWSLETTER,
  correction: EN_CORRECTION,
  terms: {
    percent: '{n} percent',
    perCent: '{n} per cent',
    quoted: '“{name}”',
    everyoneElse: 'everyone else',
    figure: '{name} at {share}',
    earlierPoll:
      '{spoken, select, yes {the poll{samePollster, select, yes {} other { by {prevPollster}}} that ended on {prevEnd}} other {the poll{samePollster, select, yes {} other { by {prevPollster}}} of {prevDates}}}',
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
    spoken: EN_SPOKEN_WORDS,
  },
};
