import type { ClaimMessages } from '../language-pack';
import { EN_GAP } from './en-gap';
import { EN_NET_SCORE, EN_NET_SCORE_CHANGE } from './en-net-score';
import { TOWARDS } from './en-parts';

const ASKED = '{asked, select, everyone { of everyone asked} other {}}';
const BOTH = '{a} has {aShare} and {b} {bShare}';
const LEADS = '{among, select, several {of the two, {a}} other {{a}}} leads {b}, {aShare} to {bShare}';
const leads = (before: string) =>
  `{setting, select, contest {${before === '' ? LEADS.replace('of the two', 'Of the two') : before + LEADS}, by more than chance would usually produce.} other {${before === '' ? 'More' : `${before}more`} say {a} than {b}, {aShare} to {bShare}, a larger gap than chance would usually produce.}}`;
const GAP_NOW = '{a} has {aNow} and {b} {bNow}, against {aThen} and {bThen} in {prevPoll}';
const MOVED = `as moved ${TOWARDS} {toward} since {prevPoll}: {aNow} to {bNow}, against {aThen} to {bThen}.`;

/** One sentence per finding that can stand in any line. It names no pollster and holds no symbol but those of slots. */
export const EN_TOLD: ClaimMessages = {
  lead: {
    'holds-twice': leads(''),
    holds: leads('In this poll, '),
    fragile:
      '{setting, select, contest {In this poll, {among, select, several {of the two, {a}} other {{a}}} is ahead of {b}, {aShare} to {bShare}, but the poll cannot settle it.} other {In this poll, {a} has the higher figure, {aShare} to {bShare} for {b}, but the poll cannot settle it.}}',
    level: '{a} and {b} are level in this poll, at {aShare} each.',
    'not-shown': `${BOTH}, a gap that chance alone could produce.`,
    family: `${BOTH}, a gap that chance could produce among several comparisons.`,
    untested: `{reason, select, notDisclosed {The poll does not disclose the figures needed to compare {a} and {b}.} noSamplingBasis {${BOTH} in a poll that carries no recognised margin of error.} noSampleSize {${BOTH} in a poll that does not say how many were asked.} tooSmall {${BOTH} in a poll with too few interviews to compare them.} other {${BOTH}, a gap that cannot be tested on this poll.}}`,
  },
  change: {
    'holds-twice':
      '{direction, select, more {{option} is up since {prevPoll}, from {then} to {now}.} other {{option} is down since {prevPoll}, from {then} to {now}.}}',
    holds:
      '{direction, select, more {In this poll, {option} is up since {prevPoll}, from {then} to {now}.} other {In this poll, {option} is down since {prevPoll}, from {then} to {now}.}}',
    fragile:
      '{direction, select, more {The figure for {option} is higher than in {prevPoll}, {now} against {then}, but the two polls cannot settle it.} other {The figure for {option} is lower than in {prevPoll}, {now} against {then}, but the two polls cannot settle it.}}',
    level: '{option} is at {now}, the same figure as in {prevPoll}.',
    'not-shown':
      '{option} is at {now}, against {then} in {prevPoll}, a difference that chance alone could produce.',
    family:
      '{option} is at {now}, against {then} in {prevPoll}, a difference that chance could produce among several comparisons.',
    'little-changed': '{option} is little changed since {prevPoll}, at {now} against {then}.',
    untested:
      '{reason, select, notDisclosed {The figures needed to compare {option} with {prevPoll} are not disclosed.} notComparable {{option} is at {now}, which cannot be compared with {prevPoll}.} sharedWaves {{option} is at {now}; this poll shares interviews with {prevPoll}, so the change cannot be tested.} samePeople {{option} is at {now}, against {then} in {prevPoll}; the same people were asked both times, so the change cannot be tested.} noSamplingBasis {{option} is at {now}, against {then} in {prevPoll}, with no recognised margin of error.} other {{option} is at {now}; the change since {prevPoll} cannot be tested.}}',
  },
  'lead-change': {
    'holds-twice': `The gap between {a} and {b} h${MOVED}`,
    holds: `In this poll, the gap between {a} and {b} h${MOVED}`,
    fragile: `The gap between {a} and {b} is further ${TOWARDS} {toward} than in {prevPoll}, {aNow} to {bNow} against {aThen} to {bThen}, but the two polls cannot settle it.`,
    level:
      'The gap between {a} and {b}, {aNow} to {bNow}, has the same figure as in {prevPoll}, {aThen} to {bThen}.',
    'not-shown': `${GAP_NOW}; chance alone could produce the difference in the gap.`,
    family: `${GAP_NOW}; chance could produce the difference in the gap among several comparisons.`,
    untested: `{reason, select, notDisclosed {The figures needed to compare the gap between {a} and {b} with {prevPoll} are not disclosed.} notComparable {{a} has {aNow} and {b} {bNow}, a gap that cannot be compared with {prevPoll}.} sharedWaves {{a} has {aNow} and {b} {bNow}; this poll shares interviews with {prevPoll}, so the change in the gap cannot be tested.} samePeople {${GAP_NOW}; the same people were asked both times, so the change in the gap cannot be tested.} noSamplingBasis {${GAP_NOW}, with no recognised margin of error.} other {{a} has {aNow} and {b} {bNow}; the change in the gap since {prevPoll} cannot be tested.}}`,
  },
  threshold: {
    'holds-twice': `{side, select, above {{option} is above {line}, at {share}${ASKED}, by more than chance would usually produce.} other {{option} is below {line}, at {share}${ASKED}, by more than chance would usually produce.}}`,
    holds: `{side, select, above {In this poll, {option} is above {line}, at {share}${ASKED}, by more than chance would usually produce.} other {In this poll, {option} is below {line}, at {share}${ASKED}, by more than chance would usually produce.}}`,
    fragile: `{side, select, above {In this poll, {option} is above {line}, at {share}${ASKED}, but the poll cannot settle it.} other {In this poll, {option} is below {line}, at {share}${ASKED}, but the poll cannot settle it.}}`,
    level: '{option} is exactly at {line} in this poll.',
    'not-shown': `{option} is at {share}${ASKED}, too near {line} for the poll to say on which side.`,
    family: `{option} is at {share}${ASKED}; among several tests, that is too near {line} to say on which side.`,
    untested: `{reason, select, notDisclosed {The poll does not disclose the figure for {option}.} noSamplingBasis {{option} is at {share}${ASKED} in a poll that carries no recognised margin of error.} noSampleSize {{option} is at {share}${ASKED} in a poll that does not say how many were asked.} other {{option} is at {share}${ASKED}, which cannot be tested against {line} on this poll.}}`,
  },
  'net-score': EN_NET_SCORE.told,
  'net-score-change': EN_NET_SCORE_CHANGE.told,
  gap: EN_GAP.told,
};
