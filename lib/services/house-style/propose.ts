import 'server-only';
import { z } from 'zod';
import { findStyleInState, type StyleVersionRow, updateStyleVersion } from '@/db/queries/house-style';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { AppError, type FieldErrors } from '@/lib/errors';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { faultsOfSentence, faultsOfShipped } from './check-sentences';
import { changesBetween, leafAt, leavesOf } from './leaves';
import {
  agreedHash,
  bodyOf,
  currentStyle,
  EDITORS_ONLY,
  MOVED_ON,
  openOwnDraft,
  recordAct,
  refuseUnless,
} from './open-version';
import { typedOf } from './save-draft';
import type { StyleBody } from './style-body';
import { target } from './start-draft';

const schema = target.extend({
  note: z
    .string()
    .trim()
    .min(3, 'Say in a sentence what changes and why.')
    .max(2000, 'At most 2,000 characters.'),
});

/** The first agreement: the author hands the draft to a second editor. Every sentence is looked at once more. */
export function proposeStyle(actor: Actor, input: unknown, ctx: Ctx): { hash: string } {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, version, note } = parse(schema, input);
  const opened = openOwnDraft(ctx.db, actor, id, version);
  refuseFaulty(opened);
  return transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    const row = openOwnDraft(tx, acting, id, version);
    const now = currentStyle(tx);
    refuseUnless(
      row.basedOnId === now.id,
      'Another version came into force since this draft was started. Bring the draft up to date first.',
    );
    refuseUnless(
      changesBetween(bodyOf(now), bodyOf(row)).length > 0,
      'This draft changes nothing of what is in force.',
    );
    refuseUnless(
      findStyleInState(tx, 'proposed') === null,
      'Another version is proposed already. It is put in force or sent back first.',
    );
    const hash = agreedHash({ ...row, note });
    const set = {
      state: 'proposed' as const,
      note,
      hash,
      proposedBy: actor.personId,
      proposedAt: ctx.now,
      updatedAt: ctx.now,
    };
    refuseUnless(updateStyleVersion(tx, row, set), MOVED_ON);
    const act = { act: 'proposed' as const, hash, before: 'draft', after: 'proposed' };
    recordAct(tx, acting, { ...row, note }, act, ctx.now);
    return { hash };
  });
}

function refuseFaulty(row: StyleVersionRow): void {
  const left = Object.keys(typedOf(row.typed));
  if (left.length > 0)
    throw new AppError('invalid', 'What was refused is not part of the draft. Mend it or take it back.', {
      fields: Object.fromEntries(
        left.map((path) => [path, 'This was refused and is not part of the draft.']),
      ),
    });
  const fields = faultsOfBody(bodyOf(row));
  if (Object.keys(fields).length > 0)
    throw new AppError('invalid', 'Some sentences need another look.', { fields });
}

/** Every sentence of a body as written, and what the desk changed also as drafted; the first fault of each. */
export function faultsOfBody({ style }: StyleBody): FieldErrors {
  const shipped = { style: DEFAULT_HOUSE_STYLE };
  const fields: FieldErrors = {};
  for (const [path, message] of leavesOf({ style: { messages: style.messages } })) {
    if (typeof message !== 'string') continue;
    const isOwn = leafAt(shipped, path) !== message;
    const [first] = (isOwn ? faultsOfSentence : faultsOfShipped)(path, message, style);
    if (first) fields[path] = first.message;
  }
  return fields;
}
