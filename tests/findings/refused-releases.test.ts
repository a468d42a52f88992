import { describe } from 'vitest';
import { type Acceptance, type Refusal, release, testRefusals } from './refusals';
import { sample } from './release-documents';

const base = sample(1200, { A: 33, B: 27, C: 14, D: 9 });
const left = { name: 'Left', options: ['A', 'C'] };
const right = { name: 'Right', options: ['B', 'D'] };
const comparedWith = (more: object) => ({ release, comparison: { base, ...more } });
const averages = (overlap: object) => comparedWith({ overlap: { window: 2, shared: 1, ...overlap } });

const REFUSED: Refusal[] = [
  [
    'a bloc with the name of an option',
    { release, blocs: [{ ...left, name: 'B' }] },
    'blocs[0].name',
    'This name belongs to an option or bloc already.',
  ],
  [
    'a bloc named twice',
    { release, blocs: [left, { ...right, name: 'Left' }] },
    'blocs[1].name',
    'This name belongs to an option or bloc already.',
  ],
  [
    'a bloc without a name',
    { release, blocs: [{ ...left, name: '' }] },
    'blocs[0].name',
    'A bloc needs its name.',
  ],
  [
    'a bloc of nothing',
    { release, blocs: [{ ...left, options: [] }] },
    'blocs[0].options',
    'A bloc sums at least one option.',
  ],
  [
    'a bloc of an unknown option',
    { release, blocs: [{ ...left, options: ['A', 'X'] }] },
    'blocs[0].options[1]',
    'This option is not in the release.',
  ],
  [
    'a bloc that counts an option twice',
    { release, blocs: [{ ...left, options: ['A', 'A'] }] },
    'blocs[0].options[1]',
    'This bloc counts the option already.',
  ],
  [
    'a printed bloc with too many decimals',
    { release, blocs: [{ ...left, printed: { pct: 45.15, decimals: 1 } }] },
    'blocs[0].printed.pct',
    'This figure has more than its 1 decimals.',
  ],
  [
    'a printed bloc above its options',
    { release, blocs: [{ ...left, printed: { pct: 46.1, decimals: 1 } }] },
    'blocs[0].printed.pct',
    'This figure is not the sum of its options, rounding allowed for.',
  ],
  [
    'a printed bloc below its options',
    { release, blocs: [{ ...left, printed: { pct: 43.9, decimals: 1 } }] },
    'blocs[0].printed.pct',
    'This figure is not the sum of its options, rounding allowed for.',
  ],
  [
    'a bloc below the one of its options that is known',
    {
      release: sample(1000, { A: 31, B: null }),
      blocs: [{ name: 'Left', options: ['A', 'B'], printed: { pct: 29, decimals: 0 } }],
    },
    'blocs[0].printed.pct',
    'This figure is not the sum of its options, rounding allowed for.',
  ],
  [
    'an earlier figure of no bloc',
    comparedWith({ blocs: [{ name: 'Left', pct: 47, decimals: 0 }] }),
    'comparison.blocs[0].name',
    'No bloc has this name.',
  ],
  [
    'an earlier figure given twice',
    { ...comparedWith({ blocs: [0, 1].map(() => ({ name: 'Left', pct: 47, decimals: 0 })) }), blocs: [left] },
    'comparison.blocs[1]',
    'This bloc has an earlier figure already.',
  ],
  [
    'an earlier figure that is not the sum',
    { ...comparedWith({ blocs: [{ name: 'Left', pct: 40, decimals: 0 }] }), blocs: [left] },
    'comparison.blocs[0].pct',
    'This figure is not the sum of its options, rounding allowed for.',
  ],
  [
    'a pair with an option in common',
    { release, blocs: [left], pairs: [['Left', 'A']] },
    'pairs[0]',
    'These two have an option in common.',
  ],
  [
    'a net score of an unknown option',
    { release, netScores: [{ approve: 'X', disapprove: 'B' }] },
    'netScores[0].approve',
    'This option is not in the release.',
  ],
  [
    'a net score less an unknown option',
    { release, netScores: [{ approve: 'A', disapprove: 'X' }] },
    'netScores[0].disapprove',
    'This option is not in the release.',
  ],
  [
    'a net score of a bloc and its part',
    { release, blocs: [left], netScores: [{ approve: 'C', disapprove: 'Left' }] },
    'netScores[0]',
    'These two have an option in common.',
  ],
  [
    'a net score that is asked as a pair',
    { release, pairs: [['A', 'B']], netScores: [{ approve: 'B', disapprove: 'A' }] },
    'netScores[0]',
    'This is asked already.',
  ],
  [
    'a change without an earlier release',
    { release, changes: ['A'] },
    'changes',
    'A change needs the release it is compared with.',
  ],
  [
    'a change of an unknown option',
    { ...comparedWith({}), changes: ['A', 'X'] },
    'changes[1]',
    'This option is not in the release.',
  ],
  [
    'a change asked twice',
    { ...comparedWith({}), changes: ['A', 'A'] },
    'changes[1]',
    'This is asked already.',
  ],
  [
    'a threshold of an unknown option',
    { release, thresholds: [{ option: 'X', pct: 5 }] },
    'thresholds[0].option',
    'This option is not in the release.',
  ],
  [
    'a threshold asked twice',
    { release, thresholds: [0, 1].map(() => ({ option: 'A', pct: 5 })) },
    'thresholds[1]',
    'This is asked already.',
  ],
  [
    'a base that no rule counts',
    { release, thresholds: [{ option: 'A', pct: 5, countedBase: 'everyone' }] },
    'thresholds[0].countedBase',
    'This is not a base that a rule counts.',
  ],
  [
    'an unknown population',
    { release: { ...release, population: 'voters' } },
    'release.population',
    'The population is adults, registered-voters or likely-voters.',
  ],
  [
    'comparable with a difference listed',
    comparedWith({
      comparability: {
        comparable: true,
        differences: [{ item: 'mode', current: 'online', earlier: 'postal', isOverridable: true }],
        unknowns: [],
      },
    }),
    'comparison.comparability.comparable',
    'Two releases compare where no difference is listed, and only there.',
  ],
  [
    'not comparable with none listed',
    comparedWith({ comparability: { comparable: false, differences: [], unknowns: [] } }),
    'comparison.comparability.comparable',
    'Two releases compare where no difference is listed, and only there.',
  ],
  [
    'comparability by another word',
    comparedWith({ comparability: { comparable: 'yes', differences: [], unknowns: [] } }),
    'comparison.comparability.comparable',
    'comparable is true or false.',
  ],
  [
    'an item of comparability that is none',
    comparedWith({ comparability: { comparable: true, differences: [], unknowns: ['weather'] } }),
    'comparison.comparability.unknowns[0]',
    'This is not an item of comparability.',
  ],
  [
    'an override without its reason',
    comparedWith({ override: { reason: ' ' } }),
    'comparison.override.reason',
    'An override needs its reason.',
  ],
  [
    'people asked twice, by another word',
    comparedWith({ samePeople: 'yes' }),
    'comparison.samePeople',
    'samePeople is true or false.',
  ],
  [
    'more waves shared than there are',
    averages({ shared: 3 }),
    'comparison.overlap.shared',
    'No more waves are shared than an average has.',
  ],
  [
    'half a wave',
    averages({ shared: 0.5 }),
    'comparison.overlap.shared',
    'The waves shared are a whole number of at least 0.',
  ],
  [
    'no wave',
    averages({ window: 0, shared: 0 }),
    'comparison.overlap.window',
    'The waves of an average are a whole number from 1 to 10,000.',
  ],
  [
    'too many waves',
    averages({ window: 10_001, shared: 0 }),
    'comparison.overlap.window',
    'The waves of an average are a whole number from 1 to 10,000.',
  ],
  [
    'interviews of too few waves',
    averages({ interviews: [600, 600] }),
    'comparison.overlap.interviews',
    'Two averages have twice the window, less the shared, waves in all.',
  ],
  [
    'earlier waves that do not sum',
    averages({ interviews: [599, 600, 400] }),
    'comparison.overlap.interviews',
    'The waves of an average sum to its sample size.',
  ],
  [
    'later waves that do not sum',
    averages({ interviews: [600, 600, 401] }),
    'comparison.overlap.interviews',
    'The waves of an average sum to its sample size.',
  ],
  [
    'shares by wave of an unknown option',
    averages({ shares: [{ option: 'X', pct: [1, 2, 3] }] }),
    'comparison.overlap.shares[0].option',
    'This option is not in the release.',
  ],
  [
    'shares by wave given twice',
    averages({ shares: [0, 1].map(() => ({ option: 'A', pct: [30, 31, 32] })) }),
    'comparison.overlap.shares[1]',
    'This is asked already.',
  ],
  [
    'shares of too few waves',
    averages({ shares: [{ option: 'A', pct: [30, 31] }] }),
    'comparison.overlap.shares[0].pct',
    'Two averages have twice the window, less the shared, waves in all.',
  ],
  [
    'more people left than were asked',
    { release: { ...release, rebased: { n: 1001 } } },
    'release.rebased.n',
    'No more people are left than were asked.',
  ],
  [
    'a re-based question with a share of no answer',
    {
      release: {
        ...sample(1000, { A: 31 }),
        shares: [
          { option: 'A', pct: 31 },
          { option: 'Undecided', pct: 5, answer: false },
        ],
        rebased: { n: 900 },
      },
    },
    'release.shares[1].pct',
    'Shares that leave out those without an answer have no share for them.',
  ],
  ['a document that is a text', 'release' as unknown as object, '', 'A release document is a JSON object.'],
];

const ACCEPTED: Acceptance[] = [
  [
    'a printed bloc within the rounding of its options',
    { release, blocs: [{ ...left, printed: { pct: 46, decimals: 1 } }] },
  ],
  [
    'a bloc above the one of its options that is known',
    {
      release: sample(1000, { A: 31, B: null }),
      blocs: [{ name: 'Left', options: ['A', 'B'], printed: { pct: 45, decimals: 0 } }],
    },
  ],
  [
    'a bloc that is everything',
    { release: sample(1000, { A: 60, B: 40 }), blocs: [{ name: 'Both', options: ['A', 'B'] }] },
  ],
  ['as many people left as were asked', { release: { ...release, rebased: { n: 1000 } } }],
  [
    'waves all of which are shared',
    {
      release: sample(1200, { A: 31 }),
      comparison: { base, overlap: { window: 2, shared: 2, interviews: [600, 600] } },
    },
  ],
];

describe('a release document is refused at its fault, in words for whoever wrote it', () => {
  testRefusals(REFUSED, ACCEPTED);
});
