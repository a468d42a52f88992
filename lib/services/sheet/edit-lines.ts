import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { insertLineVersion, setKnockedOut, touchSheet, updateDraftText } from '@/db/queries/sheet';
import { type Actor, canActAsEditor, canDraftSheets } from '@/lib/domain/roles';
import { LINE_KIND_NAMES, LINE_KINDS, type LineKind, REQUIRED_LINE_KINDS } from '@/lib/domain/sheet';
import { AppError, type FieldErrors } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { authorize, type Ctx, parse, transact } from '../context';
import { isAsPrinted } from '@/lib/domain/as-printed';
import { assembleSheet } from './assemble-sheet';
import { isUntouched, MOVED_ON, type NewestLine, openSheet, type Opened, refuseUnless } from './sheet-state';

export const lineEdits = z
  .array(
    z.strictObject({
      kind: z.enum(LINE_KINDS),
      text: z.string().max(5000, 'At most 5,000 characters.'),
      knockedOut: z.boolean(),
    }),
  )
  .max(LINE_KINDS.length);
export type LineEdits = z.output<typeof lineEdits>;

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  version: z.number().int().min(1),
  lines: lineEdits,
});

/** Saves words that are being written: the author's, or an editor's. Filed and cleared words are never touched. */
export function saveLines(actor: Actor, input: unknown, ctx: Ctx): { version: number } {
  authorize(canDraftSheets(actor), 'Only reporters and editors write lines.');
  const { id, version, lines } = parse(schema, input);
  return transact(ctx, (tx) => {
    const opened = openForWriting(tx, actor, id, version, ctx.now);
    applyEdits(tx, actor, opened, lines, ctx.now);
    refuseUnless(touchSheet(tx, opened.sheet.id, version), MOVED_ON);
    return { version: version + 1 };
  });
}

/** The sheet, where this person may write on it now and saw its newest version. */
export function openForWriting(tx: Tx, actor: Actor, id: string, version: number, now: number): Opened {
  const opened = openSheet(tx, actor, id, now);
  const isAuthor = opened.sheet.authorId === actor.personId;
  authorize(isAuthor || canActAsEditor(actor), 'Only its author or an editor writes on this sheet.');
  refuseUnless(opened.sheet.version === version, MOVED_ON);
  refuseUnless(
    opened.state === 'draft' || opened.state === 'sent-back',
    'These words are filed or cleared. Send the sheet back, or start a new version.',
  );
  return opened;
}

/** Writes the edits onto draft versions; words that were sent back get a new version first. */
export function applyEdits(tx: Tx, actor: Actor, opened: Opened, edits: LineEdits, now: number): void {
  const isDraft = opened.state === 'draft';
  const lines = isDraft ? opened.lines : renewLines(tx, actor, opened, now);
  const isAsked = edits.some((edit) => isMoved(lines, edit)) || edits.length < lines.length;
  const drafts = isDraft && isAsked && !isAsPrinted(opened.sheet) ? draftsNow(tx, opened, now) : null;
  for (const edit of edits) {
    const target = lines.find(({ line }) => line.kind === edit.kind);
    if (!target)
      throw new AppError('invalid', `This sheet has no ${LINE_KIND_NAMES[edit.kind].toLowerCase()}.`);
    if (edit.knockedOut && REQUIRED_LINE_KINDS.includes(edit.kind))
      throw new AppError('invalid', 'Some lines need another look.', {
        fields: { [edit.kind]: 'The chart cannot do without this line.' },
      });
    if (isAsPrinted(opened.sheet) && (edit.knockedOut || plainText(edit.text) !== target.version.text))
      throw new AppError(
        'invalid',
        'Figures as printed stay in the words of house style. Draft a claim instead.',
      );
    if (edit.knockedOut !== target.line.knockedOut) setKnockedOut(tx, target.line.id, edit.knockedOut);
    const text = plainText(edit.text);
    if (text === target.version.text) continue;
    const isDrafted = drafts?.get(edit.kind) === text;
    const change = {
      text,
      changedBy: actor.personId,
      changedAt: now,
      ...(isDrafted ? { draftText: text } : {}),
    };
    refuseUnless(updateDraftText(tx, target.version.id, change), MOVED_ON);
  }
  const given = edits.map(({ kind }) => kind);
  for (const { line, version } of lines.filter(({ line }) => !given.includes(line.kind)))
    follow(tx, actor, version, drafts?.get(line.kind), now);
}

/** A line that nobody edited is what house style drafts now, as the screen shows it. */
function follow(
  tx: Tx,
  actor: Actor,
  version: NewestLine['version'],
  text: string | undefined,
  now: number,
): void {
  if (text === undefined || text === version.text || !isUntouched(version)) return;
  const change = { text, draftText: text, changedBy: actor.personId, changedAt: now };
  refuseUnless(updateDraftText(tx, version.id, change), MOVED_ON);
}

/** Words that nobody had edited come back otherwise: perhaps as house style drafts them from other figures now. */
function isMoved(lines: readonly NewestLine[], edit: LineEdits[number]): boolean {
  const target = lines.find(({ line }) => line.kind === edit.kind);
  return target !== undefined && isUntouched(target.version) && plainText(edit.text) !== target.version.text;
}

function draftsNow(tx: Tx, opened: Opened, now: number): Map<LineKind, string> {
  return new Map(assembleSheet(tx, opened.sheet, now).draft.map(({ kind, text }) => [kind, text]));
}

/** New draft versions of every line, drafted from what is stored now; words that somebody wrote stay as they stand. */
export function renewLines(tx: Tx, actor: Actor, opened: Opened, now: number): NewestLine[] {
  const { draft, templateVersion } = assembleSheet(tx, opened.sheet, now);
  return opened.lines.map(({ line, version, changedBy }) => {
    const draftText = draft.find(({ kind }) => kind === line.kind)?.text ?? version.draftText;
    return {
      line,
      changedBy,
      version: insertLineVersion(tx, {
        publicId: newId(),
        lineId: line.id,
        number: version.number + 1,
        draftText,
        text: isUntouched(version) ? draftText : version.text,
        state: 'draft',
        templateVersion,
        changedBy: actor.personId,
        changedAt: now,
      }),
    };
  });
}

/** Line ends and invisible characters tidied, so that nothing hides in a copied sentence. */
export function plainText(text: string): string {
  return text
    .normalize('NFC')
    .replace(/\r\n?/g, '\n')
    .replace(/[^\P{C}\n\u2066-\u2069\u200e\u200f]/gu, '')
    .trim();
}

/** What keeps a sheet from being filed, by line. */
export function filingProblems(lines: readonly { kind: string; text: string }[]): FieldErrors {
  return Object.fromEntries(
    lines
      .filter(({ text }) => text === '')
      .map(({ kind }) => [kind, 'A filed line has words. Knock it out, or write it.']),
  );
}
