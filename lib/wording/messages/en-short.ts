import type { LanguagePack } from '../language-pack';
import { points, QUANTITY, SHORT_QUANTITY, WEIGHTING } from './en-parts';

const STATES = `{pollsterStart} states ±{statedPp} ${points('stated')} for a share`;
/** The margin, and how far it could widen where that is more. */
const PLUS_MINUS = `{wider, select, yes {±{margin} to ±{widerMargin} points} other {±{margin} ${points('margin')}}}`;
const PLUS_MINUS_ALOUD = `{wider, select, yes {plus or minus {margin} points, or {widerMargin} if {basis, select, modelled {rounding is counted} other {{design, select, clustered {clustering} other {weighting}} cost more}}} other {plus or minus {margin} ${points('margin')}}}`;
const NOT_DRAWN =
  '{drawn, select, unknown {how the sample was drawn is not stated} other {the sample was not drawn at random}}';
const dates = (prefix: '' | 'prev') => {
  const slot = (name: string) => (prefix ? prefix + name.charAt(0).toUpperCase() + name.slice(1) : name);
  return `{${slot('dateSpan')}, select, wider {from {${slot('start')}} to {${slot('end')}}} other {on {${slot('dates')}}}}`;
};
const ASKED_EARLIER = `{twoPolls, select, yes {{samePollster, select, yes { and} other {, and {prevPollster}}} {prevSized, select, yes {{prevN}} other {a number not disclosed}} ${dates('prev')}} other {}}`;
const ASKED = `{pollsterStart} asked {sized, select, yes {{n} {population}} other {{population} (number not disclosed)}} ${dates('')}${ASKED_EARLIER}`;

/** The last sentence of the short caveat: whose margin of what, or why none. */
export const EN_CAVEAT_SHORT: LanguagePack['caveatShort'] = {
  margin: `{stated, select, given {${STATES}{sameLevel, select, yes {} other { at {statedLevel} confidence}}; {newsroom} puts} none {{pollsterStart} states no margin; {newsroom} puts} other {{newsroomStart} puts}} ${QUANTITY} at ${PLUS_MINUS} ({level} confidence), for sampling error only.`,
  'stated-only': `${STATES} at {statedLevel} confidence; none is given here for ${QUANTITY}.`,
  none: `No margin is given here for ${QUANTITY}.`,
  'not-random':
    '{drawn, select, unknown {How the sample was drawn is not stated} other {The sample was not drawn at random ({sample})}}, so no margin of sampling error is claimed.',
  modelled: `{drawn, select, unknown {How the sample was drawn is not stated} other {The sample was not drawn at random ({sample})}}; on the pollster’s own model, {newsroom} puts ${QUANTITY} at ${PLUS_MINUS} ({level} confidence).`,
  comparison: `{drawn, select, unknown {How the sample was drawn is not stated} other {The sample was not drawn at random ({sample})}}; worked out as if it had been, under {comparisonRule}, ${QUANTITY} has a margin of ${PLUS_MINUS} ({level} confidence).`,
};

/** One sentence for a caption or an aside. */
export const EN_ONE_BREATH: LanguagePack['oneBreath'] = {
  margin: `${ASKED}; {newsroom} puts ${SHORT_QUANTITY} at ${PLUS_MINUS}.`,
  'stated-only': `${ASKED}; its ±{statedPp} ${points('stated')} is for a share, not for ${SHORT_QUANTITY}.`,
  none: `${ASKED}; no margin is given for ${SHORT_QUANTITY}.`,
  'not-random': `${ASKED}; ${NOT_DRAWN}, so no margin is claimed.`,
  modelled: `${ASKED}; {newsroom} puts ${SHORT_QUANTITY} at ${PLUS_MINUS}, on the pollster’s own model.`,
  comparison: `${ASKED}; ${SHORT_QUANTITY} has ${PLUS_MINUS} as if drawn at random, under {comparisonRule}.`,
};

const SPOKEN_NOT_DRAWN =
  '{drawn, select, unknown {How the sample was drawn is not stated} other {The sample was not drawn at random}}';

/** Said aloud: who asked whom, and the margin, after the finding itself. Slots hold words. */
export const EN_SPOKEN: LanguagePack['spoken'] = {
  fieldwork:
    '{pollsterStart} asked {sized, select, yes {{n} {population}} other {{population}, and does not say how many,}} {dates}.',
  margin: `{newsroomStart} puts ${SHORT_QUANTITY} at ${PLUS_MINUS_ALOUD}.`,
  'stated-only': `{pollsterStart} states plus or minus {statedPp} ${points('stated')} for a share, and ${SHORT_QUANTITY} has no margin here.`,
  none: `No margin is given for ${SHORT_QUANTITY}.`,
  'not-random': `${SPOKEN_NOT_DRAWN}, so no margin of sampling error is claimed.`,
  modelled: `${SPOKEN_NOT_DRAWN}; on the pollster’s own model, ${SHORT_QUANTITY} is given ${PLUS_MINUS_ALOUD}.`,
  comparison: `${SPOKEN_NOT_DRAWN}; worked out as if it had been, under {comparisonRule}, ${SHORT_QUANTITY} is given ${PLUS_MINUS_ALOUD}.`,
};

/** The reasons of a fragile finding where there is room for one short sentence each. */
export const EN_FRAGILE_SHORT: LanguagePack['fragileShort'] = {
  rounding: 'The result depends on how the printed figures were rounded.',
  'design-effect': `The result depends on how much ${WEIGHTING} costs the sample.`,
  'second-test': 'A second accepted test does not confirm it.',
  together: `The result depends on rounding and ${WEIGHTING} together.`,
  modelled: 'The result rests on the pollster’s own model of its error.',
  comparison: 'The result is worked out as if the sample had been drawn at random.',
};

export const EN_NEWSLETTER: LanguagePack['newsletter'] = { line: '{race}: {line}' };

/** What was wrong, what is right, and what the right figures support. Rule of correcting openly: SPJ Code, from memory. */
export const EN_CORRECTION: LanguagePack['correction'] = {
  intro:
    'Correction, {on}: {count, plural, =0 {words of an earlier version of this report about the poll by {pollster} were withdrawn} one {an earlier version of this report gave a wrong particular of the poll by {pollster}} other {an earlier version of this report gave wrong particulars of the poll by {pollster}}}.',
  share: 'It put {option} at {was}; the right figure is {is}.',
  'earlier-share': 'It put {option} at {was} in {prevPoll}; the right figure is {is}.',
  'group-share': 'It put {option} at {was} among {group}; the right figure is {is}.',
  'sample-size':
    '{wasSized, select, yes {It said that {was} people were asked} other {It did not say how many people were asked}}; {isSized, select, yes {the right number is {is}} other {the right number is not disclosed}}.',
  dates: 'It dated the interviews {was}; the right dates are {is}.',
  now: '{count, plural, =0 {What the figures support} other {What the right figures support}}: {line}',
  weaker: 'They do not support the claim that was made.',
};
