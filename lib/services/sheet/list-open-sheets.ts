import 'server-only';
import { findLastAct } from '@/db/queries/clearing';
import { findPerson } from '@/db/queries/person';
import { listNewestLines, listOpenSheets as listRows } from '@/db/queries/sheet';
import { type Actor, canReadUnpublished } from '@/lib/domain/roles';
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
  /** The newest comment of a sheet that was sent back. */
  comment: string | null;
  /** What this person can do about it now. */
  waitsFor: 'me' | 'others';
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
    const sent = state === 'sent-back' ? newestReturn(ctx, row.sheet.id) : null;
    const mine = row.sheet.authorId === actor.personId;
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
      filedBy: filing && (findPerson(ctx.db, filing.personId)?.name ?? null),
      filedAt: filing?.at ?? null,
      comment: sent,
      waitsFor: (filing ? filing.personId !== actor.personId : mine) ? 'me' : 'others',
      isUnderEmbargo: embargoAt !== null && embargoLiftedAt === null && embargoAt > ctx.now,
    };
  });
}

function newestReturn(ctx: Ctx, sheetId: number): string | null {
  const acts = (['sent-back', 'returned'] as const).map((act) => findLastAct(ctx.db, sheetId, act));
  const newest = acts.filter((act) => act !== null).sort((a, b) => b.id - a.id)[0];
  return newest?.comment ?? null;
}
