import type { LanguagePack } from '../language-pack';
import { points, TOWARDS, WEIGHTING } from './en-parts';

type End = (name: 'low' | 'high' | 'span') => string;
const near: End = (name) => name;
const wide: End = (name) => `wider${name.charAt(0).toUpperCase()}${name.slice(1)}`;

/** From one end of a range to the other, as each kind of claim measures it. */
function ends(of: End): string {
  const [low, high, span] = [of('low'), of('high'), of('span')];
  const lead = `{${span}, select, across {{${low}} ${points(low)} more for {b} to {${high}} ${points(high)} more for {a}.} other {{${low}} to {${high}} ${points(high)} more for {a}.}}`;
  const gap = `{${span}, select, across {{${low}} ${points(low)} more among {h} to {${high}} ${points(high)} more among {g}.} other {{${low}} to {${high}} ${points(high)} more among {g}.}}`;
  const move = `{${span}, select, across {{${low}} ${points(low)} ${TOWARDS} {away} to {${high}} ${points(high)} ${TOWARDS} {toward}.} other {{${low}} to {${high}} ${points(high)} ${TOWARDS} {toward}.}}`;
  const change = `{${span}, select, across {minus {${low}} to plus {${high}} ${points(high)}.} above {plus {${low}} to plus {${high}} ${points(high)}.} other {minus {${high}} to minus {${low}} ${points(low)}.}}`;
  return `{claim, select, lead {${lead}} netScore {${lead}} leadChange {${move}} change {${change}} netScoreChange {${change}} gap {${gap}} other {{${low}} to {${high}}.}}`;
}

/** What the chart shows, for those who hear the page. */
export const EN_ALT_TEXT: LanguagePack['altText'] = {
  intro:
    '{claim, select, lead {Uncertainty chart of the difference between {a} and {b}, {race}.} change {Uncertainty chart of the change for {option}, {race}.} leadChange {Uncertainty chart of the change in the gap between {a} and {b}, {race}.} netScore {Uncertainty chart of the difference between {a} and {b}, {race}.} netScoreChange {Uncertainty chart of the change in the net {name} score, {race}.} gap {Uncertainty chart of the difference between {g} and {h} for {option}, {race}.} other {Uncertainty chart of {option} against {line}, {race}.}}',
  title: '{title}.',
  range: `The {level} range runs from ${ends(near)}`,
  wider: `{basis, select, modelled {Within the rounding of the stated interval, it could run from} other {If ${WEIGHTING} cost more, it would run from}} ${ends(wide)}`,
  fieldwork:
    '{pollsterStart} surveyed {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}} {longSpan, select, day {on {startLong}} other {from {startShort} to {endLong}}}.',
};
