import type { LanguagePack } from '@/lib/wording/language-pack';

/** Range, detectable difference, and the reasons why a finding is fragile or was not tested. */
export const EN_LIMITS: Pick<LanguagePack, 'range' | 'detectable' | 'fragile' | 'untested'> = {
  range: {
    lead: '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the sample had been random, the range would run}} from {span, select, across {{low} {lowCount, plural, one {point} other {points}} more for {b} to {high} {highCount, plural, one {point} other {points}} more for {a}.} other {{low} to {high} {highCount, plural, one {point} other {points}} more for {a}.}}',
    change:
      '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the samples had been random, the range would run}} from {span, select, across {a fall of {low} {lowCount, plural, one {point} other {points}} to a rise of {high} {highCount, plural, one {point} other {points}}.} above {a rise of {low} {lowCount, plural, one {point} other {points}} to a rise of {high}.} other {a fall of {high} {highCount, plural, one {point} other {points}} to a fall of {low}.}}',
    'lead-change':
      '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the samples had been random, the range would run}} from {span, select, across {{low} {lowCount, plural, one {point} other {points}} towards {away} to {high} {highCount, plural, one {point} other {points}} towards {toward}.} other {{low} to {high} {highCount, plural, one {point} other {points}} towards {toward}.}}',
    threshold:
      '{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the sample had been random, the range would run}} from {low} to {high}.',
  },
  detectable:
    'A true change of {detectable} {detectableCount, plural, one {point} other {points}} would have been found four times in five; smaller ones are often missed.',
  fragile: {
    'as-printed':
      '{claim, select, lead {As printed, the gap is larger} change {As printed, the change is larger} leadChange {As printed, the change in the gap is larger} other {As printed, the distance from {line} is larger}} than {basis, select, sampling {sampling error alone would usually produce} modelled {chance alone would usually produce by the pollster’s own model} other {chance alone would usually produce in a random sample}}.',
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
      'Once weighting is counted, too few people were asked for {claim, select, lead {a comparison} change {a comparison} leadChange {a comparison} other {a test against {line}}} to mean much.',
    'few-clusters':
      'The interviews come from too few places for a margin of error to be worked out reliably.',
    'not-comparable':
      '{offered, select, no {The earlier poll did not offer the same answers, so the two are not compared.} other {The two samples were not drawn in the same way, so the two polls are not compared.}}',
    'not-disclosed':
      '{which, select, previous {The earlier poll does not disclose every figure that the comparison needs.} other {Not every figure that the comparison needs is disclosed.}}',
    'no-sign-of-error':
      'That is no sign that the figures are wrong; it means that {claim, select, lead {the difference between them} change {a change} leadChange {a change in the gap} other {the distance from {line}}} cannot be tested.',
  },
};
