import { describe, expect, test } from 'vitest';
import { CheckRefused } from '@/lib/findings/check-refused';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import cases from '../reference/findings/cases.json';
import refused from '../reference/findings/refused.json';

function refusalOf(input: unknown): { path: string; message: string } {
  try {
    parseCheckDocument(input);
  } catch (error) {
    if (error instanceof CheckRefused) return error.toRefusal();
    throw error;
  }
  throw new Error('the document was accepted');
}

describe('parseCheckDocument', () => {
  test.each(refused.map((one) => [one.id, one.path, one.input] as const))(
    'refuses %s at %s',
    (_id, path, input) => {
      const refusal = refusalOf(input);
      expect(refusal.path).toBe(path);
      expect(refusal.message).toMatch(/^[A-Z].*\.$/);
    },
  );

  test.each(cases.map((one) => [one.id, one.input] as const))('accepts %s unchanged', (_id, input) => {
    expect(parseCheckDocument(input)).toEqual(input);
  });
});

const share = (option: string, pct: number | null) => ({ option, pct });
const base = {
  sampleSource: 'probability',
  n: 1000,
  design: 'weighted',
  decimals: 0,
  shares: [share('Alder', 47), share('Brook', 41)],
};
const release = (change: object) => ({ release: { ...base, ...change } });
const policy = (change: object) => ({ policy: change, release: base });
const margin = { pp: 3.6, unit: 0.1, level: 0.95 };
const withoutN = Object.fromEntries(Object.entries(base).filter(([key]) => key !== 'n'));

const faults: [what: string, input: unknown, path: string][] = [
  ['no document', null, ''],
  ['a list for a document', [], ''],
  ['an unknown key at the top', { release: base, notes: 'x' }, 'notes'],
  ['a missing release', {}, 'release'],
  ['a missing sample size', { release: withoutN }, 'release.n'],
  ['n that is not a number', release({ n: Number.NaN }), 'release.n'],
  ['infinite n', release({ n: Number.POSITIVE_INFINITY }), 'release.n'],
  ['n that is not whole', release({ n: 10.5 }), 'release.n'],
  ['more people than counts can hold', release({ n: 1e16 }), 'release.n'],
  [
    'a margin that vanishes',
    release({ statedMargin: { ...margin, pp: 5e-324, unit: 5e-324 } }),
    'release.statedMargin.pp',
  ],
  [
    'a threshold that vanishes',
    { ...release({}), thresholds: [{ option: 'Alder', pct: 5e-324 }] },
    'thresholds[0].pct',
  ],
  ['a range without end', policy({ kishRange: [0.5, 1e308] }), 'policy.kishRange'],
  ['n as text', release({ n: '1000' }), 'release.n'],
  ['a share above 100', release({ shares: [share('Alder', 101)] }), 'release.shares[0].pct'],
  ['a negative share', release({ shares: [share('Alder', -1)] }), 'release.shares[0].pct'],
  ['no shares', release({ shares: [] }), 'release.shares'],
  [
    'an unknown key in a share',
    release({ shares: [{ ...share('Alder', 47), n: 3 }] }),
    'release.shares[0].n',
  ],
  ['a missing pct', release({ shares: [{ option: 'Alder' }] }), 'release.shares[0].pct'],
  ['answer null', release({ shares: [{ ...share('Alder', 47), answer: null }] }), 'release.shares[0].answer'],
  ['a name used twice', release({ shares: [share('A', 4), share('A', 5)] }), 'release.shares[1].option'],
  ['shares beyond rounding', release({ shares: [share('A', 60), share('B', 42)] }), 'release.shares'],
  ['seven decimals', release({ decimals: 7 }), 'release.decimals'],
  ['half a decimal', release({ decimals: 0.5 }), 'release.decimals'],
  ['a level of 1', policy({ level: 1 }), 'policy.level'],
  ['a policy of null', { policy: null, release: base }, 'policy'],
  [
    'a unit above 10',
    release({ statedMargin: { pp: 22, unit: 11, level: 0.95 } }),
    'release.statedMargin.unit',
  ],
  ['a margin of 0', release({ statedMargin: { ...margin, pp: 0 } }), 'release.statedMargin.pp'],
  [
    'an uneven margin that is ignored',
    release({ modelledInterval: { ...margin, unit: 0.5 } }),
    'release.modelledInterval.pp',
  ],
  [
    'a margin without its unit',
    release({ statedMargin: { pp: 3, level: 0.95 } }),
    'release.statedMargin.unit',
  ],
  [
    'a margin at level 0.5',
    release({ statedMargin: { ...margin, level: 0.5 } }),
    'release.statedMargin.level',
  ],
  ['deff below 0.5', release({ deff: { source: 'design', value: 0.4 } }), 'release.deff.value'],
  ['df of 0', release({ deff: { source: 'design', value: 1, df: 0 } }), 'release.deff.df'],
  ['df null', release({ deff: { source: 'design', value: 1, df: null } }), 'release.deff.df'],
  ['df of a stated one', release({ deff: { source: 'stated', value: 1, df: 9 } }), 'release.deff.df'],
  [
    'an assumed value above 10',
    policy({ assumed: { weighted: { value: 11, range: [1, 10] } } }),
    'policy.assumed.weighted.value',
  ],
  [
    'an assumed range below 0.5',
    policy({ assumed: { weighted: { value: 1, range: [0.4, 2] } } }),
    'policy.assumed.weighted.range',
  ],
  [
    'an assumed range of one end',
    policy({ assumed: { weighted: { value: 1, range: [1] } } }),
    'policy.assumed.weighted.range',
  ],
  [
    'a range end as text',
    policy({ assumed: { clustered: { value: 1, range: [1, '2'] } } }),
    'policy.assumed.clustered.range',
  ],
  [
    'an assumed entry without range',
    policy({ assumed: { weighted: { value: 1 } } }),
    'policy.assumed.weighted.range',
  ],
  [
    'an unknown design',
    policy({ assumed: { stratified: { value: 1, range: [1, 1] } } }),
    'policy.assumed.stratified',
  ],
  ['a Kish range without 1', policy({ kishRange: [1.1, 1.3] }), 'policy.kishRange'],
  ['a Kish range from 0', policy({ kishRange: [0, 1.3] }), 'policy.kishRange'],
  ['a Kish range of three', policy({ kishRange: [0.8, 1, 1.3] }), 'policy.kishRange'],
  ['indifference of 0', policy({ indifferencePp: 0 }), 'policy.indifferencePp'],
  ['a minimum below 1', policy({ minimumNEff: 0.5 }), 'policy.minimumNEff'],
  ['a threshold of 100', { release: base, thresholds: [{ option: 'Alder', pct: 100 }] }, 'thresholds[0].pct'],
  [
    'a threshold on an unknown option',
    { release: base, thresholds: [{ option: 'X', pct: 50 }] },
    'thresholds[0].option',
  ],
  ['a pair with an unknown option', { release: base, pairs: [['Alder', 'X']] }, 'pairs[0][1]'],
  ['a pair of one option', { release: base, pairs: [['Alder', 'Alder']] }, 'pairs[0]'],
  ['a pair of one name', { release: base, pairs: [['Alder']] }, 'pairs[0]'],
  ['a pair of three', { release: base, pairs: [['Alder', 'Brook', 'Alder']] }, 'pairs[0]'],
  [
    'a pair in either order',
    {
      release: base,
      pairs: [
        ['Alder', 'Brook'],
        ['Brook', 'Alder'],
      ],
    },
    'pairs[1]',
  ],
  ['a change twice', { release: base, previous: base, changes: ['Alder', 'Alder'] }, 'changes[1]'],
  ['a change of an unknown option', { release: base, previous: base, changes: ['X'] }, 'changes[0]'],
  ['changes without previous', { release: base, previous: null, changes: ['Alder'] }, 'changes'],
  ['pairs null', { release: base, pairs: null }, 'pairs'],
  ['a fault in previous', { release: base, previous: { ...base, n: 0 } }, 'previous.n'],
  ['a key that objects inherit', { release: base, toString: 1 }, 'toString'],
  ['a key named __proto__', JSON.parse(`{"release":${JSON.stringify(base)},"__proto__":1}`), '__proto__'],
  [
    '__proto__ in a share',
    release({ shares: [JSON.parse('{"option":"A","pct":1,"__proto__":{}}')] }),
    'release.shares[0].__proto__',
  ],
];

describe('parseCheckDocument refuses', () => {
  test.each(faults)('%s', (_what, input, path) => {
    expect(refusalOf(input).path).toBe(path);
  });
});

describe('parseCheckDocument accepts', () => {
  const accepted: [what: string, input: unknown][] = [
    ['shares exactly at the rounding limit', release({ shares: [share('A', 60), share('B', 41)] })],
    ['3.6 as a multiple of 0.1', release({ statedMargin: margin })],
    [
      'equal ends of a range',
      policy({ assumed: { weighted: { value: 1, range: [1, 1] } }, kishRange: [1, 1] }),
    ],
    [
      'an empty policy and empty lists',
      { policy: { assumed: {} }, release: base, pairs: [], changes: [], thresholds: [] },
    ],
    [
      'one option at two thresholds',
      {
        release: base,
        thresholds: [
          { option: 'Alder', pct: 50 },
          { option: 'Alder', pct: 40 },
        ],
      },
    ],
    ['a share that is not disclosed', release({ shares: [share('Alder', null)] })],
    [
      'options named like inherited keys',
      release({ shares: [share('__proto__', 4), share('constructor', 5)] }),
    ],
    [
      'a wide margin on a sample that takes no notice of it',
      release({ sampleSource: 'opt-in', statedMargin: { pp: 40, unit: 1, level: 0.95 } }),
    ],
  ];
  test.each(accepted)('%s', (_what, input) => {
    expect(parseCheckDocument(input)).toEqual(input);
  });
});
