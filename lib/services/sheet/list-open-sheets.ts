import 'server-only';
import { findLastAct } from '@/db/queries/clearing';
import { findPerson } from '@/db/queries/person';
import { listNewestLines, listOpenSheets as listRows } from '@/db/queries/sheet';
import { type Actor, canReadUnpublished, isTwoPersonAgreement, type Role } from '@/lib/domain/roles';
import type { LineState } from '@/lib/domain/sheet';
import { authorize, type Ctx } from '../context';

export type OpenSheetItem = {
  id: string;
  race: string;
  pollster: string;
  fieldStartOn: string;
  fieldEndOn: string;
  headline: string;
  state: LineState;
  author: string;
  filedBy: string | null;
  filedAt: number | null;
  isFiledByMe: boolean;
  /** Why and by whom a sheet came back. */
  returned: { comment: string; by: string; at: number } | null;
  /** Whose move it is; a draft is being written and waits for nobody. */
  waitsFor: 'me' | 'others' | 'nobody';
  isUnderEmbargo: boolean;
};

const LIMIT = 200;

/** The queue: what is being written, waits for a reader, or was sent back. */
export function listOpenSheets(actor: Actor, ctx: Ctx): OpenSheetItem[] {
  authorize(canReadUnpublished(actor), 'Sheets are written and read by reporters and editors.');
  return listRows(ctx.db, actor, ctx.now, LIMIT).map((row) => {
    const lines = listNewestLines(ctx.db, row.sheet.id);
    const kept = lines.filter(({ line }) => !line.knockedOut);
    const state = kept[0]?.version.state ?? 'draft';
    const headline =
      kept.find(({ line }) => line.kind === 'headline') ??
      kept.find(({ line }) => line.kind === 'chart-title');
    const filing = state === 'filed' ? findLastAct(ctx.db, row.sheet.id, 'filed') : null;
    const { embargoAt, embargoLiftedAt } = row.release;
    return {
      id: row.sheet.publicId,
      race: row.race,
      pollster: row.pollster,
      fieldStartOn: row.fieldStartOn,
      fieldEndOn: row.fieldEndOn,
      headline: headline?.version.text ?? '',
      state,
      author: row.author,
      filedBy: filing && nameOf(ctx, filing.personId),
      filedAt: filing?.at ?? null,
      isFiledByMe: filing?.personId === actor.personId,
      returned: state === 'sent-back' ? returnOf(ctx, row.sheet.id) : null,
      waitsFor: waitsFor(ctx, actor, row.sheet, state),
      isUnderEmbargo: embargoAt !== null && embargoLiftedAt === null && embargoAt > ctx.now,
    };
  });
}

function waitsFor(
  ctx: Ctx,
  actor: Actor,
  sheet: { id: number; authorId: number },
  state: LineState,
): OpenSheetItem['waitsFor'] {
  if (state === 'draft') return 'nobody';
  const filing = findLastAct(ctx.db, sheet.id, 'filed');
  if (!filing) return 'nobody';
  const filer = { personId: filing.personId, roles: JSON.parse(filing.roles) as Role[] };
  if (state === 'filed') return isTwoPersonAgreement(filer, actor) ? 'me' : 'others';
  const owner = newestReturn(ctx, sheet.id)?.act === 'returned' ? filer.personId : sheet.authorId;
  return owner === actor.personId ? 'me' : 'others';
}

function returnOf(ctx: Ctx, sheetId: number): OpenSheetItem['returned'] {
  const act = newestReturn(ctx, sheetId);
  return act && { comment: act.comment ?? '', by: nameOf(ctx, act.personId), at: act.at };
}

function newestReturn(ctx: Ctx, sheetId: number) {
  const acts = (['sent-back', 'returned'] as const).map((act) => findLastAct(ctx.db, sheetId, act));
  return acts.filter((act) => act !== null).sort((a, b) => b.id - a.id)[0] ?? null;
}

function nameOf(ctx: Ctx, personId: number): string {
  return findPerson(ctx.db, personId)?.name ?? '';
}
