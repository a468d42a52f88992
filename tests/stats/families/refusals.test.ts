import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';

const adjusting = {
  adjustBonferroni: stats.adjustBonferroni,
  adjustHolm: stats.adjustHolm,
  adjustHochberg: stats.adjustHochberg,
  adjustBenjaminiHochberg: stats.adjustBenjaminiHochberg,
  adjustBenjaminiYekutieli: stats.adjustBenjaminiYekutieli,
};

const refusals: [message: string, run: () => unknown][] = [
  ...Object.entries(adjusting).flatMap(([fn, adjust]) =>
    [-0.1, 1.1, Number.NaN].map((p): [string, () => unknown] => [
      `${fn} requires p-values from 0 to 1, or null`,
      () => adjust([0.2, p, null]),
    ]),
  ),
  ['holm requires p-values from 0 to 1', () => stats.holm([2], 0.05)],
  ['holm requires alpha inside 0 and 1', () => stats.holm([0.2], 0)],
  ['equivalenceTest requires a finite difference', () => stats.equivalenceTest(Infinity, 1, 3, 0.05, null)],
  [
    'equivalenceTest requires a finite standard error of at least 0',
    () => stats.equivalenceTest(1, -1, 3, 0.05, null),
  ],
  [
    'equivalenceTest requires a finite standard error of at least 0',
    () => stats.equivalenceTest(1, Number.NaN, 3, 0.05, null),
  ],
  ['equivalenceTest requires indifference above 0', () => stats.equivalenceTest(1, 1, 0, 0.05, null)],
  ['equivalenceTest requires alpha above 0 and below 0.5', () => stats.equivalenceTest(1, 1, 3, 0.5, null)],
  ['equivalenceTest requires df of at least 1, or null', () => stats.equivalenceTest(1, 1, 3, 0.05, 0)],
];

describe('what families require is said by what they throw', () => {
  test.each(refusals)('%s', (message, run) => {
    expect(run).toThrow(new RangeError(message));
  });

  test('and every promise of a refusal is kept above', () => {
    const folder = 'lib/stats/families';
    const promised = readdirSync(folder).flatMap((file) =>
      [...readFileSync(join(folder, file), 'utf8').matchAll(/@throws RangeError `([^`]+)`/g)].map(
        ([, message]) => message,
      ),
    );
    const kept = new Set(refusals.map(([message]) => message));
    expect(promised.length).toBeGreaterThan(10);
    expect(promised.filter((message) => !kept.has(message ?? ''))).toEqual([]);
  });
});
