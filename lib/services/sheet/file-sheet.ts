import 'server-only';
import { z } from 'zod';
import type { Tx } from '@/db/client';
import { findLastAct, insertClearing, insertEvidence } from '@/db/queries/clearing';
import { freezeVersion } from '@/db/queries/release';
import { moveLineVersions, touchSheet } from '@/db/queries/sheet';
import { type Actor, canDraftSheets } from '@/lib/domain/roles';
import { ESCALATES_AFTER_MS } from '@/lib/domain/look';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/security/ids';
import { actingNow, authorize, type Ctx, parse, transact } from '../context';
import { appendRecord } from '../history/append-record';
import { enqueueIn } from '../jobs/enqueue';
import { type OverrideInput, overrideInput, refuseWording } from '../wording-check/refuse-wording';
import { redraftAsPrinted } from './as-printed-words';
import { assembleSheet } from './assemble-sheet';
import { applyEdits, filingProblems, lineEdits, openForWriting } from './edit-lines';
import { markSiblings, settleByFiling } from './languages';
import { MOVED_ON, openSheet, refuseUnless } from './sheet-state';

const schema = z.strictObject({
  id: z.string().min(1).max(64),
  version: z.number().int().min(1),
  /** Hash of the figures and draft that were on the screen. */
  basisHash: z.string().regex(/^[0-9a-f]{64}$/),
  lines: lineEdits,
  override: overrideInput,
});

export type Filed = { hash: string; version: number };

/** Files a sheet: whoever files agrees to these words on this evidence, and can never be the second reader. */
export function fileSheet(actor: Actor, input: unknown, ctx: Ctx): Filed {
  authorize(canDraftSheets(actor), 'Only reporters and editors file sheets.');
  const { id, version, basisHash, lines, override } = parse(schema, input);
  return transact(ctx, (tx) => {
    const opened = openForWriting(tx, actor, id, version, ctx.now);
    applyEdits(tx, actor, opened, lines, ctx.now);
    return fileIn(tx, actor, { id, version, basisHash, override }, ctx.now, 'filed sheet');
  });
}

/** The act itself, on lines that are drafts. */
export function fileIn(
  tx: Tx,
  asker: Actor,
  seen: { id: string; version: number; basisHash: string; override?: OverrideInput },
  now: number,
  action: string,
): Filed {
  const actor = actingNow(tx, asker);
  authorize(canDraftSheets(actor), 'Only reporters and editors file sheets.');
  redraftAsPrinted(tx, actor, openSheet(tx, actor, seen.id, now), now);
  const opened = openSheet(tx, actor, seen.id, now);
  const fields = filingProblems(opened.texts);
  if (Object.keys(fields).length > 0)
    throw new AppError('invalid', 'Some lines need another look.', { fields });
  const assembled = assembleSheet(tx, opened.sheet, now);
  refuseUnless(
    assembled.basisHash === seen.basisHash,
    'The figures or the house style changed since you opened this page. Reload it and read it once more.',
  );
  const { lineBasis, draft } = assembled;
  const override = lineBasis && refuseWording(actor, lineBasis, opened.texts, draft, seen.override ?? null);
  const { bytes, hash, engine } = assembled.withTexts(opened.texts, override);
  const { comparisonVersionId } = assembled;
  const isFiledAnew = findLastAct(tx, opened.sheet.id, 'filed') !== null;
  const evidence = insertEvidence(
    tx,
    {
      publicId: newId(),
      sheetId: opened.sheet.id,
      hash,
      bytes,
      engine,
      createdAt: now,
    },
    [
      { releaseVersionId: opened.sheet.releaseVersionId, part: 'release' as const },
      ...(comparisonVersionId === null
        ? []
        : [{ releaseVersionId: comparisonVersionId, part: 'comparison' as const }]),
    ],
  );
  const ids = opened.kept.map(({ version }) => version.id);
  refuseUnless(moveLineVersions(tx, ids, 'draft', { state: 'filed', filedBy: actor.personId }), MOVED_ON);
  freezeVersion(tx, opened.sheet.releaseVersionId, now);
  if (comparisonVersionId !== null) freezeVersion(tx, comparisonVersionId, now);
  const filing = insertClearing(
    tx,
    {
      publicId: newId(),
      sheetId: opened.sheet.id,
      evidenceId: evidence.id,
      act: 'filed',
      personId: actor.personId,
      roles: JSON.stringify(actor.roles),
      at: now,
    },
    ids,
  );
  refuseUnless(touchSheet(tx, opened.sheet.id, seen.version), MOVED_ON);
  settleByFiling(tx, opened.sheet, actor, now);
  enqueueIn(
    tx,
    {
      kind: 'filing-unread',
      payload: { sheet: seen.id, filing: filing.publicId },
      idempotencyKey: `filing-unread:${filing.publicId}`,
      runAt: now + ESCALATES_AFTER_MS,
      releaseId: opened.release.id,
    },
    now,
  );
  if (isFiledAnew) markSiblings(tx, opened.sheet, 'changed', now);
  const reason = override ? { reason: override.reason } : {};
  const entry = { action, entity: 'sheet', entityId: opened.sheet.publicId, ...reason };
  const against = override ? { againstWordingCheck: override.marks } : {};
  const after = { state: 'filed', evidence: hash, texts: opened.texts, ...against };
  appendRecord(tx, { personId: actor.personId, ...entry, after, releaseId: opened.release.id }, now);
  return { hash, version: seen.version + 1 };
}
