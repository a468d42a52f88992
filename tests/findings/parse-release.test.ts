import { describe, expect, test } from 'vitest';
import cases from '../reference/findings/cases.json';
import refused from '../reference/findings/refused.json';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import { judgeRelease } from '@/lib/findings/judge-release';
import { parseReleaseDocument } from '@/lib/findings/parse-release';
import { differences } from './agreement';
import { sample } from './release-documents';

const release = sample(1000, { A: 31, B: 27, C: 14, D: 9 });
const base = sample(1200, { A: 33, B: 27, C: 14, D: 9 });
const group = (name: string, by: string, n: number, pct: number) => ({
  name,
  by,
  base: sample(n, { A: pct }),
});
const total = { name: 'Everyone', base: sample(1000, { A: 31 }) };
const groups = [
  group('Coast', 'region', 480, 36),
  group('Hills', 'region', 520, 26),
  group('Young', 'age', 300, 20),
];
const subgroups = (gap: object, more: object = {}) => [
  { question: 'Toll', total, groups, gaps: [gap], ...more },
];
const left = { name: 'Left', options: ['A', 'C'] };

/** A release document asked as a check document asks it. */
function asRelease({ previous, ...document }: CheckDocument & { thresholds?: unknown }) {
  return { ...document, ...(previous === undefined ? {} : { comparison: previous && { base: previous } }) };
}

const FAULTS: [title: string, document: object, path: string][] = [
  ['an unknown key', { release, extra: 1 }, 'extra'],
  ['a key that a base does not have', { release: { ...release, size: 2 } }, 'release.size'],
  ['a text for a document', 'release' as unknown as object, ''],
  ['null where only absence is allowed', { release, blocs: null }, 'blocs'],
  ['more people left than asked', { release: { ...release, rebased: { n: 1001 } } }, 'release.rebased.n'],
  [
    'a re-based base that still lists the undecided',
    {
      release: {
        ...release,
        shares: [...release.shares, { option: 'Undecided', pct: 5, answer: false }],
        rebased: { n: 900 },
      },
    },
    'release.shares[4].pct',
  ],
  ['a faulty earlier base', { release, comparison: { base: { ...base, n: 0 } } }, 'comparison.base.n'],
  ['a bloc with the name of an option', { release, blocs: [{ ...left, name: 'B' }] }, 'blocs[0].name'],
  ['two blocs of one name', { release, blocs: [left, left] }, 'blocs[1].name'],
  [
    'a bloc of an unknown option',
    { release, blocs: [{ ...left, options: ['A', 'X'] }] },
    'blocs[0].options[1]',
  ],
  [
    'a bloc that sums an option twice',
    { release, blocs: [{ ...left, options: ['A', 'A'] }] },
    'blocs[0].options[1]',
  ],
  ['a bloc of nothing', { release, blocs: [{ ...left, options: [] }] }, 'blocs[0].options'],
  [
    'a figure that the options cannot sum to',
    { release, blocs: [{ ...left, printed: { pct: 46.1, decimals: 1 } }] },
    'blocs[0].printed.pct',
  ],
  [
    'a figure with more than its decimals',
    { release, blocs: [{ ...left, printed: { pct: 45.15, decimals: 1 } }] },
    'blocs[0].printed.pct',
  ],
  [
    'an earlier figure of no bloc',
    { release, comparison: { base, blocs: [{ name: 'Left', pct: 40, decimals: 0 }] } },
    'comparison.blocs[0].name',
  ],
  ['a bloc against a part of it', { release, blocs: [left], pairs: [['Left', 'C']] }, 'pairs[0]'],
  [
    'two blocs with an option in common',
    { release, blocs: [left, { name: 'Centre', options: ['C', 'D'] }], pairs: [['Left', 'Centre']] },
    'pairs[0]',
  ],
  [
    'a net score of an unknown option',
    { release, netScores: [{ approve: 'A', disapprove: 'X' }] },
    'netScores[0].disapprove',
  ],
  [
    'a net score that is asked as a pair',
    { release, pairs: [['A', 'B']], netScores: [{ approve: 'B', disapprove: 'A' }] },
    'netScores[0]',
  ],
  ['changes without a comparison', { release, changes: ['A'] }, 'changes'],
  ['a change of an unknown name', { release, comparison: { base }, changes: ['X'] }, 'changes[0]'],
  [
    'a threshold asked twice',
    {
      release,
      thresholds: [
        { option: 'A', pct: 5 },
        { option: 'A', pct: 5 },
      ],
    },
    'thresholds[1]',
  ],
  [
    'an outcome that contradicts its differences',
    { release, comparison: { base, comparability: { comparable: false, differences: [], unknowns: [] } } },
    'comparison.comparability.comparable',
  ],
  [
    'an override without a reason',
    { release, comparison: { base, override: { reason: ' ' } } },
    'comparison.override.reason',
  ],
  [
    'more waves shared than there are',
    { release, comparison: { base, overlap: { window: 3, shared: 4 } } },
    'comparison.overlap.shared',
  ],
  [
    'more waves than anyone has asked',
    { release, comparison: { base, overlap: { window: 1e10, shared: 1 } } },
    'comparison.overlap.window',
  ],
  [
    'half a wave',
    { release, comparison: { base, overlap: { window: 2.5, shared: 1 } } },
    'comparison.overlap.window',
  ],
  [
    'a wave too few',
    { release, comparison: { base, overlap: { window: 3, shared: 2, interviews: [400, 400, 400] } } },
    'comparison.overlap.interviews',
  ],
  [
    'waves that do not sum to the sample',
    { release, comparison: { base, overlap: { window: 2, shared: 1, interviews: [600, 600, 500] } } },
    'comparison.overlap.interviews',
  ],
  [
    'shares of a wave too few',
    {
      release,
      comparison: { base, overlap: { window: 2, shared: 1, shares: [{ option: 'A', pct: [30] }] } },
    },
    'comparison.overlap.shares[0].pct',
  ],
  [
    'a subgroup against the total that it is part of',
    { release, subgroups: subgroups({ option: 'A', group: 'Coast', against: 'Everyone' }) },
    'subgroups[0].gaps[0].against',
  ],
  [
    'groups that have people in common',
    { release, subgroups: subgroups({ option: 'A', group: 'Coast', against: 'Young' }) },
    'subgroups[0].gaps[0]',
  ],
  [
    'a group that is not there',
    { release, subgroups: subgroups({ option: 'A', group: 'Isles', against: 'Coast' }) },
    'subgroups[0].gaps[0].group',
  ],
  [
    'an option that a group lacks',
    { release, subgroups: subgroups({ option: 'B', group: 'Coast', against: 'Hills' }) },
    'subgroups[0].gaps[0].option',
  ],
  [
    'the rest of a sample that is not given',
    {
      release,
      subgroups: subgroups(
        { option: 'A', group: 'Coast', against: { restOfWeightPct: 40 } },
        { total: undefined },
      ),
    },
    'subgroups[0].gaps[0].against',
  ],
  [
    'figures that leave the rest below nothing',
    { release, subgroups: subgroups({ option: 'A', group: 'Coast', against: { restOfWeightPct: 95 } }) },
    'subgroups[0].gaps[0].against.restOfWeightPct',
  ],
  [
    'a weight that is none',
    { release, subgroups: subgroups({ option: 'A', group: 'Coast', against: { restOfWeightPct: 100 } }) },
    'subgroups[0].gaps[0].against.restOfWeightPct',
  ],
  [
    'more people in groups than in the sample',
    {
      release,
      subgroups: subgroups(
        { option: 'A', group: 'Coast', against: 'Hills' },
        { groups: [...groups, group('Isles', 'region', 30, 40)] },
      ),
    },
    'subgroups[0].groups[3].base.n',
  ],
];

describe('a release document is refused with the path of its fault', () => {
  test.each(FAULTS)('%s', (_title, document, path) => {
    const parse = () => parseReleaseDocument(document);
    expect(parse).toThrow(expect.objectContaining({ name: 'CheckRefused' }));
    expect(parse).toThrow(expect.objectContaining({ path: expect.stringMatching(pathPattern(path)) }));
  });

  test('faults of a check document are refused at the same place', () => {
    for (const { input, path, id } of refused) {
      const document = asRelease(input as unknown as CheckDocument);
      const expected = path.replace(/^previous/, 'comparison.base');
      expect(() => parseReleaseDocument(document), id).toThrow(expect.objectContaining({ path: expected }));
    }
  });
});

describe('judging and checking', () => {
  test('agree on everything that both answer, over every reference document', () => {
    for (const { id, input } of cases) {
      const document = input as unknown as CheckDocument;
      const judged = judgeRelease(parseReleaseDocument(asRelease(document)));
      const plain = judged.findings.map((finding) =>
        Object.fromEntries(
          Object.entries(finding).filter(([key]) => !['key', 'working', 'trace'].includes(key)),
        ),
      );
      expect(differences(plain, check(document).findings, id)).toEqual([]);
      expect(differences(judged.base, check(document).base, id)).toEqual([]);
    }
  });

  test('change nothing in the document', () => {
    const document = {
      release,
      comparison: { base, overlap: { window: 3, shared: 1 } },
      blocs: [left],
      subgroups: subgroups({ option: 'A', group: 'Coast', against: { restOfWeightPct: 48 } }),
    };
    const before = JSON.stringify(document);
    judgeRelease(parseReleaseDocument(deepFrozen(document)));
    expect(JSON.stringify(document)).toBe(before);
  });
});

function pathPattern(path: string): RegExp {
  return new RegExp(`^${path.replace(/[.[\]]/g, '\\$&')}$`);
}

function deepFrozen<Value>(value: Value): Value {
  if (typeof value === 'object' && value !== null) Object.values(Object.freeze(value)).forEach(deepFrozen);
  return value;
}
