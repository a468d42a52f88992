import 'server-only';
import type { Tx } from '@/db/client';
import { listEmbedsOf } from '@/db/queries/embed';
import type { Consequence } from '@/lib/domain/corrections';
import { inScreenOrder } from '@/lib/domain/sheet';
import type { CorrectedItem } from '@/lib/findings/what-changed';
import { hashOf } from '@/lib/security/canonical';
import { factsOf } from '../release/facts';
import type { Effect } from './apply-in';
import { clearedTexts } from './cleared-texts';

export function consequencesOf(tx: Tx, releaseId: number, effects: readonly Effect[]): Consequence[] {
  const embeds = listEmbedsOf(
    tx,
    effects.map(({ sheet }) => sheet.id),
  );
  return effects.map(({ sheet, effect, evidenceId }) => {
    const { race, pollster, fieldStartOn, fieldEndOn } = factsOf(tx, sheet.releaseVersionId);
    return {
      sheetId: sheet.publicId,
      effect,
      isComparison: sheet.releaseId !== releaseId,
      race: race.name,
      pollster: pollster.name,
      fieldStartOn,
      fieldEndOn,
      language: sheet.language,
      lines: inScreenOrder(clearedTexts(tx, evidenceId), ({ kind }) => kind),
      embedId: embeds.get(sheet.id) ?? null,
    };
  });
}

/** Stands for what was on the screen when somebody decided. */
export function hashOfConsequences(
  changed: readonly CorrectedItem[],
  consequences: readonly Consequence[],
): string {
  return hashOf({ changed, consequences: consequences.map(({ sheetId, effect }) => [sheetId, effect]) });
}
