import type { Pair, TestFields } from '@/lib/findings/check-types';
import type { FindingTrace, ReleaseUntestedFields } from '@/lib/findings/judge-types';
import type { Presentation } from '@/lib/findings/present-share';

type Told<Tested> = (Tested & { trace?: FindingTrace }) | ReleaseUntestedFields;
type OneBase = TestFields & { breakingDeff: number | null };
type TwoBases = TestFields & { breakingFactor: number | null };

/** A finding that lines can be drafted from, of a check document or of a whole release. */
export type DraftFinding =
  | ({ kind: 'lead'; pair: Pair } & Told<OneBase>)
  | ({ kind: 'net-score'; pair: Pair } & Told<OneBase>)
  | ({ kind: 'change'; option: string } & Told<TwoBases & { littleChanged: boolean }>)
  | ({ kind: 'lead-change'; pair: Pair } & Told<TwoBases>)
  | ({ kind: 'net-score-change'; pair: Pair } & Told<TwoBases>)
  | ({ kind: 'threshold'; option: string; thresholdPct: number } & Told<OneBase>)
  | GapDraft;

export type GapDraft = {
  kind: 'gap';
  question: string;
  option: string;
  groups: Pair;
  presentation: [Presentation | null, Presentation | null];
} & Told<TwoBases>;

export type TestedDraft = Exclude<DraftFinding, { verdict: 'cannot-be-tested' }>;

/** The names of options, or blocs, that a finding is about. */
export function namesOf(finding: DraftFinding): readonly string[] {
  return 'pair' in finding ? finding.pair : [finding.option];
}
