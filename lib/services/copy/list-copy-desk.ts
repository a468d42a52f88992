import 'server-only';
import { insertEmbargoView, isListed } from '@/db/queries/embargo';
import { listActsOf } from '@/db/queries/clearing';
import { listEmbedsOf } from '@/db/queries/embed';
import { isReleasePublic, listClearedLinesOf, listClearedSheets } from '@/db/queries/sheet';
import { type Actor, canReadCopyDesk } from '@/lib/domain/roles';
import { inScreenOrder, type LineText } from '@/lib/domain/sheet';
import type { Stale } from '@/lib/domain/currency';
import type { Hold } from '../bans/hold';
import { authorize, type Ctx, transact } from '../context';
import { marksOf } from './copy-marks';
import { type EmbargoView, embargoView } from '../release/get-release';

export type ClearedSheetItem = {
  id: string;
  race: string;
  pollster: string;
  fieldStartOn: string;
  fieldEndOn: string;
  clearedAt: number;
  lines: LineText[];
  embargo: EmbargoView | null;
  /** Under embargo only whoever is on the list copies. */
  mayCopy: boolean;
  embedId: string | null;
  hash: string;
  /** The editor who released it alone, until a second person has read it. */
  oneReader: string | null;
  /** Why these words are no longer the newest. */
  stale: Stale[];
  needsReview: boolean;
  /** A place bars its figures now. */
  holds: Hold[];
};

const LIMIT = 100;

/** Cleared sheets, newest first. Reading one under embargo from its list is recorded. */
export function listCopyDesk(
  actor: Actor,
  search: { race: string; pollster: string },
  ctx: Ctx,
): ClearedSheetItem[] {
  authorize(canReadCopyDesk(actor), 'The copy desk is open to people with a role.');
  const rows = listClearedSheets(ctx.db, actor, ctx.now, {
    race: search.race.trim().slice(0, 120),
    pollster: search.pollster.trim().slice(0, 120),
    limit: LIMIT,
  });
  const sheetIds = rows.map(({ sheet }) => sheet.id);
  const allLines = listClearedLinesOf(ctx.db, sheetIds);
  const clearings = listActsOf(ctx.db, sheetIds).filter(({ act }) => act.act === 'cleared');
  const embedIds = listEmbedsOf(ctx.db, sheetIds);
  const marks = marksOf(ctx, rows, clearings);
  const items = rows.map((row) => {
    const isPublic = isReleasePublic(ctx.db, row.release.id, ctx.now);
    const clearing = clearings.find(({ act }) => act.sheetId === row.sheet.id);
    const isOnList = !isPublic && isListed(ctx.db, row.release.id, actor);
    const item: ClearedSheetItem = {
      id: row.sheet.publicId,
      race: row.race,
      pollster: row.pollster,
      fieldStartOn: row.fieldStartOn,
      fieldEndOn: row.fieldEndOn,
      clearedAt: clearing?.act.at ?? 0,
      lines: inScreenOrder(
        allLines.filter(({ line }) => line.sheetId === row.sheet.id),
        ({ line }) => line.kind,
      ).map(({ line, version }) => ({ kind: line.kind, text: version.text })),
      embargo: embargoView(row.release, isPublic),
      mayCopy: isPublic || isOnList,
      embedId: embedIds.get(row.sheet.id) ?? null,
      hash: clearing?.hash ?? '',
      ...marks(row, clearing?.act.evidenceId ?? null),
    };
    return { item, releaseId: row.release.id, isWatched: isOnList };
  });
  const watched = items.filter(({ isWatched }) => isWatched);
  if (watched.length > 0)
    transact(ctx, (tx) => {
      for (const { item, releaseId } of watched)
        insertEmbargoView(tx, {
          releaseId,
          personId: actor.personId,
          at: ctx.now,
          what: `copy desk: sheet ${item.id}`,
        });
    });
  return items.map(({ item }) => item).sort((a, b) => b.clearedAt - a.clearedAt);
}
