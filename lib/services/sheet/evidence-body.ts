import 'server-only';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Claim, LineText } from '@/lib/domain/sheet';
import type { WordingOverride } from '@/lib/domain/wording-override';
import type { Language } from '@/lib/domain/vocabulary';
import type { EmbedRow } from '@/lib/charts/embed-input';
import type { Scene } from '@/lib/charts/scene';
import type { SoundingSpec } from '@/lib/charts/sounding-spec';
import type { CheckAnswer, CheckDocument } from '@/lib/findings/check-types';
import type { ComparableItem, Difference } from '@/lib/findings/comparability';
import type { MissingDisclosure } from '@/lib/findings/disclosure';
import type { ComparisonTold } from '@/lib/wording/comparison-words';

/** What is frozen at the moment of clearing: everything that was on the screen, and what it was made from. */
export type EvidenceBody = {
  schema: 1;
  sheet: string;
  claim: Claim;
  claimKey: string;
  language: Language;
  release: ReleaseFacts;
  comparison: {
    release: ReleaseFacts | null;
    reason: ComparisonTold['reason'];
    unknowns: readonly ComparableItem[];
    differences: readonly Difference[];
    passedOver: ComparisonTold['passedOver'];
    override: { reason: string; person: string } | null;
  };
  policy: { version: number };
  houseStyle: { version: number; templates: string; hash: string };
  engine: string;
  document: CheckDocument;
  answer: CheckAnswer;
  draft: LineText[];
  texts: LineText[];
  chart: { spec: SoundingSpec; rows: EmbedRow[]; scene: Scene };
  missing: MissingDisclosure[];
  /** Only where an editor filed words that the wording check does not support. */
  wordingOverride?: WordingOverride;
};
