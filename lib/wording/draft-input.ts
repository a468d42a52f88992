import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { ClaimKind, ReleaseClaim } from '@/lib/domain/sheet';
import type { Language } from '@/lib/domain/vocabulary';
import type { BaseAnswer, CheckAnswer, Policy } from '@/lib/findings/check-types';
import type { OverlapAnswer } from '@/lib/findings/judge-types';
import type { DraftFinding } from './draft-finding';
import type { HouseStyle } from './house-style';

/** Everything a sheet is drafted from; the same input gives the same words. */
export type DraftInput = {
  claim: ReleaseClaim;
  /** The finding of that claim in `answer`, or in the judgement of a whole release. */
  finding: DraftFinding;
  answer: CheckAnswer;
  release: ReleaseFacts;
  /** The release it was compared with; needed by claims of a change. */
  previous: ReleaseFacts | null;
  /** Whole sentences about the comparison that belong in the method note. */
  comparison: { note: string[] };
  houseStyle: HouseStyle;
  policy: Policy;
  language: Language;
  /** What the judgement of a whole release adds; absent for a finding of a check document. */
  beside?: Beside;
  /** What stood in print before; needed by a correction notice alone. */
  corrected?: Corrected;
};

export type Beside = {
  blocs: BlocTold[];
  overlap: OverlapAnswer | null;
  /** People that re-based shares stand on; null where not disclosed, absent where not re-based. */
  rebasedN?: number | null;
  /** Both sides of a gap, in the order of the finding; null for every other kind. */
  groups: [GroupTold, GroupTold] | null;
};

export type Figure = { units: number | null; decimals: number };

export type BlocTold = {
  name: string;
  options: readonly string[];
  source: 'printed' | 'summed';
  now: Figure | null;
  then: Figure | null;
};

export type GroupTold = {
  /** Empty for everyone else in the sample. */
  name: string;
  n: number | null;
  /** Of the option of the gap; null where not disclosed or where the presentation standard suppresses it. */
  figure: Figure | null;
  isSuppressed: boolean;
  base: BaseAnswer;
};

/** The evidence that earlier words were cleared on, and the day of the correction, YYYY-MM-DD. */
export type Corrected = {
  was: Pick<DraftInput, 'finding' | 'release' | 'previous' | 'beside'>;
  on: string;
};

/** Whether the finding stands on two releases. */
export function isOfTwoReleases(kind: ClaimKind): boolean {
  return kind === 'change' || kind === 'lead-change' || kind === 'net-score-change';
}

/** The printed figure of an option or bloc, in this release or in the one it is compared with; null where it has none. */
export function figureOf(
  name: string,
  { release, previous, beside }: Pick<DraftInput, 'release' | 'previous' | 'beside'>,
  which: 'now' | 'then',
): Figure | null {
  const bloc = beside?.blocs.find((one) => one.name === name);
  if (bloc) return bloc[which];
  const facts = which === 'now' ? release : previous;
  const share = facts?.shares.find(({ option }) => option === name);
  return facts && share ? { units: share.units, decimals: facts.decimals } : null;
}
