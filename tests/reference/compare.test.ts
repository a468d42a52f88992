import { describe, expect, test } from 'vitest';
import { combine, compare } from './compare';
import { kinds, toleranceOf } from './tolerances';

const figure = () => kinds.figure;
const faultsOf = (
  actual: unknown,
  expected: unknown,
  tolerance = figure as () => typeof kinds.figure | null,
) => compare(actual, expected, tolerance).faults;

describe('an answer that agrees', () => {
  test('has every figure counted, at any depth', () => {
    const expected = { se: 0.5, ci: { wald: [0.1, 0.2], label: 'a' }, none: null };
    expect(compare(structuredClone(expected), expected, figure)).toEqual({
      figures: 5,
      faults: [],
      worst: { relative: 0, at: 'se' },
      bySize: { count: 0, largest: 0 },
    });
  });

  test('names the largest relative error and where it is', () => {
    const { worst } = compare({ a: 1, b: [2, 2 + 2e-10] }, { a: 1, b: [2, 2] }, figure);
    expect(worst?.at).toBe('b[1]');
    expect(worst?.relative).toBeCloseTo(1e-10, 15);
  });

  test('may hold keys nobody asked for, unless every key has to be asked for', () => {
    expect(faultsOf({ a: 1, b: 2 }, { a: 1 })).toEqual([]);
    expect(compare({ a: 1, b: 2 }, { a: 1 }, figure, { closed: true }).faults).toEqual(['b: not expected']);
  });

  test('counts a number near 0 that only the absolute part lets through', () => {
    const { faults, bySize, worst } = compare({ a: 3e-13, b: 5 }, { a: 1e-13, b: 5 }, figure);
    expect([faults, bySize.count, worst]).toEqual([[], 1, { relative: 0, at: 'b' }]);
    expect(bySize.largest).toBeCloseTo(2e-13, 20);
  });
});

describe('an answer fails', () => {
  test.each([
    ['where a number is beyond its tolerance', { a: 1 + 1e-8 }, { a: 1 }, 'off by'],
    ['where a key is missing', {}, { a: 1 }, 'a: missing'],
    ['where a key is undefined', { a: undefined }, { a: null }, 'a: missing'],
    ['where a key is missing further down', { ci: {} }, { ci: { t: [0, 1] } }, 'ci.t: missing'],
    ['where null stands for a number', { a: null }, { a: 0 }, 'a: null instead of 0'],
    ['where a number stands for null', { a: 0 }, { a: null }, 'a: 0 instead of null'],
    ['where null stands in a list', { a: [null, 1] }, { a: [0, 1] }, 'a[0]: null instead of 0'],
    ['where a list is shorter', { a: [1] }, { a: [1, 2] }, 'a: 1 of 2 elements'],
    ['where a list is longer', { a: [1, 2, 3] }, { a: [1, 2] }, 'a: 3 of 2 elements'],
    ['where a number stands for a list', { a: 1 }, { a: [1] }, 'a: 1 instead of [1]'],
    ['where null stands for an object', { a: null }, { a: { b: 1 } }, 'a: null instead of {"b":1}'],
    ['where a list stands for an object', { a: [1] }, { a: { 0: 1 } }, 'a: [1] instead of {"0":1}'],
    [
      'where a number is infinite and the word is expected',
      { a: Infinity },
      { a: 'Infinity' },
      'a: Infinity',
    ],
    ['where the wrong infinity is named', { a: 'Infinity' }, { a: '-Infinity' }, 'instead of "-Infinity"'],
    ['where a number is NaN', { a: Number.NaN }, { a: 1 }, 'a: NaN instead of 1'],
    ['where a number is NaN and 0 is expected', { a: Number.NaN }, { a: 0 }, 'a: NaN instead of 0'],
    ['where a number is infinite', { a: Infinity }, { a: 1 }, 'a: Infinity instead of 1'],
    ['where a number is written as text', { a: '1' }, { a: 1 }, 'a: "1" instead of 1'],
    ['where a sign is turned', { a: -0.25 }, { a: 0.25 }, 'a: -0.25 instead of 0.25'],
    ['where true stands for false', { a: true }, { a: false }, 'a: true instead of false'],
  ])('%s', (_what, actual, expected, told) => {
    const faults = faultsOf(actual, expected);
    expect(faults).toHaveLength(1);
    expect(faults[0]).toContain(told);
  });

  test('at a number without a row in the table, even an equal one', () => {
    expect(faultsOf({ a: 1 }, { a: 1 }, () => null)).toEqual(['a: no tolerance in the table']);
  });
});

describe('the table of tolerances', () => {
  test('finds a field by its place in the file, not by its last word', () => {
    expect(toleranceOf('weighted_proportion', 'ci.likelihood')).toBe(kinds.searched);
    expect(toleranceOf('weighted_proportion', 'likelihood')).toBeNull();
    expect(toleranceOf('no_such_file', 'z')).toBeNull();
  });

  test('compares a p-value by part of itself however small, until both vanish', () => {
    const p = () => kinds.pValue;
    expect(compare({ p: 1.1e-250 }, { p: 1e-250 }, p).faults).toHaveLength(1);
    expect(compare({ p: 0 }, { p: 1e-250 }, p).faults).toHaveLength(1);
    expect(compare({ p: 0 }, { p: 9e-301 }, p).faults).toEqual([]);
  });

  test('asks counts to be equal', () => {
    expect(compare({ n: 1001 }, { n: 1000 }, () => kinds.count).faults).toHaveLength(1);
    expect(compare({ n: 1000 + 1e-9 }, { n: 1000 }, () => kinds.count).faults).toHaveLength(1);
  });
});

test('several comparisons add up, and the worst of all is kept', () => {
  const parts = [compare(1, 1, figure), compare(1 + 1e-10, 1, figure), compare(2, 1, figure)];
  const sum = combine(parts);
  expect(sum).toMatchObject({ figures: 3, bySize: { count: 0 } });
  expect(sum.faults).toHaveLength(1);
  expect(sum.worst?.relative).toBeCloseTo(1e-10, 15);
});
