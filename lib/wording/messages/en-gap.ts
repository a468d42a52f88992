import type { ClaimMessages } from '../language-pack';
import { ALLOWING, A_POLL, POLL, chanceAlone, percentagePoints } from './en-parts';

const BOTH = '{option} {gShare} among {g}, {hShare} among {h}';
const HAS_BOTH = '{option} has {gShare} among {g} and {hShare} among {h}';
const more = (before: string, after: string) =>
  `{setting, select, contest {${before}{option} has more support among {g} than among {h}${after}} other {${before === '' ? 'A' : `${before}a`} larger share of {g} than of {h} say {option}${after}}}`;
const HIGHER = 'he figure for {option} is higher among {g} than among {h}';
const SUPPRESSED = 'belowPresentationStandard';

/** A gap between two groups of one sample. Shares below the presentation standard are never printed. */
export const EN_GAP: Record<'headline' | 'body' | 'chartTitle' | 'told', ClaimMessages['gap']> = {
  headline: {
    'holds-twice':
      '{setting, select, contest {{option} has more support among {g} than {h}, {gShare} to {hShare}, poll by {pollster} suggests} other {Larger share of {g} than of {h} say {option}, {gShare} to {hShare}, poll by {pollster} suggests}}',
    holds:
      '{setting, select, contest {{option} has more support among {g} than {h} in poll by {pollster}, {gShare} to {hShare}} other {Larger share of {g} than of {h} say {option} in poll by {pollster}, {gShare} to {hShare}}}',
    fragile:
      'Figure for {option} higher among {g} than {h}, {gShare} to {hShare}, but poll by {pollster} cannot settle it',
    level: '{option} level among {g} and {h} in poll by {pollster}, at {gShare} in each',
    'not-shown': `${BOTH} in poll by {pollster}: a gap that chance alone could produce`,
    family: `${BOTH} in poll by {pollster}: among several gaps, chance could produce this one`,
    untested: `{reason, select, notDisclosed {Poll by {pollster} leaves out figures needed to compare {g} and {h}} ${SUPPRESSED} {Poll by {pollster} has too few interviews to compare {g} and {h}} noSamplingBasis {${BOTH} in poll by {pollster} that carries no recognised margin of error} noSampleSize {${BOTH} in poll by {pollster} that does not say how many were asked} tooSmall {Poll by {pollster} has too few interviews to compare {g} and {h}} other {${BOTH} in poll by {pollster}: the gap cannot be tested}}`,
  },
  body: {
    'holds-twice': `${more('', `, {gShare} to {hShare}, ${A_POLL} suggests.`)} The gap would be larger than chance would usually produce even if the poll’s total error were twice its sampling error.`,
    holds: `${more(`In ${POLL}, `, ', {gShare} to {hShare}.')} That is a larger gap than sampling error alone would usually produce, also allowing for ${ALLOWING}.`,
    fragile: `In ${POLL}, t${HIGHER}, {gShare} to {hShare}, but the poll cannot settle it.`,
    level: `{option} is level among {g} and {h} in ${POLL}, at {gShare} in each. Equal figures do not mean that the groups think alike.`,
    'not-shown': `${HAS_BOTH} in ${POLL}, a gap of {gap} ${percentagePoints('gap')}. ${chanceAlone('could produce a gap of that size', 'in random samples')}.`,
    family: `${HAS_BOTH} in ${POLL}, a gap of {gap} ${percentagePoints('gap')}. It is one of several comparisons made between groups of the same poll, and among so many, chance alone could produce a gap of that size.`,
    untested: `{known, select, yes {${POLL.replace('this', 'This')} puts {option} at {gShare} among {g} and at {hShare} among {h}.} hidden {${POLL.replace('this', 'This')} asked too few people in these groups to compare {g} and {h}.} other {${POLL.replace('this', 'This')} does not disclose the figures needed to compare {g} and {h}.}}`,
  },
  chartTitle: {
    'holds-twice': more('', ', {gShare} to {hShare}'),
    holds: more('In this poll, ', ', {gShare} to {hShare}'),
    fragile: `T${HIGHER} in this poll, {gShare} to {hShare}, but the poll cannot settle it`,
    level: '{option} is level among {g} and {h} in this poll, at {gShare} in each',
    'not-shown': `${BOTH}: chance alone could produce this gap`,
    family: `${BOTH}: chance could produce this gap among several comparisons`,
    untested: `{reason, select, notDisclosed {{g} and {h}: figures not disclosed} ${SUPPRESSED} {{option} among {g} and {h}: too few interviews to show} tooSmall {{option} among {g} and {h}: too few interviews to compare} noSamplingBasis {${BOTH}, with no recognised margin of error} other {${BOTH}: the gap cannot be tested}}`,
  },
  told: {
    'holds-twice': more('', ', {gShare} to {hShare}, a larger gap than chance would usually produce.'),
    holds: more('In this poll, ', ', {gShare} to {hShare}, a larger gap than chance would usually produce.'),
    fragile: `In this poll, t${HIGHER}, {gShare} to {hShare}, but the poll cannot settle it.`,
    level: '{option} is level among {g} and {h} in this poll, at {gShare} in each.',
    'not-shown': `${HAS_BOTH}, a gap that chance alone could produce.`,
    family: `${HAS_BOTH}, a gap that chance could produce among several comparisons.`,
    untested: `{reason, select, notDisclosed {The poll does not disclose the figures needed to compare {g} and {h}.} ${SUPPRESSED} {The poll asked too few people in these groups to compare {g} and {h}.} noSamplingBasis {${HAS_BOTH} in a poll that carries no recognised margin of error.} noSampleSize {${HAS_BOTH} in a poll that does not say how many were asked.} tooSmall {The poll asked too few people in these groups to compare {g} and {h}.} other {${HAS_BOTH}, a gap that cannot be tested on this poll.}}`,
  },
};
