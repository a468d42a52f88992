import { beforeEach, describe, expect, it } from 'vitest';
import { listAllRecords } from '@/db/queries/record';
import type { Actor } from '@/lib/domain/roles';
import { correctRelease, previewCorrection } from '@/lib/services/correction/correct-release';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { answerEmbed } from '@/lib/services/embed/answer';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { verifyHistory } from '@/lib/services/history/verify';
import { getRelease } from '@/lib/services/release/get-release';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { correctionDesk } from '@/tests/support/correction';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease, sharesOf, typed } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const AUGUST = { fieldStartOn: '2026-08-13', fieldEndOn: '2026-08-16', publishedOn: '2026-08-19' };
const EARLIER = sharesOf([
  ['Alder', '41'],
  ['Brook', '45'],
  ['Someone else', '6'],
  ['Don’t know', '8', false],
]);

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
const embedOf = (sheet: string) => createEmbed(copyDesk, { sheetId: sheet }, corrections.ctx).id;
const ask = (embed: string, part = '') =>
  answerEmbed({ path: `/embed/${embed}${part}`, query: new URLSearchParams(), headers: {} }, corrections.ctx);

describe('a correction that changes what is printed', () => {
  it('pulls the words and the chart that rest on the release, in one act', () => {
    const sheet = on.cleared(reporter, editor, id);
    const embed = embedOf(sheet);
    corrections.correct(reporter, id, { n: typed('1,021') });
    expect(stateOf(sheet)).toBe('pulled');
    expect(getRelease(reporter, id, corrections.ctx).facts.n).toEqual({ status: 'given', value: 1021 });
    expect(ask(embed).status).toBe(410);
    expect(ask(embed, '@1').status).toBe(410);
    expect(listCopyDesk(copyDesk, { race: '', pollster: '' }, corrections.ctx)).toEqual([]);
  });

  it('says at the chart whose correction it was, and no figure', () => {
    const embed = embedOf(on.cleared(reporter, editor, id));
    corrections.correct(reporter, id, { n: typed('1,021') }, { whose: 'pollster' });
    const page = String(ask(embed).body);
    expect(page).toContain('The pollster revised figures behind this chart.');
    expect(page.slice(page.indexOf('<body'))).not.toMatch(/47|41|1,012|1,021/);
    expect(JSON.parse(String(ask(embed, '/data.json').body))).toMatchObject({
      withdrawn: true,
      note: 'The pollster revised figures behind this chart.',
    });
  });

  it('reaches words of another release that is compared with this one', () => {
    const august = logRelease(desk.db, reporter, {
      ...AUGUST,
      shares: EARLIER,
      race: { kind: 'existing', id: getRelease(reporter, id, desk.ctx()).facts.race.id },
    });
    const sheet = on.draft(reporter, id, 'change:Alder');
    on.file(reporter, sheet);
    on.clear(editor, sheet);
    const preview = corrections.preview(reporter, august, { n: typed('1,500') });
    expect(preview.consequences).toMatchObject([{ sheetId: sheet, effect: 'pulled', isComparison: true }]);
    corrections.correct(reporter, august, { n: typed('1,500') });
    expect(stateOf(sheet)).toBe('pulled');
  });

  it('pulls words whose claim the corrected figures support no more', () => {
    const sheet = on.cleared(reporter, editor, id);
    const shares = sharesOf([
      ['Alder', '47'],
      ['Brooke', '41'],
      ['Someone else', '4'],
      ['Don’t know', '8', false],
    ]);
    corrections.correct(reporter, id, { shares });
    expect(stateOf(sheet)).toBe('pulled');
  });
});

describe('a correction that changes nothing printed', () => {
  it('leaves the words, and tells whoever reads them that the source was corrected', () => {
    const sheet = on.cleared(reporter, editor, id);
    const embed = embedOf(sheet);
    corrections.correct(reporter, id, { methodNote: 'Weighted by age and region.' });
    expect(stateOf(sheet)).toBe('cleared');
    expect(ask(embed).status).toBe(200);
    const [item] = listCopyDesk(copyDesk, { race: '', pollster: '' }, corrections.ctx);
    expect(item?.stale).toEqual([{ reason: 'source-corrected', at: corrections.ctx.now }]);
  });

  it('is not named at a chart that an editor pulls later for another reason', () => {
    const sheet = on.cleared(reporter, editor, id);
    const embed = embedOf(sheet);
    corrections.correct(reporter, id, { methodNote: 'Weighted by age and region.' });
    pullSheet(editor, { id: sheet, reason: 'The wrong photograph stood beside it.' }, corrections.ctx);
    expect(ask(embed).status).toBe(410);
    expect(JSON.parse(String(ask(embed, '/data.json').body))).not.toHaveProperty('note');
  });

  it('is one of the link to the source only where no word in print has the link', () => {
    const link = { sourceUrl: typed('https://polls.example/other') };
    const withLink = on.cleared(reporter, editor, id);
    expect(corrections.preview(reporter, id, link).consequences).toMatchObject([{ effect: 'pulled' }]);
    corrections.correct(reporter, id, link);
    expect(stateOf(withLink)).toBe('pulled');
    const without = on.draft(reporter, id);
    on.file(reporter, without, {}, ['method-note']);
    on.clear(editor, without);
    const back = { sourceUrl: typed('https://polls.example/kelmouth') };
    expect(corrections.preview(reporter, id, back).consequences).toMatchObject([{ effect: 'flagged' }]);
  });

  it('is refused where nothing differs at all', () => {
    expect(refusal(() => corrections.preview(reporter, id, {}))).toEqual([
      'conflict',
      'Nothing differs from the version on file.',
    ]);
  });
});

describe('the consequences', () => {
  it('are shown before anything is written, and leave no trace', () => {
    const sheet = on.cleared(reporter, editor, id);
    const before = listAllRecords(desk.db).length;
    const preview = corrections.preview(reporter, id, { n: typed('1,021') });
    expect(preview).toMatchObject({
      changed: ['sample-size'],
      consequences: [
        { sheetId: sheet, effect: 'pulled', isComparison: false, pollster: 'Kelmouth Research' },
      ],
    });
    expect(preview.consequences[0]?.lines.map(({ kind }) => kind)).toContain('headline');
    expect(listAllRecords(desk.db)).toHaveLength(before);
    expect(stateOf(sheet)).toBe('cleared');
    expect(getRelease(reporter, id, corrections.ctx).facts.version).toBe(1);
  });

  it('that changed since somebody looked refuse the correction, and nothing is done', () => {
    const input = corrections.asked(reporter, id, { n: typed('1,021') });
    const { hash } = previewCorrection(reporter, input, corrections.ctx);
    const sheet = on.cleared(reporter, editor, id);
    const given = { ...input, whose: 'ours', explanation: 'A digit was wrong.', how: 'now', seen: hash };
    expect(refusal(() => correctRelease(reporter, given, corrections.ctx))[0]).toBe('conflict');
    expect(stateOf(sheet)).toBe('cleared');
    expect(getRelease(reporter, id, corrections.ctx).facts.version).toBe(1);
  });
});

describe('a correction is refused', () => {
  it('to whoever does not log releases', () => {
    expect(refusal(() => previewCorrection(copyDesk, {}, corrections.ctx))[0]).toBe('forbidden');
    expect(refusal(() => correctRelease(copyDesk, {}, corrections.ctx))[0]).toBe('forbidden');
  });

  it.each([
    ['nobody’s', { whose: 'theirs' }, 'whose'],
    ['without a word', { explanation: 'typo' }, 'explanation'],
    ['unseen', { seen: 'x' }, 'seen'],
    ['in some other way', { how: 'later' }, 'how'],
  ])('%s', (_, change, field) => {
    const input = corrections.asked(reporter, id, { n: typed('1,021') });
    const { hash } = previewCorrection(reporter, input, corrections.ctx);
    const given = { ...input, whose: 'ours', explanation: 'A digit was wrong.', how: 'now', seen: hash };
    const act = () => correctRelease(reporter, { ...given, ...change }, corrections.ctx);
    expect(act).toThrow(
      expect.objectContaining({ code: 'invalid', fields: { [field]: expect.any(String) } }),
    );
  });

  it('of a release that somebody changed meanwhile', () => {
    const input = corrections.asked(reporter, id, { n: typed('1,021') });
    corrections.correct(reporter, id, { n: typed('1,000') });
    expect(refusal(() => previewCorrection(reporter, input, corrections.ctx))[0]).toBe('conflict');
  });
});

it('tells the history whose it was, why, what it changed and what came down, and the chain holds', () => {
  const sheet = on.cleared(reporter, editor, id);
  corrections.correct(reporter, id, { n: typed('1,021') }, { whose: 'late-data' });
  const last = listAllRecords(desk.db).at(-1)!;
  expect(last).toMatchObject({ action: 'corrected release', reason: 'The sample size was typed wrongly.' });
  expect(JSON.parse(last.after!)).toMatchObject({
    whose: 'late-data',
    changed: ['sample-size'],
    effects: [{ sheet, effect: 'pulled' }],
  });
  expect(verifyHistory(desk.db, [])).toMatchObject({ ok: true });
});
