import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { http, HttpResponse } from 'msw';
import { listJobsIn } from '@/db/queries/jobs';
import { openJournal } from '@/lib/fakes/journal';
import type { Purged } from '@/lib/fakes/purge-receiver';
import { startFakes, stopFakes } from '@/lib/fakes/start';
import type { Actor } from '@/lib/domain/roles';
import { FAKE_PURGE_URL } from '@/lib/env';
import { endBan, enterBan } from '@/lib/services/bans/bans';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { freshDatabase, HOUR, makePerson, NOW, type TestDatabase } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { runDueJobs } from '@/tests/support/run-jobs';
import { sheetDesk } from '@/tests/support/sheet';

const KINDS = ['purge-embeds'] as const;
let desk: TestDatabase;
let reporter: Actor;
let editor: Actor;
let server: ReturnType<typeof startFakes>;
beforeEach(() => {
  desk = freshDatabase();
  reporter = makePerson(desk.db, { name: 'Rolf Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Edda Marsh', roles: ['editor'] });
  vi.stubEnv('LEADLINE_FAKES', '1');
  vi.stubEnv('LEADLINE_ORIGIN', 'https://leadline.example');
  server = startFakes(desk.folder);
});
afterEach(() => {
  stopFakes();
  vi.unstubAllEnvs();
  desk.closeAndRemove();
});

const purged = () => openJournal<Purged>(desk.folder, 'purge').read();
const run = (later = 0) => runDueJobs(desk.db, NOW + later, KINDS);
const embedOf = (sheetId: string) => createEmbed(editor, { sheetId }, desk.ctx()).id;
const cleared = () => sheetDesk(desk.db).cleared(reporter, editor, logRelease(desk.db, reporter));
const waiting = () =>
  listJobsIn(desk.db, ['waiting'], 'soonest', 50, editor, NOW).flatMap(({ job }) =>
    job.kind === 'purge-embeds'
      ? [{ runAt: job.runAt - NOW, attempts: job.attempts, error: job.lastError }]
      : [],
  );

describe('caches before the embeds', () => {
  it('are told every address of an embed that goes live, is superseded or is pulled', async () => {
    const sheet = cleared();
    const embed = embedOf(sheet);
    expect(await run()).toEqual([]);
    expect(purged()).toHaveLength(1);
    const address = `https://leadline.example/embed/${embed}`;
    expect(purged()[0]?.urls).toContain(address);
    expect(purged()[0]?.urls).toContain(`${address}@1/chart.svg?theme=night`);
    expect(new Set(purged()[0]?.urls).size).toBe(24);

    const { version } = getSheet(reporter, sheet, desk.ctx());
    reviseSheet(reporter, { id: sheet, version }, desk.ctx());
    const on = sheetDesk(desk.db);
    on.file(reporter, sheet);
    on.clear(editor, sheet);
    await run();
    expect(purged()).toHaveLength(2);
    expect(purged()[1]?.urls).toContain(`${address}@2/data.json`);

    pullSheet(editor, { id: sheet, reason: 'A batch of interviews is checked again.' }, desk.ctx());
    await run();
    expect(purged()).toHaveLength(3);
    expect(new Set(purged().map(({ key }) => key)).size).toBe(3);
  });

  it('are told when a ban begins, when it ends, and when an editor ends it', async () => {
    const embed = embedOf(cleared());
    await run();
    const ban = enterBan(
      editor,
      {
        jurisdiction: 'Averil Coast',
        raceId: null,
        bars: 'all-figures',
        fromLocal: '2026-09-17T09:00',
        toLocal: '2026-09-17T12:00',
        zone: 'Etc/UTC',
        rule: 'Election order of the province, read by the desk’s lawyer.',
      },
      desk.ctx(),
    );
    expect(waiting().map(({ runAt }) => runAt)).toEqual([HOUR, 4 * HOUR]);
    await run(HOUR);
    expect(purged()).toHaveLength(2);
    expect(purged()[1]?.urls).toContain(`https://leadline.example/embed/${embed}`);
    endBan(editor, { id: ban.id, reason: 'The order was withdrawn this morning.' }, desk.ctx(2 * HOUR));
    await run(2 * HOUR);
    expect(purged()).toHaveLength(3);
  });

  it('that fail are asked again later, with what they said', async () => {
    embedOf(cleared());
    server.use(http.post(FAKE_PURGE_URL, () => new HttpResponse(null, { status: 503 })));
    expect(String((await run())[0])).toContain('the cache answered 503');
    expect(waiting()).toEqual([{ runAt: 5000, attempts: 1, error: 'the cache answered 503' }]);
    server.use(http.post(FAKE_PURGE_URL, () => HttpResponse.error()));
    await run(5000);
    expect(waiting()[0]?.error).toMatch(/^the cache did not answer/);
    server.resetHandlers();
    expect(await run(25_000)).toEqual([]);
    expect(purged()).toHaveLength(1);
  });

  it('are asked nothing where no address of one is set', () => {
    vi.stubEnv('LEADLINE_FAKES', '0');
    embedOf(cleared());
    expect(waiting()).toEqual([]);
  });
});

describe('the stand-in of a cache', () => {
  const send = (key: string | null, body: string) =>
    fetch(FAKE_PURGE_URL, { method: 'POST', body, headers: key ? { 'Idempotency-Key': key } : {} });

  it('takes a request once by its key', async () => {
    const body = JSON.stringify({ urls: ['https://leadline.example/embed/a'] });
    expect((await send('one', body)).status).toBe(202);
    expect((await send('one', body)).status).toBe(200);
    expect((await send('two', body)).status).toBe(202);
    expect(purged().map(({ key }) => key)).toEqual(['one', 'two']);
  });

  it.each([
    [null, '{"urls":[]}'],
    ['k', '{"urls":"x"}'],
    ['k', '{"urls":["no address"]}'],
    ['k', 'no json'],
  ])('refuses what is no request (%s, %s)', async (key, body) => {
    expect((await send(key, body)).status).toBe(400);
    expect(purged()).toEqual([]);
  });
});
