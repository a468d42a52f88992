import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { mostellerMeasures, multiPartyAccuracy, predictiveAccuracy } from '@/lib/stats';

const shares = (length: number) =>
  fc
    .array(fc.integer({ min: 5, max: 100 }), { minLength: length, maxLength: length })
    .map((parts) => parts.map((part) => part / parts.reduce((sum, one) => sum + one, 0)));
const pair = fc.integer({ min: 2, max: 8 }).chain((length) => fc.tuple(shares(length), shares(length)));

describe('accuracy of a poll against the result', () => {
  test('is 0 in every measure where the poll is the result', () => {
    const result = Object.freeze([0.5, 0.375, 0.125]);
    expect(Object.values(mostellerMeasures(result, result)).every((measure) => measure === 0)).toBe(true);
    expect(predictiveAccuracy(result, result, 900, 1.3)).toMatchObject({ a: 0, z: 0, pValue: 1 });
    expect(multiPartyAccuracy(result, result)).toEqual({ perCandidate: [0, 0, 0], b: 0, bWeighted: 0 });
  });

  test('the largest error bounds the mean one, the root of the mean square lies between, and the lead’s is at most twice it', () => {
    fc.assert(
      fc.property(pair, ([poll, result]) => {
        const found = mostellerMeasures(poll, result);
        expect(found.meanAbsoluteError).toBeLessThanOrEqual(found.rootMeanSquareError + 1e-12);
        expect(found.rootMeanSquareError).toBeLessThanOrEqual(found.largestError + 1e-12);
        expect(found.leadError).toBeLessThanOrEqual(2 * found.largestError + 1e-12);
        expect(Math.abs(found.leadErrorSigned)).toBe(found.leadError);
        expect(Math.abs(found.winnerError)).toBeLessThanOrEqual(found.largestError);
      }),
    );
  });

  test('shared-out measures do not change with the part that is undecided', () => {
    fc.assert(
      fc.property(pair, fc.double({ min: 0.5, max: 1, noNaN: true }), ([poll, result], decided) => {
        const thinned = poll.map((share) => share * decided);
        const [all, fewer] = [mostellerMeasures(poll, result), mostellerMeasures(thinned, result)];
        expect(fewer.winnerErrorDecided).toBeCloseTo(all.winnerErrorDecided, 12);
        expect(fewer.meanAbsoluteErrorDecided).toBeCloseTo(all.meanAbsoluteErrorDecided, 12);
        expect(Number(multiPartyAccuracy(thinned, result).b)).toBeCloseTo(
          Number(multiPartyAccuracy(poll, result).b),
          11,
        );
        const a = predictiveAccuracy(thinned, result, 900, 1).a;
        expect(Number(a)).toBeCloseTo(Number(predictiveAccuracy(poll, result, 900, 1).a), 11);
      }),
    );
  });

  test('the A measure turns its sign when the pair is turned, and its error does not', () => {
    fc.assert(
      fc.property(pair, ([[p1 = 0, p2 = 0], [r1 = 0, r2 = 0]]) => {
        const there = predictiveAccuracy([p1, p2], [r1, r2], 800, 1.2);
        const back = predictiveAccuracy([p2, p1], [r2, r1], 800, 1.2);
        expect(Number(back.a)).toBeCloseTo(-Number(there.a), 12);
        expect(Number(back.se)).toBeCloseTo(Number(there.se), 12);
        expect(Number(back.pValue)).toBeCloseTo(Number(there.pValue), 12);
      }),
    );
  });

  test('the B measure of two candidates is the size of the A measure, and so is the weighted one', () => {
    fc.assert(
      fc.property(shares(2), shares(2), (poll, result) => {
        const size = Math.abs(Number(predictiveAccuracy(poll, result, 500, 1).a));
        const found = multiPartyAccuracy(poll, result);
        expect(Number(found.b)).toBeCloseTo(size, 11);
        expect(Number(found.bWeighted)).toBeCloseTo(size, 11);
      }),
    );
  });

  test('the standard error of A between two alone is that of a logit', () => {
    const { se } = predictiveAccuracy([0.4, 0.6], [0.5, 0.5], 1000, 1.5);
    expect(se).toBeCloseTo(Math.sqrt(1.5 / (1000 * 0.24)), 14);
  });

  test('takes the first of tied winners', () => {
    expect(mostellerMeasures([0.45, 0.5], [0.5, 0.5]).winnerError).toBeCloseTo(-0.05, 14);
  });
});

describe('a share of 0', () => {
  test.each([
    ['in the poll, first', [0, 0.5], [0.4, 0.6], { a: '-Infinity', se: 'Infinity', z: null, pValue: null }],
    ['in the poll, second', [0.5, 0], [0.4, 0.6], { a: 'Infinity', se: 'Infinity', z: null, pValue: null }],
    ['in the result, first', [0.5, 0.5], [0, 1], { a: 'Infinity', z: 'Infinity', pValue: 0 }],
    ['in the result, second', [0.5, 0.5], [1, 0], { a: '-Infinity', z: '-Infinity', pValue: 0 }],
    ['in both', [0, 0.5], [0, 1], { a: null, z: null, pValue: null }],
  ])('%s makes A unbounded or unknown, and says which', (_where, poll, result, expected) => {
    expect(predictiveAccuracy(poll, result, 900, 1)).toMatchObject(expected);
  });

  test('makes the B measure unbounded, and the weighted one unknown where the result is 0 too', () => {
    expect(multiPartyAccuracy([0, 0.6, 0.4], [0.1, 0.5, 0.4])).toMatchObject({
      b: 'Infinity',
      bWeighted: 'Infinity',
    });
    const unvoted = multiPartyAccuracy([0.1, 0.5, 0.4], [0, 0.6, 0.4]);
    expect(unvoted.perCandidate[0]).toBe('Infinity');
    expect([unvoted.b, unvoted.bWeighted]).toEqual(['Infinity', null]);
    expect(multiPartyAccuracy([1, 0], [0.6, 0.4]).perCandidate).toEqual(['Infinity', '-Infinity']);
    expect(multiPartyAccuracy([1, 0], [1, 0])).toEqual({
      perCandidate: [null, null],
      b: null,
      bWeighted: null,
    });
  });

  test('in the result makes the relative error unbounded, or unknown where the poll has 0 too', () => {
    expect(mostellerMeasures([0.1, 0.9], [0, 1]).meanRelativeError).toBe('Infinity');
    expect(mostellerMeasures([0, 0.9], [0, 1]).meanRelativeError).toBeNull();
  });
});

describe('what a poll and a result require is said by what it throws', () => {
  const functions = {
    mostellerMeasures,
    multiPartyAccuracy,
    predictiveAccuracy: (poll: number[], result: number[]) => predictiveAccuracy(poll, result, 900, 1),
  };
  const faults: [poll: number[], result: number[], condition: string][] = [
    [[0.5], [0.5], 'poll and result of the same two or more candidates'],
    [[0.5, 0.5], [0.5, 0.3, 0.2], 'poll and result of the same two or more candidates'],
    [[0.5, 1.5], [0.5, 0.5], 'shares from 0 to 1'],
    [[0.5, 0.5], [0.5, Number.NaN], 'shares from 0 to 1'],
    [[0, 0], [0.5, 0.5], 'shares that are not all 0'],
    [[0.5, 0.5], [0, 0], 'shares that are not all 0'],
  ];
  const cases = Object.entries(functions).flatMap(([name, run]) =>
    faults.map(
      ([poll, result, condition]) => [`${name} requires ${condition}`, () => run(poll, result)] as const,
    ),
  );

  test.each([
    ...cases,
    [
      'predictiveAccuracy requires n and deff above 0',
      () => predictiveAccuracy([0.5, 0.5], [0.5, 0.5], 0, 1),
    ] as const,
    [
      'predictiveAccuracy requires n and deff above 0',
      () => predictiveAccuracy([0.5, 0.5], [0.5, 0.5], 9, 0),
    ] as const,
  ])('%s', (message, run) => {
    expect(run).toThrow(new RangeError(message));
  });
});
