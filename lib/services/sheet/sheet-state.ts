import 'server-only';
import type { Conn } from '@/db/client';
import { findSheet, listNewestLines } from '@/db/queries/sheet';
import { inScreenOrder, type LineState, type LineText } from '@/lib/domain/sheet';
import type { Actor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';

export type FoundSheet = NonNullable<ReturnType<typeof findSheet>>;
export type NewestLine = ReturnType<typeof listNewestLines>[number];

export type Opened = FoundSheet & {
  lines: NewestLine[];
  /** Lines that the sheet keeps; a sheet is filed and cleared as one, so they share a state. */
  kept: NewestLine[];
  state: LineState;
  texts: LineText[];
};

/** A sheet with its newest words. @throws AppError `not-found` also where the asker may not see it */
export function openSheet(conn: Conn, actor: Actor, id: string, now: number): Opened {
  const found = findSheet(conn, id, actor, now);
  if (!found) throw new AppError('not-found', 'There is no such sheet.');
  const lines = inScreenOrder(listNewestLines(conn, found.sheet.id), ({ line }) => line.kind);
  const kept = lines.filter(({ line }) => !line.knockedOut);
  const state = kept[0]?.version.state ?? 'draft';
  return { ...found, lines, kept, state, texts: textsOf(kept) };
}

export function textsOf(lines: readonly NewestLine[]): LineText[] {
  return lines.map(({ line, version }) => ({ kind: line.kind, text: version.text }));
}

export function refuseUnless(condition: boolean, message: string): asserts condition {
  if (!condition) throw new AppError('conflict', message);
}

export const MOVED_ON =
  'Somebody changed this sheet meanwhile. Reload the page and look again; nothing was done.';

/** Nobody changed what house style drafted. */
export function isUntouched({ text, draftText }: NewestLine['version']): boolean {
  return text === draftText;
}
