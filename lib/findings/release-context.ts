import type { BlocOnBase } from './blocs';
import type { Policy } from './check-types';
import { comparisonCourse, type ComparisonCourse } from './comparison-status';
import type { ReleaseDocument, ReleaseUntestedReason, WaveOverlap } from './judge-types';
import { resolvePolicy } from './policy';
import { readQuestion, type ReadQuestion } from './question-base';
import { sourceOf, type BaseSource } from './release-entry';
import { rebasedSteps } from './release-working';
import type { BaseRole } from './working-base';

/** A base of the release with all that its findings and their working ask. */
export type ReadSide = {
  read: ReadQuestion;
  blocs: readonly BlocOnBase[];
  /** Against every finding on it. */
  reasons: readonly ReleaseUntestedReason[];
};

export type ReadComparison = ReadSide & {
  course: ComparisonCourse;
  /** null where no wave is shared. */
  overlap: WaveOverlap | null;
};

export type ReleaseContext = {
  document: ReleaseDocument;
  policy: Policy;
  release: ReadSide;
  earlier: ReadComparison | null;
};

/** Reads both bases of a parsed document, and what becomes of their comparison. */
export function readContext(document: ReleaseDocument): ReleaseContext {
  const policy = resolvePolicy(document.policy);
  const { comparison, blocs = [] } = document;
  const release = sideOf(document.release, policy, blocs);
  if (!comparison) return { document, policy, release, earlier: null };
  const given = new Map((comparison.blocs ?? []).map(({ name, ...printed }) => [name, printed]));
  const earlierBlocs = blocs.map(({ name, options }): BlocOnBase => {
    const printed = given.get(name);
    return printed ? { name, options, printed } : { name, options };
  });
  const side = sideOf(comparison.base, policy, earlierBlocs);
  const overlap = comparison.overlap && comparison.overlap.shared > 0 ? comparison.overlap : null;
  return {
    document,
    policy,
    release,
    earlier: { ...side, course: comparisonCourse(comparison), overlap },
  };
}

/** A side of the document as the working tells of it. */
export function sideSource({ read }: ReadSide, role: BaseRole, policy: Policy): BaseSource {
  return sourceOf(read, role, policy, rebasedSteps(read.figures, read.rebasedN, role));
}

function sideOf(base: ReleaseDocument['release'], policy: Policy, blocs: readonly BlocOnBase[]): ReadSide {
  const read = readQuestion(base, policy, blocs);
  return { read, blocs, reasons: read.rebasedN === null ? ['rebased-size'] : [] };
}
