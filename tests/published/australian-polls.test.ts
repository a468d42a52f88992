/** Findings on a real series of polls: three years, five pollsters, shares to half a percent. */
import { describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { Finding } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { australianPolls, questionsOf, successivePolls } from './australian-polls';

const pairs = successivePolls();
const answers = pairs.map(({ earlier, later }) => check(parseCheckDocument(questionsOf(earlier, later))));
const findings = answers.flatMap((answer) => answer.findings);
const ofKind = (...kinds: Finding['kind'][]) => findings.filter((one) => kinds.includes(one.kind));
const verdictsOf = (...kinds: Finding['kind'][]) =>
  ofKind(...kinds).flatMap((one) => ('verdict' in one ? [one.verdict] : []));
const partOf = (verdicts: readonly string[], verdict: string) =>
  verdicts.filter((one) => one === verdict).length / verdicts.length;

/** Every number of a value, at any depth. */
function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}

describe('239 Australian polls of 2004 to 2007', () => {
  test('are read whole, and each but a pollster’s first has one before it', () => {
    expect(australianPolls).toHaveLength(239);
    expect(pairs).toHaveLength(239 - 5);
    expect(pairs.every(({ earlier, later }) => earlier.endedOn <= later.endedOn)).toBe(true);
  });

  test('bring every finding that was asked for, and only finite numbers', () => {
    expect(ofKind('share')).toHaveLength(3 * 234);
    expect(ofKind('lead')).toHaveLength(234);
    expect(ofKind('change')).toHaveLength(3 * 234);
    expect(ofKind('lead-change')).toHaveLength(234);
    expect(ofKind('threshold')).toHaveLength(234);
    const numbers = numbersIn(answers);
    expect(numbers.length).toBeGreaterThan(20_000);
    expect(numbers.filter((one) => !Number.isFinite(one))).toEqual([]);
    expect(verdictsOf('lead', 'change', 'lead-change', 'threshold')).not.toContain('cannot-be-tested');
  });

  test('have shares inside their intervals, and those inside 0 and 100', () => {
    const outside = findings.filter(
      (one) =>
        one.kind === 'share' &&
        one.intervalPct &&
        one.estimatePct !== null &&
        !(
          0 <= one.intervalPct[0] &&
          one.intervalPct[0] <= one.estimatePct &&
          one.estimatePct < one.intervalPct[1] &&
          one.intervalPct[1] <= 100
        ),
    );
    expect(outside).toEqual([]);
  });

  test('have leads and changes in the middle of their intervals', () => {
    const tested = findings.flatMap((one) =>
      (one.kind === 'lead' || one.kind === 'change' || one.kind === 'lead-change') && 'intervalPp' in one
        ? [one]
        : [],
    );
    expect(tested).toHaveLength(5 * 234);
    for (const { estimatePp, intervalPp, marginPp } of tested) {
      expect((intervalPp[0] + intervalPp[1]) / 2).toBeCloseTo(estimatePp, 9);
      expect((intervalPp[1] - intervalPp[0]) / 2).toBeCloseTo(marginPp, 9);
    }
  });

  test('show few changes from one poll to the next, and many leads', () => {
    const changes = verdictsOf('change', 'lead-change');
    expect(partOf(changes, 'holds')).toBeLessThan(0.01);
    expect(partOf(changes, 'fragile')).toBeLessThan(0.03);
    expect(partOf(changes, 'does-not-hold')).toBeGreaterThan(0.96);
    expect(partOf(verdictsOf('lead'), 'holds')).toBeGreaterThan(0.3);
    expect(partOf(verdictsOf('lead'), 'holds')).toBeLessThan(0.5);
  });

  test('turn every change round when the two polls are taken in the other order', () => {
    const turned = pairs.map(({ earlier, later }) => check(parseCheckDocument(questionsOf(later, earlier))));
    const changesOf = (list: typeof answers) =>
      list.flatMap((answer) =>
        answer.findings.flatMap((one) =>
          one.kind === 'change' && 'z' in one ? [{ z: one.z ?? 0, p: one.p, verdict: one.verdict }] : [],
        ),
      );
    const [forwards, backwards] = [changesOf(answers), changesOf(turned)];
    expect(forwards).toHaveLength(3 * 234);
    forwards.forEach((one, index) => {
      expect(one.z + (backwards[index]?.z ?? Number.NaN)).toBeCloseTo(0, 12);
      expect(one.p).toBeCloseTo(backwards[index]?.p ?? Number.NaN, 12);
      expect(one.verdict).toBe(backwards[index]?.verdict);
    });
  });
});
