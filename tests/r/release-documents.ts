import type { Base, PrintedShare } from '@/lib/findings/check-types';
import type { ReleaseDocument } from '@/lib/findings/judge-types';

const shares = (pcts: Record<string, number | null>): PrintedShare[] =>
  Object.entries(pcts).map(([option, pct]) => ({
    option,
    pct,
    ...(option === "Don't know" ? { answer: false } : {}),
  }));

const later: Base = {
  sampleSource: 'probability',
  n: 1204,
  design: 'weighted',
  deff: { source: 'kish', value: 1.32 },
  decimals: 0,
  shares: shares({ Alder: 34, Brook: 27, Cliff: 12, Dune: 6, "Don't know": 21 }),
};

const earlier: Base = {
  ...later,
  n: 988,
  deff: { source: 'design', value: 1.5, df: 61 },
  decimals: 1,
  shares: shares({ Alder: 28.5, Brook: 29.1, Cliff: 13, Dune: 7.2, "Don't know": 22.2 }),
};

/** Don't-knows taken out and the shares computed anew. */
const left = (base: Base): Base => ({
  ...base,
  shares: base.shares.filter(({ answer }) => answer !== false),
});

const rating = (approve: number, disapprove: number): PrintedShare[] =>
  shares({ Approve: approve, Disapprove: disapprove, "Don't know": 100 - approve - disapprove });

const group = (name: string, n: number | null, pcts: Record<string, number | null>, by = 'age') => ({
  name,
  by,
  base: { ...later, n, deff: null, shares: shares(pcts) },
});

const blocs: ReleaseDocument['blocs'] = [
  { name: 'Inland', options: ['Brook', 'Cliff', 'Dune'] },
  { name: 'Coast "East"\n# all', options: ['Alder', 'Dune'], printed: { pct: 40.4, decimals: 1 } },
];

const asked: Omit<ReleaseDocument, 'release'> = {
  blocs,
  pairs: [
    ['Alder', 'Brook'],
    ['Inland', 'Alder'],
  ],
  changes: ['Alder', 'Inland', 'Coast "East"\n# all'],
  thresholds: [
    { option: 'Inland', pct: 50 },
    { option: 'Dune', pct: 5, countedBase: 'answers' },
    { option: 'Alder', pct: 40, countedBase: 'valid-votes' },
  ],
};

const tracking: Base = { ...later, n: 1500, deff: null, shares: rating(42, 51) };
const before: Base = { ...tracking, n: 1480, shares: rating(45, 49) };
const netScores = [{ approve: 'Approve', disapprove: 'Disapprove' }];

const difference = (isOverridable: boolean) => ({
  comparable: false,
  differences: [{ item: 'mode' as const, current: 'online', earlier: 'post', isOverridable }],
  unknowns: [],
});

/** Documents for every kind that only a whole release has, and every way that its bases can be made. */
export const releaseDocuments: readonly { id: string; input: ReleaseDocument }[] = [
  { id: 'blocs, printed and summed', input: { ...asked, release: later, comparison: { base: earlier } } },
  {
    id: 'blocs with earlier figures from tables',
    input: {
      ...asked,
      release: later,
      comparison: { base: earlier, blocs: [{ name: 'Inland', pct: 49.3, decimals: 1 }] },
    },
  },
  {
    id: 're-based, size known',
    input: {
      ...asked,
      release: { ...left(later), rebased: { n: 951 } },
      comparison: { base: { ...left(earlier), rebased: { n: 800 } } },
    },
  },
  {
    id: 're-based, only the people left known',
    input: {
      ...asked,
      release: { ...left(later), n: null, rebased: { n: 951 } },
      comparison: { base: { ...left(earlier), n: null, rebased: { n: null } } },
    },
  },
  {
    id: 're-based, size not known',
    input: { ...asked, release: { ...left(later), rebased: { n: null } }, comparison: { base: earlier } },
  },
  {
    id: 'net score and its change',
    input: { release: tracking, netScores, comparison: { base: before } },
  },
  {
    id: 'tracking, waves taken as equal',
    input: { release: tracking, netScores, comparison: { base: before, overlap: { window: 3, shared: 2 } } },
  },
  {
    id: 'tracking, interviews and shares of waves known',
    input: {
      release: tracking,
      netScores,
      comparison: {
        base: before,
        overlap: {
          window: 3,
          shared: 1,
          interviews: [480, 510, 490, 505, 505],
          shares: [
            { option: 'Approve', pct: [46, 45, 44, 42, 40] },
            { option: 'Disapprove', pct: [48, 49.5, 50, 51, 52] },
          ],
        },
      },
    },
  },
  {
    id: 'tracking, re-based, one share of waves known',
    input: {
      release: { ...left(tracking), rebased: { n: 1390 } },
      netScores,
      comparison: {
        base: { ...left(before), rebased: { n: 1400 } },
        overlap: {
          window: 2,
          shared: 1,
          interviews: [700, 780, 720],
          shares: [{ option: 'Approve', pct: [46, 44, 40] }],
        },
      },
    },
  },
  {
    id: 'tracking, every wave shared',
    input: { release: tracking, netScores, comparison: { base: before, overlap: { window: 2, shared: 2 } } },
  },
  {
    id: 'the same people asked twice',
    input: { release: tracking, netScores, comparison: { base: before, samePeople: true } },
  },
  {
    id: 'the same people, sizes not known',
    input: { release: { ...tracking, n: null }, netScores, comparison: { base: before, samePeople: true } },
  },
  {
    id: 'a difference that stands',
    input: { release: tracking, netScores, comparison: { base: before, comparability: difference(true) } },
  },
  {
    id: 'a difference that an editor lifted',
    input: {
      release: tracking,
      netScores,
      comparison: { base: before, comparability: difference(true), override: { reason: 'Checked.' } },
    },
  },
  {
    id: 'subgroups',
    input: {
      release: later,
      subgroups: [
        {
          question: 'Vote "now"\n# x',
          total: { name: 'All', base: later },
          groups: [
            group('Young', 402, { Alder: 45, Brook: 20, Dune: 2, "Don't know": null }),
            group('Old "er"\n', 802, { Alder: 29, Brook: 31, Dune: 8, "Don't know": 19 }),
            group('North', 24, { Alder: 40, Brook: 20 }, 'region'),
            group('South', 300, { Alder: 31, Brook: 0 }, 'region'),
            group('West', null, { Alder: 33, Brook: 20 }, 'region'),
          ],
          gaps: [
            { option: 'Alder', group: 'Young', against: 'Old "er"\n' },
            { option: 'Dune', group: 'Young', against: 'Old "er"\n' },
            { option: "Don't know", group: 'Young', against: 'Old "er"\n' },
            { option: 'Alder', group: 'North', against: 'South' },
            { option: 'Brook', group: 'South', against: 'North' },
            { option: 'Alder', group: 'South', against: 'West' },
            { option: 'Brook', group: 'Young', against: { restOfWeightPct: 33.4 } },
            { option: 'Alder', group: 'South', against: { restOfWeightPct: 25 } },
            { option: 'Alder', group: 'West', against: { restOfWeightPct: 25 } },
          ],
        },
      ],
    },
  },
];
