import type { DeskPolicy } from '@/lib/domain/house-style';
import type { FactThreshold } from '@/lib/domain/release-facts';
import type { RaceKind } from '@/lib/domain/vocabulary';
import type { Policy } from '@/lib/findings/check-types';

export type RaceChoice = {
  id: string;
  name: string;
  kind: RaceKind;
  options: string[];
  thresholds: FactThreshold[];
};

/** What the form offers to choose from, and the policy that findings are computed under. */
export type FormChoices = {
  races: RaceChoice[];
  pollsters: string[];
  sponsors: string[];
  /** The desk's own time zone. */
  zone: string;
  policy: Policy;
  /** Kinds of sample that the desk computes as if random; none where it is not said. */
  comparisonBasis?: DeskPolicy['comparisonBasis'];
};
