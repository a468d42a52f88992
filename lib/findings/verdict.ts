import type { Basis, TestedReason, Verdict } from './check-types';

/** What the verdict rests on; estimate, rounding and standard errors in one unit. */
export type VerdictFacts = {
  /** Significant at its own level, and so is every better-ranked finding of its family. */
  isSignificant: boolean;
  p: number;
  /** The finding's own level by Holm's procedure. */
  alpha: number;
  /** 1 − policy.level. */
  familyAlpha: number;
  /** |estimate|. */
  size: number;
  rounding: number;
  /** Critical value at alpha. */
  critical: number;
  se: { chosen: number; low: number; high: number };
  secondTestsAgree: boolean;
  bases: readonly Basis[];
};

export type Judgement = { verdict: Exclude<Verdict, 'cannot-be-tested'>; reasons: TestedReason[] };

/**
 * The verdict of a tested finding with its reasons.
 *
 * `holds` only if the claim survives rounding, the unfavourable end of the design effect, both together, and every
 * second test, on probability samples; `does-not-hold` if it is not significant; `fragile` for the rest.
 *
 * @example
 * judgeVerdict({
 *   isSignificant: false, p: 0.09, alpha: 0.05, familyAlpha: 0.05, size: 6, rounding: 0.8, critical: 1.96,
 *   se: { chosen: 3.5, low: 3.4, high: 3.6 }, secondTestsAgree: false, bases: ['sampling'],
 * }); // => { verdict: 'does-not-hold', reasons: [] }
 */
export function judgeVerdict(facts: VerdictFacts): Judgement {
  if (!facts.isSignificant) return { verdict: 'does-not-hold', reasons: reasonsAgainst(facts) };
  const reasons = reasonsForDoubt(facts);
  return { verdict: reasons.length === 0 ? 'holds' : 'fragile', reasons };
}

function reasonsAgainst({ p, alpha, familyAlpha, size, critical, se, bases }: VerdictFacts): TestedReason[] {
  const reasons: TestedReason[] = [];
  if (p < familyAlpha) reasons.push('family');
  const isSampling = bases.every((basis) => basis === 'sampling');
  if (p >= alpha && size > critical * se.low && isSampling) reasons.push('would-hold-at-lower-deff');
  return reasons;
}

function reasonsForDoubt(facts: VerdictFacts): TestedReason[] {
  const { size, rounding, critical, se, bases } = facts;
  const survivesRounding = size - rounding > critical * se.chosen;
  const survivesDesign = size > critical * se.high;
  const survivesBoth = size - rounding > critical * se.high;
  const reasons: TestedReason[] = [];
  if (!survivesRounding) reasons.push('rounding');
  if (!survivesDesign) reasons.push('design-effect');
  if (!facts.secondTestsAgree) reasons.push('second-test');
  if (survivesRounding && survivesDesign && !survivesBoth) reasons.push('together');
  if (bases.includes('modelled')) reasons.push('modelled');
  if (bases.includes('comparison')) reasons.push('comparison');
  return reasons;
}
