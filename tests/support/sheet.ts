import type { Db } from '@/db/client';
import type { LineKind } from '@/lib/domain/sheet';
import type { Actor } from '@/lib/domain/roles';
import { newId } from '@/lib/security/ids';
import { clearSheet, sendBack } from '@/lib/services/sheet/clear-sheet';
import { createSheet } from '@/lib/services/sheet/create-sheet';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { NOW } from './database';

export const LEAD = 'lead:Alder|Brook';

type Edits = Partial<Record<LineKind, string>>;

/** What people do with sheets, each act as it would come from the screen they have open. */
export function sheetDesk(db: Db) {
  const ctx = (later = 0) => ({ db, now: NOW + later });
  const hashOf = (actor: Actor, id: string) => getSheet(actor, id, ctx()).hash ?? '';
  return {
    ctx,
    hashOf,

    draft: (actor: Actor, releaseId: string, claimKey = LEAD) =>
      createSheet(actor, { submissionKey: newId(), releaseId, claimKey }, ctx()).id,

    /** The input of a filing or of an editor's change, from what is on the screen. */
    filing(actor: Actor, id: string, edits: Edits = {}, knockedOut: LineKind[] = []) {
      const { version, basisHash, lines } = getSheet(actor, id, ctx());
      return {
        id,
        version,
        basisHash,
        lines: lines.map((line) => ({
          kind: line.kind,
          text: edits[line.kind] ?? line.text,
          knockedOut: line.knockedOut || knockedOut.includes(line.kind),
        })),
      };
    },

    file(actor: Actor, id: string, edits: Edits = {}, knockedOut: LineKind[] = []) {
      return fileSheet(actor, this.filing(actor, id, edits, knockedOut), ctx());
    },

    clear: (actor: Actor, id: string, later = 0) =>
      clearSheet(actor, { id, hash: hashOf(actor, id) }, ctx(later)),

    sendBack: (actor: Actor, id: string, comment: string) =>
      sendBack(actor, { id, hash: hashOf(actor, id), comment }, ctx()),

    /** Drafted and filed by the first, cleared by the second. */
    cleared(author: Actor, editor: Actor, releaseId: string, later = 0) {
      const id = this.draft(author, releaseId);
      this.file(author, id);
      this.clear(editor, id, later);
      return id;
    },
  };
}
