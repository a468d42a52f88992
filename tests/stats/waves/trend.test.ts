import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { homogeneityOfShares, trendOfShares } from '@/lib/stats';

const scored = fc
  .array(
    fc.record({
      p: fc.double({ min: 0.02, max: 0.98, noNaN: true }),
      n: fc.integer({ min: 50, max: 20_000 }),
      deff: fc.double({ min: 0.5, max: 10, noNaN: true }),
    }),
    { minLength: 2, maxLength: 10 },
  )
  .map((polls) => polls.map((poll, score) => ({ ...poll, score: score * score - 3 })));

const near = (a: number | null, b: number | null, scale = 1) =>
  expect(Math.abs((a ?? Number.NaN) - (b ?? Number.NaN))).toBeLessThan(
    1e-8 * Math.max(scale, Math.abs(b ?? 0)),
  );

describe('trend of a share', () => {
  test('does not depend on where the scores begin, nor, but for the slope, on their unit', () => {
    fc.assert(
      fc.property(
        scored,
        fc.integer({ min: -500, max: 500 }),
        fc.integer({ min: 1, max: 30 }),
        (polls, shift, unit) => {
          const before = trendOfShares(polls);
          const after = trendOfShares(polls.map((poll) => ({ ...poll, score: poll.score * unit + shift })));
          near(after.z, before.z);
          near(after.chiSquareDeparture, before.chiSquareDeparture);
          near(after.slope * unit, before.slope);
        },
      ),
    );
  });

  test('turns its sign with the scores', () => {
    fc.assert(
      fc.property(scored, (polls) => {
        const turned = trendOfShares(polls.map((poll) => ({ ...poll, score: -poll.score })));
        near(turned.z, -(trendOfShares(polls).z ?? Number.NaN));
      }),
    );
  });

  test('and the departure from it make up the whole difference between the polls', () => {
    fc.assert(
      fc.property(scored, (polls) => {
        const { chiSquare, chiSquareDeparture, df, dfDeparture } = trendOfShares(polls);
        const whole = homogeneityOfShares(polls);
        near((chiSquare ?? Number.NaN) + (chiSquareDeparture ?? Number.NaN), whole.chiSquare);
        expect(df + dfDeparture).toBe(whole.df);
      }),
    );
  });

  test('of two polls leaves nothing to depart from, and no p-value for it', () => {
    const polls = [
      { p: 0.4, n: 800, deff: 1.3, score: 3 },
      { p: 0.46, n: 900, deff: 1.1, score: 9 },
    ];
    const { z, chiSquare, chiSquareDeparture, dfDeparture, pValueDeparture } = trendOfShares(polls);
    expect(chiSquareDeparture).toBeCloseTo(0, 12);
    expect([dfDeparture, pValueDeparture]).toEqual([0, null]);
    near(chiSquare, homogeneityOfShares(polls).chiSquare);
    expect(z).toBeGreaterThan(0);
  });

  test('of a straight line departs nowhere', () => {
    const polls = [0, 1, 2, 3].map((score) => ({ p: 0.3 + 0.02 * score, n: 900, deff: 1, score }));
    const { slope, chiSquareDeparture, pValueDeparture } = trendOfShares(polls);
    expect(slope).toBeCloseTo(0.02, 12);
    expect(chiSquareDeparture).toBeCloseTo(0, 12);
    expect(pValueDeparture).toBeCloseTo(1, 12);
  });

  test.each([0, 1])('has a slope of 0 and no test where every poll found %d', (p) => {
    const polls = [1, 2, 3].map((score) => Object.freeze({ p, n: 500, deff: 1, score }));
    expect(trendOfShares(Object.freeze(polls))).toEqual({
      pooled: p,
      slope: 0,
      z: null,
      chiSquare: null,
      df: 1,
      pValue: null,
      chiSquareDeparture: null,
      dfDeparture: 1,
      pValueDeparture: null,
    });
  });
});
