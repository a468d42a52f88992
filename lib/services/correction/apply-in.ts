import 'server-only';
import type { Tx } from '@/db/client';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import {
  type CorrectionRow,
  type CurrentEvidence,
  insertEffect,
  listCurrentEvidenceOn,
  listReplacements,
} from '@/db/queries/corrections';
import { findEmbedOfSheet, insertEmbedVersion, moveEmbed } from '@/db/queries/embed';
import { findWholeVersion, type ReleaseRow, updateRelease } from '@/db/queries/release';
import { listNewestLines, moveLineVersions, moveSheetsToVersion, type SheetRow } from '@/db/queries/sheet';
import type { CorrectionEffect } from '@/lib/domain/corrections';
import type { Actor } from '@/lib/domain/roles';
import { enqueuePurgeIn } from '../jobs/enqueue-purge';
import { reindexSeries } from '../release/index-findings';
import { assembleSheet } from '../sheet/assemble-sheet';
import { enqueueShelfEndIn } from '../sheet/shelf-end';
import { overrideIn } from '../sheet/override-in';
import { pullIn } from '../sheet/pull-in';
import { MOVED_ON, refuseUnless, textsOf } from '../sheet/sheet-state';
import { clearedTexts } from './cleared-texts';
import { standingOf } from './standing';

export type Effect = {
  sheet: SheetRow;
  evidenceId: number;
  effect: CorrectionEffect;
  replacement: SheetRow | null;
};

export type Applied = {
  row: CorrectionRow;
  /** As it stood when the asker looked. */
  release: ReleaseRow;
  pollsterId: number;
};

/** What stands before a correction: to be asked for before anything of it is written. */
export type Before = { touched: CurrentEvidence[]; standing: Map<number, string | null> };

export function standingBefore(tx: Tx, releaseId: number, now: number): Before {
  const touched = listCurrentEvidenceOn(tx, releaseId);
  const standing = new Map(
    touched.map(({ sheet, evidenceId }) => [sheet.id, standingOf(tx, sheet, kindsIn(tx, evidenceId), now)]),
  );
  return { touched, standing };
}

/**
 * The version becomes current, and in the same moment everything cleared that rested on the old one, also as a
 * comparison, is pulled where anything printed of it differs now, flagged where nothing does, or gives way to words
 * that were agreed to against the new version.
 */
export function applyIn(tx: Tx, actor: Actor, applied: Applied, before: Before, now: number): Effect[] {
  const { row, release, pollsterId } = applied;
  const { toVersionId } = row;
  const replacements = listReplacements(tx, row.id).filter((sheet) => isAgreed(tx, sheet));
  for (const sheet of replacements) refuseUnagreed(tx, sheet, now);
  const set = { currentVersionId: toVersionId, pollsterId };
  refuseUnless(updateRelease(tx, release.id, release.version, set), MOVED_ON);
  const [old, whole] = [findWholeVersion(tx, row.fromVersionId)!, findWholeVersion(tx, toVersionId)!];
  const from = [old.version.fieldEndOn, whole.version.fieldEndOn].sort()[0]!;
  for (const series of new Set([release.pollsterId, pollsterId]))
    reindexSeries(tx, { raceId: release.raceId, pollsterId: series, from }, now);
  moveSheetsToVersion(tx, release.id, toVersionId, whole.question.id);
  const effects = before.touched.map(({ sheet, evidenceId }): Effect => {
    const replacement = replacements.find(({ replacesSheetId }) => replacesSheetId === sheet.id) ?? null;
    const moved = sheet.releaseId === release.id ? { ...sheet, releaseVersionId: toVersionId } : sheet;
    const isSame = before.standing.get(sheet.id) === standingOf(tx, moved, kindsIn(tx, evidenceId), now);
    const effect = replacement ? 'replaced' : isSame ? 'flagged' : 'pulled';
    return { sheet, evidenceId, effect, replacement };
  });
  for (const one of effects) {
    if (one.effect !== 'flagged') pullIn(tx, actor, one.sheet, row.explanation, now);
    if (one.replacement) takePlace(tx, one.replacement, one.sheet, now);
    insertEffect(tx, {
      correctionId: row.id,
      sheetId: one.sheet.id,
      evidenceId: one.evidenceId,
      effect: one.effect,
      replacementSheetId: one.replacement?.id ?? null,
      at: now,
    });
  }
  return effects;
}

const kindsIn = (tx: Tx, evidenceId: number) => clearedTexts(tx, evidenceId).map(({ kind }) => kind);

/** The agreed words become printable, and the address of the old chart shows the new one. */
function takePlace(tx: Tx, sheet: SheetRow, replaced: SheetRow, now: number): void {
  const ids = keptLines(tx, sheet).map(({ version }) => version.id);
  refuseUnless(moveLineVersions(tx, ids, 'agreed', { state: 'cleared' }), MOVED_ON);
  enqueueShelfEndIn(tx, sheet, now);
  const embed = findEmbedOfSheet(tx, replaced.id);
  if (!embed) return;
  moveEmbed(tx, embed.id, sheet.id);
  const { evidenceId } = findLastAct(tx, sheet.id, 'cleared')!;
  const number = insertEmbedVersion(tx, embed.id, evidenceId!, now);
  const { releaseId } = sheet;
  enqueuePurgeIn(tx, { of: 'embed', id: embed.publicId }, `version-${number}`, now, { releaseId });
}

const keptLines = (tx: Tx, sheet: SheetRow) =>
  listNewestLines(tx, sheet.id).filter(({ line }) => !line.knockedOut);

function isAgreed(tx: Tx, sheet: SheetRow): boolean {
  return keptLines(tx, sheet)[0]?.version.state === 'agreed';
}

/** What two people agreed to is what would be printed: a policy or house style that moved on since asks them again. */
function refuseUnagreed(tx: Tx, sheet: SheetRow, now: number): void {
  const act = findLastAct(tx, sheet.id, 'cleared');
  const evidence = act?.evidenceId ? findEvidence(tx, act.evidenceId) : null;
  const texts = textsOf(keptLines(tx, sheet));
  refuseUnless(
    evidence !== null &&
      assembleSheet(tx, sheet, now).withTexts(texts, overrideIn(evidence)).hash === evidence.hash,
    'A replacement rests on figures, a policy or a house style that changed since it was agreed to. It has to be agreed to anew first; nothing was done.',
  );
}
