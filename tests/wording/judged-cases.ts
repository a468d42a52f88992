import { given, NOT_DISCLOSED } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { baseOf } from '@/lib/findings/check-document-of';
import { judgeRelease } from '@/lib/findings/judge-release';
import type { ComparisonInput, ReleaseDocument, Subgroup } from '@/lib/findings/judge-types';
import { parseReleaseDocument } from '@/lib/findings/parse-release';
import type { DraftInput } from '@/lib/wording/draft-input';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { draftInputOf } from '@/lib/wording/of-judgement';
import { earlierOf, OPT_IN, releaseOf, sharesOf } from './examples';

type Case = {
  key: string;
  release: ReleaseFacts;
  previous?: ReleaseFacts;
  comparison?: Omit<ComparisonInput, 'base'>;
  asked?: Partial<Omit<ReleaseDocument, 'release' | 'comparison'>>;
  rebased?: { n: number | null };
};

/** What lines about one finding of a whole release are drafted from, through the engine itself. */
export function judgedInput({ key, release, previous, comparison, asked, rebased }: Case): DraftInput {
  const document = parseReleaseDocument({
    ...asked,
    release: { ...baseOf(release), ...(rebased ? { rebased } : {}) },
    ...(previous ? { comparison: { base: baseOf(previous), ...comparison } } : {}),
  });
  return draftInputOf({
    document,
    judgement: judgeRelease(document),
    key,
    release,
    previous: previous ?? null,
    comparison: { note: [] },
    houseStyle: DEFAULT_HOUSE_STYLE,
    language: 'en',
  });
}

const KNOWN: Partial<ReleaseFacts> = { deff: { source: 'stated', value: 1.2, df: null } };
const APPROVAL: Partial<ReleaseFacts> = {
  race: { id: 'approval', name: 'Approval of the governor', kind: 'approval', thresholds: [] },
  population: given('adults'),
  questionWording: given('Do you approve or disapprove of the way the governor does the job?'),
  ...KNOWN,
};
const PARTIES: Partial<ReleaseFacts> = {
  race: { id: 'assembly', name: 'Assembly of Averil Coast', kind: 'party-list', thresholds: [] },
  ...KNOWN,
};
const ASSUMED: Partial<ReleaseFacts> = { deff: null, statedMargin: NOT_DISCLOSED };

const net = (approve: number, disapprove: number, change: Partial<ReleaseFacts> = {}) =>
  releaseOf(
    { Approve: approve, Disapprove: disapprove, 'Don’t know': 100 - approve - disapprove },
    { ...APPROVAL, ...change },
  );
const netBefore = (approve: number, disapprove: number, change: Partial<ReleaseFacts> = {}) =>
  earlierOf(
    { Approve: approve, Disapprove: disapprove, 'Don’t know': 100 - approve - disapprove },
    { ...APPROVAL, ...change },
  );
const parties = (dunmor: number, ilvane: number, aldane: number, change: Partial<ReleaseFacts> = {}) =>
  releaseOf(
    { Dunmor: dunmor, Ilvane: ilvane, Aldane: aldane, 'Harbour Union': 6 },
    { ...PARTIES, ...change },
  );
const partiesBefore = (dunmor: number, ilvane: number, aldane: number) =>
  earlierOf({ Dunmor: dunmor, Ilvane: ilvane, Aldane: aldane, 'Harbour Union': 6 }, PARTIES);

const netScores = [{ approve: 'Approve', disapprove: 'Disapprove' }];
const blocs = [{ name: 'Coast Alliance', options: ['Dunmor', 'Aldane'] }];
const blocLead = { blocs, pairs: [['Coast Alliance', 'Ilvane'] as const] };
const NET = 'net-score:Approve|Disapprove';
const NET_CHANGE = 'net-score-change:Approve|Disapprove';
const BLOC_LEAD = 'lead:Coast Alliance|Ilvane';

const group = (name: string, n: number | null, alder: number | null, brook: number): Subgroup => ({
  name,
  by: 'sex',
  base: {
    sampleSource: 'probability',
    n,
    design: 'weighted',
    deff: { source: 'stated', value: 1.2 },
    decimals: 0,
    shares: [
      { option: 'Alder', pct: alder },
      { option: 'Brook', pct: brook },
    ],
  },
});

const main = releaseOf({ Alder: 47, Brook: 41, 'Don’t know': 12 }, { n: given(2024), ...KNOWN });
const gap = (women: Subgroup, men: Subgroup) =>
  judgedInput({
    key: 'gap:vote|Alder|women|men',
    release: main,
    asked: {
      subgroups: [
        {
          question: 'vote',
          groups: [women, men],
          gaps: [{ option: 'Alder', group: 'women', against: 'men' }],
        },
      ],
    },
  });

const tracker = (alder: number, change: Partial<ReleaseFacts>) =>
  releaseOf({ Alder: alder, Brook: 88 - alder, 'Don’t know': 12 }, { n: given(1500), ...KNOWN, ...change });
const EARLIER: Partial<ReleaseFacts> = {
  releaseId: 'earlier',
  versionId: 'earlier',
  fieldStartOn: '2026-09-12',
  fieldEndOn: '2026-09-15',
};

/** Findings that only the judgement of a whole release makes, one per kind, state and reason that reads differently. */
export const JUDGED_CASES: Record<string, DraftInput> = {
  'net-score-holds-twice': judgedInput({ key: NET, release: net(35, 58), asked: { netScores } }),
  'net-score-holds': judgedInput({ key: NET, release: net(50, 40), asked: { netScores } }),
  'net-score-fragile': judgedInput({ key: NET, release: net(49, 41, ASSUMED), asked: { netScores } }),
  'net-score-level': judgedInput({ key: NET, release: net(46, 46), asked: { netScores } }),
  'net-score-not-shown': judgedInput({ key: NET, release: net(45, 48), asked: { netScores } }),
  'net-score-untested': judgedInput({ key: NET, release: net(45, 48, OPT_IN), asked: { netScores } }),
  'net-score-change-holds-twice': judgedInput({
    key: NET_CHANGE,
    release: net(58, 35),
    previous: netBefore(40, 53),
    asked: { netScores },
  }),
  'net-score-change-holds': judgedInput({
    key: NET_CHANGE,
    release: net(40, 55),
    previous: netBefore(47, 46),
    asked: { netScores },
  }),
  'net-score-change-fragile': judgedInput({
    key: NET_CHANGE,
    release: net(46, 46, ASSUMED),
    previous: netBefore(41, 52, ASSUMED),
    asked: { netScores, changes: [] },
  }),
  'net-score-change-level': judgedInput({
    key: NET_CHANGE,
    release: net(44, 46),
    previous: netBefore(45, 47),
    asked: { netScores },
  }),
  'net-score-change-not-shown': judgedInput({
    key: NET_CHANGE,
    release: net(44, 47),
    previous: netBefore(46, 46),
    asked: { netScores },
  }),
  'net-score-change-same-people': judgedInput({
    key: NET_CHANGE,
    release: net(44, 47),
    previous: netBefore(46, 46),
    comparison: { samePeople: true },
    asked: { netScores },
  }),
  'bloc-lead-holds': judgedInput({ key: BLOC_LEAD, release: parties(33, 36, 19), asked: blocLead }),
  'bloc-lead-fragile': judgedInput({ key: BLOC_LEAD, release: parties(27, 38, 18), asked: blocLead }),
  'bloc-lead-not-shown': judgedInput({ key: BLOC_LEAD, release: parties(24, 38, 16), asked: blocLead }),
  'bloc-threshold-holds': judgedInput({
    key: 'threshold:Coast Alliance|50',
    release: parties(35, 32, 22),
    asked: { blocs, pairs: [], thresholds: [{ option: 'Coast Alliance', pct: 50 }] },
  }),
  'bloc-threshold-printed': judgedInput({
    key: 'threshold:Coast Alliance|50',
    release: parties(29, 36, 20),
    asked: {
      blocs: [{ ...blocs[0]!, printed: { pct: 49.6, decimals: 1 } }],
      pairs: [],
      thresholds: [{ option: 'Coast Alliance', pct: 50 }],
    },
  }),
  'bloc-change-holds': judgedInput({
    key: 'change:Coast Alliance',
    release: parties(33, 36, 23),
    previous: partiesBefore(28, 42, 17),
    asked: { blocs, pairs: [], changes: ['Coast Alliance'] },
  }),
  'lead-of-several': judgedInput({
    key: 'lead:Aldane|Harbour Union',
    release: parties(34, 30, 19),
    asked: { pairs: [['Aldane', 'Harbour Union']] },
  }),
  'threshold-other-base': judgedInput({
    key: 'threshold:Harbour Union|5',
    release: releaseOf({ Dunmor: 31, Ilvane: 30, 'Harbour Union': 6, 'Don’t know': 20 }, PARTIES),
    asked: { pairs: [], thresholds: [{ option: 'Harbour Union', pct: 5, countedBase: 'valid-votes' }] },
  }),
  'lead-rebased': judgedInput({
    key: 'lead:Alder|Brook',
    release: releaseOf({ Alder: 56, Brook: 44 }, KNOWN),
    rebased: { n: 830 },
  }),
  'lead-rebased-size': judgedInput({
    key: 'lead:Alder|Brook',
    release: releaseOf({ Alder: 56, Brook: 44 }, KNOWN),
    rebased: { n: null },
  }),
  'change-overlap-holds': judgedInput({
    key: 'change:Alder',
    release: tracker(51, {}),
    previous: tracker(45, EARLIER),
    comparison: { overlap: { window: 4, shared: 2 } },
    asked: { pairs: [], changes: ['Alder'] },
  }),
  'change-overlap-not-shown': judgedInput({
    key: 'change:Alder',
    release: tracker(46, {}),
    previous: tracker(45, EARLIER),
    comparison: { overlap: { window: 4, shared: 2, interviews: [370, 380, 375, 375, 370, 380] } },
    asked: { pairs: [], changes: ['Alder'] },
  }),
  'change-shared-waves': judgedInput({
    key: 'change:Alder',
    release: tracker(46, {}),
    previous: tracker(45, EARLIER),
    comparison: { overlap: { window: 4, shared: 4 } },
    asked: { pairs: [], changes: ['Alder'] },
  }),
  'change-same-people': judgedInput({
    key: 'change:Alder',
    release: tracker(48, {}),
    previous: tracker(44, EARLIER),
    comparison: { samePeople: true },
    asked: { pairs: [], changes: ['Alder'] },
  }),
  'gap-holds-twice': gap(group('women', 1040, 60, 31), group('men', 984, 36, 51)),
  'gap-holds': gap(group('women', 1040, 52, 37), group('men', 984, 43, 44)),
  'gap-fragile': gap(group('women', 1040, 50, 38), group('men', 984, 45, 43)),
  'gap-level': gap(group('women', 1040, 47, 41), group('men', 984, 47, 41)),
  'gap-not-shown': gap(group('women', 1040, 48, 40), group('men', 984, 46, 42)),
  'gap-too-small': gap(group('women', 1040, 48, 40), group('men', 24, 46, 42)),
  'gap-not-disclosed': gap(group('women', 1040, null, 40), group('men', 984, 46, 42)),
  'gap-no-size': gap(group('women', null, 49, 40), group('men', 984, 42, 42)),
  'gap-against-the-rest': judgedInput({
    key: 'gap:vote|Alder|women|',
    release: main,
    asked: {
      subgroups: [
        {
          question: 'vote',
          total: { name: 'everyone', base: baseOf(main) },
          groups: [group('women', 1040, 53, 37)],
          gaps: [{ option: 'Alder', group: 'women', against: { restOfWeightPct: 51 } }],
        },
      ],
    },
  }),
};

export const RIGHT_TO_LEFT = judgedInput({
  key: 'lead:תקווה|Brook',
  release: releaseOf({}, { shares: sharesOf({ תקווה: 52, Brook: 40 }), ...KNOWN }),
});
