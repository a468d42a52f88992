import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listEmbargoViews } from '@/db/queries/embargo';
import { findRelease } from '@/db/queries/release';
import { answerEmbed } from '@/lib/services/embed/answer';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { listEmbeds } from '@/lib/services/embed/list-embeds';
import { setEmbargoReader } from '@/lib/services/release/embargo';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { freshDatabase, HOUR, makePerson } from '@/tests/support/database';
import { elementsOf, parseMarkup, textOf } from '@/tests/support/markup';
import { refusal } from '@/tests/support/refusal';
import { GOVERNOR, logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const administrator = makePerson(db, { name: 'Ned Harrow', roles: ['administrator'] });
const reason = 'The pollster is checking a batch of interviews.';

const NOON = { local: '2026-09-17T12:00', zone: 'Etc/UTC' };
const named = (name: string) =>
  ({ ...GOVERNOR, race: { ...(GOVERNOR as { race: object }).race, name } }) as typeof GOVERNOR;

function embedOf(race: string, embargo: typeof NOON | null = null) {
  const releaseId = logRelease(db, reporter, { race: named(race), embargo });
  const sheetId = on.cleared(reporter, editor, releaseId);
  return { releaseId, sheetId, id: createEmbed(editor, { sheetId }, desk.ctx()).id };
}

const ask = (path: string, headers: Record<string, string> = {}, later = 0, query = '') => {
  const answer = answerEmbed({ path, query: new URLSearchParams(query), headers }, desk.ctx(later));
  return { ...answer, text: Buffer.from(answer.body ?? '').toString('utf8') };
};

let live: ReturnType<typeof embedOf>;
let waiting: ReturnType<typeof embedOf>;
beforeAll(() => {
  live = embedOf('Averil Coast governor');
  waiting = embedOf('Assembly', NOON);
});

describe('making an embed', () => {
  it('is done by reporters, editors and the copy desk, from cleared words', () => {
    const input = { sheetId: live.sheetId };
    expect(createEmbed(copyDesk, input, desk.ctx())).toEqual({ id: live.id });
    expect(createEmbed(reporter, input, desk.ctx())).toEqual({ id: live.id });
    expect(refusal(() => createEmbed(administrator, input, desk.ctx()))[0]).toBe('forbidden');
    const sheetId = on.draft(reporter, logRelease(db, reporter, { race: named('Drafted only') }));
    expect(refusal(() => createEmbed(reporter, { sheetId }, desk.ctx()))[0]).toBe('conflict');
    on.file(reporter, sheetId);
    expect(refusal(() => createEmbed(editor, { sheetId }, desk.ctx()))[0]).toBe('conflict');
  });

  it('of a sheet under embargo is not for the copy desk, which does not see it', () => {
    const input = { sheetId: waiting.sheetId };
    expect(refusal(() => createEmbed(copyDesk, input, desk.ctx()))[0]).toBe('not-found');
  });
});

describe('a live embed', () => {
  it('is a page with title, figures, every answer in a table, non-answers and the caveat', () => {
    const { status, text, headers } = ask(`/embed/${live.id}`);
    expect(status).toBe(200);
    expect(headers['Content-Type']).toBe('text/html; charset=utf-8');
    const page = parseMarkup(text);
    const table = elementsOf(page, 'table').map(textOf).join(' ');
    for (const cell of ['Alder', '47', 'Brook', '41', 'Someone else', '4', 'Don’t know', '8'])
      expect(table).toContain(cell);
    expect(elementsOf(page, 'script')).toEqual([]);
    expect(elementsOf(page, 'svg').length).toBeGreaterThan(0);
    const words = textOf(elementsOf(page, 'body')[0]!);
    const { lines } = getSheet(editor, live.sheetId, desk.ctx());
    const cleared = lines.filter(({ kind }) => kind === 'caveat' || kind === 'chart-title');
    for (const text of ['1,012', 'Kelmouth Research', ...cleared.flatMap((line) => line.text.split(/\n+/))])
      expect(words).toContain(text);
  });

  it('has picture and data of its own, framable anywhere', () => {
    const picture = ask(`/embed/${live.id}/chart.svg`);
    expect([picture.status, picture.headers['Content-Type']]).toEqual([200, 'image/svg+xml; charset=utf-8']);
    const data = ask(`/embed/${live.id}/data.json`);
    expect(JSON.parse(data.text)).toMatchObject({ id: live.id, version: 1, n: 1012 });
    expect(data.headers['Content-Security-Policy']).toContain('frame-ancestors *');
    expect(data.headers).not.toHaveProperty('Set-Cookie');
  });

  it('answers 304 to whoever has it already, and 200 to everybody else', () => {
    const first = ask(`/embed/${live.id}`);
    const etag = first.headers.ETag!;
    const again = ask(`/embed/${live.id}`, { 'if-none-match': `"other", W/${etag}` });
    expect([again.status, again.body, again.headers.ETag]).toEqual([304, null, etag]);
    expect(ask(`/embed/${live.id}`, { 'if-none-match': '"other"' }).status).toBe(200);
    expect(ask(`/embed/${live.id}`, {}, 0, 'theme=night').headers.ETag).not.toBe(etag);
    expect(ask(`/embed/${live.id}`, {}, 0, 'theme=plaid').headers.ETag).toBe(etag);
  });

  it('lives at most a minute in a cache that we cannot purge', () => {
    expect(ask(`/embed/${live.id}`).headers['Cache-Control']).toBe(
      'public, max-age=30, stale-while-revalidate=30, stale-if-error=300',
    );
  });
});

describe('what is not public', () => {
  it('gets one answer, the same in every byte and header, whatever the reason', () => {
    const unknown = ask(`/embed/${'A'.repeat(22)}`);
    expect(unknown.status).toBe(404);
    expect(unknown.headers).toMatchObject({ 'Cache-Control': 'no-store' });
    expect(unknown.headers).not.toHaveProperty('ETag');
    const others = [
      `/embed/${waiting.id}`,
      `/embed/${waiting.id}/data.json`,
      `/embed/${waiting.id}/chart.svg`,
      `/embed/${waiting.id}@1`,
      `/embed/${live.id}@9`,
      `/embed/${live.id}/chart.exe`,
      '/embed/x',
      '/embed/',
      `/embed/${live.id}/../${live.id}`,
      '/embed/%00',
    ];
    for (const path of others) expect(ask(path), path).toEqual(unknown);
    expect(ask(`/embed/${waiting.id}`, { 'if-none-match': '*' })).toEqual(unknown);
  });

  it('opens at the very minute that the embargo ends', () => {
    expect(ask(`/embed/${waiting.id}`, {}, 4 * HOUR - 1).status).toBe(404);
    expect(ask(`/embed/${waiting.id}`, {}, 4 * HOUR).status).toBe(200);
  });
});

describe('a pulled embed', () => {
  it('answers 410 in every form with a date and no figure', () => {
    const pulled = embedOf('Bridge toll');
    pullSheet(editor, { id: pulled.sheetId, reason }, desk.ctx());
    for (const part of ['', '/chart.svg', '/data.json', '@1']) {
      const { status, headers, text } = ask(`/embed/${pulled.id}${part}`);
      expect([status, headers['Cache-Control']]).toEqual([410, 'no-store']);
      expect(headers).not.toHaveProperty('ETag');
      const words = text.replace(/<style>.*?<\/style>|<svg[^>]*>|<text[^>]*>/gs, '');
      for (const figure of ['47', '41', '1,012', '1012', 'Alder', 'Brook', reason])
        expect(words, `${part} says ${figure}`).not.toContain(figure);
      expect(words).toMatch(/17 September 2026|2026-09-17/);
    }
  });

  it('that the public never saw answers 404 for ever', () => {
    const unseen = embedOf('Harbour levy', NOON);
    pullSheet(editor, { id: unseen.sheetId, reason }, desk.ctx());
    expect(ask(`/embed/${unseen.id}`, {}, 5 * HOUR)).toEqual(ask('/embed/x'));
  });
});

describe('the list of embeds', () => {
  it('says which is live, waiting or pulled, to those who may know', () => {
    const states = (actor: typeof editor) =>
      Object.fromEntries(listEmbeds(actor, desk.ctx()).map(({ race, state }) => [race, state]));
    expect(states(editor)).toEqual({
      'Averil Coast governor': 'live',
      Assembly: 'waiting',
      'Bridge toll': 'pulled',
      'Harbour levy': 'pulled',
    });
    expect(states(copyDesk)).toEqual({ 'Averil Coast governor': 'live', 'Bridge toll': 'pulled' });
    expect(refusal(() => listEmbeds(administrator, desk.ctx()))[0]).toBe('forbidden');
    expect(listEmbeds(editor, desk.ctx()).at(-1)?.url).toBe(`http://localhost:3000/embed/${live.id}`);
  });

  it('is read under embargo from the list of the release, and each such reading is recorded', () => {
    const input = { id: waiting.releaseId, personId: copyDesk.publicId, listed: true };
    setEmbargoReader(editor, input, desk.ctx());
    const seen = () => listEmbeds(copyDesk, desk.ctx()).map(({ race }) => race);
    expect(seen()).toContain('Assembly');
    const release = findRelease(db, waiting.releaseId, editor, desk.ctx().now)!;
    const view = { name: 'Tamsin Oake', at: desk.ctx().now, what: 'embeds' };
    expect(listEmbargoViews(db, release.id)).toEqual([view]);
    setEmbargoReader(editor, { ...input, listed: false }, desk.ctx());
    expect(seen()).not.toContain('Assembly');
  });
});

describe('a body that travels compressed', () => {
  const path = () => `/embed/${live.id}`;
  const unpack = { br: brotliDecompressSync, gzip: gunzipSync };

  it.each(['br', 'gzip'] as const)('is the same page in %s, smaller, with an ETag of its own', (encoding) => {
    const plain = ask(path());
    const packed = ask(path(), { 'accept-encoding': encoding });
    expect(packed.headers).toMatchObject({ 'Content-Encoding': encoding, Vary: 'Accept-Encoding' });
    expect(unpack[encoding](packed.body as Uint8Array).toString('utf8')).toBe(plain.text);
    expect((packed.body as Uint8Array).byteLength).toBeLessThan(plain.text.length / 2);
    expect(packed.headers.ETag).not.toBe(plain.headers.ETag);
    const again = ask(path(), { 'accept-encoding': encoding, 'if-none-match': packed.headers.ETag! });
    expect([again.status, again.body]).toEqual([304, null]);
  });

  it('goes as it is to whoever takes no encoding, or gives it weight 0', () => {
    for (const accepted of ['', 'identity', 'gzip;q=0, br;q=0.0', 'zstd'])
      expect(ask(path(), { 'accept-encoding': accepted }).headers['Content-Encoding']).toBeUndefined();
    expect(ask(path(), { 'accept-encoding': 'gzip, deflate, br;q=0' }).headers['Content-Encoding']).toBe(
      'gzip',
    );
  });

  it('is never told of an address that is not public', () => {
    expect(ask(`/embed/${waiting.id}`, { 'accept-encoding': 'br' })).toEqual(ask(`/embed/${'A'.repeat(22)}`));
  });
});
