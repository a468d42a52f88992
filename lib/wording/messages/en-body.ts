import type { ClaimMessages } from '../language-pack';
import { EN_GAP } from './en-gap';
import { EN_NET_SCORE, EN_NET_SCORE_CHANGE } from './en-net-score';

/** The first sentences of a body: what the poll found. Range, reasons and limits follow as sentences of their own. */
export const EN_BODY: ClaimMessages = {
  lead: {
    'holds-twice':
      '{setting, select, contest {{among, select, several {Of the two, {a}} other {{a}}} leads {b} by {gap} percentage {gapCount, plural, one {point} other {points}}, {aShare} to {bShare}, a poll{populated, select, yes { of {population}} other {}} by {pollster} suggests.} other {More say {a} than {b}, {aShare} to {bShare}, a poll{populated, select, yes { of {population}} other {}} by {pollster} suggests.}} The gap would be larger than chance would usually produce even if the poll’s total error were twice its sampling error.',
    holds:
      '{setting, select, contest {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {among, select, several {of the two, {a}} other {{a}}} leads {b} by {gap} percentage {gapCount, plural, one {point} other {points}}, {aShare} to {bShare}.} other {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, more say {a} than {b}, {aShare} to {bShare}.}} That is a larger gap than sampling error alone would usually produce, also allowing for {design, select, unweighted {rounding} clustered {rounding and clustering} other {rounding and weighting}}.',
    fragile:
      '{setting, select, contest {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {among, select, several {of the two, {a}} other {{a}}} is ahead of {b}, {aShare} to {bShare}, but the poll cannot settle it.} other {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {a} has the higher figure, {aShare} to {bShare} for {b}, but the poll cannot settle it.}}',
    level:
      '{a} and {b} are level in this poll{populated, select, yes { of {population}} other {}} by {pollster}, at {aShare} each. Equal figures do not mean that opinion is evenly split.',
    'not-shown':
      '{a} has {aShare} and {b} {bShare} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, a gap of {gap} percentage {gapCount, plural, one {point} other {points}}. {basis, select, sampling {Sampling error alone could produce a gap of that size.} modelled {By the pollster’s own model, chance alone could produce a gap of that size.} other {Chance alone could produce a gap of that size even in a random sample.}}',
    family:
      '{a} has {aShare} and {b} {bShare} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, a gap of {gap} percentage {gapCount, plural, one {point} other {points}}. It is one of several comparisons made with the same poll, and among so many, chance alone could produce a gap of that size.',
    untested:
      '{known, select, yes {This poll{populated, select, yes { of {population}} other {}} by {pollster} puts {a} at {aShare} and {b} at {bShare}.} other {This poll{populated, select, yes { of {population}} other {}} by {pollster} does not disclose the figures needed to compare {a} and {b}.}}',
  },
  change: {
    'holds-twice':
      '{direction, select, more {{option} is up since {prevDates}, from {then} to {now}, two polls{populated, select, yes { of {population}} other {}} by {pollsters} suggest. The rise would be larger than chance would usually produce even if the total error of the polls were twice their sampling error.} other {{option} is down since {prevDates}, from {then} to {now}, two polls{populated, select, yes { of {population}} other {}} by {pollsters} suggest. The fall would be larger than chance would usually produce even if the total error of the polls were twice their sampling error.}}',
    holds:
      '{direction, select, more {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {option} is up, from {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}} to {now}. The rise is larger than sampling error alone would usually produce, also allowing for {design, select, unweighted {rounding} clustered {rounding and clustering} other {rounding and weighting}}.} other {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {option} is down, from {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}} to {now}. The fall is larger than sampling error alone would usually produce, also allowing for {design, select, unweighted {rounding} clustered {rounding and clustering} other {rounding and weighting}}.}}',
    fragile:
      '{direction, select, more {The figure for {option} is higher in this poll{populated, select, yes { of {population}} other {}} by {pollster}, {now} against {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}, but the two polls cannot settle it.} other {The figure for {option} is lower in this poll{populated, select, yes { of {population}} other {}} by {pollster}, {now} against {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}, but the two polls cannot settle it.}}',
    level:
      '{option} is at {now} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, the same figure as {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}. Equal figures do not mean that opinion stood still.',
    'not-shown':
      '{option} is at {now} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, against {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}. {basis, select, sampling {Sampling error alone could produce a difference of {move} percentage {moveCount, plural, one {point} other {points}} between two such polls.} modelled {By the pollster’s own model, chance alone could produce a difference of {move} percentage {moveCount, plural, one {point} other {points}} between two such polls.} other {Chance alone could produce a difference of {move} percentage {moveCount, plural, one {point} other {points}} even between two random samples.}}',
    family:
      '{option} is at {now} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, against {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}. It is one of several comparisons made between the two polls, and among so many, chance alone could produce a difference of {move} percentage {moveCount, plural, one {point} other {points}}.',
    'little-changed':
      '{option} is little changed: {now} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, against {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}. Even with sampling error and rounding allowed for, the difference is smaller than the {indifference} percentage {indifferenceCount, plural, one {point} other {points}} set beforehand as the least that matters.',
    untested:
      '{known, select, both {{option} is at {now} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, against {then} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}.} now {{option} is at {now} in this poll{populated, select, yes { of {population}} other {}} by {pollster}.} other {This poll{populated, select, yes { of {population}} other {}} by {pollster} does not disclose the figure for {option}.}}',
  },
  'lead-change': {
    'holds-twice':
      'The gap between {a} and {b} has moved {habit, select, US {toward} other {towards}} {toward} since {prevDates}, two polls{populated, select, yes { of {population}} other {}} by {pollsters} suggest. It was {aThen} to {bThen} and is now {aNow} to {bNow}. The move would be larger than chance would usually produce even if the total error of the polls were twice their sampling error.',
    holds:
      'In this poll{populated, select, yes { of {population}} other {}} by {pollster}, the gap between {a} and {b} has moved {habit, select, US {toward} other {towards}} {toward}: {aNow} to {bNow}, against {aThen} to {bThen} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}. The move is larger than sampling error alone would usually produce, also allowing for {design, select, unweighted {rounding} clustered {rounding and clustering} other {rounding and weighting}}.',
    fragile:
      'In this poll{populated, select, yes { of {population}} other {}} by {pollster}, the gap between {a} and {b} is further {habit, select, US {toward} other {towards}} {toward}, {aNow} to {bNow} against {aThen} to {bThen} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}, but the two polls cannot settle it.',
    level:
      'The gap between {a} and {b} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, {aNow} to {bNow}, has the same figure as {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}, {aThen} to {bThen}. Equal figures do not mean that opinion stood still.',
    'not-shown':
      '{a} has {aNow} and {b} {bNow} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, against {aThen} and {bThen} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}. {basis, select, sampling {Sampling error alone could make the gap between them differ by {move} percentage {moveCount, plural, one {point} other {points}} between two such polls.} modelled {By the pollster’s own model, chance alone could make the gap between them differ by {move} percentage {moveCount, plural, one {point} other {points}} between two such polls.} other {Chance alone could make the gap between them differ by {move} percentage {moveCount, plural, one {point} other {points}} even between two random samples.}}',
    family:
      '{a} has {aNow} and {b} {bNow} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, against {aThen} and {bThen} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}. It is one of several comparisons made between the two polls, and among so many, chance alone could make the gap differ by {move} percentage {moveCount, plural, one {point} other {points}}.',
    untested:
      '{known, select, both {{a} has {aNow} and {b} {bNow} in this poll{populated, select, yes { of {population}} other {}} by {pollster}, against {aThen} and {bThen} {samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}.} now {{a} has {aNow} and {b} {bNow} in this poll{populated, select, yes { of {population}} other {}} by {pollster}.} other {This poll{populated, select, yes { of {population}} other {}} by {pollster} does not disclose the figures needed to compare {a} and {b}.}}',
  },
  threshold: {
    'holds-twice':
      '{side, select, above {{option} is above {line}, at {share}{asked, select, everyone { of everyone asked} other {}}, a poll{populated, select, yes { of {population}} other {}} by {pollster} suggests.} other {{option} is below {line}, at {share}{asked, select, everyone { of everyone asked} other {}}, a poll{populated, select, yes { of {population}} other {}} by {pollster} suggests.}} The distance from {line} would be larger than chance would usually produce even if the poll’s total error were twice its sampling error.',
    holds:
      '{side, select, above {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {option} is above {line}, at {share}{asked, select, everyone { of everyone asked} other {}}.} other {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {option} is below {line}, at {share}{asked, select, everyone { of everyone asked} other {}}.}} The distance from {line} is larger than sampling error alone would usually produce, also allowing for {design, select, unweighted {rounding} clustered {rounding and clustering} other {rounding and weighting}}.',
    fragile:
      '{side, select, above {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {option} is above {line}, at {share}{asked, select, everyone { of everyone asked} other {}}, but the poll cannot settle it.} other {In this poll{populated, select, yes { of {population}} other {}} by {pollster}, {option} is below {line}, at {share}{asked, select, everyone { of everyone asked} other {}}, but the poll cannot settle it.}}',
    level:
      '{option} is exactly at {line} in this poll{populated, select, yes { of {population}} other {}} by {pollster}. The poll cannot say on which side of it opinion lies.',
    'not-shown':
      '{option} is at {share}{asked, select, everyone { of everyone asked} other {}} in this poll{populated, select, yes { of {population}} other {}} by {pollster}. {basis, select, sampling {Sampling error alone could account for the distance from {line}, so the poll cannot say on which side opinion lies.} modelled {By the pollster’s own model, chance alone could account for the distance from {line}, so the poll cannot say on which side opinion lies.} other {Chance alone could account for the distance from {line} even in a random sample, so the poll cannot say on which side opinion lies.}}',
    family:
      '{option} is at {share}{asked, select, everyone { of everyone asked} other {}} in this poll{populated, select, yes { of {population}} other {}} by {pollster}. It is one of several figures tested against a threshold in the same poll, and among so many, chance alone could account for the distance from {line}.',
    untested:
      '{known, select, yes {{option} is at {share}{asked, select, everyone { of everyone asked} other {}} in this poll{populated, select, yes { of {population}} other {}} by {pollster}.} other {This poll{populated, select, yes { of {population}} other {}} by {pollster} does not disclose the figure for {option}.}}',
  },
  'net-score': EN_NET_SCORE.body,
  'net-score-change': EN_NET_SCORE_CHANGE.body,
  gap: EN_GAP.body,
};
