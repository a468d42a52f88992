import 'server-only';
import {
  findCorrection,
  listCurrentEvidenceOn,
  listEffects,
  listReplacements,
  type WholeCorrection,
} from '@/db/queries/corrections';
import { listNewestLines } from '@/db/queries/sheet';
import { rehearse } from '@/db/write';
import { isAsPrinted } from '@/lib/domain/as-printed';
import type { Consequence, CorrectionSource, CorrectionState } from '@/lib/domain/corrections';
import { type Actor, canActAsEditor, canReadUnpublished } from '@/lib/domain/roles';
import type { LineState } from '@/lib/domain/sheet';
import { AppError } from '@/lib/errors';
import type { CorrectedItem } from '@/lib/findings/what-changed';
import { authorize, type Ctx } from '../context';
import { factsOf } from '../release/facts';
import { consequencesOf } from './consequences';
import { previewStaged } from './settle-correction';

export type Replacement = { sheetId: string; replaces: string; state: LineState };

export type CorrectionView = {
  id: string;
  releaseId: string;
  race: string;
  pollster: string;
  whose: CorrectionSource;
  explanation: string;
  changed: CorrectedItem[];
  state: CorrectionState;
  fromVersion: number;
  toVersion: number;
  createdBy: string;
  createdAt: number;
  settledBy: string | null;
  settledAt: number | null;
  notices: { by: string; at: number } | null;
  /** What it did; of a staged one, what applying it would do now. */
  consequences: Consequence[];
  /** Stands for these consequences; null where it is settled, or cannot be applied as it is. */
  hash: string | null;
  /** Why it cannot be applied as it is. */
  whyNot: string | null;
  replacements: Replacement[];
  /** Sheets that a replacement can be drafted of. */
  replaceable: string[];
  mayConfirm: boolean;
};

/** One correction, with everything that it did or would do. */
export function getCorrection(actor: Actor, id: string, ctx: Ctx): CorrectionView {
  authorize(canReadUnpublished(actor), 'Corrections are read by reporters and editors.');
  const found = findCorrection(ctx.db, id, actor, ctx.now);
  if (!found) throw new AppError('not-found', 'There is no such correction.');
  const { correction, release, race, pollster } = found;
  const replacements = replacementsOf(found, ctx);
  const isStaged = correction.state === 'staged';
  return {
    id: correction.publicId,
    releaseId: release.publicId,
    race,
    pollster,
    whose: correction.whose,
    explanation: correction.explanation,
    changed: JSON.parse(correction.changed) as CorrectedItem[],
    state: correction.state,
    fromVersion: factsOf(ctx.db, correction.fromVersionId).version,
    toVersion: factsOf(ctx.db, correction.toVersionId).version,
    createdBy: found.createdBy,
    createdAt: correction.createdAt,
    settledBy: found.settledBy,
    settledAt: correction.settledAt,
    notices:
      found.noticesBy && correction.noticesAt ? { by: found.noticesBy, at: correction.noticesAt } : null,
    ...(isStaged ? plannedOf(actor, id, ctx) : { ...doneOf(found, ctx), hash: null, whyNot: null }),
    replacements,
    replaceable: isStaged ? replaceableOf(found, replacements, ctx) : [],
    mayConfirm: correction.state === 'applied' && correction.noticesAt === null && canActAsEditor(actor),
  };
}

function plannedOf(
  actor: Actor,
  id: string,
  ctx: Ctx,
): Pick<CorrectionView, 'consequences' | 'hash' | 'whyNot'> {
  try {
    const { consequences, hash } = previewStaged(actor, { id }, ctx);
    return { consequences, hash, whyNot: null };
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== 'conflict') throw error;
    return { consequences: [], hash: null, whyNot: error.message };
  }
}

function doneOf({ correction, release }: WholeCorrection, ctx: Ctx): Pick<CorrectionView, 'consequences'> {
  const effects = listEffects(ctx.db, correction.id).map(({ effect, sheet }) => ({
    sheet,
    evidenceId: effect.evidenceId,
    effect: effect.effect,
    replacement: null,
  }));
  return { consequences: rehearse(ctx.db, (tx) => consequencesOf(tx, release.id, effects)) };
}

function replacementsOf({ correction }: WholeCorrection, { db }: Ctx): Replacement[] {
  const sheets = listReplacements(db, correction.id);
  const replaced = new Map(
    [...listEffects(db, correction.id), ...listCurrentEvidenceOn(db, correction.releaseId)].map(
      ({ sheet }) => [sheet.id, sheet.publicId],
    ),
  );
  return sheets.map((sheet) => ({
    sheetId: sheet.publicId,
    replaces: replaced.get(sheet.replacesSheetId ?? 0) ?? '',
    state:
      listNewestLines(db, sheet.id).find(({ line }) => !line.knockedOut)?.version.state ?? ('draft' as const),
  }));
}

function replaceableOf(
  { correction }: WholeCorrection,
  replacements: readonly Replacement[],
  { db }: Ctx,
): string[] {
  return listCurrentEvidenceOn(db, correction.releaseId)
    .filter(({ sheet }) => !isAsPrinted(sheet))
    .map(({ sheet }) => sheet.publicId)
    .filter((id) => !replacements.some(({ replaces }) => replaces === id));
}
