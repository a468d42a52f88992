import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  adjustBenjaminiHochberg,
  adjustBenjaminiYekutieli,
  adjustBonferroni,
  adjustHochberg,
  adjustHolm,
  holm,
} from '@/lib/stats';

const p = fc.double({ min: 0, max: 1, noNaN: true });
const family = fc.array(fc.option(p), { maxLength: 12 });
const made = fc.array(p, { minLength: 1, maxLength: 12 });
const procedures = {
  Bonferroni: adjustBonferroni,
  Holm: adjustHolm,
  Hochberg: adjustHochberg,
  'Benjamini–Hochberg': adjustBenjaminiHochberg,
  'Benjamini–Yekutieli': adjustBenjaminiYekutieli,
};
/** Products of different order differ in their last bit. */
const ROUNDING = 1 + 1e-12;
const all = (adjusted: readonly (number | null)[]) => adjusted.map((one) => one ?? -1);

describe.each(Object.entries(procedures))('adjusted by %s', (_name, adjust) => {
  test('no p-value falls, and none leaves 0 to 1: a family never strengthens', () => {
    fc.assert(
      fc.property(made, (family_) => {
        all(adjust(family_)).forEach((adjusted, index) => {
          expect(adjusted * ROUNDING).toBeGreaterThanOrEqual(family_[index] ?? 2);
          expect(adjusted).toBeLessThanOrEqual(1);
        });
      }),
    );
  });

  test('p-values keep their order', () => {
    fc.assert(
      fc.property(made, (family_) => {
        const adjusted = all(adjust(family_));
        family_.forEach((one, i) =>
          family_.forEach((other, j) => {
            if (one <= other) expect(adjusted[i]).toBeLessThanOrEqual(adjusted[j] ?? -1);
          }),
        );
      }),
    );
  });

  test('p-values do not depend on the order they are given in', () => {
    fc.assert(
      fc.property(made, (family_) => {
        expect(all(adjust([...family_].reverse())).reverse()).toEqual(all(adjust(family_)));
      }),
    );
  });

  test('tests that could not be made stay unmade and do not count', () => {
    fc.assert(
      fc.property(family, (family_) => {
        const adjusted = adjust(family_);
        expect(adjusted.map((one) => one === null)).toEqual(family_.map((one) => one === null));
        expect(adjusted.filter((one) => one !== null)).toEqual(adjust(family_.filter((one) => one !== null)));
      }),
    );
    expect(adjust([null, null])).toEqual([null, null]);
    expect(adjust([])).toEqual([]);
  });

  test('a single test is itself, and equal ones stay equal', () => {
    expect(adjust([0.03])).toEqual([0.03]);
    expect(adjust([null, 0.03])).toEqual([null, 0.03]);
    expect(new Set(adjust([0.01, 0.01, 0.01])).size).toBe(1);
    expect(adjust([0, 0, 1])).toEqual([0, 0, 1]);
  });

  test('a family grown by another test is no easier', () => {
    fc.assert(
      fc.property(made, (family_) => {
        const alone = all(adjust(family_));
        const grown = all(adjust([...family_, 1]));
        alone.forEach((one, index) => expect((grown[index] ?? -1) * ROUNDING).toBeGreaterThanOrEqual(one));
      }),
    );
  });

  test('the family itself is left as it was', () => {
    const frozen = Object.freeze([0.04, null, 0.01]);
    adjust(frozen);
    expect(frozen).toEqual([0.04, null, 0.01]);
  });
});

describe('the procedures beside each other', () => {
  test('rank: Benjamini–Hochberg, Hochberg, Holm, Bonferroni from the smallest up', () => {
    fc.assert(
      fc.property(made, (family_) => {
        const [discovery, hochberg, stepDown, bonferroni] = [
          adjustBenjaminiHochberg,
          adjustHochberg,
          adjustHolm,
          adjustBonferroni,
        ].map((adjust) => all(adjust(family_)));
        family_.forEach((_, index) => {
          expect(discovery?.[index]).toBeLessThanOrEqual((hochberg?.[index] ?? -1) * ROUNDING);
          expect(hochberg?.[index]).toBeLessThanOrEqual((stepDown?.[index] ?? -1) * ROUNDING);
          expect(stepDown?.[index]).toBeLessThanOrEqual((bonferroni?.[index] ?? -1) * ROUNDING);
        });
      }),
    );
  });

  test('Benjamini–Yekutieli is Benjamini–Hochberg times the harmonic sum, at most 1', () => {
    const [one, two] = all(adjustBenjaminiYekutieli([0.01, 0.2]));
    const [plainOne, plainTwo] = all(adjustBenjaminiHochberg([0.01, 0.2]));
    expect(one).toBeCloseTo(1.5 * (plainOne ?? 0), 15);
    expect(two).toBeCloseTo(1.5 * (plainTwo ?? 0), 15);
  });

  test('Holm’s adjusted values are those of the verdicts', () => {
    fc.assert(
      fc.property(made, (family_) => {
        holm(family_, 0.05).forEach(({ pAdjusted }, index) => {
          expect(pAdjusted).toBeCloseTo(adjustHolm(family_)[index] ?? -1, 8);
        });
      }),
    );
  });
});
