import type { Db } from '@/db/client';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { Actor } from '@/lib/domain/roles';
import { correctRelease, previewCorrection } from '@/lib/services/correction/correct-release';
import { applyStaged, previewStaged } from '@/lib/services/correction/settle-correction';
import { getReleaseForm } from '@/lib/services/release/get-release-form';
import { HOUR, NOW } from './database';

type Change = Partial<ReleaseFormValues>;
type Told = { whose?: string; explanation?: string; how?: 'now' | 'staged' };

/** What people do with corrections, each act as it would come from the screen they have open. */
export function correctionDesk(db: Db) {
  const ctx = { db, now: NOW + 2 * HOUR };
  const asked = (actor: Actor, id: string, change: Change) => {
    const { version, values } = getReleaseForm(actor, id, ctx);
    return { id, version, release: { ...values, ...change } };
  };
  return {
    ctx,
    asked,
    preview: (actor: Actor, id: string, change: Change) =>
      previewCorrection(actor, asked(actor, id, change), ctx),

    /** Looked at and then done. */
    correct(actor: Actor, id: string, change: Change, told: Told = {}) {
      const input = asked(actor, id, change);
      const { hash } = previewCorrection(actor, input, ctx);
      const said = { whose: 'ours', explanation: 'The sample size was typed wrongly.', how: 'now', ...told };
      return correctRelease(actor, { ...input, ...said, seen: hash }, ctx);
    },

    apply(actor: Actor, correctionId: string, later = 0) {
      const at = { db, now: ctx.now + later };
      const { hash } = previewStaged(actor, { id: correctionId }, at);
      applyStaged(actor, { id: correctionId, seen: hash }, at);
    },
  };
}
