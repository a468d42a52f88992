import type { LineKind } from './sheet';

/** A phrase of a line that the wording check holds back, as an editor saw it. */
export type HeldPhrase = { kind: LineKind; rule: string; phrase: string };

/** Why an editor filed words that the check calls not supported; kept in the evidence. */
export type WordingOverride = {
  reason: string;
  /** Public id of the editor. */
  person: string;
  marks: (HeldPhrase & { message: string })[];
};
