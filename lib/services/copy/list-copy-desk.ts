import 'server-only';
import { insertEmbargoView, isListed } from '@/db/queries/embargo';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { findEmbedOfSheet } from '@/db/queries/embed';
import { isReleasePublic, listClearedLines, listClearedSheets } from '@/db/queries/sheet';
import { type Actor, canReadCopyDesk } from '@/lib/domain/roles';
import type { LineText } from '@/lib/domain/sheet';
import { authorize, type Ctx, transact } from '../context';
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
  const items = rows.map((row) => {
    const isPublic = isReleasePublic(ctx.db, row.release.id, ctx.now);
    const act = findLastAct(ctx.db, row.sheet.id, 'cleared');
    const evidence = act?.evidenceId ? findEvidence(ctx.db, act.evidenceId) : null;
    const isOnList = isListed(ctx.db, row.release.id, actor);
    const item: ClearedSheetItem = {
      id: row.sheet.publicId,
      race: row.race,
      pollster: row.pollster,
      fieldStartOn: row.fieldStartOn,
      fieldEndOn: row.fieldEndOn,
      clearedAt: act?.at ?? 0,
      lines: listClearedLines(ctx.db, row.sheet.id).map(({ line, version }) => ({
        kind: line.kind,
        text: version.text,
      })),
      embargo: embargoView(row.release, isPublic),
      mayCopy: isPublic || isOnList,
      embedId: findEmbedOfSheet(ctx.db, row.sheet.id)?.publicId ?? null,
      hash: evidence?.hash ?? '',
    };
    return { item, releaseId: row.release.id, isWatched: !isPublic && isOnList };
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
