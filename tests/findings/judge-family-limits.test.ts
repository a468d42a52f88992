import { describe, expect, test } from 'vitest';
import { criticalAt } from '@/lib/findings/critical-at';
import { judgeFamily } from '@/lib/findings/judge-family';
import type { DeffEnd, Measured, SecondResult } from '@/lib/findings/measured';
import { DEFAULT_POLICY } from '@/lib/findings/policy';

const CRITICAL = criticalAt(1 - DEFAULT_POLICY.level, null);

type Given = { estimatePp: number; se: Record<DeffEnd, number>; second?: SecondResult[]; unitsPp?: number[] };

function measured({ estimatePp, se, second = [], unitsPp = [0.001] }: Given): Measured {
  return {
    bases: [],
    estimatePp,
    df: null,
    standardError: (end) => se[end],
    interval: (q) => [estimatePp / 100 - q * se.chosen, estimatePp / 100 + q * se.chosen],
    unitsPp,
    secondTests: () => second,
  };
}

/** The only finding of its family, so that its level is 0.05. */
function judged(given: Given) {
  const [only] = judgeFamily([measured(given)], DEFAULT_POLICY);
  if (!only) throw new TypeError('judgeFamily answers every finding');
  return { ...only.fields, breaking: only.breaking };
}

const level = (se: number) => ({ chosen: se, low: se, high: se });
const certain = level(0);

describe('the standard errors of a finding', () => {
  test('an estimate that the high end alone does not bear is fragile by the design effect', () => {
    const { verdict, reasons, sePp } = judged({
      estimatePp: 6,
      se: { chosen: 0.02, low: 0.01, high: 0.04 },
    });
    expect({ verdict, reasons, sePp }).toEqual({ verdict: 'fragile', reasons: ['design-effect'], sePp: 2 });
  });

  test('what could be detected is told at the high end, and only where it was not found', () => {
    const se = { chosen: 0.02, low: 0.01, high: 0.04 };
    const { detectable80Pp, roundingPp } = judged({ estimatePp: 1, se, unitsPp: [1, 1] });
    // (z at 0.975 + z at 0.8) · 4 points, R 4.2.2: 4 * (qnorm(0.975) + qnorm(0.8))
    expect(detectable80Pp).toBeCloseTo(11.20634087245187 + roundingPp, 9);
    expect(roundingPp).toBeGreaterThan(0);
    expect(judged({ estimatePp: 12, se }).detectable80Pp).toBeNull();
    expect(judged({ estimatePp: 0, se: certain }).detectable80Pp).toBeNull();
  });
});

describe('an estimate without variance', () => {
  test('other than 0 is certain: it holds, has no z, and survives twice the error', () => {
    const { verdict, p, z, breaking, survivesTwiceError } = judged({ estimatePp: 5, se: certain });
    expect({ verdict, p, z, breaking, survivesTwiceError }).toEqual({
      verdict: 'holds',
      p: 0,
      z: null,
      breaking: null,
      survivesTwiceError: true,
    });
  });

  test('of 0 has z 0 and p 1, and does not hold', () => {
    const { verdict, p, z, breaking, survivesTwiceError } = judged({ estimatePp: 0, se: certain });
    expect({ verdict, p, z, breaking, survivesTwiceError }).toEqual({
      verdict: 'does-not-hold',
      p: 1,
      z: 0,
      breaking: 0,
      survivesTwiceError: null,
    });
  });
});

describe('twice the error', () => {
  const atTwice = 6;
  const se = level(0.06 / (2 * CRITICAL));

  test('is survived by an estimate of exactly twice its critical distance, on either side of 0', () => {
    expect(judged({ estimatePp: atTwice, se }).z).toBe(2 * CRITICAL);
    expect(judged({ estimatePp: atTwice, se }).survivesTwiceError).toBe(true);
    expect(judged({ estimatePp: -atTwice, se }).survivesTwiceError).toBe(true);
  });

  test('is not survived by one just below it', () => {
    expect(judged({ estimatePp: 0.999 * atTwice, se })).toMatchObject({
      verdict: 'holds',
      survivesTwiceError: false,
    });
    expect(judged({ estimatePp: -0.999 * atTwice, se }).survivesTwiceError).toBe(false);
  });

  test('is not asked of a fragile finding', () => {
    const fragile = { estimatePp: 6, se: { chosen: 0.01, low: 0.01, high: 0.04 } };
    expect(judged(fragile)).toMatchObject({ verdict: 'fragile', survivesTwiceError: null });
  });
});

describe('a second test agrees', () => {
  const agrees = (estimatePp: number, second: SecondResult) =>
    judged({ estimatePp, se: level(0.01), second: [second] }).secondTests.map((one) => one.significant);

  test('with a p below the level of the finding, not at it', () => {
    expect(agrees(5, { name: 'score', p: 0.049 })).toEqual([true]);
    expect(agrees(5, { name: 'score', p: 1 - DEFAULT_POLICY.level })).toEqual([false]);
  });

  test('with an interval beyond 0 on the side of the estimate, not touching it', () => {
    expect(agrees(5, { name: 'newcombe', intervalPp: [0.1, 9] })).toEqual([true]);
    expect(agrees(5, { name: 'newcombe', intervalPp: [0, 9] })).toEqual([false]);
    expect(agrees(5, { name: 'newcombe', intervalPp: [-9, -1] })).toEqual([false]);
    expect(agrees(-5, { name: 'newcombe', intervalPp: [-9, -0.1] })).toEqual([true]);
    expect(agrees(-5, { name: 'newcombe', intervalPp: [-9, 0] })).toEqual([false]);
    expect(agrees(-5, { name: 'newcombe', intervalPp: [1, 9] })).toEqual([false]);
  });

  test('never with an estimate of 0', () => {
    expect(agrees(0, { name: 'score', p: 0 })).toEqual([false]);
    expect(agrees(0, { name: 'newcombe', intervalPp: [1, 2] })).toEqual([false]);
    expect(agrees(0, { name: 'newcombe', intervalPp: [-2, -1] })).toEqual([false]);
  });

  test('makes the finding fragile where one of several does not', () => {
    const second: SecondResult[] = [
      { name: 'score', p: 0.001 },
      { name: 'exact-sign', p: 0.2 },
    ];
    expect(judged({ estimatePp: 5, se: level(0.01), second })).toMatchObject({
      verdict: 'fragile',
      reasons: ['second-test'],
    });
  });
});
