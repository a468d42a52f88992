import type { Db } from '@/db/client';
import { newId } from '@/lib/security/ids';
import { enterBan } from '@/lib/services/bans/bans';
import { addShift } from '@/lib/services/on-call/on-call';
import { getRelease } from '@/lib/services/release/get-release';
import { addComment } from '@/lib/services/sheet/comment';
import { createAsPrinted } from '@/lib/services/sheet/create-as-printed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { setTerms } from '@/lib/services/sheet/terms';
import { dayFrom } from './form';
import type { Staff } from './people';

const ZONE = 'Etc/UTC';
const HOUR = 60 * 60_000;

/** The work around a filed sheet: when it is wanted, and a comment on its words. */
export function seedWork(db: Db, { quent, varn }: Staff, sheetId: string, at: number, now: number): void {
  const wanted = { local: new Date(now + 2 * HOUR).toISOString().slice(0, 16), zone: ZONE };
  setTerms(quent, { id: sheetId, wanted, shelfDays: null }, { db, now: at });
  const quote = 'smaller ones are often missed';
  const line = getSheet(varn, sheetId, { db, now: at }).lines.find(({ text }) => text.includes(quote))!;
  const start = line.text.indexOf(quote);
  const body = 'Is that clear to readers without the number before it?';
  addComment(
    varn,
    { id: sheetId, kind: line.kind, start, end: start + quote.length, quote, body },
    { db, now: at },
  );
}

/** Figures as printed, drafted for two people to agree to. */
export function seedAsPrinted(db: Db, { quent }: Staff, releaseId: string, at: number): void {
  createAsPrinted(quent, { submissionKey: newId(), releaseId }, { db, now: at });
}

/** Who is fetched at night, and a ban that an invented place puts on an invented election. */
export function seedCalendar(
  db: Db,
  { reed, quill }: Staff,
  releaseId: string,
  at: number,
  now: number,
): void {
  const ctx = { db, now: at };
  const night = { fromTime: '22:00', toTime: '06:00', zone: ZONE };
  addShift(reed, { personId: reed.publicId, when: { weekday: 1 }, ...night }, ctx);
  const raceId = getRelease(quill, releaseId, ctx).facts.race.id;
  enterBan(
    reed,
    {
      jurisdiction: 'Averil Coast',
      raceId,
      bars: 'new-figures',
      fromLocal: `${dayFrom(now, 40)}T00:00`,
      toLocal: `${dayFrom(now, 42)}T20:00`,
      zone: ZONE,
      rule: 'Provincial electoral code, section 31: no new poll figures in the last two days. Read by our lawyers.',
    },
    ctx,
  );
}
