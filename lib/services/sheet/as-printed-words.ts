import 'server-only';
import type { Tx } from '@/db/client';
import { updateDraftText } from '@/db/queries/sheet';
import { isAsPrinted } from '@/lib/domain/as-printed';
import type { Actor } from '@/lib/domain/roles';
import { assembleSheet } from './assemble-sheet';
import { MOVED_ON, type Opened, refuseUnless } from './sheet-state';

/** Figures as printed are always in the words of the house style in force: drafted anew before they are filed. */
export function redraftAsPrinted(tx: Tx, actor: Actor, opened: Opened, now: number): void {
  if (!isAsPrinted(opened.sheet)) return;
  const { draft, templateVersion } = assembleSheet(tx, opened.sheet, now);
  for (const { line, version } of opened.lines) {
    const text = draft.find(({ kind }) => kind === line.kind)!.text;
    if (text === version.text && text === version.draftText) continue;
    const change = { text, draftText: text, templateVersion, changedBy: actor.personId, changedAt: now };
    refuseUnless(updateDraftText(tx, version.id, change), MOVED_ON);
  }
}
