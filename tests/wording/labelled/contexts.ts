import { given } from '@/lib/domain/disclosed';
import type { FactThreshold, ReleaseFacts } from '@/lib/domain/release-facts';
import { earlierOf, OPT_IN, releaseOf, sharesOf } from '../examples';

/** What a sentence is read against: each release with the one it is compared with. */
export type Context = { releases: { facts: ReleaseFacts; previous: ReleaseFacts | null }[] };

type Change = Partial<ReleaseFacts>;

const two = (alder: number, brook: number) => ({
  Alder: alder,
  Brook: brook,
  'Someone else': 4,
  'Don’t know': 96 - alder - brook,
});
const only = (facts: ReleaseFacts): Context => ({ releases: [{ facts, previous: null }] });
const after = (facts: ReleaseFacts, previous: ReleaseFacts): Context => ({
  releases: [{ facts, previous }],
});

const MODELLED: Change = { ...OPT_IN, modelledInterval: { pp: 3.8, unit: 0.1, level: 0.95 } };
const SMALL: Change = { n: given(240), statedMargin: given({ pp: 7.4, unit: 0.1, level: 0.95 }) };
const HUGE: Change = {
  n: given(12400),
  deff: { source: 'stated', value: 1.3, df: null },
  statedMargin: given({ pp: 1, unit: 0.1, level: 0.95 }),
};
const NORWATER: Change = {
  releaseId: 'release-norwater',
  versionId: 'version-norwater',
  pollster: { id: 'norwater', name: 'Norwater Polls' },
  sponsor: given({ id: 'evening', name: 'The Averil Evening' }),
  population: given('registered-voters'),
  n: given(1604),
  fieldStartOn: '2026-09-10',
  fieldEndOn: '2026-09-15',
  publishedOn: '2026-09-17',
  statedMargin: given({ pp: 2.9, unit: 0.1, level: 0.95 }),
};
const TOLL: Change = {
  race: {
    id: 'toll',
    name: 'Bridge toll referendum',
    kind: 'referendum',
    thresholds: [
      { option: 'Yes', pct: 50, base: 'answers' },
      { option: 'No', pct: 50, base: 'answers' },
    ],
  },
  questionWording: given('Should a toll be charged on the Averil Bridge?'),
  n: given(1510),
  statedMargin: given({ pp: 3, unit: 0.1, level: 0.95 }),
};
const STAKE: Change = { sponsor: given({ id: 'operators', name: 'Averil Bridge Operators' }) };
const APPROVAL: Change = {
  race: { id: 'approval', name: 'Approval of the governor', kind: 'approval', thresholds: [] },
  population: given('adults'),
  questionWording: given('Do you approve or disapprove of the way the governor does the job?'),
};

const hurdle = (option: string): FactThreshold => ({ option, pct: 5, base: 'answers' });
const ASSEMBLY: Change = {
  race: {
    id: 'assembly',
    name: 'Assembly of Averil Coast',
    kind: 'party-list',
    thresholds: [hurdle('Harbour Union'), hurdle('Meadow Party'), hurdle('Lantern List')],
  },
  n: given(1830),
  decimals: 1,
  deff: { source: 'design', value: 1.3, df: 60 },
  statedMargin: given({ pp: 2.6, unit: 0.1, level: 0.95 }),
  shares: sharesOf({
    'Coast Alliance': 381,
    'Reform League': 304,
    'Meadow Party': 186,
    'Harbour Union': 56,
    'Lantern List': 31,
  }),
};
const approval = (approve: number) => ({
  Approve: approve,
  Disapprove: 93 - approve,
  'Don’t know': 7,
});
const toll = (yes: number, no: number) => ({ Yes: yes, No: no, 'Don’t know': 100 - yes - no });

/** Every context that a labelled sentence may name; the verdicts behind them are asserted beside it. */
export const CONTEXTS = {
  none: { releases: [] },
  'lead-holds': only(releaseOf(two(52, 38))),
  'lead-fragile': only(releaseOf(two(47, 39), { statedMargin: given({ pp: 3.1, unit: 0.1, level: 0.95 }) })),
  'lead-not-shown': only(releaseOf(two(45, 42))),
  'lead-level': only(releaseOf(two(44, 44))),
  'change-up': after(releaseOf(two(51, 38)), earlierOf(two(41, 47))),
  'change-fragile': after(releaseOf(two(48, 40)), earlierOf(two(41, 42))),
  'change-not-shown': after(releaseOf(two(47, 42)), earlierOf(two(44, 42))),
  'little-changed': after(releaseOf(two(48, 40), HUGE), earlierOf(two(49, 40), HUGE)),
  'approval-down': after(releaseOf(approval(37), APPROVAL), earlierOf(approval(48), APPROVAL)),
  'other-population': after(releaseOf(two(51, 38)), earlierOf(two(41, 47), { population: given('adults') })),
  'opt-in': after(releaseOf(two(48, 41), OPT_IN), earlierOf(two(45, 43), OPT_IN)),
  modelled: only(releaseOf(two(52, 38), MODELLED)),
  assembly: only(releaseOf({}, ASSEMBLY)),
  'toll-majority': only(releaseOf(toll(41, 57), { ...TOLL, ...STAKE })),
  'toll-close': only(releaseOf(toll(51, 44), TOLL)),
  'small-sample': only(releaseOf(two(48, 40), SMALL)),
  'two-pollsters': {
    releases: [
      { facts: releaseOf(two(52, 38)), previous: earlierOf(two(51, 39)) },
      { facts: releaseOf(two(46, 44), NORWATER), previous: null },
    ],
  },
} satisfies Record<string, Context>;

export type ContextName = keyof typeof CONTEXTS;
