import 'server-only';
import { listActsOf } from '@/db/queries/clearing';
import { listNewestLinesOf, listOpenSheets as listRows } from '@/db/queries/sheet';
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
  const rows = listRows(ctx.db, actor, ctx.now, LIMIT);
  const sheetIds = rows.map(({ sheet }) => sheet.id);
  const allLines = listNewestLinesOf(ctx.db, sheetIds);
  const allActs = listActsOf(ctx.db, sheetIds);
  return rows.map((row) => {
    const lines = allLines.filter(({ line }) => line.sheetId === row.sheet.id);
    const acts = allActs.filter(({ act }) => act.sheetId === row.sheet.id);
    const kept = lines.filter(({ line }) => !line.knockedOut);
    const state = kept[0]?.version.state ?? 'draft';
    const headline =
      kept.find(({ line }) => line.kind === 'headline') ??
      kept.find(({ line }) => line.kind === 'chart-title');
    const filing = state === 'filed' ? lastFiling(acts) : null;
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
      filedBy: filing && filing.person,
      filedAt: filing?.act.at ?? null,
      isFiledByMe: filing?.act.personId === actor.personId,
      returned: state === 'sent-back' ? returnOf(acts) : null,
      waitsFor: waitsFor(actor, row.sheet.authorId, state, acts),
      isUnderEmbargo: embargoAt !== null && embargoLiftedAt === null && embargoAt > ctx.now,
    };
  });
}

/** Of one sheet, newest first. */
type Acts = ReturnType<typeof listActsOf>;

function waitsFor(actor: Actor, authorId: number, state: LineState, acts: Acts): OpenSheetItem['waitsFor'] {
  const filing = lastFiling(acts);
  if (state === 'draft' || !filing) return 'nobody';
  const filer = { personId: filing.act.personId, roles: JSON.parse(filing.act.roles) as Role[] };
  if (state === 'filed') return isTwoPersonAgreement(filer, actor) ? 'me' : 'others';
  const owner = lastReturn(acts)?.act.act === 'returned' ? filer.personId : authorId;
  return owner === actor.personId ? 'me' : 'others';
}

function returnOf(acts: Acts): OpenSheetItem['returned'] {
  const last = lastReturn(acts);
  return last && { comment: last.act.comment ?? '', by: last.person, at: last.act.at };
}

const lastFiling = (acts: Acts) => acts.find(({ act }) => act.act === 'filed') ?? null;
const lastReturn = (acts: Acts) =>
  acts.find(({ act }) => act.act === 'sent-back' || act.act === 'returned') ?? null;
