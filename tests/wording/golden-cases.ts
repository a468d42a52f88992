import { given, NOT_APPLICABLE, NOT_DISCLOSED, NOT_ENTERED } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Claim } from '@/lib/domain/sheet';
import { earlierOf, inputOf, OPT_IN, releaseOf, sharesOf } from './examples';

const lead: Claim = { kind: 'lead', pair: ['Alder', 'Brook'] };
const change: Claim = { kind: 'change', option: 'Alder' };
const leadChange: Claim = { kind: 'lead-change', pair: ['Alder', 'Brook'] };
const half = (option: string): Claim => ({ kind: 'threshold', option, pct: 50 });
const hurdle: Claim = { kind: 'threshold', option: 'Harbour Union', pct: 5 };

const two = (alder: number, brook: number) => ({
  Alder: alder,
  Brook: brook,
  'Someone else': 4,
  'Don’t know': 96 - alder - brook,
});
const KNOWN_DEFF: Partial<ReleaseFacts> = { deff: { source: 'stated', value: 1.3, df: null } };
const ASSUMED: Partial<ReleaseFacts> = { statedMargin: given({ pp: 3.1, unit: 0.1, level: 0.95 }) };
const SMALL: Partial<ReleaseFacts> = { n: given(120), statedMargin: NOT_DISCLOSED };
const MODELLED: Partial<ReleaseFacts> = {
  ...OPT_IN,
  modelledInterval: { pp: 3.8, unit: 0.1, level: 0.95 },
};

function race(option: string, pct: number, base: 'valid-votes' | 'answers' = 'answers') {
  return {
    id: 'governor',
    name: 'Governor of Averil Coast',
    kind: 'candidate' as const,
    thresholds: [{ option, pct, base }],
  };
}

const approval: Partial<ReleaseFacts> = {
  race: { id: 'approval', name: 'Approval of the governor', kind: 'approval', thresholds: [] },
  population: given('adults'),
  questionWording: given('Do you approve or disapprove of the way the governor does the job?'),
};

function assembly(units: number, n: number, change: Partial<ReleaseFacts> = {}): ReleaseFacts {
  return releaseOf(
    {},
    {
      race: {
        id: 'assembly',
        name: 'Assembly of Averil Coast',
        kind: 'party-list',
        thresholds: [{ option: 'Harbour Union', pct: 5, base: 'valid-votes' }],
      },
      decimals: 1,
      n: given(n),
      deff: { source: 'design', value: 1.3, df: 60 },
      statedMargin: NOT_DISCLOSED,
      shares: sharesOf({ Dunmor: 335, Ilvane: 281, Aldane: 202, 'Harbour Union': units }),
      ...change,
    },
  );
}

/** One sheet per claim, verdict and reason that reads differently. The key is the name of its golden file. */
export const GOLDEN_CASES = {
  'lead-holds-twice': inputOf({ claim: lead, release: releaseOf(two(60, 31), KNOWN_DEFF) }),
  'lead-holds': inputOf({ claim: lead, release: releaseOf(two(52, 40), ASSUMED) }),
  'lead-holds-reversed': inputOf({
    claim: lead,
    release: releaseOf(two(39, 52)),
    pairs: [['Alder', 'Brook']],
  }),
  'lead-fragile-design-effect': inputOf({ claim: lead, release: releaseOf(two(49, 41), ASSUMED) }),
  'lead-fragile-rounding': inputOf({ claim: lead, release: releaseOf(two(49, 42), KNOWN_DEFF) }),
  'lead-fragile-together': inputOf({
    claim: lead,
    release: releaseOf(two(46, 38), ASSUMED),
  }),
  'lead-fragile-second-test': inputOf({
    claim: { kind: 'lead', pair: ['Aldane', 'Hethra'] },
    release: assembly(0, 120, {
      deff: { source: 'stated', value: 1, df: null },
      shares: sharesOf({ Dunmor: 455, Ilvane: 401, Aldane: 52, Hethra: 5 }),
    }),
    pairs: [['Aldane', 'Hethra']],
  }),
  'lead-fragile-modelled': inputOf({ claim: lead, release: releaseOf(two(54, 38), MODELLED) }),
  'lead-fragile-comparison': inputOf({
    claim: lead,
    release: releaseOf(two(54, 38), OPT_IN),
    policy: { comparisonBasis: true },
  }),
  'lead-not-shown': inputOf({ claim: lead, release: releaseOf(two(47, 41)) }),
  'lead-not-shown-modelled': inputOf({ claim: lead, release: releaseOf(two(47, 43), MODELLED) }),
  'lead-not-shown-lower-deff': inputOf({ claim: lead, release: releaseOf(two(40, 34), ASSUMED) }),
  'lead-not-shown-family': inputOf({
    claim: { kind: 'lead', pair: ['Dunmor', 'Ilvane'] },
    release: assembly(48, 1000, { shares: sharesOf({ Dunmor: 285, Ilvane: 230, Aldane: 202 }) }),
    pairs: [
      ['Dunmor', 'Ilvane'],
      ['Dunmor', 'Aldane'],
      ['Ilvane', 'Aldane'],
    ],
  }),
  'lead-level': inputOf({ claim: lead, release: releaseOf(two(44, 44)) }),
  'lead-untested-opt-in': inputOf({ claim: lead, release: releaseOf(two(49, 41), OPT_IN) }),
  'lead-untested-not-stated-how': inputOf({
    claim: lead,
    release: releaseOf(two(49, 41), {
      ...OPT_IN,
      sampleSource: 'unknown',
      mode: NOT_DISCLOSED,
      population: NOT_DISCLOSED,
      questionWording: NOT_ENTERED,
    }),
  }),
  'lead-untested-no-size': inputOf({ claim: lead, release: releaseOf(two(49, 41), { n: NOT_DISCLOSED }) }),
  'lead-untested-too-small': inputOf({ claim: lead, release: releaseOf(two(49, 41), SMALL) }),
  'lead-untested-few-clusters': inputOf({
    claim: lead,
    release: releaseOf(two(49, 41), {
      design: 'clustered',
      mode: given('face-to-face'),
      deff: { source: 'design', value: 2.1, df: 6 },
    }),
  }),
  'lead-untested-not-disclosed': inputOf({
    claim: lead,
    release: releaseOf({ Alder: 47, Brook: null }),
    pairs: [['Alder', 'Brook']],
  }),
  'lead-approval-holds': inputOf({
    claim: { kind: 'lead', pair: ['Approve', 'Disapprove'] },
    release: releaseOf({ Approve: 53, Disapprove: 39, 'Don’t know': 8 }, approval),
  }),
  'lead-approval-fragile': inputOf({
    claim: { kind: 'lead', pair: ['Approve', 'Disapprove'] },
    release: releaseOf({ Approve: 48, Disapprove: 41, 'Don’t know': 11 }, approval),
  }),
  'change-holds-twice': inputOf({
    claim: change,
    release: releaseOf(two(58, 33), KNOWN_DEFF),
    previous: earlierOf(two(43, 44), KNOWN_DEFF),
  }),
  'change-holds-down': inputOf({
    claim: change,
    release: releaseOf(two(42, 48), KNOWN_DEFF),
    previous: earlierOf(two(52, 40), KNOWN_DEFF),
    note: ['No earlier release since then could be compared.'],
  }),
  'change-fragile': inputOf({
    claim: change,
    release: releaseOf(two(50, 41), ASSUMED),
    previous: earlierOf(two(43, 44), ASSUMED),
  }),
  'change-fragile-down': inputOf({
    claim: change,
    release: releaseOf(two(38, 46), KNOWN_DEFF),
    previous: earlierOf(two(44, 43), KNOWN_DEFF),
  }),
  'change-not-shown': inputOf({
    claim: change,
    release: releaseOf(two(47, 41)),
    previous: earlierOf(two(44, 43)),
    note: ['Whether the questions were asked in the same order is not known.'],
  }),
  'change-not-shown-family': inputOf({
    claim: change,
    release: releaseOf(two(38, 37), ASSUMED),
    previous: earlierOf(two(44, 43), ASSUMED),
  }),
  'change-same-figure': inputOf({
    claim: change,
    release: releaseOf(two(45, 43)),
    previous: earlierOf(two(45, 42)),
  }),
  'change-little-changed': inputOf({
    claim: change,
    release: releaseOf(two(47, 41), { n: given(9000), ...KNOWN_DEFF }),
    previous: earlierOf(two(47, 42), { n: given(9000), ...KNOWN_DEFF }),
  }),
  'change-across-years': inputOf({
    claim: change,
    release: releaseOf(two(47, 41), {
      fieldStartOn: '2026-12-29',
      fieldEndOn: '2027-01-03',
      publishedOn: '2027-01-05',
    }),
    previous: earlierOf(two(44, 43), { fieldStartOn: '2026-11-28', fieldEndOn: '2026-12-02' }),
  }),
  'change-untested-opt-in': inputOf({
    claim: change,
    release: releaseOf(two(47, 41), OPT_IN),
    previous: earlierOf(two(44, 43), OPT_IN),
  }),
  'change-untested-not-comparable': inputOf({
    claim: change,
    release: releaseOf(two(47, 41)),
    previous: earlierOf(two(44, 43), OPT_IN),
  }),
  'change-untested-not-disclosed': inputOf({
    claim: change,
    release: releaseOf(two(47, 41)),
    previous: earlierOf({ Alder: null, Brook: 43 }),
  }),
  'lead-change-holds': inputOf({
    claim: leadChange,
    release: releaseOf(two(54, 36), KNOWN_DEFF),
    previous: earlierOf(two(43, 45), KNOWN_DEFF),
  }),
  'lead-change-fragile': inputOf({
    claim: leadChange,
    release: releaseOf(two(50, 41), ASSUMED),
    previous: earlierOf(two(43, 46), ASSUMED),
  }),
  'lead-change-not-shown': inputOf({
    claim: leadChange,
    release: releaseOf(two(47, 41)),
    previous: earlierOf(two(44, 43)),
  }),
  'lead-change-same-figure': inputOf({
    claim: leadChange,
    release: releaseOf(two(46, 42)),
    previous: earlierOf(two(45, 41)),
  }),
  'lead-change-untested': inputOf({
    claim: leadChange,
    release: releaseOf(two(47, 41), { n: NOT_DISCLOSED }),
    previous: earlierOf(two(44, 43)),
  }),
  'threshold-holds-above-half': inputOf({
    claim: half('Alder'),
    release: releaseOf(two(58, 33), { ...KNOWN_DEFF, race: race('Alder', 50) }),
  }),
  'threshold-holds-below-half': inputOf({
    claim: half('Brook'),
    release: releaseOf(two(49, 41), { race: race('Brook', 50) }),
  }),
  'threshold-holds-of-votes': inputOf({
    claim: half('Alder'),
    release: releaseOf({ Alder: 55, Brook: 45 }, { ...KNOWN_DEFF, race: race('Alder', 50, 'valid-votes') }),
  }),
  'threshold-fragile': inputOf({
    claim: half('Alder'),
    release: releaseOf(two(54, 38), { ...ASSUMED, race: race('Alder', 50) }),
  }),
  'threshold-not-shown': inputOf({
    claim: half('Alder'),
    release: releaseOf(two(51, 41), { race: race('Alder', 50), sponsor: NOT_APPLICABLE }),
  }),
  'threshold-level': inputOf({
    claim: half('Alder'),
    release: releaseOf(two(50, 41), { race: race('Alder', 50) }),
  }),
  'threshold-hurdle-not-shown': inputOf({ claim: hurdle, release: assembly(52, 1000) }),
  'threshold-hurdle-holds': inputOf({ claim: hurdle, release: assembly(91, 1200) }),
  'threshold-hurdle-untested': inputOf({ claim: hurdle, release: assembly(52, 1000, OPT_IN) }),
};
