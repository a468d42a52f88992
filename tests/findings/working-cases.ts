import type { ReleaseDocument } from '@/lib/findings/judge-types';
import { sample } from './release-documents';

/** Of the reference cases: findings that together have every kind of step, with every wording of it. */
export const CHECKED_FINDINGS: Record<string, readonly number[]> = {
  'case-001-family': [5],
  'case-002-family': [5],
  'case-004-above': [1, 6],
  'case-006-smalln': [5, 8],
  'case-008-kish': [0, 1, 3],
  'case-011-pctnull': [9],
  'case-012-nnull': [6, 9, 10],
  'case-013-comparison-fragile': [4],
  'case-020-lead-does-not-hold-would-hold-at-lower-deff': [0],
  'case-023-deff': [0],
  'case-025-modelled-fragile': [0, 2, 3],
  'case-026-lead-fragile-second-test': [3],
  'case-031-few': [3],
  'case-033-optin': [7],
  'case-036-extreme': [5],
  'case-038-change-fisher-holds': [2],
  'case-043-change-fisher-fragile-second-test': [2],
  'case-044-optin': [1, 9],
  'case-047-few-clusters': [2],
  'case-049-little-true': [2],
  'case-051-lead-change-fragile-design-effect': [2],
  'case-057-threshold-binomial-fragile-second-test': [2],
};

const weighted = { design: 'weighted' as const };
const parties = { A: 31, B: 27, C: 14, D: 9, Undecided: 19 };
const groups = [
  { name: 'Coast', by: 'region', base: sample(480, { A: 36 }, weighted) },
  { name: 'Hills', by: 'region', base: sample(520, { A: 26 }, weighted) },
];
const asked: ReleaseDocument = {
  release: { ...sample(1000, parties, weighted), rebased: { n: 870 } },
  comparison: {
    base: sample(1200, { ...parties, A: 38, Undecided: 12 }, weighted),
    overlap: { window: 3, shared: 2 },
  },
  blocs: [
    { name: 'Left', options: ['A', 'C'], printed: { pct: 44.6, decimals: 1 } },
    { name: 'Right', options: ['B', 'D'] },
  ],
  pairs: [
    ['A', 'B'],
    ['Left', 'Right'],
  ],
  netScores: [{ approve: 'A', disapprove: 'D' }],
  thresholds: [{ option: 'Right', pct: 33 }],
  subgroups: [
    {
      question: 'Toll',
      total: { name: 'Everyone', base: sample(1000, { A: 31 }, weighted) },
      groups,
      gaps: [
        { option: 'A', group: 'Coast', against: 'Hills' },
        { option: 'A', group: 'Coast', against: { restOfWeightPct: 49 } },
      ],
    },
  ],
};
const interviews = { ...asked, release: sample(1200, parties, weighted) };
const byInterviews: ReleaseDocument = {
  ...interviews,
  comparison: {
    base: sample(1200, parties),
    overlap: { window: 3, shared: 2, interviews: [300, 400, 500, 300] },
  },
};
const twice: ReleaseDocument = { ...asked, comparison: { base: sample(1200, parties), samePeople: true } };

const untestable: ReleaseDocument = {
  ...asked,
  release: sample(null, { ...parties, B: null }, { sampleSource: 'opt-in' }),
  netScores: [],
};

/** Releases with blocs, net scores, thresholds, subgroups and waves. */
export const JUDGED_DOCUMENTS = {
  'every-kind': asked,
  'waves-by-interviews': byInterviews,
  'same-people': twice,
  untestable,
};

/** Of each of them the findings that are written out: together every kind of step. */
export const JUDGED_FINDINGS: Record<keyof typeof JUDGED_DOCUMENTS, readonly string[]> = {
  'every-kind': [
    'share:A',
    'share:Left',
    'share:Right',
    'lead:A|B',
    'lead:Left|Right',
    'net-score:A|D',
    'change:A',
    'change:Right',
    'lead-change:Left|Right',
    'net-score-change:A|D',
    'threshold:Right|33',
    'gap:Toll|A|Coast|Hills',
    'gap:Toll|A|Coast|',
  ],
  'waves-by-interviews': ['lead:A|B', 'change:A', 'change:Right', 'lead-change:A|B'],
  'same-people': ['change:A', 'change:Right', 'lead-change:A|B', 'net-score-change:A|D'],
  untestable: ['share:A', 'lead:Left|Right', 'change:A', 'threshold:Right|33', 'lead-change:Left|Right'],
};
