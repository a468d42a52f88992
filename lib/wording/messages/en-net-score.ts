import type { ClaimMessages } from '../language-pack';
import { ALLOWING, A_POLL, IN_THE_EARLIER, POLL, TWO_POLLS, chanceAlone, percentagePoints } from './en-parts';

type Messages<K extends keyof ClaimMessages> = Record<
  'headline' | 'body' | 'chartTitle' | 'told',
  ClaimMessages[K]
>;

const BOTH = '{a} {aShare}, {b} {bShare}';
const MORE = 'ore say {a} than {b}, {aShare} to {bShare}, a net score of {net}';

/** A net score is told as the gap it is: which of the two more people say, with the score beside it. */
export const EN_NET_SCORE: Messages<'net-score'> = {
  headline: {
    'holds-twice': `M${MORE}, poll by {pollster} suggests`,
    holds: 'More say {a} than {b} in poll by {pollster}, {aShare} to {bShare}, a net score of {net}',
    fragile: '{a} higher than {b} in poll by {pollster}, {aShare} to {bShare}, but the poll cannot settle it',
    level: '{a} and {b} level in poll by {pollster}, at {aShare} each',
    'not-shown': `${BOTH} in poll by {pollster}: a net score that chance alone could produce`,
    family: `${BOTH} in poll by {pollster}: among several, chance could produce this net score`,
    untested: `{reason, select, notDisclosed {Poll by {pollster} leaves out figures needed for a net {name} score} noSamplingBasis {${BOTH} in poll by {pollster} that carries no recognised margin of error} noSampleSize {${BOTH} in poll by {pollster} that does not say how many were asked} tooSmall {${BOTH} in poll by {pollster} with too few interviews to compare them} other {${BOTH} in poll by {pollster}: the net score cannot be tested}}`,
  },
  body: {
    'holds-twice': `M${MORE}, ${A_POLL} suggests. The gap would be larger than chance would usually produce even if the poll’s total error were twice its sampling error.`,
    holds: `In ${POLL}, m${MORE}. That is a larger gap than sampling error alone would usually produce, also allowing for ${ALLOWING}.`,
    fragile: `In ${POLL}, {a} has the higher figure, {aShare} to {bShare} for {b}, a net {name} score of {net}, but the poll cannot settle it.`,
    level: `{a} and {b} are level in ${POLL}, at {aShare} each, a net score of zero. Equal figures do not mean that opinion is evenly split.`,
    'not-shown': `{a} has {aShare} and {b} {bShare} in ${POLL}, a net {name} score of {net}. ${chanceAlone('could produce a gap of that size', 'in a random sample')}.`,
    family: `{a} has {aShare} and {b} {bShare} in ${POLL}, a net {name} score of {net}. It is one of several comparisons made with the same poll, and among so many, chance alone could produce a gap of that size.`,
    untested: `{known, select, yes {${POLL.replace('this', 'This')} puts {a} at {aShare} and {b} at {bShare}, a net {name} score of {net}.} other {${POLL.replace('this', 'This')} does not disclose the figures needed for a net {name} score.}}`,
  },
  chartTitle: {
    'holds-twice': `M${MORE}`,
    holds: 'More say {a} than {b} in this poll, {aShare} to {bShare}, a net score of {net}',
    fragile:
      '{a} has the higher figure in this poll, {aShare} to {bShare} for {b}, but the poll cannot settle it',
    level: '{a} and {b} are level in this poll, at {aShare} each',
    'not-shown': `${BOTH}: chance alone could produce this net score`,
    family: `${BOTH}: chance could produce this net score among several comparisons`,
    untested: `{reason, select, notDisclosed {Net {name} score: figures not disclosed} noSamplingBasis {${BOTH}, with no recognised margin of error} other {${BOTH}: the net score cannot be tested}}`,
  },
  told: {
    'holds-twice': `M${MORE}, more than chance would usually produce.`,
    holds: `In this poll, m${MORE}, more than chance would usually produce.`,
    fragile:
      'In this poll, {a} has the higher figure, {aShare} to {bShare} for {b}, but the poll cannot settle it.',
    level: '{a} and {b} are level in this poll, at {aShare} each.',
    'not-shown':
      '{a} has {aShare} and {b} {bShare}, a net {name} score of {net} that chance alone could produce.',
    family:
      '{a} has {aShare} and {b} {bShare}, a net {name} score of {net} that chance could produce among several comparisons.',
    untested:
      '{reason, select, notDisclosed {The poll does not disclose the figures needed for a net {name} score.} noSamplingBasis {{a} has {aShare} and {b} {bShare} in a poll that carries no recognised margin of error.} noSampleSize {{a} has {aShare} and {b} {bShare} in a poll that does not say how many were asked.} other {{a} has {aShare} and {b} {bShare}, a net {name} score that cannot be tested on this poll.}}',
  },
};

const NET_NOW = 'The net {name} score is {netNow}';
const MOVE = `{move} ${percentagePoints('move')}`;
const upOrDown = (write: (word: 'up' | 'down', noun: 'rise' | 'fall') => string) =>
  `{direction, select, more {${write('up', 'rise')}} other {${write('down', 'fall')}}}`;
const higherOrLower = (write: (word: 'higher' | 'lower') => string) =>
  `{direction, select, more {${write('higher')}} other {${write('lower')}}}`;

/** The change of a net score: a direction with its interval, as the change of a share. */
export const EN_NET_SCORE_CHANGE: Messages<'net-score-change'> = {
  headline: {
    'holds-twice': upOrDown(
      (word) => `Net {name} score ${word} since {prevDates}, polls by {pollsters} suggest`,
    ),
    holds: upOrDown((word) => `Net {name} score ${word} since {prevDates} in polls by {pollsters}`),
    fragile: higherOrLower(
      (word) =>
        `Net {name} score ${word} than on {prevDates}, {netNow} to {netThen}, but polls by {pollsters} cannot settle it`,
    ),
    level: 'Net {name} score at {netNow} in poll by {pollster}, the same figure as on {prevDates}',
    'not-shown':
      'Net {name} score {netNow} in poll by {pollster}, {netThen} on {prevDates}: chance alone could explain it',
    family:
      'Net {name} score {netNow} in poll by {pollster}, {netThen} on {prevDates}: among several, chance could explain it',
    untested:
      '{reason, select, notDisclosed {Polls by {pollsters} leave out figures needed to compare net {name} scores} notComparable {Net {name} score {netNow} in poll by {pollster}; it cannot be compared with the poll of {prevDates}} noSamplingBasis {Net {name} score {netNow} in poll by {pollster} that carries no recognised margin of error} other {Net {name} score {netNow} in poll by {pollster}; the change since {prevDates} cannot be tested}}',
  },
  body: {
    'holds-twice': upOrDown(
      (word, noun) =>
        `The net {name} score is ${word} since {prevDates}, from {netThen} to {netNow}, ${TWO_POLLS} suggest. The ${noun} would be larger than chance would usually produce even if the total error of the polls were twice their sampling error.`,
    ),
    holds: upOrDown(
      (word, noun) =>
        `In ${POLL}, the net {name} score is ${word}, from {netThen} ${IN_THE_EARLIER} to {netNow}. The ${noun} is larger than sampling error alone would usually produce, also allowing for ${ALLOWING}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `The net {name} score is ${word} in ${POLL}, {netNow} against {netThen} ${IN_THE_EARLIER}, but the two polls cannot settle it.`,
    ),
    level: `${NET_NOW} in ${POLL}, the same figure as ${IN_THE_EARLIER}. Equal figures do not mean that opinion stood still.`,
    'not-shown': `${NET_NOW} in ${POLL}, against {netThen} ${IN_THE_EARLIER}. ${chanceAlone(`could produce a difference of ${MOVE}`, 'between two random samples')}.`,
    family: `${NET_NOW} in ${POLL}, against {netThen} ${IN_THE_EARLIER}. It is one of several comparisons made between the two polls, and among so many, chance alone could produce a difference of ${MOVE}.`,
    untested: `{known, select, both {${NET_NOW} in ${POLL}, against {netThen} ${IN_THE_EARLIER}.} now {${NET_NOW} in ${POLL}.} other {${POLL.replace('this', 'This')} does not disclose the figures needed for a net {name} score.}}`,
  },
  chartTitle: {
    'holds-twice': upOrDown((word) => `The net {name} score is ${word} since {prevDates}`),
    holds: upOrDown((word) => `The net {name} score is ${word} in this poll since {prevDates}`),
    fragile: higherOrLower(
      (word) => `The net {name} score is ${word} than on {prevDates}, but the polls cannot settle it`,
    ),
    level: 'The net {name} score has the same figure as on {prevDates}',
    'not-shown':
      'Net {name} score {netNow}, against {netThen} on {prevDates}: chance alone could produce this difference',
    family:
      'Net {name} score {netNow}, against {netThen} on {prevDates}: chance could produce this difference among several comparisons',
    untested:
      '{reason, select, notDisclosed {Net {name} score: figures not disclosed} notComparable {Net {name} score {netNow}; not comparable with {prevDates}} noSamplingBasis {Net {name} score {netNow}, with no recognised margin of error} other {Net {name} score {netNow}: the change since {prevDates} cannot be tested}}',
  },
  told: {
    'holds-twice': upOrDown(
      (word) => `The net {name} score is ${word} since {prevPoll}, from {netThen} to {netNow}.`,
    ),
    holds: upOrDown(
      (word) => `In this poll, the net {name} score is ${word} since {prevPoll}, from {netThen} to {netNow}.`,
    ),
    fragile: higherOrLower(
      (word) =>
        `The net {name} score is ${word} than in {prevPoll}, {netNow} against {netThen}, but the two polls cannot settle it.`,
    ),
    level: `${NET_NOW}, the same figure as in {prevPoll}.`,
    'not-shown': `${NET_NOW}, against {netThen} in {prevPoll}, a difference that chance alone could produce.`,
    family: `${NET_NOW}, against {netThen} in {prevPoll}, a difference that chance could produce among several comparisons.`,
    untested: `{reason, select, notDisclosed {The figures needed to compare the net {name} score with {prevPoll} are not disclosed.} notComparable {${NET_NOW}, which cannot be compared with {prevPoll}.} sharedWaves {${NET_NOW}; this poll shares interviews with {prevPoll}, so the change cannot be tested.} samePeople {${NET_NOW}, against {netThen} in {prevPoll}; the same people were asked both times, so the change cannot be tested.} noSamplingBasis {${NET_NOW}, against {netThen} in {prevPoll}, with no recognised margin of error.} other {${NET_NOW}; the change since {prevPoll} cannot be tested.}}`,
  },
};
