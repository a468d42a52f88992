import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { insertHouseStyle, insertPolicy } from '@/db/queries/desk';
import { nextStyleNumber, type StyleVersionRow, updateStyleVersion } from '@/db/queries/house-style';
import { listClearedSheets } from '@/db/queries/job-subjects';
import { type Actor, canActAsEditor } from '@/lib/domain/roles';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { enqueueRecomputeIn } from '../jobs/enqueue-recompute';
import { tellIn } from '../outbox/tell-in';
import { enqueueShelfEndIn } from '../sheet/shelf-end';
import {
  agreedHash,
  currentStyle,
  EDITORS_ONLY,
  MOVED_ON,
  openStyle,
  recordAct,
  refuseUnless,
} from './open-version';

const agreed = z.strictObject({
  id: z.string().min(1).max(64),
  /** Of the version that was on the screen. */
  hash: z.string().regex(/^[0-9a-f]{64}$/, 'Reload the page and look again.'),
});

/** The second agreement: another editor puts a proposed version in force, from this moment for everything drafted. */
export function putStyleInForce(actor: Actor, input: unknown, ctx: Ctx): { number: number } {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, hash } = parse(agreed, input);
  return transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    const row = openProposed(tx, acting, id, hash);
    authorize(
      row.proposedBy !== actor.personId,
      'You proposed this version. Another editor reads it before it comes into force.',
    );
    const before = currentStyle(tx);
    refuseUnless(
      row.basedOnId === before.id,
      'Another version came into force since this was proposed. Send it back to be brought up to date.',
    );
    refuseUnless(updateStyleVersion(tx, before, { state: 'replaced' }), MOVED_ON);
    const number = nextStyleNumber(tx);
    const set = {
      state: 'in-force' as const,
      number,
      putInForceBy: actor.personId,
      inForceAt: ctx.now,
      updatedAt: ctx.now,
      ...bodiesOf(tx, row, before, ctx.now),
    };
    refuseUnless(updateStyleVersion(tx, row, set), MOVED_ON);
    const act = { act: 'put-in-force' as const, hash, before: 'proposed', after: 'in-force' };
    recordAct(tx, acting, row, act, ctx.now);
    followIn(tx, acting, before, set, ctx.now);
    const subject = { entity: 'house style version' as const, entityId: row.publicId };
    tellIn(tx, { kind: 'style-in-force', ...subject, refs: { number } }, ctx.now);
    return { number };
  });
}

/** What evidence pins: a new row only for what differs, so that no sheet is asked for again without a reason. */
function bodiesOf(tx: Tx, row: StyleVersionRow, before: StyleVersionRow, now: number) {
  const isSame = (part: 'houseStyle' | 'policy') => row[part] === before[part];
  return {
    houseStyleId: isSame('houseStyle') ? before.houseStyleId : insertHouseStyle(tx, row.houseStyle, now),
    policyId: isSame('policy') ? before.policyId : insertPolicy(tx, row.policy, now),
  };
}

/** What rests on the desk's settings follows: marks under the new policy, and shelf lives under the new style. */
function followIn(
  tx: Tx,
  actor: Actor,
  before: StyleVersionRow,
  after: Pick<StyleVersionRow, 'houseStyleId' | 'policyId'>,
  now: number,
) {
  if (after.policyId !== before.policyId) enqueueRecomputeIn(tx, now, actor.personId);
  if (after.houseStyleId !== before.houseStyleId)
    for (const sheet of listClearedSheets(tx)) enqueueShelfEndIn(tx, sheet, now);
}

const back = agreed.extend({
  comment: z.string().trim().min(3, 'Say what should change.').max(2000, 'At most 2,000 characters.'),
});

/** Sends a proposed version back to its author with a reason. Whoever proposed it may take it back the same way. */
export function sendStyleBack(actor: Actor, input: unknown, ctx: Ctx): void {
  authorize(canActAsEditor(actor), EDITORS_ONLY);
  const { id, hash, comment } = parse(back, input);
  transact(ctx, (tx) => {
    const acting = actingNow(tx, actor);
    const row = openProposed(tx, acting, id, hash);
    const set = {
      state: 'draft' as const,
      hash: null,
      proposedBy: null,
      proposedAt: null,
      updatedAt: ctx.now,
    };
    refuseUnless(updateStyleVersion(tx, row, set), MOVED_ON);
    const act = { act: 'sent-back' as const, hash, comment, before: 'proposed', after: 'draft' };
    recordAct(tx, acting, row, act, ctx.now);
  });
}

function openProposed(tx: Tx, acting: Actor, id: string, hash: string): StyleVersionRow {
  authorize(canActAsEditor(acting), EDITORS_ONLY);
  const row = openStyle(tx, acting, id);
  refuseUnless(row.state === 'proposed', 'This version is not proposed, or not any more. Reload the page.');
  refuseUnless(row.hash === hash && agreedHash(row) === hash, MOVED_ON);
  return row;
}
