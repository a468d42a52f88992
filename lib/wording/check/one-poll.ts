import type { WordingCheckInput, WordingMark } from './types';

/**
 * A headline that rests on one poll, where the desk warns of such or refuses them. One poll is a part of the trend, not
 * the news by itself: AP Stylebook polls chapter as quoted publicly and BBC Editorial Guidelines, section 10, from
 * memory.
 */
export function onePollMarks(input: WordingCheckInput): WordingMark[] {
  const { houseStyle, part, releases, polls = releases.length } = input;
  if (part !== 'headline' || polls !== 1 || houseStyle.onePollHeadlines === 'allow') return [];
  const message =
    houseStyle.onePollHeadlines === 'refuse'
      ? 'This headline rests on one poll. This desk files no such headline: put the poll in its trend, or leave the headline out.'
      : 'This headline rests on one poll. Put it in its trend where you can.';
  return [
    {
      start: 0,
      end: 0,
      phrase: '',
      rule: 'one-poll',
      grade: 'house-style',
      quoted: false,
      release: releases.length > 0 ? 0 : null,
      claim: null,
      message,
      replacement: null,
    },
  ];
}
