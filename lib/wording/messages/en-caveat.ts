import type { LanguagePack } from '../language-pack';
import { QUANTITY } from './en-parts';

/**
 * Who was asked, by whom, for whom, how and when; what kind of sample; whose margin it is and of what; other error.
 * Minimum contents: common practice, no source. "Sampling error only": AAPOR's advice to journalists, from memory.
 * Total error about twice the stated margins: Shirani-Mehr, Rothschild, Goel and Gelman, JASA 113 (2018) 607–614.
 */
export const EN_CAVEAT: LanguagePack['caveat'] = {
  fieldwork:
    '{pollsterStart} surveyed {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}} {dateSpan, select, wider {from {start} to {end}} other {on {dates}}}{sponsored, select, given { for {sponsor}} own { on its own account} other {}}.',
  earlier:
    'The earlier poll{samePollster, select, yes {} other {, by {prevPollster},}} surveyed {prevSized, select, yes {{prevN} {prevPopulation}} other {{prevPopulation}}} {prevDateSpan, select, wider {from {prevStart} to {prevEnd}} other {on {prevDates}}}.',
  'not-disclosed': 'Not disclosed: {items}.',
  'not-recorded': 'Not recorded by {newsroom}: {items}.',
  'sample-random':
    '{design, select, weighted {The sample was drawn at random and the results are weighted.} clustered {The sample was drawn at random, in clusters.} unweighted {The sample was drawn at random and the results are not weighted.} other {The sample was drawn at random; whether the results are weighted is not known.}}',
  'sample-not-random':
    '{drawn, select, unknown {How the sample was drawn is not stated, so no margin of sampling error is claimed.} other {The sample was not drawn at random ({sample}), so no margin of sampling error is claimed.}}',
  'sample-modelled':
    '{drawn, select, unknown {How the sample was drawn is not stated.} other {The sample was not drawn at random ({sample}).}} {pollsterStart} states a modelled interval of ±{modelled} {modelledCount, plural, one {point} other {points}} for a share; it rests on a model and is not a margin of sampling error.',
  'sample-comparison':
    '{drawn, select, unknown {How the sample was drawn is not stated.} other {The sample was not drawn at random ({sample}).}} The margin given here is worked out as if it had been, for comparison only, under {comparisonRule}; it is not a margin of sampling error.',
  margin: `{stated, select, given {{pollsterStart} states ±{statedPp} {statedCount, plural, one {point} other {points}} for a share{sameLevel, select, yes {} other { at {statedLevel} confidence}}; {newsroom} puts} none {{pollsterStart} states no margin; {newsroom} puts} other {{newsroomStart} puts}} ${QUANTITY} at ±{margin} {marginCount, plural, one {point} other {points}}{wider, select, yes {, or ±{widerMargin} {basis, select, modelled {within the rounding of that interval} other {if {design, select, clustered {clustering} other {weighting}} cost more}}} other {}} ({level} confidence).`,
  'margin-stated-only': `{pollsterStart} states ±{statedPp} {statedCount, plural, one {point} other {points}} for a share at {statedLevel} confidence; none is given here for ${QUANTITY}.`,
  'twice-margin':
    'The rule of thumb of twice the margin (here ±{shareMargin} {shareMarginCount, plural, one {point} other {points}} for a share) finds the difference {zone, select, above {large enough} between {between once and twice that margin} other {smaller than that margin}}; {thumb, select, agrees {{newsroom} goes by its own test of the difference.} stricter {the test of {newsroom} is stricter, since it also allows for weighting, rounding and the number of comparisons.} other {the test of {newsroom} asks less, since others or undecided people have a part.}}',
  'small-shares': 'The stated margin is for a share near half; small shares have smaller margins.',
  'margin-none': `No margin is given here for ${QUANTITY}.`,
  'errors-before-a-vote':
    'Margins cover sampling error only; studies of pre-election polls found total error about twice the stated margins.',
  errors:
    'Margins cover sampling error only; the wording of questions and the people whom the poll did not reach can move the figures too.',
  'errors-without-margin':
    'The wording of questions and the people whom the poll did not reach can move the figures.',
};
