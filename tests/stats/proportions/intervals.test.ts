import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  agrestiCoullInterval,
  clopperPearsonInterval,
  criticalValue,
  effectiveCounts,
  jeffreysInterval,
  maximumMargin,
  shareEstimate,
  waldInterval,
  wilsonCorrectedInterval,
  wilsonInterval,
  withinUnit,
  type Interval,
} from '@/lib/stats';
import { expectFigure, expectInterval, expectP } from '../../support/reference';

const proportion = fc.double({ min: 0, max: 1, noNaN: true });
const size = fc.double({ min: 1, max: 1e6, noNaN: true });
const level = fc.double({ min: 0.51, max: 0.9999, noNaN: true });
const counts = fc
  .integer({ min: 1, max: 100_000 })
  .chain((n) => fc.tuple(fc.integer({ min: 0, max: n }), fc.constant(n)));
const at = (confidence: number) => criticalValue(1 - confidence, null);

/** Every interval of a count, under the name of its method. */
const methods: Record<string, (x: number, n: number, confidence: number) => Interval> = {
  Wald: (x, n, confidence) => waldInterval(x / n, n, at(confidence)),
  Wilson: (x, n, confidence) => wilsonInterval(x / n, n, at(confidence)),
  'Wilson corrected': (x, n, confidence) => wilsonCorrectedInterval(x, n, at(confidence)) ?? [2, -1],
  'Clopper–Pearson': clopperPearsonInterval,
  'Agresti–Coull': (x, n, confidence) => agrestiCoullInterval(x, n, at(confidence)),
  Jeffreys: (x, n, confidence) => jeffreysInterval(x, n, confidence, 'modified'),
};

describe('the handbook table of margins (common practice, no source)', () => {
  const table: [n: number, pointsAt95: number][] = [
    [400, 4.9],
    [600, 4.0],
    [1000, 3.1],
    [1500, 2.5],
  ];
  test.each(table)('a sample of %d has a margin of %d points', (n, points) => {
    expect(Number((100 * maximumMargin(n, 1, at(0.95))).toFixed(1))).toBe(points);
  });
});

describe.each(Object.entries(methods))('the %s interval', (_name, interval) => {
  test('contains the share', () => {
    fc.assert(
      fc.property(counts, level, ([x, n], confidence) => {
        const [low, high] = interval(x, n, confidence);
        expect(low).toBeLessThanOrEqual(x / n + 1e-12);
        expect(high).toBeGreaterThanOrEqual(x / n - 1e-12);
      }),
      { numRuns: 60 },
    );
  });

  test('is mirrored for those who did not choose the option', () => {
    fc.assert(
      fc.property(counts, level, ([x, n], confidence) => {
        const [low, high] = interval(x, n, confidence);
        const [others, most] = interval(n - x, n, confidence);
        expect(others).toBeCloseTo(1 - high, 11);
        expect(most).toBeCloseTo(1 - low, 11);
      }),
      { numRuns: 60 },
    );
  });

  test('widens with the level', () => {
    const [low, high] = interval(37, 120, 0.9);
    const [lower, higher] = interval(37, 120, 0.95);
    expect(lower).toBeLessThan(low);
    expect(higher).toBeGreaterThan(high);
  });

  test('narrows with ten times as many people', () => {
    const [low, high] = interval(37, 120, 0.95);
    const [closer, nearer] = interval(370, 1200, 0.95);
    expect(nearer - closer).toBeLessThan(high - low);
  });
});

describe('intervals that stay where a share can be', () => {
  test('end inside 0 and 1, also on effective counts', () => {
    fc.assert(
      fc.property(proportion, size, level, (p, n, confidence) => {
        const x = Math.min(n, n * p);
        const ends = [
          wilsonInterval(p, n, at(confidence)),
          clopperPearsonInterval(x, n, confidence),
          jeffreysInterval(x, n, confidence, 'raw'),
          withinUnit(waldInterval(p, n, at(confidence))),
          withinUnit(agrestiCoullInterval(x, n, at(confidence))),
        ].flat();
        expect(Math.min(...ends)).toBeGreaterThanOrEqual(0);
        expect(Math.max(...ends)).toBeLessThanOrEqual(1);
      }),
      { numRuns: 60 },
    );
  });

  test('nest: Wilson in Agresti–Coull, and Wilson in its corrected form', () => {
    fc.assert(
      fc.property(counts, level, ([x, n], confidence) => {
        const [low, high] = wilsonInterval(x / n, n, at(confidence));
        const wider = [
          agrestiCoullInterval(x, n, at(confidence)),
          wilsonCorrectedInterval(x, n, at(confidence)) ?? [2, -1],
        ] as const;
        for (const [lower, higher] of wider) {
          expect(lower).toBeLessThanOrEqual(low + 1e-12);
          expect(higher).toBeGreaterThanOrEqual(high - 1e-12);
        }
      }),
    );
  });
});

describe('without counts on one side', () => {
  test('the exact interval ends at 0 and has the closed form at the other end', () => {
    expect(clopperPearsonInterval(0, 50, 0.95)[0]).toBe(0);
    expect(clopperPearsonInterval(50, 50, 0.95)[1]).toBe(1);
    expectFigure(clopperPearsonInterval(0, 50, 0.95)[1], 1 - 0.025 ** (1 / 50), 'high end');
  });

  test('the modified Jeffreys interval ends at 0 and 1, the raw one short of them', () => {
    expect(jeffreysInterval(0, 30, 0.95, 'modified')[0]).toBe(0);
    expect(jeffreysInterval(30, 30, 0.95, 'modified')[1]).toBe(1);
    expect(jeffreysInterval(0, 30, 0.95, 'raw')[0]).toBeGreaterThan(0);
    expect(jeffreysInterval(30, 30, 0.95, 'raw')[1]).toBeLessThan(1);
    expectInterval(
      jeffreysInterval(0, 30, 0.95, 'modified'),
      [0, jeffreysInterval(0, 30, 0.95, 'raw')[1]],
      'other end',
    );
  });

  test('the Wilson intervals end at 0 and 1, and Wald has no width', () => {
    expect(wilsonInterval(0, 30, 1.96)[0]).toBe(0);
    expect(wilsonInterval(1, 30, 1.96)[1]).toBe(1);
    expect(wilsonCorrectedInterval(0, 30, 1.96)?.[0]).toBe(0);
    expect(wilsonCorrectedInterval(30, 30, 1.96)?.[1]).toBe(1);
    expect(waldInterval(0, 30, 1.96)).toEqual([0, 0]);
  });
});

describe('the ends near 0', () => {
  test('keep their digits with a thousandth of a count (R 4.2.2 qbeta)', () => {
    expectP(clopperPearsonInterval(1e-3, 1e6, 0.95)[1], 3.6909757489991245e-6, 'high end');
  });

  test('solve the equation of the score interval with a millionth of a count', () => {
    const [p, n, q] = [1e-12, 1e6, 1.96];
    const [low] = wilsonInterval(p, n, q);
    expectP((p - low) ** 2 * n, q * q * low * (1 - low), 'the equation');
  });
});

describe('a design effect', () => {
  test('widens the margin by its root, and is the interval of the effective sample', () => {
    const plain = shareEstimate({ p: 0.4, n: 1200, deff: 1 }, 0.95);
    const designed = shareEstimate({ p: 0.4, n: 1200, deff: 2.25 }, 0.95);
    expect(designed.margin / plain.margin).toBeCloseTo(1.5, 14);
    const { n } = effectiveCounts({ p: 0.4, n: 1200, deff: 2.25 });
    expectInterval(designed.interval, waldInterval(0.4, n, at(0.95)), 'effective');
  });

  test('leaves a corrected interval unsaid where counts are no longer whole', () => {
    expect(wilsonCorrectedInterval(100, 412.5, 1.96)).toBeNull();
    expect(wilsonCorrectedInterval(100.5, 412, 1.96)).toBeNull();
  });

  test('never makes an effective count larger than the effective sample', () => {
    fc.assert(
      fc.property(proportion, size, fc.double({ min: 0.5, max: 10, noNaN: true }), (p, n, deff) => {
        const effective = effectiveCounts({ p, n, deff });
        expect(effective.x).toBeLessThanOrEqual(effective.n);
      }),
    );
  });
});
