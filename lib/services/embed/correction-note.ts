import 'server-only';
import type { Conn } from '@/db/client';
import { listEffectsOn } from '@/db/queries/corrections';
import { listClearedLines } from '@/db/queries/sheet';
import { CORRECTION_SOURCE_NOTES } from '@/lib/domain/corrections';

/**
 * What stands where a chart was that a correction withdrew: whose correction it was, without a figure. Old and new
 * values only once its replacement is cleared with a correction notice, in the words of that notice.
 */
export function correctionNote(conn: Conn, evidenceId: number): string | null {
  const found = listEffectsOn(conn, evidenceId).find(({ effect }) => effect.effect !== 'flagged');
  if (!found) return null;
  const { replacementSheetId } = found.effect;
  const cleared = replacementSheetId === null ? [] : listClearedLines(conn, replacementSheetId);
  const notice = cleared.find(({ line }) => line.kind === 'correction-notice');
  return notice?.version.text ?? CORRECTION_SOURCE_NOTES[found.correction.whose];
}
