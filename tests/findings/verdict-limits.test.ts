import { describe, expect, it } from 'vitest';
import { judgeVerdict, type VerdictFacts } from '@/lib/findings/verdict';

/** Numbers that are exact in binary, so that a limit is met exactly. */
const firm: VerdictFacts = {
  isSignificant: true,
  p: 0.001,
  alpha: 0.05,
  familyAlpha: 0.05,
  size: 8,
  rounding: 0.5,
  critical: 2,
  se: { chosen: 2, low: 1, high: 3 },
  secondTestsAgree: true,
  bases: ['sampling'],
};
const weak: VerdictFacts = { ...firm, isSignificant: false, p: 0.2, size: 3 };

describe('a significant finding exactly at a limit', () => {
  it('holds only beyond it', () => {
    expect(judgeVerdict(firm)).toEqual({ verdict: 'holds', reasons: [] });
  });

  it('is fragile by rounding when the rounded estimate equals the critical distance', () => {
    const facts = { ...firm, size: 4.5, se: { chosen: 2, low: 1, high: 2 } };
    expect(judgeVerdict(facts)).toEqual({ verdict: 'fragile', reasons: ['rounding'] });
    expect(judgeVerdict({ ...facts, size: 4.75 }).verdict).toBe('holds');
  });

  it('is fragile by the design effect when the estimate equals the distance at its high end', () => {
    expect(judgeVerdict({ ...firm, size: 6 })).toEqual({ verdict: 'fragile', reasons: ['design-effect'] });
  });

  it('is fragile by both together when only the two of them reach the distance', () => {
    expect(judgeVerdict({ ...firm, size: 6.5 })).toEqual({ verdict: 'fragile', reasons: ['together'] });
    expect(judgeVerdict({ ...firm, size: 6.25 }).reasons).toEqual(['together']);
    expect(judgeVerdict({ ...firm, size: 6.75 }).reasons).toEqual([]);
  });

  it('lists doubts in their order, and never "together" beside one of its parts', () => {
    const facts: VerdictFacts = {
      ...firm,
      size: 4.25,
      secondTestsAgree: false,
      bases: ['sampling', 'modelled', 'comparison'],
    };
    expect(judgeVerdict(facts).reasons).toEqual([
      'rounding',
      'design-effect',
      'second-test',
      'modelled',
      'comparison',
    ]);
  });
});

describe('a finding that is not significant', () => {
  it('blames the family only when its p is below the level of the policy', () => {
    expect(judgeVerdict({ ...weak, p: 0.04, alpha: 0.025 }).reasons).toContain('family');
    expect(judgeVerdict({ ...weak, p: 0.05, alpha: 0.025 }).reasons).not.toContain('family');
  });

  it('would hold at a lower design effect only beyond the distance at its low end', () => {
    expect(judgeVerdict(weak).reasons).toEqual(['would-hold-at-lower-deff']);
    expect(judgeVerdict({ ...weak, size: 2 }).reasons).toEqual([]);
  });

  it('says so with p exactly at its level, and not below it', () => {
    expect(judgeVerdict({ ...weak, p: 0.05 }).reasons).toEqual(['would-hold-at-lower-deff']);
    expect(judgeVerdict({ ...weak, p: 0.04, alpha: 0.05 }).reasons).toEqual(['family']);
  });

  it('promises nothing when any base is not a probability sample', () => {
    expect(judgeVerdict({ ...weak, bases: ['sampling', 'modelled'] }).reasons).toEqual([]);
    expect(judgeVerdict({ ...weak, bases: ['comparison'] }).reasons).toEqual([]);
  });
});
