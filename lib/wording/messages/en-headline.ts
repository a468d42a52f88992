import type { ClaimMessages } from '../language-pack';
import { EN_GAP } from './en-gap';
import { EN_NET_SCORE, EN_NET_SCORE_CHANGE } from './en-net-score';

/** Headline claims: no full stop, the pollster always named, no size of a change without its range. */
export const EN_HEADLINE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {{among, select, several {Of the two, {a}} other {{a}}} leads {b}, {aShare} to {bShare}, poll by {pollster} suggests} other {More say {a} than {b}, {aShare} to {bShare}, poll by {pollster} suggests}}',
    holds:
      '{setting, select, contest {{among, select, several {Of the two, {a}} other {{a}}} leads {b} in poll by {pollster}, {aShare} to {bShare}} other {More say {a} than {b} in poll by {pollster}, {aShare} to {bShare}}}',
    fragile:
      '{setting, select, contest {{among, select, several {Of the two, {a}} other {{a} is}} ahead of {b} in poll by {pollster}, {aShare} to {bShare}, but the poll cannot settle it} other {{a} higher than {b} in poll by {pollster}, {aShare} to {bShare}, but the poll cannot settle it}}',
    level: '{a} and {b} level in poll by {pollster}, at {aShare} each',
    'not-shown': '{a} {aShare}, {b} {bShare} in poll by {pollster}: a gap that chance alone could produce',
    family:
      '{a} {aShare}, {b} {bShare} in poll by {pollster}: among several gaps, chance could produce this one',
    untested:
      '{reason, select, notDisclosed {Poll by {pollster} leaves out figures needed to compare {a} and {b}} noSamplingBasis {{a} {aShare}, {b} {bShare} in poll by {pollster} that carries no recognised margin of error} noSampleSize {{a} {aShare}, {b} {bShare} in poll by {pollster} that does not say how many were asked} tooSmall {{a} {aShare}, {b} {bShare} in poll by {pollster} with too few interviews to compare them} other {{a} {aShare}, {b} {bShare} in poll by {pollster}: the gap cannot be tested}}',
  },
  change: {
    'holds-twice':
      '{direction, select, more {{option} up since {prevDates}, polls by {pollsters} suggest} other {{option} down since {prevDates}, polls by {pollsters} suggest}}',
    holds:
      '{direction, select, more {{option} up since {prevDates} in polls by {pollsters}} other {{option} down since {prevDates} in polls by {pollsters}}}',
    fragile:
      '{direction, select, more {{option} higher than on {prevDates}, {now} against {then}, but polls by {pollsters} cannot settle it} other {{option} lower than on {prevDates}, {now} against {then}, but polls by {pollsters} cannot settle it}}',
    level: '{option} at {now} in poll by {pollster}, the same figure as on {prevDates}',
    'not-shown':
      '{option} {now} in poll by {pollster}, {then} on {prevDates}: chance alone could produce the difference',
    family:
      '{option} {now} in poll by {pollster}, {then} on {prevDates}: chance could produce it among several',
    'little-changed': '{option} little changed since {prevDates} in polls by {pollsters}',
    untested:
      '{reason, select, notDisclosed {Polls by {pollsters} leave out figures needed to compare {option} with {prevDates}} notComparable {{option} at {now} in poll by {pollster}; it cannot be compared with the poll of {prevDates}} noSamplingBasis {{option} at {now} in poll by {pollster} that carries no recognised margin of error} other {{option} at {now} in poll by {pollster}; the change since {prevDates} cannot be tested}}',
  },
  'lead-change': {
    'holds-twice':
      'Gap between {a} and {b} has moved {habit, select, US {toward} other {towards}} {toward} since {prevDates}, polls by {pollsters} suggest',
    holds:
      'Gap between {a} and {b} has moved {habit, select, US {toward} other {towards}} {toward} since {prevDates} in polls by {pollsters}',
    fragile:
      '{a}–{b} gap further {habit, select, US {toward} other {towards}} {toward} than on {prevDates}, but polls by {pollsters} cannot settle it',
    level: 'Gap between {a} and {b} at the same figure as on {prevDates} in poll by {pollster}',
    'not-shown':
      '{a}–{b} gap in poll by {pollster}: chance alone could explain the difference from {prevDates}',
    family: '{a}–{b} gap in poll by {pollster}: one of several differences that chance could explain',
    untested:
      '{reason, select, notDisclosed {Polls by {pollsters} leave out figures needed to compare the gap between {a} and {b}} notComparable {{a} {aNow}, {b} {bNow} in poll by {pollster}; the gap cannot be compared with the poll of {prevDates}} noSamplingBasis {{a} {aNow}, {b} {bNow} in poll by {pollster} that carries no recognised margin of error} other {{a} {aNow}, {b} {bNow} in poll by {pollster}; the change in the gap since {prevDates} cannot be tested}}',
  },
  threshold: {
    'holds-twice':
      '{side, select, above {{option} above {line}, at {share}{asked, select, everyone { of everyone asked} other {}}, poll by {pollster} suggests} other {{option} below {line}, at {share}{asked, select, everyone { of everyone asked} other {}}, poll by {pollster} suggests}}',
    holds:
      '{side, select, above {{option} above {line} in poll by {pollster}, at {share}{asked, select, everyone { of everyone asked} other {}}} other {{option} below {line} in poll by {pollster}, at {share}{asked, select, everyone { of everyone asked} other {}}}}',
    fragile:
      '{side, select, above {{option} above {line} in poll by {pollster}, at {share}{asked, select, everyone { of everyone asked} other {}}, but the poll cannot settle it} other {{option} below {line} in poll by {pollster}, at {share}{asked, select, everyone { of everyone asked} other {}}, but the poll cannot settle it}}',
    level: '{option} exactly at {line} in poll by {pollster}',
    'not-shown':
      '{option} at {share}{asked, select, everyone { of everyone asked} other {}} in poll by {pollster}, too near {line} to say on which side',
    family:
      '{option} at {share}{asked, select, everyone { of everyone asked} other {}} in poll by {pollster}, too near {line} to say on which side',
    untested:
      '{reason, select, notDisclosed {Poll by {pollster} leaves out the figure for {option}} noSamplingBasis {{option} at {share} in poll by {pollster} that carries no recognised margin of error} noSampleSize {{option} at {share} in poll by {pollster} that does not say how many were asked} tooSmall {{option} at {share} in poll by {pollster} with too few interviews to set against {line}} other {{option} at {share} in poll by {pollster}, which cannot be tested against {line}}}',
  },
  'net-score': EN_NET_SCORE.headline,
  'net-score-change': EN_NET_SCORE_CHANGE.headline,
  gap: EN_GAP.headline,
};
