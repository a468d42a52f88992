import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  indicator,
  kishDesignEffect,
  surveyDesign,
  weightedLead,
  weightedMean,
  weightedProportion,
  type SampleMean,
} from '@/lib/stats';
import { reordered, respondentFile, type RespondentFile } from './support';

const options = { level: 0.95 };
const nested = ({ weights, stratum, psu }: RespondentFile) =>
  surveyDesign({ weights, stratum, psu, nest: true, lonelyPsu: 'adjust' });
const shareOfA = (file: RespondentFile) =>
  weightedProportion(nested(file), indicator(file.answer, 'A'), options);

function expectSame(one: SampleMean, other: SampleMean, digits = 1e-11): void {
  expect(Math.abs(one.estimate - other.estimate)).toBeLessThan(digits);
  expect(Math.abs(one.se - other.se)).toBeLessThan(digits);
  expect(one.df).toBe(other.df);
  expect(one.n).toBe(other.n);
}

describe('a weighted share', () => {
  test('does not depend on the scale of the weights', () => {
    fc.assert(
      fc.property(respondentFile, fc.double({ min: 1e-6, max: 1e6, noNaN: true }), (file, factor) => {
        const scaled = { ...file, weights: file.weights.map((weight) => weight * factor) };
        expectSame(shareOfA(file), shareOfA(scaled));
      }),
    );
  });

  test('does not depend on the order of the respondents', () => {
    fc.assert(
      fc.property(respondentFile, fc.integer({ min: 2, max: 1000 }), (file, seed) => {
        expectSame(shareOfA(file), shareOfA(reordered(file, (index) => (index * 7919 * seed) % 1009)));
      }),
    );
  });

  test('with one unit per respondent is the share without units', () => {
    fc.assert(
      fc.property(respondentFile, ({ weights, stratum, answer }) => {
        const outcome = indicator(answer, 'A');
        const alone = surveyDesign({ weights, stratum });
        const single = surveyDesign({ weights, stratum, psu: weights.map((_, row) => row) });
        expectSame(
          weightedProportion(alone, outcome, options),
          weightedProportion(single, outcome, options),
          1e-15,
        );
      }),
    );
  });

  test('in a domain of everyone is the share without a domain', () => {
    fc.assert(
      fc.property(respondentFile, (file) => {
        const whole = weightedProportion(nested(file), indicator(file.answer, 'A'), {
          ...options,
          domain: file.weights.map(() => true),
        });
        expect(whole).toEqual(shareOfA(file));
      }),
    );
  });

  test('in a domain is a ratio: values outside are not looked at', () => {
    fc.assert(
      fc.property(respondentFile, (file) => {
        const domain = indicator(file.stratum, 's1');
        const outcome = Array.from(indicator(file.answer, 'A'));
        const unasked = outcome.map((value, row) => (domain[row] === 1 ? value : Number.NaN));
        const design = nested(file);
        expect(weightedProportion(design, unasked, { ...options, domain })).toEqual(
          weightedProportion(design, outcome, { ...options, domain }),
        );
      }),
    );
  });

  test('has intervals that contain it, but for the folded arcsine, and that widen with the level', () => {
    fc.assert(
      fc.property(respondentFile, (file) => {
        const outcome = indicator(file.answer, 'B');
        const { arcsineT: _folded, ...narrow } = weightedProportion(nested(file), outcome, { level: 0.8 }).ci;
        const { ci: wide, estimate } = weightedProportion(nested(file), outcome, { level: 0.99 });
        for (const [name, interval] of Object.entries(narrow)) {
          const wider = wide[name as keyof typeof wide];
          if (!interval || !wider) throw new Error(`${name} has no interval`);
          expect(interval[0]).toBeLessThanOrEqual(estimate);
          expect(interval[1]).toBeGreaterThanOrEqual(estimate);
          expect(wider[0]).toBeLessThanOrEqual(interval[0]);
          expect(wider[1]).toBeGreaterThanOrEqual(interval[1]);
        }
      }),
    );
  });

  test('has an effective size that times the design effect is n − 1', () => {
    fc.assert(
      fc.property(respondentFile, (file) => {
        const { effectiveN, deff, n } = shareOfA(file);
        expect((effectiveN ?? 0) * (deff ?? 0)).toBeCloseTo(n - 1, 8);
      }),
    );
  });

  test('brings the Kish design effect of the weights in its domain', () => {
    const weights = [1, 2, 3, 4, 5, 6];
    const domain = [1, 0, 1, 0, 1, 1];
    const share = weightedProportion(surveyDesign({ weights }), [1, 0, 0, 0, 1, 0], { ...options, domain });
    expect(share.kishDeff).toBeCloseTo(kishDesignEffect([1, 3, 5, 6]), 14);
    expect(share.n).toBe(4);
    expect(share.sumWeights).toBe(15);
  });

  test.each([0, 1])('of %d has no variance and no interval, and never a NaN', (value) => {
    const weights = [1.1, 2.7, 0.3, 4.9, 1.7];
    const share = weightedProportion(
      surveyDesign({ weights }),
      weights.map(() => value),
      options,
    );
    expect(share).toMatchObject({ estimate: value, se: 0, deff: null, effectiveN: null, df: 4 });
    expect(Object.values(share.ci)).toEqual(Array.from({ length: 10 }, () => null));
  });

  test('without variance inside every stratum has none, though it is neither 0 nor 1', () => {
    const design = surveyDesign({ weights: [0.1, 0.1, 0.1, 0.7, 0.7, 0.7], stratum: [1, 1, 1, 2, 2, 2] });
    const share = weightedProportion(design, [1, 1, 1, 0, 0, 0], options);
    expect(share.se).toBe(0);
    expect(share.ci.meanT).toBeNull();
  });

  test('in a domain with one unit a stratum has 0 degrees of freedom and no interval by Student', () => {
    const design = surveyDesign({ weights: [1, 2, 1, 2], stratum: ['n', 'n', 's', 's'] });
    const share = weightedProportion(design, [1, 0, 0, 1], { ...options, domain: [1, 0, 1, 0] });
    expect(share.df).toBe(0);
    expect(share.se).toBeGreaterThan(0);
    expect(share.ci).toMatchObject({ meanT: null, logitT: null, kornGraubard: null, likelihood: null });
    expect(share.ci.wilson).not.toBeNull();
  });

  test('keeps units without members of the domain as units with nothing', () => {
    const design = surveyDesign({ weights: [1, 1, 1, 1], psu: ['a', 'a', 'b', 'c'] });
    const { se } = weightedProportion(design, [1, 0, 0, 0], { ...options, domain: [1, 1, 0, 0] });
    expect(se).toBe(0);
    const split = weightedProportion(design, [1, 0, 0, 0], { ...options, domain: [1, 0, 1, 0] });
    // Unit totals 1/4, −1/4 and 0: V = 3/2 · 2/16.
    expect(split.se).toBeCloseTo(Math.sqrt(3 / 16), 15);
  });

  test('leaves what it is given as it was, and gives the same answer again', () => {
    const weights = Float64Array.of(1, 2, 3, 4);
    const outcome = Float64Array.of(1, 0, 0, 1);
    const design = surveyDesign({ weights });
    const first = weightedProportion(design, outcome, options);
    weightedMean(design, [9, 8, 7, 6], options);
    expect(weightedProportion(design, outcome, options)).toEqual(first);
    expect([...weights, ...outcome]).toEqual([1, 2, 3, 4, 1, 0, 0, 1]);
  });
});

describe('a weighted lead', () => {
  test('is the difference of the two shares, and turns its sign with their order', () => {
    fc.assert(
      fc.property(respondentFile, (file) => {
        const [a, b] = [indicator(file.answer, 'A'), indicator(file.answer, 'B')];
        const lead = weightedLead(nested(file), a, b, options);
        const turned = weightedLead(nested(file), b, a, options);
        expect(lead.estimate).toBeCloseTo(lead.first - lead.second, 13);
        expect(lead.first).toBeCloseTo(shareOfA(file).estimate, 13);
        expect(turned.estimate).toBeCloseTo(-lead.estimate, 14);
        expect(turned.se).toBeCloseTo(lead.se, 14);
        expect(turned.pT).toBeCloseTo(lead.pT ?? Number.NaN, 10);
      }),
    );
  });

  test('over nobody is the share itself', () => {
    const design = surveyDesign({ weights: [1, 2, 3, 4] });
    const lead = weightedLead(design, [1, 0, 1, 0], [0, 0, 0, 0], options);
    const share = weightedProportion(design, [1, 0, 1, 0], options);
    expect(lead.se).toBe(share.se);
    expect(lead.ci.t).toEqual(share.ci.meanT);
    expect(lead.ci.normal).toEqual(share.ci.meanNormal);
  });

  test('without variance has no z, no p and no interval', () => {
    const lead = weightedLead(surveyDesign({ weights: [1, 2] }), [1, 1], [0, 0], options);
    expect(lead).toMatchObject({ estimate: 1, se: 0, z: null, pNormal: null, pT: null });
    expect(lead.ci).toEqual({ normal: null, t: null });
  });
});

describe('a weighted mean', () => {
  test('of 0 and 1 is the weighted share', () => {
    fc.assert(
      fc.property(respondentFile, (file) => {
        const outcome = indicator(file.answer, 'C');
        const mean = weightedMean(nested(file), outcome, options);
        const share = weightedProportion(nested(file), outcome, options);
        expect(mean).toMatchObject({
          estimate: share.estimate,
          se: share.se,
          deff: share.deff,
          df: share.df,
        });
      }),
    );
  });

  test('moves with the origin and the unit of the values', () => {
    const design = surveyDesign({ weights: [1, 2, 3, 4] });
    const mean = weightedMean(design, [1, 5, 2, 8], options);
    const moved = weightedMean(design, [103, 115, 106, 124], options);
    expect(moved.estimate).toBeCloseTo(100 + 3 * mean.estimate, 12);
    expect(moved.se).toBeCloseTo(3 * mean.se, 12);
  });

  test('of equal values has no variance, whatever rounding leaves', () => {
    const weights = Array.from({ length: 1000 }, (_, row) => 0.1 + (row % 7));
    expect(
      weightedMean(
        surveyDesign({ weights }),
        weights.map(() => 0.1),
        options,
      ),
    ).toMatchObject({
      se: 0,
      deff: null,
    });
  });
});
