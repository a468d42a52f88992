import type { ClaimMessages } from '../language-pack';
import { EN_GAP } from './en-gap';
import { EN_NET_SCORE, EN_NET_SCORE_CHANGE } from './en-net-score';

/** Chart titles: the chart names pollster and dates beneath, the title says how far the picture goes. */
export const EN_CHART_TITLE: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {{among, select, several {Of the two, {a}} other {{a}}} leads {b}, {aShare} to {bShare}} other {More say {a} than {b}, {aShare} to {bShare}}}',
    holds:
      '{setting, select, contest {{among, select, several {Of the two, {a}} other {{a}}} leads {b} in this poll, {aShare} to {bShare}} other {More say {a} than {b} in this poll, {aShare} to {bShare}}}',
    fragile:
      '{setting, select, contest {{among, select, several {Of the two, {a}} other {{a}}} is ahead of {b} in this poll, {aShare} to {bShare}, but the poll cannot settle it} other {{a} has the higher figure in this poll, {aShare} to {bShare} for {b}, but the poll cannot settle it}}',
    level: '{a} and {b} are level in this poll, at {aShare} each',
    'not-shown': '{a} {aShare}, {b} {bShare}: chance alone could produce this gap',
    family: '{a} {aShare}, {b} {bShare}: chance could produce this gap among several comparisons',
    untested:
      '{reason, select, notDisclosed {{a} and {b}: figures not disclosed} noSamplingBasis {{a} {aShare}, {b} {bShare}, with no recognised margin of error} other {{a} {aShare}, {b} {bShare}: the gap cannot be tested}}',
  },
  change: {
    'holds-twice':
      '{direction, select, more {{option} is up since {prevDates}} other {{option} is down since {prevDates}}}',
    holds:
      '{direction, select, more {{option} is up in this poll since {prevDates}} other {{option} is down in this poll since {prevDates}}}',
    fragile:
      '{direction, select, more {{option} has a higher figure than on {prevDates}, but the polls cannot settle it} other {{option} has a lower figure than on {prevDates}, but the polls cannot settle it}}',
    level: '{option} has the same figure as on {prevDates}',
    'not-shown':
      '{option} at {now}, against {then} on {prevDates}: chance alone could produce this difference',
    family:
      '{option} at {now}, against {then} on {prevDates}: chance could produce this difference among several comparisons',
    'little-changed': '{option} is little changed since {prevDates}',
    untested:
      '{reason, select, notDisclosed {{option}: figures not disclosed} notComparable {{option} at {now}; not comparable with {prevDates}} noSamplingBasis {{option} at {now}, with no recognised margin of error} other {{option} at {now}: the change since {prevDates} cannot be tested}}',
  },
  'lead-change': {
    'holds-twice':
      'The gap between {a} and {b} has moved {habit, select, US {toward} other {towards}} {toward} since {prevDates}',
    holds:
      'The gap between {a} and {b} has moved {habit, select, US {toward} other {towards}} {toward} in this poll since {prevDates}',
    fragile:
      'The gap between {a} and {b} is further {habit, select, US {toward} other {towards}} {toward} than on {prevDates}, but the polls cannot settle it',
    level: 'The gap between {a} and {b} is at the same figure as on {prevDates}',
    'not-shown':
      'The gap between {a} and {b}, compared with {prevDates}: chance alone could produce the difference',
    family:
      'The gap between {a} and {b}, compared with {prevDates}: chance could produce the difference among several comparisons',
    untested:
      '{reason, select, notDisclosed {The gap between {a} and {b}: figures not disclosed} notComparable {The gap between {a} and {b}: not comparable with {prevDates}} noSamplingBasis {The gap between {a} and {b}, with no recognised margin of error} other {The gap between {a} and {b}: the change since {prevDates} cannot be tested}}',
  },
  threshold: {
    'holds-twice':
      '{side, select, above {{option} is above {line}, at {share}{asked, select, everyone { of everyone asked} other {}}} other {{option} is below {line}, at {share}{asked, select, everyone { of everyone asked} other {}}}}',
    holds:
      '{side, select, above {{option} is above {line} in this poll, at {share}{asked, select, everyone { of everyone asked} other {}}} other {{option} is below {line} in this poll, at {share}{asked, select, everyone { of everyone asked} other {}}}}',
    fragile:
      '{side, select, above {{option} is above {line} in this poll, at {share}{asked, select, everyone { of everyone asked} other {}}, but the poll cannot settle it} other {{option} is below {line} in this poll, at {share}{asked, select, everyone { of everyone asked} other {}}, but the poll cannot settle it}}',
    level: '{option} is exactly at {line} in this poll',
    'not-shown':
      '{option} at {share}{asked, select, everyone { of everyone asked} other {}}: too near {line} to say on which side',
    family:
      '{option} at {share}{asked, select, everyone { of everyone asked} other {}}: too near {line} to say on which side',
    untested:
      '{reason, select, notDisclosed {{option}: figure not disclosed} noSamplingBasis {{option} at {share}, with no recognised margin of error} other {{option} at {share}: cannot be tested against {line}}}',
  },
  'net-score': EN_NET_SCORE.chartTitle,
  'net-score-change': EN_NET_SCORE_CHANGE.chartTitle,
  gap: EN_GAP.chartTitle,
};
