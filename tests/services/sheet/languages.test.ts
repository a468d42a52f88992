import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { Actor } from '@/lib/domain/roles';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { newId } from '@/lib/security/ids';
import { listLanguages, signLanguage } from '@/lib/services/house-style/sign-language';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { createAsPrinted } from '@/lib/services/sheet/create-as-printed';
import { createSheet } from '@/lib/services/sheet/create-sheet';
import { getAsPrinted } from '@/lib/services/sheet/get-as-printed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { markReviewed } from '@/lib/services/sheet/languages';
import { PACK_STATUS } from '@/lib/wording/pack-status';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { LEAD, sheetDesk } from '@/tests/support/sheet';

let desk: TestDatabase;
let reporter: Actor;
let editor: Actor;
let releaseId: string;
beforeEach(() => {
  desk = freshDatabase();
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  releaseId = logRelease(desk.db, reporter);
});
afterEach(() => desk.closeAndRemove());

const draftIn = (language?: string) =>
  createSheet(reporter, { submissionKey: newId(), releaseId, claimKey: LEAD, language }, desk.ctx()).id;
const view = (id: string) => getSheet(reporter, id, desk.ctx());

describe('the language of a sheet', () => {
  it.each([
    ['en', 'poll by Kelmouth Research'],
    ['es', 'sondeo de Kelmouth Research'],
    ['fr', 'sondage'],
    ['de', 'Umfrage von Kelmouth Research'],
  ])('is the one that the reporter chose: %s', (language, words) => {
    const { language: drafted, lines } = view(draftIn(language));
    expect(drafted).toBe(language);
    expect(lines[0]?.text).toContain(words);
  });

  it('is English where none was chosen, and none that the desk does not write', () => {
    expect(view(draftIn()).language).toBe('en');
    expect(refusal(() => draftIn('it'))[0]).toBe('invalid');
  });

  it('is reviewed where its pack says so, in one place for all', () => {
    for (const { language, isReviewed } of listLanguages(reporter, desk.ctx()))
      expect(isReviewed).toBe(PACK_STATUS[language].status === 'reviewed-here');
  });

  it.each(LANGUAGES)('is that of figures as printed too: %s', (language) => {
    const input = { submissionKey: newId(), releaseId, language };
    const { id } = createAsPrinted(reporter, input, desk.ctx());
    expect(getAsPrinted(reporter, id, desk.ctx()).desk.language).toBe(language);
  });
});

describe('the same claim in several languages', () => {
  const sign = () => {
    const { packHash } = listLanguages(editor, desk.ctx()).find(({ language }) => language === 'es')!;
    signLanguage(editor, { language: 'es', packHash, isNative: true }, desk.ctx());
  };

  it('is cleared one by one: clearing one clears no other', () => {
    const on = sheetDesk(desk.db);
    const [english, spanish] = [draftIn('en'), draftIn('es')];
    on.file(reporter, english);
    on.file(reporter, spanish);
    on.clear(editor, english);
    expect([view(english).state, view(spanish).state]).toEqual(['cleared', 'filed']);
    expect(refusal(() => on.clear(editor, spanish))[0]).toBe('conflict');
    sign();
    on.clear(editor, spanish);
    expect(view(spanish).state).toBe('cleared');
  });

  it('knows its other languages and where a further one is drafted from', () => {
    const [english, spanish] = [draftIn('en'), draftIn('es')];
    expect(view(english).desk.siblings).toEqual([{ id: spanish, language: 'es' }]);
    expect(view(english).desk.claim).toEqual({ releaseId, key: LEAD });
  });

  it('needs review in the others when one changes, until somebody looks', () => {
    const on = sheetDesk(desk.db);
    const [english, spanish] = [draftIn('en'), draftIn('es')];
    on.file(reporter, english);
    on.clear(editor, english);
    expect(view(spanish).desk.reviews).toEqual([]);
    reviseSheet(reporter, { id: english, version: view(english).version }, desk.ctx());
    on.file(reporter, english, { headline: 'Alder 47%, Brook 41% in the Kelmouth Research poll' });
    expect(view(spanish).desk.reviews).toMatchObject([
      { language: 'en', sheetId: english, cause: 'changed' },
    ]);
    expect(view(spanish).lines[0]?.text).toContain('47\u00a0%');
    markReviewed(editor, { id: spanish }, desk.ctx());
    expect(view(spanish).desk.reviews).toEqual([]);
  });
});
