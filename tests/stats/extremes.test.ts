import { describe, expect, test } from 'vitest';
import * as stats from '@/lib/stats';

const beyond: [name: string, run: () => unknown, message: string][] = [
  ['a size', () => stats.wilsonInterval(0.5, 1e-300, 2), 'wilsonInterval requires n above 0'],
  ['a critical value', () => stats.wilsonInterval(0.4, 1e5, 1e200), 'wilsonInterval requires q above 0'],
  [
    'a design effect',
    () => stats.shareEstimate({ p: 0.5, n: 1, deff: 1e300 }, 0.95),
    'shareEstimate requires n and deff above 0',
  ],
  [
    'a margin',
    () => stats.sampleSizeForMargin({ margin: 1e-200, p: 0.5, deff: 1, level: 0.95 }),
    'sampleSizeForMargin requires margin and deff above 0',
  ],
  [
    'a level of a series',
    () => stats.levelBands([1e308], [1e308], 0.95, 0),
    'levelBands requires as many variances as means, of at least 0',
  ],
];

describe('numbers whose squares no double can hold', () => {
  test.each(beyond)('are refused as %s', (_name, run, message) => {
    expect(run).toThrow(new RangeError(message));
  });

  test('leave every interval finite and in order just inside the limits', () => {
    const edges = [1e-75, 1, 1e75];
    for (const n of edges) {
      for (const q of edges) {
        for (const p of [0, 0.3, 1]) {
          const [low, high] = stats.wilsonInterval(p, n, q);
          expect(low).toBeGreaterThanOrEqual(0);
          expect(high).toBeLessThanOrEqual(1);
          expect(high - low).toBeGreaterThanOrEqual(-1e-15);
        }
      }
    }
  });
});
