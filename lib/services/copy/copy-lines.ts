import 'server-only';
import { z } from 'zod';
import { insertCopy } from '@/db/queries/clearing';
import { isListed } from '@/db/queries/embargo';
import { findSheet, isReleasePublic, listClearedLines } from '@/db/queries/sheet';
import { type Actor, canReadCopyDesk } from '@/lib/domain/roles';
import { inScreenOrder, LINE_KINDS } from '@/lib/domain/sheet';
import { AppError } from '@/lib/errors';
import { asHtml, asMarkdown, asPlain } from '@/lib/wording/copy-forms';
import { refuseUnderBan } from '../bans/hold';
import { authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  kinds: z.array(z.enum(LINE_KINDS)).min(1).max(LINE_KINDS.length),
  form: z.enum(['plain', 'rich', 'markdown']),
});

export type Copied = { plain: string; html: string | null };

/** Fetches cleared words at the click, checks them at that moment, and records the copy. */
export function copyLines(actor: Actor, input: unknown, ctx: Ctx): Copied {
  authorize(canReadCopyDesk(actor), 'The copy desk is open to people with a role.');
  const { id, kinds, form } = parse(schema, input);
  return transact(ctx, (tx) => {
    const found = findSheet(tx, id, actor, ctx.now);
    if (!found) throw new AppError('not-found', 'There is no such sheet.');
    const isPublic = isReleasePublic(tx, found.release.id, ctx.now);
    authorize(
      isPublic || isListed(tx, found.release.id, actor),
      'This release is under embargo. Only people on its list copy from it before the hour.',
    );
    refuseUnderBan(tx, found.release.raceId, ctx.now);
    const lines = inScreenOrder(listClearedLines(tx, found.sheet.id), ({ line }) => line.kind).filter(
      ({ line }) => kinds.includes(line.kind),
    );
    if (lines.length !== new Set(kinds).size)
      throw new AppError(
        'conflict',
        'These words are not cleared any more. Reload before you copy anything.',
      );
    for (const { version } of lines)
      insertCopy(tx, {
        lineVersionId: version.id,
        personId: actor.personId,
        form,
        underEmbargo: !isPublic,
        at: ctx.now,
      });
    const subject = { entity: 'sheet', entityId: id, releaseId: found.release.id };
    const after = { form, kinds: lines.map(({ line }) => line.kind), underEmbargo: !isPublic };
    appendRecord(tx, { personId: actor.personId, action: 'copied', ...subject, after }, ctx.now);
    const texts = lines.map(({ line, version }) => ({ kind: line.kind, text: version.text }));
    if (form === 'markdown') return { plain: asMarkdown(texts), html: null };
    return { plain: asPlain(texts), html: form === 'rich' ? asHtml(texts) : null };
  });
}
