import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Verdict } from '@/lib/findings/check-types';
import type { ReleaseDocument } from '@/lib/findings/judge-types';
import {
  anyDeff,
  anyShares,
  anySize,
  judge,
  sample,
  testedOf,
  testFieldsOf,
  untestedOf,
} from './release-documents';

const STRENGTH: Record<Verdict, number> = { holds: 3, fragile: 2, 'does-not-hold': 1, 'cannot-be-tested': 0 };
const stated = (value: number) => ({ deff: { source: 'stated' as const, value } });
const anyRelease = fc
  .tuple(anySize, anyShares, anyDeff)
  .map(([n, shares, deff]) => ({ n, shares, deff, base: sample(n, shares, stated(deff)) }));
const lead: Pick<ReleaseDocument, 'pairs'> = { pairs: [['A', 'B']] };
const RUNS = { numRuns: 60 };

describe('leads and net scores', () => {
  test('turn their sign with the pair and keep their verdict', () => {
    fc.assert(
      fc.property(anyRelease, ({ base }) => {
        const one = testedOf({ release: base, pairs: [['A', 'B']] }, 'lead:A|B');
        const other = testedOf({ release: base, pairs: [['B', 'A']] }, 'lead:B|A');
        expect(other.estimatePp + one.estimatePp).toBe(0);
        expect([other.verdict, other.p, other.reasons]).toEqual([one.verdict, one.p, one.reasons]);
      }),
      RUNS,
    );
  });

  test('a net score is the lead of what it is made of', () => {
    fc.assert(
      fc.property(anyRelease, ({ base }) => {
        const net = { release: base, netScores: [{ approve: 'A', disapprove: 'B' }], pairs: [] };
        expect(testFieldsOf(net, 'net-score:A|B')).toEqual(
          testFieldsOf({ release: base, ...lead }, 'lead:A|B'),
        );
      }),
      RUNS,
    );
  });

  test('a bloc of one option is that option', () => {
    fc.assert(
      fc.property(anyRelease, anyRelease, ({ base }, { base: before }) => {
        const blocs = [{ name: 'Alone', options: ['A'] }];
        const comparison = { base: before };
        const document = { release: base, comparison, blocs };
        const bloc: ReleaseDocument = { ...document, pairs: [['Alone', 'B']], changes: ['Alone'] };
        const plain: ReleaseDocument = { ...document, pairs: [['A', 'B']], changes: ['A'] };
        expect(testFieldsOf(bloc, 'lead:Alone|B')).toEqual(testFieldsOf(plain, 'lead:A|B'));
        expect(testFieldsOf(bloc, 'change:Alone')).toEqual(testFieldsOf(plain, 'change:A'));
      }),
      RUNS,
    );
  });

  test('the order of the shares changes nothing but the order', () => {
    fc.assert(
      fc.property(anyRelease, ({ base }) => {
        const turned = { ...base, shares: [...base.shares].reverse() };
        expect(testFieldsOf({ release: turned, ...lead }, 'lead:A|B')).toEqual(
          testFieldsOf({ release: base, ...lead }, 'lead:A|B'),
        );
        const shares = judge({ release: turned, pairs: [] }).findings.map(({ key }) => key);
        expect(shares.reverse()).toEqual(judge({ release: base, pairs: [] }).findings.map(({ key }) => key));
      }),
      RUNS,
    );
  });

  test('the interval leaves out 0 exactly where the test alone is significant', () => {
    fc.assert(
      fc.property(anyRelease, ({ base }) => {
        const { intervalPp, p } = testedOf({ release: base, ...lead }, 'lead:A|B');
        expect(intervalPp[0] > 0 || intervalPp[1] < 0).toBe(p < 0.05);
      }),
      RUNS,
    );
  });
});

describe('a verdict never grows stronger', () => {
  const strengthOf = (document: ReleaseDocument, key: string) => STRENGTH[testedOf(document, key).verdict];

  test('with coarser rounding', () => {
    fc.assert(
      fc.property(anyRelease, ({ base }) => {
        const fine = { ...base, decimals: 1 };
        expect(strengthOf({ release: base, ...lead }, 'lead:A|B')).toBeLessThanOrEqual(
          strengthOf({ release: fine, ...lead }, 'lead:A|B'),
        );
      }),
      RUNS,
    );
  });

  test('with a larger design effect', () => {
    fc.assert(
      fc.property(anyRelease, fc.double({ min: 1, max: 2, noNaN: true }), ({ n, shares, deff }, factor) => {
        const more = sample(n, shares, stated(deff * factor));
        const less = sample(n, shares, stated(deff));
        fc.pre(n / (deff * factor) >= 100);
        expect(strengthOf({ release: more, ...lead }, 'lead:A|B')).toBeLessThanOrEqual(
          strengthOf({ release: less, ...lead }, 'lead:A|B'),
        );
      }),
      RUNS,
    );
  });

  test('with a wider range of the design effect', () => {
    fc.assert(
      fc.property(anyRelease, fc.double({ min: 1, max: 2, noNaN: true }), ({ n, shares, deff }, factor) => {
        const release = sample(n, shares, { deff: { source: 'kish', value: deff } });
        const at = (high: number) => ({ release, ...lead, policy: { kishRange: [1, high] as const } });
        const [wide, narrow] = [at(1.1 * factor), at(1.1)].map((document) =>
          strengthOf(document, 'lead:A|B'),
        );
        expect(wide).toBeLessThanOrEqual(narrow ?? 0);
      }),
      RUNS,
    );
  });

  test('in a larger family', () => {
    fc.assert(
      fc.property(anyRelease, ({ base }) => {
        const alone = testedOf({ release: base, ...lead }, 'lead:A|B');
        const more: ReleaseDocument = {
          release: base,
          pairs: [
            ['A', 'B'],
            ['B', 'C'],
          ],
          netScores: [{ approve: 'A', disapprove: 'C' }],
        };
        const among = testedOf(more, 'lead:A|B');
        expect(STRENGTH[among.verdict]).toBeLessThanOrEqual(STRENGTH[alone.verdict]);
        expect(among.pAdjusted).toBeGreaterThanOrEqual(alone.pAdjusted);
      }),
      RUNS,
    );
  });
});

describe('gaps, waves and people asked twice', () => {
  test('a gap turns its sign with its groups and keeps its verdict', () => {
    const anyGroup = fc.tuple(fc.integer({ min: 150, max: 900 }), fc.integer({ min: 10, max: 90 }));
    fc.assert(
      fc.property(anyGroup, anyGroup, ([n1, p1], [n2, p2]) => {
        const groups = [
          { name: 'Coast', by: 'region', base: sample(n1, { A: p1 }) },
          { name: 'Hills', by: 'region', base: sample(n2, { A: p2 }) },
        ];
        const ask = (group: string, against: string): ReleaseDocument => ({
          release: sample(2000, { A: 40 }),
          subgroups: [{ question: 'Toll', groups, gaps: [{ option: 'A', group, against }] }],
        });
        const one = testedOf(ask('Coast', 'Hills'), 'gap:Toll|A|Coast|Hills');
        const other = testedOf(ask('Hills', 'Coast'), 'gap:Toll|A|Hills|Coast');
        expect(one.estimatePp + other.estimatePp).toBe(0);
        expect(other.verdict).toBe(one.verdict);
        expect(other.sePp).toBeCloseTo(one.sePp, 12);
      }),
      RUNS,
    );
  });

  test('averages with no wave in common are an ordinary change', () => {
    fc.assert(
      fc.property(
        anyRelease,
        anyRelease,
        fc.integer({ min: 1, max: 9 }),
        ({ base }, { base: before }, window) => {
          const ask = (more: object): ReleaseDocument => ({
            release: base,
            comparison: { base: before, ...more },
            changes: ['A'],
          });
          const apart = testFieldsOf(ask({ overlap: { window, shared: 0 } }), 'change:A');
          expect(apart).toEqual(testFieldsOf(ask({}), 'change:A'));
        },
      ),
      RUNS,
    );
  });

  test('equal interviews said or assumed are the same', () => {
    const waves = fc
      .integer({ min: 2, max: 8 })
      .chain((window) => fc.tuple(fc.constant(window), fc.integer({ min: 1, max: window - 1 })));
    fc.assert(
      fc.property(
        waves,
        fc.integer({ min: 100, max: 400 }),
        anyShares,
        anyShares,
        ([window, shared], each, now, then) => {
          const ask = (interviews?: number[]): ReleaseDocument => ({
            release: sample(window * each, now),
            comparison: {
              base: sample(window * each, then),
              overlap: { window, shared, ...(interviews ? { interviews } : {}) },
            },
            changes: ['A'],
          });
          const said = ask(Array<number>(2 * window - shared).fill(each));
          expect(testedOf(said, 'change:A').sePp).toBeCloseTo(testedOf(ask(), 'change:A').sePp, 10);
        },
      ),
      RUNS,
    );
  });

  test('a change of people asked twice is never tested', () => {
    fc.assert(
      fc.property(anyRelease, anyRelease, ({ base }, { base: before }) => {
        const document = { release: base, comparison: { base: before, samePeople: true }, ...lead };
        for (const key of ['change:A', 'lead-change:A|B']) {
          const untested = untestedOf(document, key);
          expect(untested.reasons).toContain('same-people');
          expect(untested.independentMarginPp).toBeGreaterThan(0);
        }
      }),
      RUNS,
    );
  });
});

describe('re-basing', () => {
  const rebased = (a: number, b: number, n: number) => {
    const decimals = 6;
    const left = Math.round((n * (a + b)) / 100);
    const pct = (share: number) => Number(((100 * share) / (a + b)).toFixed(decimals));
    return { ...sample(n, { A: pct(a), B: pct(b) }, { decimals }), rebased: { n: left } };
  };

  test('keeps the primary test of a lead but for its squared term', () => {
    // R 4.2.2: a <- .41 / .86; b <- .45 / .86
    // c(.04 / sqrt((.86 - .04^2) / 1000), (b - a) / sqrt((1 - (b - a)^2) / 860))
    const before = testedOf({ release: sample(1000, { A: 41, B: 45 }) }, 'lead:B|A');
    const after = testedOf({ release: rebased(41, 45, 1000) }, 'lead:B|A');
    expect(before.z).toBeCloseTo(1.36525927882423, 10);
    expect(after.z).toBeCloseTo(1.36546645692469, 6);
  });

  test('keeps the score test exactly', () => {
    fc.assert(
      fc.property(fc.integer({ min: 20, max: 48 }), fc.integer({ min: 20, max: 48 }), (a, b) => {
        fc.pre(a !== b);
        const before = testedOf({ release: sample(1000, { A: a, B: b }), ...lead }, 'lead:A|B');
        const after = testedOf({ release: rebased(a, b, 1000), ...lead }, 'lead:A|B');
        const scoreOf = ({ secondTests: [score] }: typeof before) =>
          score?.name === 'score' ? score.p : NaN;
        expect(scoreOf(after) / scoreOf(before)).toBeCloseTo(1, 4);
        expect(Math.abs((after.z ?? 0) / (before.z ?? 1))).toBeGreaterThan(0.999);
      }),
      RUNS,
    );
  });
});
