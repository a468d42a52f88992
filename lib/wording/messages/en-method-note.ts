import type { LanguagePack } from '../language-pack';

/** How the finding was worked out, for the foot of an article: formal, complete, one sentence per item. */
export const EN_METHOD_NOTE: LanguagePack['methodNote'] = {
  question: 'Question asked: “{question}”{ended, select, yes {} other {.}}',
  'no-choice': 'Without a choice: {shares}.',
  'compared-with':
    'Compared with the poll by {prevPollster}{prevPopulated, select, yes { of {prevPopulation}} other {}}, {prevDatesLong}{prevSized, select, yes { ({prevN} asked)} other { (number asked not disclosed)}}.',
  'shared-waves':
    'The two polls are averages of {window} waves each, of which they share {shared}; only the waves that they do not share make the difference.{equal, select, yes { Every wave is taken to have as many interviews.} other {}}{pooled, select, yes { Shares of single waves are not disclosed; one pooled share stands for them.} other {}}',
  rebased: 'Shares are of the {rebasedN} people who made a choice.',
  bloc: '{source, select, printed {The figure for {bloc} is that of the pollster’s tables for {members}.} other {The figure for {bloc} is the sum of the printed shares of {members}.}}',
  'net-score':
    'A net score has the margin of a gap, not that of a share; it moves two points when one point of opinion crosses over.',
  design:
    '{poll, select, earlier {Design effect of the earlier poll} group {Design effect among {group}} other {Design effect}}: {deff}, worked out from the design of the sample.',
  kish: '{poll, select, earlier {Design effect of the earlier poll} group {Design effect among {group}} other {Design effect}}: {deff} from the weights alone, taken as {deffLow} to {deffHigh}.',
  stated:
    '{poll, select, earlier {Design effect of the earlier poll} group {Design effect among {group}} other {Design effect}}: {deff}, as stated by {pollster}.',
  implied:
    '{poll, select, earlier {Design effect of the earlier poll} group {Design effect among {group}} other {Design effect}}: {deff}, implied by the {stated, select, modelled {modelled interval} other {margin}} that {pollster} states ({deffLow} to {deffHigh} within its rounding).',
  assumed:
    '{poll, select, earlier {Design effect of the earlier poll} group {Design effect among {group}} other {Design effect}}: {deff} assumed by {newsroom}{ranged, select, yes {, taken as {deffLow} to {deffHigh}} other {}}.',
  'stated-margin-like-unweighted':
    'The margin that {pollster} states{poll, select, earlier { for the earlier poll} other {}} cannot be told from one that ignores weighting and was not used.',
  'one-deff': 'One overall design effect for every share and difference is an approximation.',
  test: 'Two-sided test at the {level} level: {z, select, none {{p}} other {z = {z}, {p}}}.',
  family:
    'It is one of {count} tests made together, with levels by Holm’s method; adjusted for that, {pAdjusted}.',
  'second-test':
    'Second test ({name}): {measure, select, p {{p}} other {{low} to {high} points}}, {passes, select, yes {passes} other {does not pass}}.',
  rounding:
    'Rounding of the printed figures: ±{rounding} {roundingCount, plural, one {point} other {points}} allowed for.',
  'breaking-deff':
    '{settled, select, yes {At the printed figures the result would no longer pass at a design effect of {breaking} or more.} other {At the printed figures the result would pass only at a design effect below {breaking}.}}',
  'breaking-factor':
    '{settled, select, yes {At the printed figures the result would no longer pass if both design effects were {breaking} times as large or larger.} other {At the printed figures the result would pass only if both design effects were below {breaking} times what they are.}}',
  'lower-deff': 'At the low end of the range of the design effect it would pass.',
  detectable:
    'A true {claim, select, lead {gap} change {change} leadChange {change in the gap} netScore {net score} netScoreChange {change in the net score} gap {gap} other {distance from the threshold}} of {detectable} {detectableCount, plural, one {point} other {points}} would have been found four times in five.',
  'little-changed':
    'Little changed: both one-sided tests against a change of {indifference} {indifferenceCount, plural, one {point} other {points}}, set beforehand, pass.',
  exaggerated: 'Changes that pass such a test are on average somewhat exaggerated.',
  untested: 'No test was made.',
  source: 'Source: {url}',
  engine: 'Worked out with calculation engine {engine} and wording {templateVersion}.',
  'before-a-vote':
    'Polls measure opinion at the time. Local law may restrict what is published and when: ask the desk’s lawyers and the election authority. Official results are those that the election authority certifies.',
  opinion: 'Polls measure opinion at the time.',
};
