import 'server-only';
import { listActsOf } from '@/db/queries/clearing';
import { listOpenReviews } from '@/db/queries/languages';
import { listFirstLooks, listTermsOf } from '@/db/queries/sheet-desk';
import { listNewestLinesOf, listOpenSheets as listRows } from '@/db/queries/sheet';
import { type Actor, canReadUnpublished, isTwoPersonAgreement, type Role } from '@/lib/domain/roles';
import { isAsPrinted } from '@/lib/domain/as-printed';
import { type Look, lookOf } from '@/lib/domain/look';
import type { LineState } from '@/lib/domain/sheet';
import { inOrderOfWork, type Wanted } from '@/lib/domain/wanted';
import { holdsOn } from '../bans/hold';
import { authorize, type Ctx } from '../context';
import { wantedOf } from './terms';

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
  wanted: Wanted | null;
  /** Of a filed one: whether a second person has opened it. */
  look: Look | null;
  /** A place bars its figures now: it cannot be cleared. */
  isHeld: boolean;
  /** The same claim changed in another language. */
  needsReview: boolean;
  isAsPrinted: boolean;
};

const LIMIT = 200;

/** The queue: what is being written, waits for a reader, or was sent back; what is wanted first stands first. */
export function listOpenSheets(actor: Actor, ctx: Ctx): OpenSheetItem[] {
  authorize(canReadUnpublished(actor), 'Sheets are written and read by reporters and editors.');
  const rows = listRows(ctx.db, actor, ctx.now, LIMIT);
  const sheetIds = rows.map(({ sheet }) => sheet.id);
  const allLines = listNewestLinesOf(ctx.db, sheetIds);
  const allActs = listActsOf(ctx.db, sheetIds);
  const terms = listTermsOf(ctx.db, sheetIds);
  const looks = listFirstLooks(
    ctx.db,
    allActs.filter(({ act }) => act.act === 'filed').map(({ act }) => act.id),
  );
  const reviews = new Set(listOpenReviews(ctx.db, sheetIds).map(({ review }) => review.sheetId));
  const held = new Map<number, boolean>();
  const isHeld = (raceId: number) => {
    if (!held.has(raceId)) held.set(raceId, holdsOn(ctx.db, raceId, ctx.now).length > 0);
    return held.get(raceId)!;
  };
  const items = rows.map((row): OpenSheetItem => {
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
      wanted: wantedOf(terms.get(row.sheet.id)),
      look: filing && lookOf(filing.act.at, looks.get(filing.act.id) ?? null, ctx.now),
      isHeld: isHeld(row.release.raceId),
      needsReview: reviews.has(row.sheet.id),
      isAsPrinted: isAsPrinted(row.sheet),
    };
  });
  return inOrderOfWork(items);
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
