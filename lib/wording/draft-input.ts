import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Claim } from '@/lib/domain/sheet';
import type { Language } from '@/lib/domain/vocabulary';
import type { CheckAnswer, Policy, TestableFinding } from '@/lib/findings/check-types';
import type { HouseStyle } from './house-style';

/** Everything a sheet is drafted from; the same input gives the same words. */
export type DraftInput = {
  claim: Claim;
  /** The finding of that claim in `answer`. */
  finding: TestableFinding;
  answer: CheckAnswer;
  release: ReleaseFacts;
  /** The release it was compared with; needed by claims of a change. */
  previous: ReleaseFacts | null;
  /** Whole sentences about the comparison that belong in the method note. */
  comparison: { note: string[] };
  houseStyle: HouseStyle;
  policy: Policy;
  language: Language;
};

/** Whether the finding stands on two releases. */
export function isOfTwoReleases(kind: Claim['kind']): boolean {
  return kind === 'change' || kind === 'lead-change';
}
