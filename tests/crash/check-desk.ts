import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { expect } from 'vitest';
import type { Db } from '@/db/client';
import { findLastRecord, listAllRecords } from '@/db/queries/record';
import { answerEmbed } from '@/lib/services/embed/answer';
import { checkFiles } from '@/lib/services/files/check-files';
import { headFile, readHead } from '@/lib/services/history/head';
import { verifyHistory } from '@/lib/services/history/verify';
import { type FrozenEngine, verifyEvidence } from '@/lib/services/sheet/verify-evidence';
import { diskStore } from '@/lib/storage/disk-store';
import type { Act, Told } from './told';

/** The entry in the history that proves an accepted act. */
const ENTRIES: Record<Act, string> = {
  logged: 'logged release',
  filed: 'filed sheet',
  cleared: 'cleared sheet',
  embedded: 'made embed',
  lifted: 'lifted embargo',
  pulled: 'pulled sheet',
  stored: 'stored file',
};

/** What must hold at any moment, also right after a crash. */
export async function checkDesk(db: Db, folder: string, told: readonly Told[], now: number): Promise<void> {
  expect(db.$client.pragma('integrity_check', { simple: true })).toBe('ok');
  expect(db.$client.pragma('foreign_key_check')).toEqual([]);
  checkHistory(db, told);
  const { problems } = await verifyEvidence(db, engineOf);
  expect(problems, 'evidence comes out the same, and two people agreed to what is cleared').toEqual([]);
  checkStates(db);
  checkEmbeds(db, now);
  const files = await checkFiles(db, diskStore(join(folder, 'files')), { now });
  expect([...files.missing, ...files.damaged], 'no row lacks its bytes').toEqual([]);
}

/** Every accepted act is there, exactly once, in a chain without a gap that its head outside still fits. */
function checkHistory(db: Db, told: readonly Told[]): void {
  const head = readHead(headFile(db)!);
  expect(verifyHistory(db, head ? [{ name: 'the head', head }] : [])).toMatchObject({ ok: true });
  // Two processes write, and each may die between an act and keeping its head.
  const behind = findLastRecord(db)!.seq - (head?.seq ?? 0);
  expect(behind, 'acts by which the head is behind').toBeLessThanOrEqual(3);
  const entries = new Map<string, number>();
  for (const { action, entityId } of listAllRecords(db))
    entries.set(`${action} ${entityId}`, (entries.get(`${action} ${entityId}`) ?? 0) + 1);
  const lost = told.filter(({ act, id }) => entries.get(`${ENTRIES[act]} ${id}`) !== 1);
  expect(lost, 'accepted acts that are not in the history once').toEqual([]);
}

/** The lines of a sheet share one state, and no line has two cleared versions. */
function checkStates(db: Db): void {
  const count = (sql: string) => db.$client.prepare(sql).pluck().get();
  expect(
    count(`select count(*) from (select l.sheet_id from lines l join line_versions v on v.line_id = l.id
      where l.knocked_out = 0 group by l.sheet_id having count(distinct v.state) > 1)`),
    'sheets of which a part was moved',
  ).toBe(0);
  expect(
    count(`select count(*) from embed_versions e join evidence v on v.id = e.evidence_id
      join line_versions x on x.state = 'pulled' join lines l on l.id = x.line_id and l.sheet_id = v.sheet_id
      where e.state = 'live'`),
    'live embeds of words that were pulled',
  ).toBe(0);
  expect(
    count(`select count(*) from embeds e where not exists
      (select 1 from embed_versions v where v.embed_id = e.id)`),
    'embeds without a version',
  ).toBe(0);
}

/** What the public sees of every embed is what its state says, and nothing of an embargo. */
function checkEmbeds(db: Db, now: number): void {
  const rows = db.$client
    .prepare(
      `select e.public_id as id, v.state, v.pulled_unseen as unseen,
        r.embargo_at is not null and r.embargo_lifted_at is null and r.embargo_at > ? as held
       from embeds e join embed_versions v on v.embed_id = e.id join sheets s on s.id = e.sheet_id
       join releases r on r.id = s.release_id`,
    )
    .all(now) as { id: string; state: string; unseen: number; held: number }[];
  for (const { id, state, unseen, held } of rows) {
    const answer = answerEmbed(
      { path: `/embed/${id}/data.json`, query: new URLSearchParams(), headers: {} },
      { db, now },
    );
    const expected = held || unseen ? 404 : state === 'pulled' ? 410 : 200;
    expect([id, answer.status]).toEqual([id, expected]);
  }
}

async function engineOf(version: string): Promise<FrozenEngine> {
  const file = join(process.cwd(), 'lib/findings/archive', `${version}.mjs`);
  expect(readFileSync(file).length).toBeGreaterThan(0);
  return (await import(/* @vite-ignore */ pathToFileURL(file).href)) as FrozenEngine;
}
