import type { LanguagePack } from '../language-pack';
import { points, RANGE_RUNS } from './en-parts';

const LEAD_RANGE =
  '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the sample had been random, the range would run}} from {span, select, across {{low} {lowCount, plural, one {point} other {points}} more for {b} to {high} {highCount, plural, one {point} other {points}} more for {a}.} other {{low} to {high} {highCount, plural, one {point} other {points}} more for {a}.}}';
const CHANGE_RANGE =
  '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the samples had been random, the range would run}} from {span, select, across {a fall of {low} {lowCount, plural, one {point} other {points}} to a rise of {high} {highCount, plural, one {point} other {points}}.} above {a rise of {low} {lowCount, plural, one {point} other {points}} to a rise of {high}.} other {a fall of {high} {highCount, plural, one {point} other {points}} to a fall of {low}.}}';

/** Range, detectable difference, and the reasons why a finding is fragile or was not tested. */
export const EN_LIMITS: Pick<LanguagePack, 'range' | 'detectable' | 'fragile' | 'untested'> = {
  range: {
    lead: LEAD_RANGE,
    change: CHANGE_RANGE,
    'lead-change':
      '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the samples had been random, the range would run}} from {span, select, across {{low} {lowCount, plural, one {point} other {points}} {habit, select, US {toward} other {towards}} {away} to {high} {highCount, plural, one {point} other {points}} {habit, select, US {toward} other {towards}} {toward}.} other {{low} to {high} {highCount, plural, one {point} other {points}} {habit, select, US {toward} other {towards}} {toward}.}}',
    threshold:
      '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the sample had been random, the range would run}} from {low} to {high}.',
    'net-score': LEAD_RANGE,
    'net-score-change': CHANGE_RANGE,
    gap: `${RANGE_RUNS('samples')} {span, select, across {{low} ${points('low')} more among {h} to {high} ${points('high')} more among {g}.} other {{low} to {high} ${points('high')} more among {g}.}}`,
  },
  detectable:
    'A true {claim, select, gap {gap} other {change}} of {detectable} {detectableCount, plural, one {point} other {points}} would have been found four times in five; smaller ones are often missed.',
  fragile: {
    'as-printed':
      '{claim, select, lead {As printed, the gap is larger} change {As printed, the change is larger} leadChange {As printed, the change in the gap is larger} netScore {As printed, the gap is larger} netScoreChange {As printed, the change in the net score is larger} gap {As printed, the gap is larger} other {As printed, the distance from {line} is larger}} than {basis, select, sampling {sampling error alone would usually produce} modelled {chance alone would usually produce by the pollster’s own model} other {chance alone would usually produce in a random sample}}.',
    rounding: 'The rounding of the printed figures could undo that.',
    'design-effect':
      '{deffSource, select, assumed {A heavier cost of {design, select, clustered {clustering} other {weighting}} than {newsroom} assumes could undo that.} kish {A heavier cost of weighting than the weights alone suggest could undo that.} other {A cost of {design, select, clustered {clustering} other {weighting}} at the heavy end of what the pollster’s margin implies could undo that.}}',
    'second-test': 'A second accepted test of the same figures does not confirm it.',
    together:
      'Rounding and a heavier cost of {design, select, clustered {clustering} other {weighting}} could together undo that, though neither could alone.',
    modelled:
      'The sample was not drawn at random, so the result rests on the pollster’s own model of its error.',
    comparison:
      'The sample was not drawn at random; the result is worked out as if it had been, for comparison only.',
  },
  untested: {
    'no-sample-size':
      '{which, select, both {Neither poll says how many people were asked, so no margin of error can be worked out.} previous {The earlier poll does not say how many people were asked, so no margin of error can be worked out.} other {The poll does not say how many people were asked, so no margin of error can be worked out.}}',
    'no-sampling-basis':
      '{which, select, both {The two samples are not known to have been drawn at random, and no margin of sampling error is recognised for such samples.} previous {The sample of the earlier poll is not known to have been drawn at random, and no margin of sampling error is recognised for such a sample.} other {{drawn, select, unknown {How the sample was drawn is not stated, so no margin of sampling error can be claimed for it.} other {The sample was not drawn at random, and no margin of sampling error is recognised for such a sample.}}}}',
    'too-small':
      'Once weighting is counted, too few people were asked for {claim, select, threshold {a test against {line}} other {a comparison}} to mean much.',
    'few-clusters':
      'The interviews come from too few places for a margin of error to be worked out reliably.',
    'not-comparable':
      '{offered, select, no {The earlier poll did not offer the same answers, so the two are not compared.} other {The two samples were not drawn in the same way, so the two polls are not compared.}}',
    'not-disclosed':
      '{which, select, previous {The earlier poll does not disclose every figure that the comparison needs.} other {Not every figure that the comparison needs is disclosed.}}',
    'shared-waves':
      'The two polls share interviews that cannot be told apart, so the change between them cannot be worked out.',
    'same-people':
      'The same people were asked both times, and how many of them changed their answer is not disclosed.',
    'independent-margin': `Two separate samples of these sizes would have a margin of ±{independent} ${points('independent')} here; that of people asked twice is not known.`,
    'rebased-size':
      'The shares leave out people who made no choice, and how many were left is not disclosed.',
    'other-base': 'The rule behind {line} counts other people than these shares do.',
    'below-presentation-standard': 'At least one of the groups is too small for its share to be shown.',
    'no-sign-of-error':
      'That is no sign that the figures are wrong; it means that {claim, select, lead {the difference between them} change {a change} leadChange {a change in the gap} netScore {the difference between them} netScoreChange {a change in the net score} gap {the gap between the groups} other {the distance from {line}}} cannot be tested.',
  },
};
