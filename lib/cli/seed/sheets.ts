import type { Db } from '@/db/client';
import type { Actor } from '@/lib/domain/roles';
import type { LineKind } from '@/lib/domain/sheet';
import { newId } from '@/lib/security/ids';
import { clearSheet, sendBack } from '@/lib/services/sheet/clear-sheet';
import { createSheet } from '@/lib/services/sheet/create-sheet';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';

/** One person's acts on sheets at one moment, as that person would do them on the screen. */
export function deskOf(db: Db) {
  const ctx = (now: number) => ({ db, now });
  return {
    draft(actor: Actor, releaseId: string, claimKey: string, now: number): string {
      return createSheet(actor, { submissionKey: newId(), releaseId, claimKey }, ctx(now)).id;
    },

    file(actor: Actor, id: string, now: number, edits: Partial<Record<LineKind, string>> = {}): void {
      const { version, basisHash, lines } = getSheet(actor, id, ctx(now));
      const words = lines.map(({ kind, text, knockedOut }) => ({
        kind,
        text: edits[kind] ?? text,
        knockedOut,
      }));
      fileSheet(actor, { id, version, basisHash, lines: words }, ctx(now));
    },

    clear(actor: Actor, id: string, now: number): void {
      const { hash } = getSheet(actor, id, ctx(now));
      const { outcome } = clearSheet(actor, { id, hash }, ctx(now));
      if (outcome !== 'cleared') throw new Error(`demo sheet ${id} was not cleared`);
    },

    sendBack(actor: Actor, id: string, now: number, comment: string): void {
      const { hash } = getSheet(actor, id, ctx(now));
      sendBack(actor, { id, hash, comment }, ctx(now));
    },
  };
}
