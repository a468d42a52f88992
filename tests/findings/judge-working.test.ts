import { describe, expect, test } from 'vitest';
import { findingOf, judge, testedOf } from './release-documents';
import { recomputed } from './recompute';
import { JUDGED_DOCUMENTS } from './working-cases';

const asked = JUDGED_DOCUMENTS['every-kind'];
const steps = Object.values(JUDGED_DOCUMENTS).flatMap((document) =>
  judge(document).findings.flatMap((finding) => finding.working.map((step) => ({ key: finding.key, step }))),
);

describe('the working of a judged release', () => {
  test('gives its results when its plain arithmetic is computed again', () => {
    const checked = steps.flatMap(({ key, step }) => {
      const again = recomputed(step);
      return again ? [{ key, step, agrees: again.agrees }] : [];
    });
    expect(checked.length).toBeGreaterThan(300);
    expect(checked.filter(({ agrees }) => !agrees)).toEqual([]);
  });

  test('shows where the figures of blocs, waves, re-based groups and rests come from', () => {
    const labels = new Set(steps.map(({ step }) => step.label));
    for (const label of [
      'Bloc Left, this release',
      'Bloc Right, earlier release',
      'Waves not shared',
      'Interviews of a wave',
      'A, pooled over both averages',
      'Effective size of the people left in',
      'People in the rest of the sample',
      'Share in the rest of the sample',
      'Margin if different people had been asked',
    ]) {
      expect(labels, label).toContain(label);
    }
  });

  test('shows no number that is none, and no ASCII minus', () => {
    for (const { step } of steps) {
      expect(`${step.substituted} ${step.result}`).not.toMatch(/NaN|undefined|null|Infinity|(^|[\s(])-\d/);
      expect(step.label && step.formula && step.substituted && step.result).not.toBe('');
    }
  });

  test('is made once, travels as JSON and is the same each time it is read', () => {
    const finding = findingOf(asked, 'lead:A|B');
    expect(finding.working).toBe(finding.working);
    expect(JSON.parse(JSON.stringify(finding))).toMatchObject({ key: 'lead:A|B', working: finding.working });
  });

  test('has every finding under a key of its own', () => {
    const keys = judge(asked).findings.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
  });
});

describe('the trace of a finding', () => {
  test('is enough to compute its estimate and standard error again', () => {
    for (const { key } of judge(asked).findings.filter((one) => 'trace' in one)) {
      const { estimatePp, sePp, trace } = testedOf(asked, key);
      const total =
        trace.terms.reduce((sum, { sign, p }) => sum + sign * p, 0) * 100 - (trace.thresholdPct ?? 0);
      expect(total, key).toBeCloseTo(estimatePp, 9);
      expect(100 * errorFrom(trace), key).toBeCloseTo(sePp, 9);
    }
  });

  test('says how many tests its family has and how many rank before it', () => {
    const changes = judge(asked).findings.filter(({ kind }) => kind.endsWith('change'));
    const places = changes.map(({ key }) => testedOf(asked, key).trace.family);
    expect(places.map(({ before }) => before).sort((a, b) => a - b)).toEqual(
      changes.map((_, place) => place),
    );
    expect(new Set(places.map(({ size }) => size))).toEqual(new Set([changes.length]));
  });
});

/** From statistics by hand: variance of one share, of a lead, of waves not shared. */
function errorFrom({ terms, bases, thresholdPct, waves }: ReturnType<typeof testedOf>['trace']): number {
  const spread = ([a = 0, b]: readonly number[]) => (b === undefined ? a * (1 - a) : a + b - (a - b) ** 2);
  if (waves) {
    const larger = Math.max(...bases.map(({ deff }) => deff));
    const variance = waves.reduce(
      (sum, { weightChange, shares, interviews: n }) => sum + (weightChange ** 2 * spread(shares)) / n,
      0,
    );
    return Math.sqrt(larger * variance);
  }
  const variances = bases.map(({ n, deff }, place) => {
    const own = terms.filter(({ base }) => base === place).map(({ p }) => p);
    return (deff * spread(thresholdPct === null ? own : [thresholdPct / 100])) / n;
  });
  return Math.sqrt(variances.reduce((sum, one) => sum + one, 0));
}
