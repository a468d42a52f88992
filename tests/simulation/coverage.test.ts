import { describe, expect, it } from 'vitest';
import { differenceCoverage, differenceNames } from './difference-coverage';
import { allowance } from './rate';
import { exactShareCoverage, shareIntervalNames, simulatedShareCoverage } from './share-coverage';

const DRAWS = 2000;
const SIZES = [30, 100, 400, 1000];
const SHARES = [0.005, 0.02, 0.1, 0.3, 0.5, 0.93];
const everywhere = SIZES.flatMap((n) => SHARES.map((p) => ({ n, p })));

describe('intervals of a share in simple random samples, summed over every count', () => {
  it('Clopper–Pearson never covers less often than promised', () => {
    for (const { n, p } of everywhere) {
      expect(exactShareCoverage('clopper-pearson', n, p), `n ${n}, p ${p}`).toBeGreaterThanOrEqual(0.95);
    }
  });

  it('Wald covers poorly near 0, and no better after many people', () => {
    expect(exactShareCoverage('wald', 30, 0.005)).toBeLessThan(0.2);
    expect(exactShareCoverage('wald', 100, 0.02)).toBeLessThan(0.9);
    expect(exactShareCoverage('wald', 1000, 0.005)).toBeLessThan(0.9);
  });

  it('Wilson is near its level on average, where Wald is not', () => {
    const average = (name: 'wald' | 'wilson') =>
      everywhere.reduce((sum, { n, p }) => sum + exactShareCoverage(name, n, p), 0) / everywhere.length;
    expect(Math.abs(average('wilson') - 0.95)).toBeLessThan(0.01);
    expect(average('wald')).toBeLessThan(0.9);
  });

  it.each(['wilson corrected', 'agresti-coull'] as const)('%s covers at least as often as Wilson', (name) => {
    for (const { n, p } of everywhere) {
      const ahead = exactShareCoverage(name, n, p) - exactShareCoverage('wilson', n, p);
      expect(ahead, `n ${n}, p ${p}`).toBeGreaterThanOrEqual(-1e-9);
    }
  });

  it.each(shareIntervalNames)('%s covers as promised at a half with 1,000 people', (name) => {
    expect(Math.abs(exactShareCoverage(name, 1000, 0.5) - 0.95)).toBeLessThan(0.005);
  });
});

describe('intervals in clustered samples of a known design effect', () => {
  const effective = shareIntervalNames.filter((name) => name !== 'wilson corrected');

  it.each(effective)('%s of a share covers as promised on effective counts', (name) => {
    const { rate } = simulatedShareCoverage(name, { n: 800, p: 0.4, deff: 2 }, DRAWS, 31);
    expect(Math.abs(rate - 0.95)).toBeLessThan(allowance(0.05, DRAWS) + 0.005);
  });

  it('covers far too seldom when the design effect is ignored', () => {
    const ignored = simulatedShareCoverage('wilson', { n: 800, p: 0.4, deff: 2 }, DRAWS, 31, 1);
    expect(ignored.rate).toBeLessThan(0.88);
  });

  it('covers differences and leads as promised', () => {
    const rates = differenceCoverage(
      { before: { n: 600, a: 0.42, b: 0.4, deff: 1.5 }, after: { n: 800, a: 0.46, b: 0.38, deff: 2 } },
      DRAWS,
      32,
    );
    for (const name of differenceNames) {
      expect(Math.abs((rates.get(name)?.rate ?? 0) - 0.95), name).toBeLessThan(
        allowance(0.05, DRAWS) + 0.005,
      );
    }
  });

  it('covers small shares of small polls with Newcombe better than with the Wald change', () => {
    const side = { n: 60, a: 0.02, b: 0.4, deff: 1 };
    const rates = differenceCoverage({ before: side, after: { ...side, n: 200 } }, DRAWS, 33);
    expect(rates.get('change of a share')?.rate).toBeLessThan(0.9);
    expect(rates.get('newcombe')?.rate).toBeGreaterThan(0.94);
  });
});
