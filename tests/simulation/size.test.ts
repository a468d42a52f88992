import { describe, expect, it } from 'vitest';
import { allowance } from './rate';
import { testNames, testSizes, type NullCase, type TestName } from './test-sizes';

const DRAWS = 2000;
const sizes = (asked: NullCase, seed: number) => {
  const rates = testSizes(asked, DRAWS, seed);
  return (name: TestName) => rates.get(name)?.rate ?? null;
};
const exact: TestName[] = ['exact, effective counts', 'fisher', 'sign'];
const large = testNames.filter((name) => !exact.includes(name) && name !== 'exact, whole counts');

describe('tests where nothing is there to be found', () => {
  it('reject in 5 percent of large clustered polls of a known design effect', () => {
    const at = sizes({ n: 800, p: 0.4, deff: 2 }, 41);
    for (const name of large) {
      expect(Math.abs((at(name) ?? 1) - 0.05), name).toBeLessThan(allowance(0.05, DRAWS) + 0.003);
    }
  });

  it.each([
    { n: 100, p: 0.03, deff: 1 },
    { n: 300, p: 0.03, deff: 1 },
    { n: 600, p: 0.04, deff: 2 },
  ])('never reject more than 5 percent when they are exact: $n people, $p, design effect $deff', (asked) => {
    const at = sizes(asked, 42);
    for (const name of exact) expect(at(name), name).toBeLessThan(0.05 + allowance(0.05, DRAWS));
  });

  it('are wrong more often without pooling than with it in small samples', () => {
    const at = sizes({ n: 40, p: 0.3, deff: 1 }, 43);
    expect(at('unpooled')).toBeGreaterThan(at('pooled') ?? 1);
    expect(at('lead, z')).toBeGreaterThan(at('lead, score') ?? 1);
  });

  it('have no exact test of whole counts in a sample with a design effect', () => {
    expect(sizes({ n: 100, p: 0.3, deff: 2 }, 44)('exact, whole counts')).toBeNull();
    expect(sizes({ n: 100, p: 0.3, deff: 1 }, 44)('exact, whole counts')).toBeLessThan(0.06);
  });
});
