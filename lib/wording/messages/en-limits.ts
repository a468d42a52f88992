import type { LanguagePack } from '@/lib/wording/language-pack';

/** Range, detectable difference, and the reasons why a finding is fragile or was not tested. */
export const EN_LIMITS: Pick<LanguagePack, 'range' | 'detectable' | 'fragile' | 'untested'> = {
  range: {
    lead: '{basis, select, sampling {Allowing for sampling error} modelled {By the pollster’s own model} other {If the sample had been random}}, {span, select, across {the difference could be anything from {low} {lowCount, plural, one {point} other {points}} more for {b} to {high} {highCount, plural, one {point} other {points}} more for {a}.} other {the difference could be anything from {low} to {high} {highCount, plural, one {point} other {points}}.}}',
    change:
      '{basis, select, sampling {Allowing for sampling error} modelled {By the pollster’s own model} other {If the samples had been random}}, {span, select, across {the change could be anything from a fall of {low} {lowCount, plural, one {point} other {points}} to a rise of {high} {highCount, plural, one {point} other {points}}.} above {the change could be anything from a rise of {low} {lowCount, plural, one {point} other {points}} to a rise of {high}.} other {the change could be anything from a fall of {high} {highCount, plural, one {point} other {points}} to a fall of {low}.}}',
    'lead-change':
      '{basis, select, sampling {Allowing for sampling error} modelled {By the pollster’s own model} other {If the samples had been random}}, {span, select, across {the change in the gap could be anything from {low} {lowCount, plural, one {point} other {points}} towards {away} to {high} {highCount, plural, one {point} other {points}} towards {toward}.} other {the change in the gap could be anything from {low} to {high} {highCount, plural, one {point} other {points}} towards {toward}.}}',
    threshold:
      '{basis, select, sampling {Allowing for sampling error} modelled {By the pollster’s own model} other {If the sample had been random}}, the share could be anything from {low} to {high}.',
  },
  detectable:
    'A true change of {detectable} {detectableCount, plural, one {point} other {points}} would have been found four times in five; smaller ones are often missed.',
  fragile: {
    rounding:
      '{claim, select, lead {The printed gap} change {The printed change} leadChange {The printed change in the gap} other {The printed distance from {line}}} is larger than sampling error alone would usually produce, but not once the rounding of the figures is allowed for.',
    'design-effect':
      '{claim, select, lead {The gap} change {The change} leadChange {The change in the gap} other {The distance from {line}}} is larger than sampling error alone would usually produce if {deffSource, select, assumed {weighting cost the sample as much precision as {newsroom} assumes} kish {weighting cost the sample as much precision as the weights alone suggest} other {weighting cost the sample as much precision as the pollster’s margin implies}}, but not if it cost more.',
    'second-test': 'A second accepted test of the same figures does not confirm it.',
    together:
      'Neither rounding nor a heavier cost of weighting would overturn this alone; both together could.',
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
