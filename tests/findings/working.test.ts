import { describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import { working } from '@/lib/findings/working';
import cases from '../reference/findings/cases.json';
import { recomputed } from './recompute';

const everyStep = cases.flatMap(({ id, input }) => {
  const document = input as unknown as CheckDocument;
  const answer = check(document);
  return answer.findings.flatMap((finding, index) =>
    working(document, answer, index).map((step) => ({ id, finding, step })),
  );
});

describe('working', () => {
  test('every step that is plain arithmetic gives its result when computed again', () => {
    const checked = everyStep.flatMap(({ id, step }) => {
      const again = recomputed(step);
      return again ? [{ id, step, agrees: again.agrees }] : [];
    });
    expect(checked.length).toBeGreaterThan(2000);
    expect(checked.filter(({ agrees }) => !agrees)).toEqual([]);
  });

  test('arithmetic is shown for every kind of quantity', () => {
    const labels = new Set(everyStep.flatMap(({ step }) => (recomputed(step) ? [step.label] : [])));
    for (const label of [
      'Effective sample size',
      'Design effect implied by the stated margin',
      'Design effect implied by the modelled interval',
      'Interval (score)',
      'Maximum margin of a share',
      'Estimate',
      'Standard error',
      'Standard error at the low end of the design effect',
      'Standard error at the high end of the design effect',
      'Margin',
      'Interval',
      'Test statistic',
      'Level of this test in its family',
      'Survives rounding',
      'Survives the high design effect',
      'Survives both together',
      'Survives twice the sampling error',
      'Difference found four times in five',
      'Design effect at which it would cease to be significant',
      'Factor on both design effects at which it would cease to be significant',
    ]) {
      expect(labels, label).toContain(label);
    }
  });

  test('every finding but a share ends its rules with a verdict in the words of the screen', () => {
    const words = {
      holds: 'Holds',
      fragile: 'Fragile',
      'does-not-hold': 'Not shown',
      'cannot-be-tested': 'Cannot be tested',
    };
    const verdicts = everyStep.filter(({ step }) => step.label === 'Verdict');
    expect(new Set(verdicts.map(({ step }) => step.result))).toEqual(new Set(Object.values(words)));
    for (const { finding, step } of verdicts) {
      if (finding.kind === 'share') throw new Error('a share has no verdict');
      expect(step.result).toBe(words[finding.verdict]);
    }
  });

  test('no step shows a number that is none, or an ASCII minus', () => {
    for (const { step } of everyStep) {
      expect(`${step.substituted} ${step.result}`).not.toMatch(/NaN|undefined|null|Infinity|(^|[\s(])-\d/);
      expect(step.label && step.formula && step.substituted && step.result).not.toBe('');
    }
  });

  test('numbers carry at most six significant digits', () => {
    for (const { step } of everyStep) {
      for (const [number] of step.result.matchAll(/\d[\d.]*/g)) {
        expect(
          number.replace('.', '').replace(/^0+/, '').replace(/0+$/, '').length,
          step.result,
        ).toBeLessThanOrEqual(6);
      }
    }
  });

  test('refuses an index without a finding', () => {
    const [one] = cases;
    const document = one?.input as unknown as CheckDocument;
    const answer = check(document);
    expect(() => working(document, answer, 99)).toThrow(
      new RangeError('working requires the index of a finding of the answer'),
    );
  });
});
