import type { Db } from '@/db/client';
import { newId } from '@/lib/security/ids';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { createRelease } from '@/lib/services/release/create-release';
import { getRelease } from '@/lib/services/release/get-release';
import { ensureDeskSettings } from '@/lib/services/setup/desk-settings';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import type { DemoAccount } from '../accounts';
import { seedAsPrinted, seedCalendar, seedWork } from './clearing';
import { formOf } from './form';
import { seedPeople, type Staff } from './people';
import { type DemoKey, demoReleases, type RaceKey, RACES } from './releases';
import { deskOf } from './sheets';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;

/** Fills a new database with the invented newsroom, through the services that its people use. */
export async function seedDemo({
  db,
  now,
  password,
}: {
  db: Db;
  now: number;
  password: string | undefined;
}): Promise<DemoAccount[]> {
  const began = now - 50 * DAY;
  ensureDeskSettings({ db, now: began });
  const { staff, accounts } = await seedPeople(db, began, password);
  const releases = seedReleases(db, staff, now);
  seedSheets(db, staff, releases, now);
  return accounts;
}

/** Logs every demo release on the morning after its interviews ended, oldest first. */
function seedReleases(db: Db, staff: Staff, now: number): Record<DemoKey, string> {
  const races = new Map<RaceKey, string>();
  const entries = Object.entries(demoReleases(now)) as [DemoKey, ReturnType<typeof demoReleases>[DemoKey]][];
  return Object.fromEntries(
    entries.map(([key, release], index) => {
      const raceId = races.get(release.race);
      const race: Parameters<typeof formOf>[0]['race'] = raceId
        ? { kind: 'existing', id: raceId }
        : { kind: 'new', race: RACES[release.race] };
      const at = Math.min(now - 4 * HOUR, now + (release.field[1] + 1) * DAY - 8 * HOUR) + index * MINUTE;
      const actor = index % 3 === 0 ? staff.quent : staff.quill;
      const input = { submissionKey: newId(), release: formOf({ ...release, race }, now) };
      const { id } = createRelease(actor, input, { db, now: at });
      races.set(release.race, getRelease(actor, id, { db, now: at }).facts.race.id);
      return [key, id];
    }),
  ) as Record<DemoKey, string>;
}

/** Sheets in every state: draft, filed, sent back, cleared, superseded, pulled, and one under embargo. */
function seedSheets(db: Db, staff: Staff, releases: Record<DemoKey, string>, now: number): void {
  const { quill, quent, reed, varn, oake } = staff;
  const desk = deskOf(db);
  let at = now - 3 * HOUR;
  const next = () => (at += 3 * MINUTE);
  const embed = (sheetId: string) => createEmbed(oake, { sheetId }, { db, now: next() });
  const cleared = (release: DemoKey, claim: string) => {
    const id = desk.draft(quill, releases[release], claim, next());
    desk.file(quill, id, next());
    desk.clear(reed, id, next());
    return id;
  };

  embed(cleared('norwater', 'lead:Alder|Brook'));
  cleared('approval', 'change:Approve');
  embed(cleared('kelmouth', 'lead:Alder|Brook'));
  cleared('quillon', 'lead:Alder|Brook');
  cleared('assembly', 'threshold:Commons List|5');

  const pulled = cleared('quillonModelled', 'lead:End the toll|Keep the toll');
  embed(pulled);
  pullSheet(
    reed,
    { id: pulled, reason: 'The pollster told us that a batch of interviews is being checked again.' },
    { db, now: next() },
  );

  const renewed = cleared('toll', 'lead:Keep the toll|End the toll');
  const { version } = getSheet(varn, renewed, { db, now: next() });
  reviseSheet(varn, { id: renewed, version }, { db, now: next() });
  desk.file(varn, renewed, next(), { headline: 'Bridge toll: the two sides level in this poll' });
  desk.clear(quill, renewed, next());

  const waiting = desk.draft(quent, releases.kelmouth, 'change:Alder', next());
  desk.file(quent, waiting, next());
  seedWork(db, staff, waiting, next(), now);

  const sentBack = desk.draft(quill, releases.approval, 'lead:Disapprove|Approve', next());
  desk.file(quill, sentBack, next());
  desk.sendBack(reed, sentBack, next(), 'Say in the body that one adult in ten gave no opinion.');

  desk.draft(quent, releases.assembly, 'lead:Harbour Party|Inland Union', next());

  const hidden = desk.draft(quill, releases.embargoed, 'lead:Harbour Party|Inland Union', next());
  desk.file(quill, hidden, next());
  desk.clear(varn, hidden, next());
  createEmbed(varn, { sheetId: hidden }, { db, now: next() });

  seedAsPrinted(db, staff, releases.toll, next());
  seedCalendar(db, staff, releases.kelmouth, next(), now);
}
