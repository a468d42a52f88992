import { describe, expect, it } from 'vitest';
import { drawPoll } from './draws';
import { normalDraw, seeded } from './random';
import { allowance, rateOf } from './rate';

const DRAWS = 3000;

describe('the seeded generator', () => {
  it('repeats itself with the same seed and differs with another', () => {
    const first = (seed: number) => Array.from({ length: 5 }, seeded(seed));
    expect(first(1)).toEqual(first(1));
    expect(first(1)).not.toEqual(first(2));
  });

  it('is level over 0–1: every tenth gets its part', () => {
    const random = seeded(11);
    const tenths = new Array<number>(10).fill(0);
    for (let draw = 0; draw < 50_000; draw += 1) {
      const tenth = Math.floor(10 * random());
      tenths[tenth] = (tenths[tenth] ?? 0) + 1;
    }
    for (const hits of tenths) {
      expect(Math.abs(rateOf(hits, 50_000).rate - 0.1)).toBeLessThan(allowance(0.1, 50_000));
    }
  });

  it('gives normal deviates of variance 1', () => {
    const random = seeded(12);
    const draws = Array.from({ length: 20_000 }, () => normalDraw(random));
    expect(Math.abs(moments(draws).mean)).toBeLessThan(0.03);
    expect(Math.abs(moments(draws).variance - 1)).toBeLessThan(0.05);
  });
});

describe('a drawn poll', () => {
  it.each([1, 1.5, 2, 4])('of design effect %s spreads its shares and leads by just that', (deff) => {
    const random = seeded(21);
    const [n, a, b] = [400, 0.45, 0.38];
    const polls = Array.from({ length: DRAWS }, () => drawPoll(random, n, { shares: [a, b], deff }));
    const shares = moments(polls.map(([first = 0]) => first / n));
    const leads = moments(polls.map(([first = 0, second = 0]) => (first - second) / n));
    const error = 4 * Math.sqrt(2 / DRAWS);
    expect(Math.abs(shares.variance / ((a * (1 - a)) / n) / deff - 1)).toBeLessThan(error);
    expect(Math.abs(leads.variance / ((a + b - (a - b) ** 2) / n) / deff - 1)).toBeLessThan(error);
    expect(Math.abs(shares.mean - a)).toBeLessThan(4 * Math.sqrt(shares.variance / DRAWS));
  });

  it('asks exactly as many people as it should, also when the last cluster is not full', () => {
    const counts = drawPoll(seeded(22), 1012, { shares: [0.4, 0.3, 0.2], deff: 2 });
    expect(counts).toHaveLength(4);
    expect(counts.reduce((sum, count) => sum + count, 0)).toBe(1012);
  });
});

function moments(values: readonly number[]): { mean: number; variance: number } {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  return { mean, variance: squares / (values.length - 1) };
}
