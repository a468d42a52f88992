import type { Base, CheckDocument } from '@/lib/findings/check-types';

const HOSTILE = [
  '"); stop("out',
  "it's \\ # not a comment\nstop()",
  'Öst\u2028West',
  '\u0000\uD800',
  '🗳 `x`',
];

const small: Base = {
  sampleSource: 'probability',
  n: 130,
  design: 'unweighted',
  decimals: 0,
  shares: [
    { option: 'Alder', pct: 12 },
    { option: 'Brook', pct: 4 },
    { option: 'Cliff', pct: 0 },
    { option: 'Undecided', pct: null, answer: false },
  ],
};

const fine: Base = {
  sampleSource: 'probability',
  n: 2412,
  design: 'clustered',
  deff: { source: 'design', value: 1.71, df: 41 },
  decimals: 4,
  shares: [
    { option: 'Alder', pct: 14.1234 },
    { option: 'Brook', pct: 3.2001 },
    { option: 'Cliff', pct: 0.0002 },
  ],
};

const everyone: Base = {
  sampleSource: 'probability',
  n: 400,
  design: 'weighted',
  deff: { source: 'kish', value: 0.9 },
  decimals: 0,
  shares: [
    { option: 'Alder', pct: 100 },
    { option: 'Brook', pct: 0 },
  ],
};

const named: Base = {
  ...small,
  n: 900,
  shares: HOSTILE.map((option, index) => ({ option, pct: 30 - 4 * index })),
};

/** Documents for what the reference has little of: few counts, no variance, unequal decimals, hostile names. */
export const checkDocuments: readonly { id: string; document: CheckDocument }[] = [
  {
    id: 'few counts on unequal decimals',
    document: {
      release: small,
      previous: fine,
      pairs: [
        ['Alder', 'Brook'],
        ['Brook', 'Cliff'],
        ['Cliff', 'Alder'],
        ['Alder', 'Undecided'],
      ],
      changes: ['Alder', 'Brook', 'Cliff', 'Undecided'],
      thresholds: [
        { option: 'Alder', pct: 5 },
        { option: 'Cliff', pct: 0.5 },
        { option: 'Brook', pct: 99 },
        { option: 'Undecided', pct: 50 },
      ],
    },
  },
  { id: 'many decimals against whole percents', document: { release: fine, previous: small } },
  {
    id: 'no variance',
    document: {
      release: everyone,
      previous: { ...everyone, n: 700 },
      thresholds: [
        { option: 'Alder', pct: 99.9 },
        { option: 'Brook', pct: 50 },
      ],
    },
  },
  {
    id: 'no variance and a change',
    document: {
      release: everyone,
      previous: {
        ...everyone,
        shares: [
          { option: 'Alder', pct: 0 },
          { option: 'Brook', pct: 100 },
        ],
      },
    },
  },
  {
    id: 'names that try to break out',
    document: {
      release: named,
      previous: named,
      changes: HOSTILE,
      thresholds: HOSTILE.map((option) => ({ option, pct: 25 })),
    },
  },
];
