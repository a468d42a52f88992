import { describe, expect, it } from 'vitest';
import { exactVerdictRates } from './exact-verdict-rates';
import { allowance } from './rate';
import { verdictRates, type VerdictCase } from './verdict-rates';

const DRAWS = 1500;
/** Where printed whole percents are most unlucky: a printed lead of 5 points is just significant. */
const UNLUCKY_N = 1445;
const knowledge = ['known', 'assumed'] as const;

describe('verdicts on leads printed in whole percents', () => {
  const level: VerdictCase[] = [400, 1000, 1440, 2000].flatMap((n) =>
    knowledge.map((known) => ({ n, lead: 0, deff: 1.4, knowledge: known })),
  );

  it.each(level)('hold in no more than 5 percent where nobody leads: n $n, $knowledge', (asked) => {
    const { holds } = verdictRates(asked, DRAWS, asked.n);
    expect(holds.rate).toBeLessThan(0.05 + allowance(0.05, DRAWS));
  });

  it('hold less often where the design effect is only assumed', () => {
    const asked = { n: 1000, lead: 0.06, deff: 1.4 };
    const [known, assumed] = knowledge.map((one) => verdictRates({ ...asked, knowledge: one }, DRAWS, 51));
    expect(assumed?.holds.rate).toBeLessThan((known?.holds.rate ?? 0) - 0.1);
    expect(assumed?.fragile.rate).toBeGreaterThan(known?.fragile.rate ?? 1);
  });

  it('hold more often the larger the true lead', () => {
    const rates = [0, 0.04, 0.08].map(
      (lead) => verdictRates({ n: 1000, lead, deff: 1, knowledge: 'known' }, DRAWS, 52).holds.rate,
    );
    expect(rates).toEqual([...rates].sort((a, b) => a - b));
    expect(rates[2]).toBeGreaterThan(0.6);
  });

  it('almost never hold for the option that is behind', () => {
    const { holdsWrongly } = verdictRates({ n: 400, lead: 0.04, deff: 2, knowledge: 'known' }, DRAWS, 53);
    expect(holdsWrongly.rate).toBeLessThan(0.01);
  });

  it('are firmer than the plain test, which rounding carries above 8 percent at an unlucky size', () => {
    const exact = exactVerdictRates(UNLUCKY_N, 0);
    expect(exact.plainPrinted).toBeGreaterThan(0.08);
    expect(exact.plainPrinted).toBeLessThan(0.09);
    expect(exact.holds).toBeLessThan(0.05);
    expect(exact.holds + exact.fragile).toBeCloseTo(exact.plainPrinted, 9);
  });

  it('are as often by simulation as by summing over every outcome', () => {
    const simulated = verdictRates({ n: UNLUCKY_N, lead: 0.02, deff: 1, knowledge: 'known' }, DRAWS, 54);
    const exact = exactVerdictRates(UNLUCKY_N, 0.02);
    for (const key of ['holds', 'fragile', 'plainPrinted'] as const) {
      expect(Math.abs(simulated[key].rate - exact[key]), key).toBeLessThan(allowance(exact[key], DRAWS));
    }
  });
});
