import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { changeOfOverlappingAverages, type TrackingAverages } from '@/lib/stats';

const tracking = fc
  .record({
    window: fc.integer({ min: 1, max: 10 }),
    part: fc.double({ min: 0, max: 1, noNaN: true }),
    weighting: fc.constantFrom<TrackingAverages['weighting']>('equal', 'by_n'),
    deff: fc.double({ min: 0.5, max: 10, noNaN: true }),
  })
  .chain(({ window, part, weighting, deff }) => {
    const shared = Math.floor(part * (window + 0.999));
    const wave = fc.record({
      p: fc.double({ min: 0.02, max: 0.98, noNaN: true }),
      n: fc.integer({ min: 50, max: 2000 }),
    });
    const length = { minLength: 2 * window - shared, maxLength: 2 * window - shared };
    return fc.record({
      window: fc.constant(window),
      shared: fc.constant(shared),
      waves: fc.array(wave, length),
      deff: fc.constant(deff),
      weighting: fc.constant(weighting),
    });
  });

describe('change between overlapping averages', () => {
  test('has the variance of both averages less twice what they have in common', () => {
    fc.assert(
      fc.property(tracking, (averages) => {
        const { window, shared, waves, deff, weighting } = averages;
        const { se, seIfIndependent } = changeOfOverlappingAverages(averages);
        const size = (part: typeof waves) =>
          weighting === 'equal' ? window : part.reduce((sum, { n }) => sum + n, 0);
        const weight = (n: number) => (weighting === 'equal' ? 1 : n);
        const [first, second] = [waves.slice(0, window), waves.slice(window - shared)];
        const inBoth = waves.slice(window - shared, window);
        const covariance = inBoth.reduce(
          (sum, { p, n }) => sum + (weight(n) ** 2 * deff * p * (1 - p)) / n,
          0,
        );
        const common = covariance / (size(first) * size(second));
        expect(se ** 2).toBeCloseTo(Math.max(0, seIfIndependent ** 2 - 2 * common), 10);
      }),
    );
  });

  test('without shared waves is as of independent polls', () => {
    fc.assert(
      fc.property(tracking, (averages) => {
        fc.pre(averages.shared === 0);
        const { se, seIfIndependent, correlation } = changeOfOverlappingAverages(averages);
        expect(se).toBeCloseTo(seIfIndependent, 12);
        expect(correlation).toBe(0);
      }),
    );
  });

  test('of equal waves follows the closed form 2(k − m)·deff·pq/(k²n)', () => {
    for (const [window, shared] of [
      [3, 2],
      [5, 3],
      [7, 6],
      [4, 0],
    ] as const) {
      const waves = Array.from({ length: 2 * window - shared }, () => ({ p: 0.45, n: 300 }));
      const { se, sePooled } = changeOfOverlappingAverages({
        window,
        shared,
        waves,
        deff: 1.3,
        weighting: 'equal',
      });
      const closed = Math.sqrt((2 * (window - shared) * 1.3 * 0.45 * 0.55) / (window ** 2 * 300));
      expect(se).toBeCloseTo(closed, 14);
      expect(sePooled).toBeCloseTo(closed, 14);
    }
  });

  test.each(['equal', 'by_n'] as const)(
    'of one and the same window (%s) has no variance, and no test',
    (weighting) => {
      const waves = Object.freeze([0.4, 0.41, 0.44].map((p, day) => Object.freeze({ p, n: 200 + day })));
      const found = changeOfOverlappingAverages(
        Object.freeze({ window: 3, shared: 3, waves, deff: 1, weighting }),
      );
      expect(found).toMatchObject({ change: 0, se: 0, z: null, pValue: null, sePooled: 0, zPooled: null });
      expect(found.correlation).toBeCloseTo(1, 12);
    },
  );

  test('is the plain unpooled test for single waves', () => {
    const waves = [
      { p: 0.4, n: 500 },
      { p: 0.45, n: 600 },
    ];
    const found = changeOfOverlappingAverages({ window: 1, shared: 0, waves, deff: 1, weighting: 'by_n' });
    expect(found.z).toBeCloseTo(0.05 / Math.sqrt(0.24 / 500 + 0.2475 / 600), 12);
    expect(found.zPooled).toBeCloseTo(found.change / found.sePooled, 12);
  });

  test('turns its sign when time runs backwards', () => {
    fc.assert(
      fc.property(tracking, (averages) => {
        const back = changeOfOverlappingAverages({ ...averages, waves: averages.waves.toReversed() });
        const there = changeOfOverlappingAverages(averages);
        expect(back.change).toBeCloseTo(-there.change, 12);
        expect(back.se).toBeCloseTo(there.se, 12);
      }),
    );
  });

  test('has no correlation where an average has no variance', () => {
    const waves = [0, 0, 0.4].map((p) => ({ p, n: 100 }));
    const found = changeOfOverlappingAverages({ window: 2, shared: 1, waves, deff: 1, weighting: 'equal' });
    expect(found.correlation).toBeNull();
    expect(found.se).toBeGreaterThan(0);
  });

  test('has no test where nobody in any wave said so, though waves differ', () => {
    const waves = [0, 0].map((p) => ({ p, n: 100 }));
    const found = changeOfOverlappingAverages({ window: 1, shared: 0, waves, deff: 1, weighting: 'equal' });
    expect(found).toMatchObject({
      se: 0,
      z: null,
      pValue: null,
      sePooled: 0,
      zPooled: null,
      pValuePooled: null,
    });
  });
});
