import 'server-only';
import type { listRecords } from '@/db/queries/record';
import { listUnreadSheets } from '@/db/queries/one-reader';
import { holdsOn } from '../bans/hold';
import type { Ctx } from '../context';

export type HistoryMark =
  /** One editor released the words of this sheet alone, and nobody else has read them yet. */
  | { kind: 'one-reader' }
  /** Publication of these figures is barred now. */
  | { kind: 'barred'; jurisdiction: string; untilAt: number; zone: string };

type Rows = ReturnType<typeof listRecords>;

/** What stands over the sheets and embeds of a page of the history as they are now. */
export function historyMarks(ctx: Ctx, rows: Rows): (row: Rows[number]) => HistoryMark[] {
  const sheets = rows.filter(({ record }) => record.entity === 'sheet').map(({ record }) => record.entityId);
  const unread = listUnreadSheets(ctx.db, [...new Set(sheets)]);
  const holds = new Map<number, HistoryMark[]>();
  const barred = (raceId: number) => {
    const known = holds.get(raceId);
    if (known) return known;
    const found = holdsOn(ctx.db, raceId, ctx.now).map(({ jurisdiction, untilAt, zone }): HistoryMark => ({
      kind: 'barred',
      jurisdiction,
      untilAt,
      zone,
    }));
    holds.set(raceId, found);
    return found;
  };
  return ({ record: { entity, entityId }, raceId, isVisible }) => {
    if (!isVisible || (entity !== 'sheet' && entity !== 'embed')) return [];
    return [
      ...(entity === 'sheet' && unread.has(entityId) ? [{ kind: 'one-reader' as const }] : []),
      ...(raceId === null ? [] : barred(raceId)),
    ];
  };
}
