import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { leadPosterior, probabilityLargest } from '@/lib/stats';

const counts = (maxLength: number) =>
  fc.array(fc.oneof(fc.integer({ min: 0, max: 30 }), fc.integer({ min: 0, max: 3_000_000 })), {
    minLength: 2,
    maxLength,
  });
const runs = { numRuns: 40 };
const poll = { deff: 1.4, level: 0.95, threshold: 0 };

/** A fixed stream of uniform numbers: a linear congruential generator (Numerical Recipes, from memory). */
function uniforms(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 2 ** 32;
  };
}

/** Gamma variables of whole shape are sums of exponential ones. */
function gammaDraw(shape: number, uniform: () => number): number {
  let sum = 0;
  for (let index = 0; index < shape; index += 1) sum -= Math.log(uniform());
  return sum;
}

describe('posterior of a lead', () => {
  test('the two of a pair are ahead of each other with probabilities that sum to 1', () => {
    fc.assert(
      fc.property(counts(6), ([first = 0, second = 0, ...others]) => {
        const there = leadPosterior({ ...poll, counts: [first, second, ...others] });
        const back = leadPosterior({ ...poll, counts: [second, first, ...others] });
        expect(there.firstAheadOfSecond + back.firstAheadOfSecond).toBeCloseTo(1, 8);
        expect(there.leadOverThreshold).toBe(there.firstAheadOfSecond);
        expect(back.credibleLead[0]).toBeCloseTo(-there.credibleLead[1], 9);
        expect(back.sdLead).toBeCloseTo(there.sdLead, 12);
      }),
      runs,
    );
  });

  test('the ends of the credible interval are exceeded with just the probabilities of the tails', () => {
    fc.assert(
      fc.property(
        counts(5),
        fc.constantFrom(0.5, 0.9, 0.99),
        fc.constantFrom(0.5, 1, 3),
        (given, level, deff) => {
          const { credibleLead } = leadPosterior({ counts: given, deff, level, threshold: 0 });
          const over = credibleLead.map((threshold) => {
            return leadPosterior({ counts: given, deff, level, threshold }).leadOverThreshold;
          });
          expect(over[0]).toBeCloseTo((1 + level) / 2, 7);
          expect(over[1]).toBeCloseTo((1 - level) / 2, 7);
        },
      ),
      runs,
    );
  });

  test('a lead over a threshold grows less probable as the threshold rises', () => {
    fc.assert(
      fc.property(counts(5), fc.double({ min: -0.9, max: 0.8, noNaN: true }), (given, threshold) => {
        const low = leadPosterior({ ...poll, counts: given, threshold }).leadOverThreshold;
        const high = leadPosterior({ ...poll, counts: given, threshold: threshold + 0.1 }).leadOverThreshold;
        expect(high).toBeLessThanOrEqual(low + 1e-9);
        expect(low).toBeGreaterThanOrEqual(0);
        expect(low).toBeLessThanOrEqual(1);
      }),
      runs,
    );
  });

  test('agrees with a simulation from a fixed stream within its Monte Carlo error', () => {
    const question = { counts: [21, 16, 9], deff: 1, level: 0.9, threshold: 0.05 };
    const found = leadPosterior(question);
    const uniform = uniforms(20261201);
    const draws = 20_000;
    const leads: number[] = [];
    const firsts = [0, 0, 0];
    for (let draw = 0; draw < draws; draw += 1) {
      const [a = 0, b = 0, c = 0] = question.counts.map((count) => gammaDraw(count + 1, uniform));
      leads.push((a - b) / (a + b + c));
      const winner = [a, b, c].indexOf(Math.max(a, b, c));
      firsts[winner] = (firsts[winner] ?? 0) + 1;
    }
    const within = (share: number, p: number) =>
      expect(Math.abs(share - p)).toBeLessThan(4 * Math.sqrt((p * (1 - p)) / draws));
    const shareOver = (limit: number) => leads.filter((lead) => lead > limit).length / draws;
    within(shareOver(0), found.firstAheadOfSecond);
    within(shareOver(0.05), found.leadOverThreshold);
    within(shareOver(found.credibleLead[0]), 0.95);
    within(shareOver(found.credibleLead[1]), 0.05);
    found.largest.forEach((p, option) => within((firsts[option] ?? 0) / draws, p));
    const mean = leads.reduce((sum, lead) => sum + lead, 0) / draws;
    expect(Math.abs(mean - found.meanLead)).toBeLessThan((4 * found.sdLead) / Math.sqrt(draws));
  });

  test('of the prior alone has the closed forms of a uniform triangle', () => {
    const found = leadPosterior({ counts: [0, 0, 0], deff: 1, level: 0.95, threshold: 0.5 });
    expect(found.alpha).toEqual([1, 1, 1]);
    expect(found.firstAheadOfSecond).toBeCloseTo(0.5, 12);
    expect(found.leadOverThreshold).toBeCloseTo(0.125, 12);
    expect(found.sdLead).toBeCloseTo(Math.sqrt(1 / 6), 12);
    expect(found.credibleLead[1]).toBeCloseTo(1 - Math.sqrt(0.05), 12);
    found.largest.forEach((p) => expect(p).toBeCloseTo(1 / 3, 12));
  });

  test('of two options and no counts is uniform from −1 to 1', () => {
    const found = leadPosterior({ counts: [0, 0], deff: 2, level: 0.9, threshold: -0.5 });
    expect(found.leadOverThreshold).toBeCloseTo(0.75, 12);
    expect(found.credibleLead[0]).toBeCloseTo(-0.9, 12);
    expect(found.credibleLead[1]).toBeCloseTo(0.9, 12);
  });

  test.each([
    ['millions beside none', [5_000_000, 0, 0], 1],
    ['a tiny design effect', [700, 690, 20], 0.001],
    ['a huge one', [700, 690, 20], 1e6],
    ['twelve options', [300, 280, 200, 150, 100, 80, 60, 50, 40, 30, 20, 0], 1.4],
    ['a pair of few among millions', [3, 1, 2_000_000, 1_999_000], 1],
    ['parts of a person', [0.4, 0.2], 1],
  ])('gives numbers in their places for %s', (_what, given, deff) => {
    const frozen = Object.freeze({ counts: Object.freeze(given), deff, level: 0.95, threshold: 0.01 });
    const found = leadPosterior(frozen);
    const [low, high] = found.credibleLead;
    expect(low).toBeLessThan(found.meanLead);
    expect(high).toBeGreaterThan(found.meanLead);
    expect(found.credibleFirstShare[0]).toBeLessThan(found.credibleFirstShare[1]);
    expect(found.largest.reduce((sum, p) => sum + p, 0)).toBeCloseTo(1, 11);
    const all = [found.firstAheadOfSecond, found.leadOverThreshold, ...found.largest];
    expect(all.every((p) => p >= 0 && p <= 1)).toBe(true);
  });

  test.each([
    [{ counts: [5] }, 'two or more counts of at least 0'],
    [{ counts: [5, -1] }, 'two or more counts of at least 0'],
    [{ counts: [5, Infinity] }, 'two or more counts of at least 0'],
    [{ counts: [5, Number.NaN] }, 'two or more counts of at least 0'],
    [{ deff: 0 }, 'deff above 0'],
    [{ level: 1 }, 'level inside 0 and 1'],
    [{ threshold: 1 }, 'threshold inside -1 and 1'],
    [{ threshold: Number.NaN }, 'threshold inside -1 and 1'],
  ])('refuses %o', (change, condition) => {
    expect(() => leadPosterior({ counts: [5, 4], ...poll, ...change })).toThrow(
      new RangeError(`leadPosterior requires ${condition}`),
    );
  });
});

describe('probability of being the largest', () => {
  test('sums to 1 and follows the options when they are put in another order', () => {
    fc.assert(
      fc.property(counts(12), (given) => {
        const found = probabilityLargest(given.map((count) => count + 1));
        const turned = probabilityLargest(given.map((count) => count + 1).toReversed());
        expect(found.reduce((sum, p) => sum + p, 0)).toBeCloseTo(1, 11);
        found.forEach((p, option) => expect(turned.at(-1 - option)).toBeCloseTo(p, 11));
      }),
      runs,
    );
  });

  test('of two options is that of being ahead', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 5000 }), fc.integer({ min: 0, max: 5000 }), (a, b) => {
        const { firstAheadOfSecond, largest } = leadPosterior({ ...poll, counts: [a, b] });
        expect(largest[0]).toBeCloseTo(firstAheadOfSecond, 10);
      }),
      runs,
    );
  });

  test('is level among equals, however many', () => {
    for (const size of [2, 5, 12]) {
      const found = probabilityLargest(Array.from({ length: size }, () => 321.5));
      found.forEach((p) => expect(p).toBeCloseTo(1 / size, 12));
    }
  });

  test.each([[[]], [[4]], [[4, 0.5]], [[4, Infinity]]])('refuses %j', (alpha) => {
    expect(() => probabilityLargest(alpha)).toThrow(
      new RangeError('probabilityLargest requires two or more alphas of at least 1'),
    );
  });
});
