import { describe, expect, test } from 'vitest';
import type { Comparability, Difference } from '@/lib/findings/comparability';
import { comparisonCourse } from '@/lib/findings/comparison-status';
import type { ComparisonInput, ReleaseDocument, WaveOverlap } from '@/lib/findings/judge-types';
import { judge, sample, testedOf, untestedOf } from './release-documents';

const difference = (item: Difference['item']): Difference => ({
  item,
  current: 'now',
  earlier: 'then',
  isOverridable: item !== 'race' && item !== 'field-dates',
});
const found = (...items: Difference['item'][]): Comparability => ({
  comparable: items.length === 0,
  differences: items.map(difference),
  unknowns: ['question-order'],
});
const override = { reason: 'The pollster confirmed in writing that the question was the same.' };

const release = sample(1200, { A: 47, B: 33 });
const base = sample(1200, { A: 45, B: 35 });
const document = (comparison: Partial<ComparisonInput>): ReleaseDocument => ({
  release,
  comparison: { base, ...comparison },
  changes: ['A'],
});

describe('what becomes of a comparison', () => {
  test('unknown items are told and the comparison is computed', () => {
    const { comparison } = judge(document({ comparability: found() }));
    expect(comparison).toMatchObject({
      status: 'comparable',
      unknowns: ['question-order'],
      wasLookedInto: true,
    });
    expect(judge(document({})).comparison?.wasLookedInto).toBe(false);
    expect(testedOf(document({ comparability: found() }), 'change:A').estimatePp).toBe(2);
  });

  test('a difference stands against every change, with the estimate shown', () => {
    const asked = document({ comparability: found('mode') });
    expect(untestedOf(asked, 'change:A')).toMatchObject({ estimatePp: 2, reasons: ['not-comparable'] });
    expect(judge(asked).comparison).toMatchObject({ status: 'not-comparable', overrideReason: null });
  });

  test('a written reason lifts it and travels with the answer', () => {
    const asked = document({ comparability: found('mode', 'population'), override });
    expect(testedOf(asked, 'change:A').estimatePp).toBe(2);
    expect(judge(asked).comparison).toMatchObject({ status: 'overridden', overrideReason: override.reason });
    expect(judge(document({ comparability: found(), override })).comparison).toMatchObject({
      status: 'comparable',
      overrideReason: null,
    });
  });

  test('no reason lifts another race, or interviews that overlap in time', () => {
    expect(untestedOf(document({ comparability: found('race'), override }), 'change:A').reasons).toEqual([
      'not-comparable',
    ]);
    const overlapping = document({ comparability: found('field-dates'), override });
    expect(untestedOf(overlapping, 'change:A').reasons).toEqual(['shared-waves']);
  });

  test('knowing the shared waves lifts an overlap in time, and a reason the rest', () => {
    const overlap = { window: 3, shared: 2 };
    expect(comparisonCourse({ comparability: found('field-dates'), overlap })).toMatchObject({
      status: 'overlapping',
      reasons: [],
      overlap: { window: 3, shared: 2, assumesEqualWaves: true, usesPooledShare: true },
    });
    expect(comparisonCourse({ comparability: found('field-dates', 'mode'), overlap }).reasons).toEqual([
      'not-comparable',
    ]);
    expect(
      comparisonCourse({ comparability: found('field-dates', 'mode'), overlap, override }),
    ).toMatchObject({
      status: 'overlapping',
      reasons: [],
      overrideReason: override.reason,
    });
  });
});

describe('changes between tracking averages', () => {
  const change = (overlap: WaveOverlap, more: Partial<ReleaseDocument> = {}) =>
    testedOf({ ...document({ overlap }), ...more }, 'change:A');

  test('rest on the waves not shared, at the pooled share', () => {
    // R 4.2.2: se <- sqrt(2 * .46 * .54 / (3^2 * 400)); c(100 * se, 100 * qnorm(.975) * se, .02 / se)
    const tested = change({ window: 3, shared: 2 });
    expect(tested.sePp).toBeCloseTo(1.17473401244707, 10);
    expect(tested.marginPp).toBeCloseTo(2.30243635581049, 10);
    expect(tested.z).toBeCloseTo(1.7025130615175, 10);
    expect(tested.secondTests).toEqual([]);
    expect(tested.trace.waves?.map((wave) => wave.in)).toEqual(['earlier', 'both', 'both', 'later']);
  });

  test('weigh waves by their interviews and take their own shares where both are known', () => {
    // R 4.2.2: n <- c(300, 400, 500, 600); q <- c(.42, .44, .45, .49); w1 <- c(n[1:3], 0) / 1200
    // w2 <- c(0, n[2:4]) / 1500; c(sum(w1 * q), sum(w2 * q), 100 * sqrt(sum((w2 - w1)^2 * q * (1 - q) / n)))
    const overlap = {
      window: 3,
      shared: 2,
      interviews: [300, 400, 500, 600],
      shares: [{ option: 'A', pct: [42, 44, 45, 49] }],
    };
    const tested = testedOf(
      {
        release: sample(1500, { A: 46.3 }, { decimals: 1 }),
        comparison: { base: sample(1200, { A: 43.9 }, { decimals: 1 }), overlap },
        changes: ['A'],
      },
      'change:A',
    );
    expect(tested.sePp).toBeCloseTo(1.11159919835244, 10);
  });

  test('of a lead take the variance of a lead in every wave', () => {
    // R 4.2.2: v <- .42 + .34 - .08^2; se <- sqrt(1.3 * 2 * 3 * v / (16 * 300)); c(100 * se, .06 / se)
    const deff = { source: 'stated' as const, value: 1.3 };
    const tested = testedOf(
      {
        release: sample(1200, { A: 44, B: 33 }, { deff }),
        comparison: { base: sample(1200, { A: 40, B: 35 }, { deff }), overlap: { window: 4, shared: 1 } },
        pairs: [['A', 'B']],
        changes: [],
      },
      'lead-change:A|B',
    );
    expect(tested.sePp).toBeCloseTo(3.49942852477372, 10);
    expect(tested.z).toBeCloseTo(1.71456566622916, 10);
  });

  test('with no wave shared are ordinary changes', () => {
    const apart = change({ window: 3, shared: 0 });
    const plain = testedOf(document({}), 'change:A');
    expect({ ...apart, working: null }).toEqual({ ...plain, working: null });
    expect(judge(document({ overlap: { window: 3, shared: 0 } })).comparison?.status).toBe('comparable');
  });

  test('with every wave shared cannot be tested', () => {
    const asked = document({ overlap: { window: 3, shared: 3 } });
    expect(untestedOf(asked, 'change:A')).toMatchObject({ estimatePp: 2, reasons: ['shared-waves'] });
  });

  test('grow more certain with every wave shared', () => {
    const errors = [1, 2, 3, 4].map((shared) => change({ window: 5, shared }).sePp);
    expect(errors).toEqual([...errors].sort((a, b) => b - a));
    expect(new Set(errors).size).toBe(4);
  });
});

describe('people asked twice', () => {
  test('have no test, and the margin of independent samples beside', () => {
    // R 4.2.2: 100 * qnorm(.975) * sqrt(.45 * .55 / 1000 + .47 * .53 / 1000)
    const asked: ReleaseDocument = {
      release: sample(1000, { A: 47, B: 33 }),
      comparison: { base: sample(1000, { A: 45, B: 35 }), samePeople: true },
    };
    const change = untestedOf(asked, 'change:A');
    expect(change).toMatchObject({ estimatePp: 2, reasons: ['same-people'] });
    expect(change.independentMarginPp).toBeCloseTo(4.36768640169679, 10);
    expect(untestedOf(asked, 'lead-change:A|B').independentMarginPp).toBeGreaterThan(4.4);
    expect(judge(asked).comparison?.status).toBe('same-people');
    expect(testedOf(asked, 'lead:A|B').verdict).toBe('holds');
  });

  test('have no margin beside where a base has none', () => {
    const asked: ReleaseDocument = {
      release: sample(1000, { A: 47 }),
      comparison: { base: sample(null, { A: 45 }), samePeople: true },
      changes: ['A'],
    };
    expect(untestedOf(asked, 'change:A')).toMatchObject({
      reasons: ['no-sample-size', 'same-people'],
      independentMarginPp: null,
    });
  });
});
