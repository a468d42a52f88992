import { beforeEach, describe, expect, it } from 'vitest';
import type { Actor } from '@/lib/domain/roles';
import { newId } from '@/lib/security/ids';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { draftReplacement } from '@/lib/services/correction/draft-replacement';
import {
  applyStaged,
  confirmNotices,
  previewStaged,
  withdrawStaged,
} from '@/lib/services/correction/settle-correction';
import { answerEmbed } from '@/lib/services/embed/answer';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { getRelease } from '@/lib/services/release/get-release';
import { reviseRelease } from '@/lib/services/release/revise-release';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { correctionDesk } from '@/tests/support/correction';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, sharesOf, typed } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const AUGUST = { fieldStartOn: '2026-08-13', fieldEndOn: '2026-08-16', publishedOn: '2026-08-19' };

let desk: TestDatabase;
let on: ReturnType<typeof sheetDesk>;
let corrections: ReturnType<typeof correctionDesk>;
let reporter: Actor;
let editor: Actor;
let copyDesk: Actor;
let id: string;
beforeEach(() => {
  desk = freshDatabase();
  on = sheetDesk(desk.db);
  corrections = correctionDesk(desk.db);
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  copyDesk = makePerson(desk.db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
  id = logRelease(desk.db, reporter);
  return () => desk.closeAndRemove();
});

const stateOf = (sheet: string) => getSheet(editor, sheet, corrections.ctx).state;
const logAugust = () =>
  logRelease(desk.db, reporter, {
    ...AUGUST,
    race: { kind: 'existing', id: getRelease(reporter, id, desk.ctx()).facts.race.id },
    shares: sharesOf([
      ['Alder', '41'],
      ['Brook', '45'],
      ['Someone else', '6'],
      ['Don’t know', '8', false],
    ]),
  });
const stage = (release = id) =>
  corrections.correct(reporter, release, { n: typed('1,021') }, { how: 'staged' }).id;
const replace = (correctionId: string, sheetId: string, actor = reporter) =>
  draftReplacement(actor, { submissionKey: newId(), correctionId, sheetId }, corrections.ctx).id;
const agreed = (correctionId: string, sheetId: string) => {
  const replacement = replace(correctionId, sheetId);
  on.file(reporter, replacement);
  on.clear(editor, replacement);
  return replacement;
};
const embedOf = (sheet: string) => createEmbed(copyDesk, { sheetId: sheet }, corrections.ctx).id;
const ask = (embed: string, part = '') =>
  answerEmbed({ path: `/embed/${embed}${part}`, query: new URLSearchParams(), headers: {} }, corrections.ctx);
const inPrint = () =>
  listCopyDesk(copyDesk, { race: '', pollster: '' }, corrections.ctx).map((sheet) => sheet.id);

describe('a staged correction', () => {
  it('changes nothing in print until it is applied', () => {
    const sheet = on.cleared(reporter, editor, id);
    const embed = embedOf(sheet);
    const replacement = agreed(stage(), sheet);
    expect(stateOf(replacement)).toBe('agreed');
    expect(
      getSheet(editor, replacement, corrections.ctx)
        .lines.map(({ text }) => text)
        .join(' '),
    ).toContain('1,021');
    expect(inPrint()).toEqual([sheet]);
    expect(ask(embed).status).toBe(200);
    expect(getRelease(reporter, id, corrections.ctx).facts.n).toMatchObject({ value: 1012 });
  });

  it('swaps old words and new ones, and the address of the chart stays with its article', () => {
    const sheet = on.cleared(reporter, editor, id);
    const embed = embedOf(sheet);
    const correctionId = stage();
    const replacement = agreed(correctionId, sheet);
    corrections.apply(reporter, correctionId);
    expect([stateOf(sheet), stateOf(replacement)]).toEqual(['pulled', 'cleared']);
    expect(inPrint()).toEqual([replacement]);
    expect(ask(embed).status).toBe(200);
    expect(JSON.parse(String(ask(embed, '/data.json').body))).toMatchObject({ n: 1021, version: 2 });
    expect(ask(embed, '@1').status).toBe(410);
    const notice = getSheet(editor, replacement, corrections.ctx).lines.find(
      ({ kind }) => kind === 'correction-notice',
    );
    expect(notice?.text).toMatch(/1,012.*1,021|1,021.*1,012/);
    expect(String(ask(embed, '@1').body)).toContain('1,012');
    expect(getRelease(reporter, id, corrections.ctx).facts).toMatchObject({ version: 2, n: { value: 1021 } });
  });

  it('pulls what has no replacement that two people agreed to', () => {
    logAugust();
    const [first, second] = [on.cleared(reporter, editor, id), on.draft(reporter, id, 'change:Alder')];
    on.file(reporter, second);
    on.clear(editor, second);
    const correctionId = stage();
    const ready = agreed(correctionId, first);
    const unread = replace(correctionId, second);
    corrections.apply(reporter, correctionId);
    expect([first, second, ready].map(stateOf)).toEqual(['pulled', 'pulled', 'cleared']);
    expect(stateOf(unread)).toBe('draft');
    on.file(reporter, unread);
    on.clear(editor, unread);
    expect(stateOf(unread)).toBe('cleared');
  });

  it('replaces words of a release that is compared with the corrected one', () => {
    const august = logAugust();
    const sheet = on.draft(reporter, id, 'change:Alder');
    on.file(reporter, sheet);
    on.clear(editor, sheet);
    const corrected = sharesOf([
      ['Alder', '44'],
      ['Brook', '42'],
      ['Someone else', '6'],
      ['Don’t know', '8', false],
    ]);
    const correctionId = corrections.correct(reporter, august, { shares: corrected }, { how: 'staged' }).id;
    const replacement = agreed(correctionId, sheet);
    const words = getSheet(editor, replacement, corrections.ctx)
      .lines.map(({ text }) => text)
      .join(' ');
    expect(words).toContain('44% on 13–16 August');
    corrections.apply(editor, correctionId);
    expect([stateOf(sheet), stateOf(replacement)]).toEqual(['pulled', 'cleared']);
  });

  it('shows what applying it would do, and refuses when that changed since', () => {
    const sheet = on.cleared(reporter, editor, id);
    const correctionId = stage();
    const seen = previewStaged(reporter, { id: correctionId }, corrections.ctx);
    expect(seen.consequences).toMatchObject([{ sheetId: sheet, effect: 'pulled' }]);
    agreed(correctionId, sheet);
    const apply = () => applyStaged(reporter, { id: correctionId, seen: seen.hash }, corrections.ctx);
    expect(refusal(apply)[0]).toBe('conflict');
    expect(stateOf(sheet)).toBe('cleared');
    expect(previewStaged(reporter, { id: correctionId }, corrections.ctx).consequences).toMatchObject([
      { sheetId: sheet, effect: 'replaced' },
    ]);
  });

  it('is one at a time, and holds every other change of the release back', () => {
    stage();
    const again = () => corrections.preview(reporter, id, { n: typed('1,000') });
    expect(refusal(again)[0]).toBe('conflict');
    const input = corrections.asked(reporter, id, { n: typed('1,000') });
    expect(refusal(() => reviseRelease(reporter, input, corrections.ctx))[0]).toBe('conflict');
  });

  it('is withdrawn with a reason, and what was drafted for it goes', () => {
    const sheet = on.cleared(reporter, editor, id);
    const correctionId = stage();
    const replacement = agreed(correctionId, sheet);
    const reason = 'The pollster took the revision back.';
    withdrawStaged(reporter, { id: correctionId, reason }, corrections.ctx);
    expect([stateOf(sheet), stateOf(replacement)]).toEqual(['cleared', 'pulled']);
    expect(refusal(() => withdrawStaged(reporter, { id: correctionId, reason }, corrections.ctx))[0]).toBe(
      'conflict',
    );
    expect(refusal(() => corrections.apply(reporter, correctionId))[0]).toBe('conflict');
    expect(refusal(() => replace(correctionId, sheet))[0]).toBe('conflict');
    expect(corrections.preview(reporter, id, { n: typed('1,000') }).changed).toEqual(['sample-size']);
  });

  it('does not change the pollster, which everything shows', () => {
    const act = () => corrections.correct(reporter, id, { pollster: 'The Quillon Panel' }, { how: 'staged' });
    expect(act).toThrow(
      expect.objectContaining({ code: 'invalid', fields: { pollster: expect.stringContaining('at once') } }),
    );
  });
});

describe('a replacement', () => {
  it('is drafted once, of a sheet that the correction touches, by whoever drafts sheets', () => {
    const sheet = on.cleared(reporter, editor, id);
    const correctionId = stage();
    expect(refusal(() => replace(correctionId, sheet, copyDesk))[0]).toBe('forbidden');
    expect(refusal(() => replace(newId(), sheet))[0]).toBe('not-found');
    expect(refusal(() => replace(correctionId, newId()))[0]).toBe('not-found');
    replace(correctionId, sheet);
    expect(refusal(() => replace(correctionId, sheet))[0]).toBe('conflict');
  });

  it('sent twice is one sheet', () => {
    const sheet = on.cleared(reporter, editor, id);
    const input = { submissionKey: newId(), correctionId: stage(), sheetId: sheet };
    const [one, other] = [0, 1].map(() => draftReplacement(reporter, input, corrections.ctx).id);
    expect(one).toBe(other);
  });
});

describe('the notices of a correction', () => {
  it('go out when an editor lets them, once, after it is applied', () => {
    on.cleared(reporter, editor, id);
    const correctionId = stage();
    const confirm = (actor: Actor) => confirmNotices(actor, { id: correctionId }, corrections.ctx);
    expect(refusal(() => confirm(reporter))[0]).toBe('forbidden');
    expect(refusal(() => confirm(editor))[0]).toBe('conflict');
    corrections.apply(reporter, correctionId);
    confirm(editor);
    expect(refusal(() => confirm(editor))[0]).toBe('conflict');
  });

  it('are nobody’s without the role', () => {
    for (const act of [previewStaged, applyStaged, withdrawStaged, confirmNotices])
      expect(refusal(() => act(copyDesk, {}, corrections.ctx))[0]).toBe('forbidden');
  });
});
