/**
 * Franklin, C. (2007), The "Margin of Error" for Differences in Polls. Its formulas are from memory and its worked
 * examples were not at hand: the polls here are our own.
 */
import { describe, expect, test } from 'vitest';
import { changeOfShare, criticalValue, leadEstimate, shareEstimate } from '@/lib/stats';

const level = 0.95;
const polls = [
  { first: 0.47, second: 0.41, n: 1012 },
  { first: 0.5, second: 0.5, n: 625 },
  { first: 0.52, second: 0.44, n: 600 },
  { first: 0.31, second: 0.29, n: 400 },
  { first: 0.08, second: 0.05, n: 1111 },
];

describe('the margin of a lead in one poll', () => {
  test.each(polls)('of $first to $second among $n is the paper’s, which counts n − 1', (poll) => {
    const { first, second, n } = poll;
    const variance = (first + second - (first - second) ** 2) / (n - 1);
    const printed = criticalValue(1 - level, null) * Math.sqrt(variance);
    expect(leadEstimate({ ...poll, n: n - 1, deff: 1 }, level).margin).toBeCloseTo(printed, 14);
    expect(leadEstimate({ ...poll, deff: 1 }, level).margin / printed).toBeCloseTo(
      Math.sqrt((n - 1) / n),
      12,
    );
  });

  test('is twice that of a share where nobody answers otherwise', () => {
    const lead = leadEstimate({ first: 0.54, second: 0.46, n: 800, deff: 1 }, level);
    expect(lead.margin).toBeCloseTo(2 * shareEstimate({ p: 0.54, n: 800, deff: 1 }, level).margin, 14);
  });

  test('is less than twice that of the leader’s share, and more than 1.7 times, with one in eight undecided', () => {
    const lead = leadEstimate({ first: 0.46, second: 0.41, n: 800, deff: 1 }, level);
    const ratio = lead.margin / shareEstimate({ p: 0.46, n: 800, deff: 1 }, level).margin;
    expect(ratio).toBeGreaterThan(1.7);
    expect(ratio).toBeLessThan(2);
  });
});

test('the margin of a change between two polls alike is √2 times that of either share', () => {
  const poll = { p: 0.47, n: 900, deff: 1 };
  const change = changeOfShare(poll, poll, level);
  expect(change.margin / shareEstimate(poll, level).margin).toBeCloseTo(Math.SQRT2, 14);
});
