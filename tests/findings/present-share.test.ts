import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { presentShare, type PresentationReason } from '@/lib/findings/present-share';

const REVIEW_ONLY: PresentationReason[] = ['no-events', 'few-clusters'];

const anyShare = fc.record({
  p: fc.double({ min: 0, max: 1, noNaN: true }),
  n: fc.integer({ min: 30, max: 5000 }),
  deff: fc.double({ min: 0.5, max: 6, noNaN: true }),
  df: fc.option(fc.integer({ min: 1, max: 200 })),
});

describe('the presentation standard for small bases', () => {
  test('suppresses fewer than 30 people, and fewer than 30 effective ones', () => {
    expect(presentShare({ p: 0.5, n: 29, nEff: 29 }).reasons).toEqual(['fewer-than-30', 'interval-too-wide']);
    expect(presentShare({ p: 0.5, n: 45, nEff: 28 }).outcome).toBe('suppress');
    expect(presentShare({ p: 0.02, n: 30, nEff: 30 }).reasons).not.toContain('fewer-than-30');
  });

  test('suppresses an interval of 30 points or more', () => {
    expect(presentShare({ p: 0.5, n: 46, nEff: 46 }).reasons).toEqual(['interval-too-wide']);
    expect(presentShare({ p: 0.3, n: 60, nEff: 40 })).toMatchObject({ outcome: 'show', reasons: [] });
  });

  test('suppresses an interval wider than 130 percent of the share, unless it is 5 points or less', () => {
    expect(presentShare({ p: 0.02, n: 200, nEff: 150 }).reasons).toEqual(['relative-width']);
    expect(presentShare({ p: 0.0002, n: 20000, nEff: 10000 })).toMatchObject({ outcome: 'show' });
  });

  test('asks for review where nobody or everybody gave the answer, or clusters are few', () => {
    expect(presentShare({ p: 0, n: 100, nEff: 90 })).toMatchObject({
      outcome: 'review',
      reasons: ['no-events'],
      relativeWidth: null,
    });
    expect(presentShare({ p: 1, n: 100, nEff: 90 }).reasons).toEqual(['no-events']);
    expect(presentShare({ p: 0.5, n: 900, nEff: 600, df: 7 }).reasons).toEqual(['few-clusters']);
    expect(presentShare({ p: 0.5, n: 900, nEff: 600, df: 8 }).outcome).toBe('show');
  });

  test('marks a share that may be shown while the rest to 100 percent may not', () => {
    expect(presentShare({ p: 0.98, n: 200, nEff: 150 })).toMatchObject({
      outcome: 'show',
      restUnreliable: true,
    });
    expect(presentShare({ p: 0.98, n: 2000, nEff: 1500 }).restUnreliable).toBe(false);
  });

  test('adjusts for few degrees of freedom as R does', () => {
    // R 4.2.2: m <- 80 * (qt(.025, 119) / qt(.025, 20))^2; c(m, qbeta(.025, .3*m, .7*m+1), qbeta(.975, .3*m+1, .7*m))
    const { nEffUsed, interval } = presentShare({ p: 0.3, n: 120, nEff: 80, df: 20 });
    expect(nEffUsed).toBeCloseTo(72.08597758769, 9);
    expect(interval[0]).toBeCloseTo(0.197653242995152, 10);
    expect(interval[1]).toBeCloseTo(0.419391697337411, 10);
  });

  test('never takes more effective people than were asked', () => {
    fc.assert(
      fc.property(anyShare, ({ p, n, deff, df }) => {
        const shown = presentShare({ p, n, nEff: n / deff, df });
        expect(shown.nEffUsed).toBeLessThanOrEqual(n);
        expect(shown.interval[0]).toBeLessThanOrEqual(p + 1e-9);
        expect(shown.interval[1]).toBeGreaterThanOrEqual(p - 1e-9);
        const hasGrounds = shown.reasons.some((reason) => !REVIEW_ONLY.includes(reason));
        expect(shown.outcome === 'suppress').toBe(hasGrounds);
        expect(shown.outcome === 'show').toBe(shown.reasons.length === 0);
      }),
    );
  });

  test('shows no more of a share when its base counts less', () => {
    const rank = { show: 2, review: 1, suppress: 0 };
    fc.assert(
      fc.property(anyShare, fc.double({ min: 1, max: 3, noNaN: true }), ({ p, n, deff }, factor) => {
        const more = presentShare({ p, n, nEff: n / deff });
        const less = presentShare({ p, n, nEff: n / (deff * factor) });
        expect(rank[less.outcome]).toBeLessThanOrEqual(rank[more.outcome]);
      }),
    );
  });

  test('refuses what is no share or no base', () => {
    const fine = { p: 0.5, n: 100, nEff: 80 };
    expect(() => presentShare({ ...fine, p: 1.2 })).toThrow('presentShare requires p from 0 to 1');
    expect(() => presentShare({ ...fine, p: NaN })).toThrow(RangeError);
    expect(() => presentShare({ ...fine, n: 2.5 })).toThrow('presentShare requires a whole n of at least 1');
    expect(() => presentShare({ ...fine, nEff: 0 })).toThrow('presentShare requires nEff above 0');
    expect(() => presentShare({ ...fine, df: 0 })).toThrow('presentShare requires df of at least 1, or null');
    expect(() => presentShare({ ...fine, level: 1 })).toThrow('presentShare requires level inside 0 and 1');
  });
});
