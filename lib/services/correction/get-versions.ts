import 'server-only';
import { listCorrectionsOf } from '@/db/queries/corrections';
import { listVersions } from '@/db/queries/release';
import type { CorrectionSource, CorrectionState } from '@/lib/domain/corrections';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { type Actor, canReadUnpublished } from '@/lib/domain/roles';
import { type CorrectedItem, whatChanged } from '@/lib/findings/what-changed';
import { authorize, type Ctx } from '../context';
import { factsOfWhole } from '../release/facts';
import { findVisibleRelease } from '../release/get-release';

export type VersionView = {
  facts: ReleaseFacts;
  methodNote: string | null;
  enteredBy: string;
  enteredAt: number;
  isCurrent: boolean;
  /** Against the version before it. */
  changed: CorrectedItem[];
  /** The correction that brought it; null for the first and for one mended before anything rested on it. */
  correction: { id: string; whose: CorrectionSource; explanation: string; state: CorrectionState } | null;
};

/** Every version of a release, newest first, each with what it changed and whose change it was. */
export function getVersions(actor: Actor, id: string, ctx: Ctx): { id: string; versions: VersionView[] } {
  authorize(canReadUnpublished(actor), 'Releases are read by reporters and editors.');
  const release = findVisibleRelease(actor, id, ctx);
  const corrections = listCorrectionsOf(ctx.db, release.id);
  const rows = listVersions(ctx.db, release.id);
  const facts = rows.map((whole) => ({
    ...factsOfWhole(ctx.db, whole),
    sameQuestion: whole.question.sameQuestion,
    methodNote: whole.version.methodNote,
  }));
  const versions = rows.map((whole, place): VersionView => {
    const { sameQuestion: _, methodNote, ...printed } = facts[place]!;
    const before = facts[place - 1];
    const found = corrections.find(({ correction }) => correction.toVersionId === whole.version.id);
    return {
      facts: printed,
      methodNote,
      enteredBy: whole.enteredBy,
      enteredAt: whole.version.createdAt,
      isCurrent: whole.version.id === release.currentVersionId,
      changed: before ? whatChanged(before, facts[place]!) : [],
      correction: found
        ? {
            id: found.correction.publicId,
            whose: found.correction.whose,
            explanation: found.correction.explanation,
            state: found.correction.state,
          }
        : null,
    };
  });
  return { id: release.publicId, versions: versions.reverse() };
}
