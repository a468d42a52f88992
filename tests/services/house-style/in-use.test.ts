import { beforeEach, describe, expect, it } from 'vitest';
import { insertHouseStyle } from '@/db/queries/desk';
import { write } from '@/db/write';
import type { Actor } from '@/lib/domain/roles';
import { fillSentence } from '@/lib/services/house-style/fill-sentence';
import { getStyle } from '@/lib/services/house-style/get-style';
import { listStyles } from '@/lib/services/house-style/list-styles';
import { previewLive } from '@/lib/services/house-style/preview-live';
import { takeUpStyle } from '@/lib/services/house-style/start-draft';
import {
  listLanguages,
  refuseUnsigned,
  signLanguage,
  withdrawSignature,
} from '@/lib/services/house-style/sign-language';
import { draftNewerWording, ensureDeskSettings, readDeskSettings } from '@/lib/services/setup/desk-settings';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { freshDatabase, makePerson, type TestDatabase } from '../../support/database';
import { FRAGILE_LEAD, OWN_FRAGILE, styleDesk } from '../../support/house-style';
import { refusal } from '../../support/refusal';
import { logRelease, sharesOf } from '../../support/release';
import { sheetDesk } from '../../support/sheet';

let desk: TestDatabase;
let first: Actor;
let second: Actor;
let reporter: Actor;

beforeEach(() => {
  desk = freshDatabase();
  first = makePerson(desk.db, { name: 'Ines Marr', roles: ['editor'] });
  second = makePerson(desk.db, { name: 'Tobin Vale', roles: ['editor'] });
  reporter = makePerson(desk.db, { name: 'Rook Adley', roles: ['reporter'] });
  return () => desk.closeAndRemove();
});

const FRAGILE_SHARES = sharesOf([
  ['Alder', '49'],
  ['Brook', '41'],
  ['Someone else', '4'],
  ['Don’t know', '6', false],
]);
const fragile = () =>
  logRelease(desk.db, reporter, {
    shares: FRAGILE_SHARES,
    statedMargin: { notDisclosed: false, pp: '3.1', unit: '0.1', level: '95' },
  });

describe('a house style in force', () => {
  it('is what the next sheet is drafted with', () => {
    styleDesk(desk.db).inForce(first, second, { [FRAGILE_LEAD]: OWN_FRAGILE });
    const sheets = sheetDesk(desk.db);
    const id = sheets.draft(reporter, fragile());
    const { lines } = getSheet(reporter, id, desk.ctx());
    expect(lines.find(({ kind }) => kind === 'headline')?.text).toBe(
      'Alder has the higher figure, 49% to 41% for Brook, in poll by Kelmouth Research, but the poll cannot settle it',
    );
  });

  it('computes a kind of sample as if random only where the desk says so, and prints that kind’s rule', () => {
    styleDesk(desk.db).inForce(first, second, {
      'policy.comparisonBasis.quota': true,
      'style.comparisonRules.quota': 'the polling act of Averil Coast',
    });
    const of = (source: 'quota' | 'opt-in' | 'probability') => readDeskSettings(desk.db, [source]);
    expect(of('quota').policy.body.comparisonBasis).toBe(true);
    expect(of('quota').houseStyle.body.comparisonRule).toBe('the polling act of Averil Coast');
    expect(of('opt-in').policy.body.comparisonBasis).toBe(false);
    expect(of('opt-in').houseStyle.body.comparisonRule).toBe('a rule of this newsroom');
    expect(of('probability').policy.body.comparisonBasis).toBe(false);
    expect(readDeskSettings(desk.db, ['quota', 'opt-in']).policy.body.comparisonBasis).toBe(false);
  });
});

describe('what was typed and refused', () => {
  it('is kept beside the draft and keeps it from being proposed', () => {
    const acts = styleDesk(desk.db);
    const id = acts.start(first);
    const text = '{a} leads {b} in poll by {pollster}, {aShare} to {bShare}';
    const { faults } = acts.save(first, id, { [FRAGILE_LEAD]: text, 'style.newsroom': 'the Courier' });
    expect(faults[FRAGILE_LEAD]?.[0]?.phrase).toBe('leads');
    const view = getStyle(first, id, desk.ctx());
    expect(view.typed).toEqual({ [FRAGILE_LEAD]: text });
    expect(view.body.style.messages.en.headline.lead.fragile).toBe(
      DEFAULT_HOUSE_STYLE.messages.en.headline.lead.fragile,
    );
    expect(view.body.style.newsroom).toBe('the Courier');
    expect(refusal(() => acts.propose(first, id))[0]).toBe('invalid');
    acts.save(first, id, { [FRAGILE_LEAD]: OWN_FRAGILE });
    expect(acts.propose(first, id)).toMatch(/^[0-9a-f]{64}$/);
  });

  it('cannot be got round by a ladder or a ban that comes later', () => {
    const acts = styleDesk(desk.db);
    const id = acts.start(first);
    acts.save(first, id, { 'style.banned.en': ['higher figure'] });
    expect(refusal(() => acts.propose(first, id))).toEqual(['invalid', 'Some sentences need another look.']);
  });
});

describe('while a sentence is written', () => {
  it('it is seen filled with the desk’s own releases first, then with invented ones', () => {
    fragile();
    const id = styleDesk(desk.db).start(first);
    const filled = fillSentence(first, { id, path: FRAGILE_LEAD, text: OWN_FRAGILE }, desk.ctx());
    expect(filled).toHaveLength(3);
    expect(filled.map(({ isExample }) => isExample)).toEqual([false, true, true]);
    expect(filled[0]).toMatchObject({
      pollster: 'Kelmouth Research',
      text: 'Alder has the higher figure, 49% to 41% for Brook, in poll by Kelmouth Research, but the poll cannot settle it',
    });
  });

  it('a release under embargo fills nothing', () => {
    const embargo = { local: '2026-09-20T06:00', zone: 'Etc/UTC' };
    logRelease(desk.db, reporter, { shares: FRAGILE_SHARES, embargo });
    const id = styleDesk(desk.db).start(first);
    const filled = fillSentence(first, { id, path: FRAGILE_LEAD, text: OWN_FRAGILE }, desk.ctx());
    expect(filled.every(({ isExample }) => isExample)).toBe(true);
  });
});

describe('the preview of what is live', () => {
  it('lists the cleared sheets that would read differently, with what stands there now', () => {
    const sheet = sheetDesk(desk.db).cleared(reporter, first, fragile());
    const acts = styleDesk(desk.db);
    const id = acts.start(first);
    expect(previewLive(first, { id }, desk.ctx())).toMatchObject({
      changes: [],
      seen: 1,
      total: 1,
      next: null,
    });
    acts.save(first, id, { [FRAGILE_LEAD]: OWN_FRAGILE });
    const { changes } = previewLive(first, { id }, desk.ctx());
    expect(changes).toHaveLength(1);
    expect(changes[0]).toMatchObject({ sheet, verdict: { before: 'fragile', after: 'fragile' } });
    expect(changes[0]?.lines.map(({ kind }) => kind)).toEqual(['headline']);
    expect(changes[0]?.lines[0]?.before).toMatch(/^Alder is ahead of Brook/);
  });

  it('shows a verdict that a new policy would change', () => {
    sheetDesk(desk.db).cleared(reporter, first, fragile());
    const acts = styleDesk(desk.db);
    const id = acts.start(first);
    acts.save(first, id, { 'policy.level': 0.999 });
    const [change] = previewLive(first, { id }, desk.ctx()).changes;
    expect(change?.verdict).toEqual({ before: 'fragile', after: 'does-not-hold' });
  });

  it('is for editors', () => {
    const id = styleDesk(desk.db).start(first);
    expect(refusal(() => previewLive(reporter, { id }, desk.ctx()))[0]).toBe('forbidden');
  });
});

describe('newer wording of the product', () => {
  const newer = {
    ...DEFAULT_HOUSE_STYLE,
    templateVersion: '99.0.0',
    messages: {
      ...DEFAULT_HOUSE_STYLE.messages,
      en: {
        ...DEFAULT_HOUSE_STYLE.messages.en,
        detectable:
          'Had there been a change of {detectable} {detectableCount, plural, one {point} other {points}}, such polls would have found it four times in five.',
      },
    },
  };

  it('becomes a draft for the editors and is in force only once two of them agree', () => {
    styleDesk(desk.db).inForce(first, second, { [FRAGILE_LEAD]: OWN_FRAGILE });
    const id = write(desk.db, (tx) => draftNewerWording(tx, desk.ctx().now, newer))!;
    expect(listStyles(first, desk.ctx()).open).toMatchObject([
      { id, state: 'draft', origin: 'product', author: null },
    ]);
    expect(readDeskSettings(desk.db).houseStyle.body.templateVersion).toBe(
      DEFAULT_HOUSE_STYLE.templateVersion,
    );
    const { body, version } = getStyle(first, id, desk.ctx());
    expect(body.style.messages.en.headline.lead.fragile).toBe(OWN_FRAGILE);
    expect(body.style.messages.en.detectable).toBe(newer.messages.en.detectable);
    expect(refusal(() => styleDesk(desk.db).propose(first, id))[0]).toBe('forbidden');
    takeUpStyle(first, { id, version }, desk.ctx());
    expect(refusal(() => takeUpStyle(second, { id, version: version + 1 }, desk.ctx()))[0]).toBe('conflict');
  });

  it('is drafted once, and not again at the next start', () => {
    write(desk.db, (tx) => draftNewerWording(tx, desk.ctx().now, newer));
    expect(write(desk.db, (tx) => draftNewerWording(tx, desk.ctx().now, newer))).toBeNull();
  });

  it('of the same version changes nothing when the desk starts again', () => {
    ensureDeskSettings(desk.ctx());
    expect(listStyles(first, desk.ctx())).toMatchObject({ open: [], versions: [{ number: 1 }] });
  });

  it('fills in what an older house style does not have', () => {
    const { messages, newsroom } = DEFAULT_HOUSE_STYLE;
    const old = {
      newsroom: 'the Courier',
      templateVersion: '0.9.0',
      messages: { en: { headline: messages.en.headline } },
    };
    write(desk.db, (tx) => insertHouseStyle(tx, JSON.stringify(old), desk.ctx().now));
    const { body } = readDeskSettings(desk.db).houseStyle;
    expect(body).toMatchObject({ newsroom: 'the Courier', onePollHeadlines: 'allow' });
    expect(body.messages.en.body).toEqual(messages.en.body);
    expect(newsroom).toBe('our desk');
  });
});

describe('a language', () => {
  it('that the makers reviewed needs no signature', () => {
    const english = listLanguages(reporter, desk.ctx()).find(({ language }) => language === 'en')!;
    expect(english).toMatchObject({ isReviewed: true, isClearable: true, signature: null });
    const input = { language: 'en', packHash: english.packHash, isNative: true };
    expect(refusal(() => signLanguage(first, input, desk.ctx()))).toEqual([
      'conflict',
      'This language needs no signature.',
    ]);
    expect(refusal(() => signLanguage(reporter, input, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => signLanguage(first, { ...input, isNative: false }, desk.ctx()))[0]).toBe('invalid');
  });

  it('that nobody signed is drafted and filed, and cleared only once a native editor has signed it', () => {
    const sheets = sheetDesk(desk.db);
    const id = sheets.draft(reporter, fragile());
    desk.db.$client.prepare(`UPDATE sheets SET language = 'es' WHERE public_id = ?`).run(id);
    sheets.file(reporter, id);
    const [code, message] = refusal(() => sheets.clear(first, id));
    expect([code, message]).toEqual([
      'conflict',
      expect.stringMatching(/^No native editor of this desk has signed/),
    ]);
    signLanguage(second, { language: 'es', packHash: spanish().packHash, isNative: true }, desk.ctx());
    expect(spanish()).toMatchObject({
      isReviewed: false,
      isClearable: true,
      signature: { by: 'Tobin Vale' },
    });
    expect(sheets.clear(first, id)).toMatchObject({ outcome: 'cleared' });
  });

  it('is signed as it is: a changed sentence needs a new signature, and a signature can be taken back', () => {
    const sign = (packHash: string) => ({ language: 'es', packHash, isNative: true });
    signLanguage(second, sign(spanish().packHash), desk.ctx());
    expect(refusal(() => signLanguage(first, sign(spanish().packHash), desk.ctx()))[1]).toBe(
      'It is signed already.',
    );
    const old = spanish().packHash;
    const detectable = `${DEFAULT_HOUSE_STYLE.messages.es.detectable} `.replace(
      /\. $/,
      ', con las mismas muestras.',
    );
    styleDesk(desk.db).inForce(first, second, { 'style.messages.es.detectable': detectable });
    expect(spanish().isClearable).toBe(false);
    expect(refusal(() => signLanguage(second, sign(old), desk.ctx()))[0]).toBe('conflict');
    signLanguage(second, sign(spanish().packHash), desk.ctx());
    withdrawSignature(first, { language: 'es', packHash: spanish().packHash }, desk.ctx());
    expect(spanish().isClearable).toBe(false);
    expect(refusal(() => refuseUnsigned(desk.db, 'es'))[0]).toBe('conflict');
    expect(() => refuseUnsigned(desk.db, 'en')).not.toThrow();
  });
});

const spanish = () => listLanguages(first, desk.ctx()).find(({ language }) => language === 'es')!;
