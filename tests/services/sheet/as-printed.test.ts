import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findLatestHouseStyle, insertHouseStyle } from '@/db/queries/desk';
import { write } from '@/db/write';
import { newId } from '@/lib/security/ids';
import { listCopyDesk } from '@/lib/services/copy/list-copy-desk';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { clearSheet } from '@/lib/services/sheet/clear-sheet';
import { createAsPrinted } from '@/lib/services/sheet/create-as-printed';
import { saveLines } from '@/lib/services/sheet/edit-lines';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getAsPrinted } from '@/lib/services/sheet/get-as-printed';
import { readSecond, releaseAlone } from '@/lib/services/sheet/release-alone';
import { getSheetData } from '@/lib/services/sheet/sheet-data';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { freshDatabase, HOUR, makePerson, type TestDatabase } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

let desk: TestDatabase;
let id: string;
let releaseId: string;
let people: Record<'reporter' | 'editor' | 'other' | 'copyDesk', ReturnType<typeof makePerson>>;
/** 22:00 and 06:00 by the clocks of the desk; the tests begin at 08:00. */
const [NIGHTFALL, BEFORE, DAWN] = [14 * HOUR, 14 * HOUR - 1, 22 * HOUR];

beforeEach(() => {
  desk = freshDatabase();
  people = {
    reporter: makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] }),
    editor: makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] }),
    other: makePerson(desk.db, { name: 'Isolde Varn', roles: ['editor'] }),
    copyDesk: makePerson(desk.db, { name: 'Tamsin Oake', roles: ['copy-desk'] }),
  };
  releaseId = logRelease(desk.db, people.reporter);
  id = createAsPrinted(people.reporter, { submissionKey: newId(), releaseId }, desk.ctx()).id;
});
afterEach(() => desk.closeAndRemove());

const see = (actor = people.editor, later = 0) => getAsPrinted(actor, id, desk.ctx(later));
const basis = () => ({ id, version: see().version, basisHash: see().basisHash });
const alone = (actor = people.editor, later = NIGHTFALL) => releaseAlone(actor, basis(), desk.ctx(later));

function switchOn(change: object = { asPrintedNight: true }): void {
  const style = JSON.parse(findLatestHouseStyle(desk.db)!.body) as object;
  write(desk.db, (tx) => insertHouseStyle(tx, JSON.stringify({ ...style, ...change }), desk.ctx().now));
}

describe('figures as printed', () => {
  it('say what the pollster printed, of whom, when and for whom, and nothing of a verdict', () => {
    const [headline, body, caveat] = see().lines.map(({ text }) => text);
    expect(headline).toBe('Averil Coast governor, Kelmouth Research: Alder 47%, Brook 41%, Someone else 4%');
    expect(body).toContain('1,012 likely voters');
    expect(body).toContain('Don’t know 8%');
    expect(caveat).toContain('The poll was made for the Averil Courier.');
    expect(caveat).toContain('Kelmouth Research states ±3.7 points for a share at 95% confidence.');
    for (const { text } of see().lines) expect(claimsAbove('cannot-be-tested', text)).toEqual([]);
  });

  it('are edited by nobody, have no chart, and are cleared by two people like any words', () => {
    const lines = [{ kind: 'headline', text: 'Alder leads', knockedOut: false }];
    expect(refusal(() => saveLines(people.reporter, { id, version: 1, lines }, desk.ctx()))[0]).toBe(
      'invalid',
    );
    fileSheet(people.reporter, { ...basis(), lines: [] }, desk.ctx());
    const hash = see().hash!;
    expect(refusal(() => clearSheet(people.reporter, { id, hash }, desk.ctx()))[0]).toBe('forbidden');
    expect(clearSheet(people.editor, { id, hash }, desk.ctx()).outcome).toBe('cleared');
    expect(see().oneReader).toBeNull();
    expect(refusal(() => createEmbed(people.editor, { sheetId: id }, desk.ctx()))[1]).toContain('no chart');
  });
});

describe('the night rule', () => {
  it('is off by default, for editors only, and only at night', () => {
    expect(refusal(() => alone())[0]).toBe('forbidden');
    switchOn();
    expect(refusal(() => alone(people.reporter))[0]).toBe('forbidden');
    expect(refusal(() => alone(people.copyDesk))[0]).toBe('forbidden');
    for (const later of [0, BEFORE, DAWN])
      expect(refusal(() => alone(people.editor, later))[0]).toBe('conflict');
    expect(see(people.editor, NIGHTFALL).alone).toBe('may');
    alone();
    expect(see().state).toBe('cleared');
  });

  it('releases no claim', () => {
    switchOn();
    const on = sheetDesk(desk.db);
    const claim = on.draft(people.editor, releaseId);
    const { version, basisHash } = on.filing(people.editor, claim);
    expect(
      refusal(() => releaseAlone(people.editor, { id: claim, version, basisHash }, desk.ctx(NIGHTFALL))),
    ).toEqual(['conflict', 'Only figures as printed are released by one reader.']);
  });

  it('marks the words “one reader” until somebody else has read them', () => {
    switchOn();
    alone();
    const oneReader = () =>
      listCopyDesk(people.copyDesk, { race: '', pollster: '' }, desk.ctx(NIGHTFALL))[0]?.oneReader;
    expect(oneReader()).toBe('Marten Reed');
    expect(getSheetData(people.copyDesk, id, desk.ctx(NIGHTFALL)).cleared?.readers).toBe(1);
    const seen = { id, hash: see().hash! };
    expect(refusal(() => readSecond(people.editor, seen, desk.ctx(NIGHTFALL)))[0]).toBe('forbidden');
    expect(refusal(() => readSecond(people.copyDesk, seen, desk.ctx(NIGHTFALL)))[0]).toBe('forbidden');
    readSecond(people.reporter, seen, desk.ctx(DAWN));
    expect(refusal(() => readSecond(people.other, seen, desk.ctx(DAWN)))[0]).toBe('conflict');
    expect(oneReader()).toBeNull();
    expect(see().oneReader).toEqual({ by: 'Marten Reed', second: 'Rhea Quill' });
  });
});

describe('the database', () => {
  const insert = (sql: string, ...values: unknown[]) => desk.db.$client.prepare(sql).run(...values);
  const allow = (
    evidence: number,
    sheet: number,
    change: { time?: string; from?: string; style?: number } = {},
  ) =>
    insert(
      'insert into one_reader_releases (evidence_id, sheet_id, person_id, house_style_id, local_time, night_from, night_to, zone, at) values (?, ?, ?, ?, ?, ?, ?, ?, ?)',
      evidence,
      sheet,
      people.editor.personId,
      change.style ?? findLatestHouseStyle(desk.db)!.id,
      change.time ?? '23:00',
      change.from ?? '22:00',
      '06:00',
      'Etc/UTC',
      5,
    );
  const clear = (evidence: number, sheet: number, roles = '["editor"]', person = people.editor.personId) =>
    insert(
      "insert into clearings (public_id, sheet_id, evidence_id, act, person_id, roles, at) values (?, ?, ?, 'cleared', ?, ?, 5)",
      newId(),
      sheet,
      evidence,
      person,
      roles,
    );
  /** A filing by the editor: of figures as printed, or of a claim. */
  function filedByEditor(isClaim = false) {
    if (isClaim) {
      const on = sheetDesk(desk.db);
      id = on.draft(people.editor, releaseId);
      on.file(people.editor, id);
    } else fileSheet(people.editor, { ...basis(), lines: [] }, desk.ctx());
    const row = desk.db.$client.prepare('select max(id) as evidence, sheet_id as sheet from evidence').get();
    return row as { evidence: number; sheet: number };
  }
  const TWO = /two different people agree/;

  it('admits a clearing by its filer only for figures as printed, by an editor, unedited, at night, with the rule on', () => {
    const { evidence, sheet } = filedByEditor();
    expect(() => clear(evidence, sheet)).toThrow(TWO);
    expect(() => allow(evidence, sheet)).toThrow(/only at night/);
    switchOn({ asPrintedNight: 'yes' });
    expect(() => allow(evidence, sheet)).toThrow(/only at night/);
    const earlier = findLatestHouseStyle(desk.db)!.id;
    switchOn();
    expect(() => allow(evidence, sheet, { style: earlier })).toThrow(/only at night/);
    for (const change of [{ time: '12:00' }, { time: '06:00' }, { time: '12:00', from: '08:00' }])
      expect(() => allow(evidence, sheet, change)).toThrow(/only at night/);
    allow(evidence, sheet);
    expect(() => clear(evidence, sheet, '["reporter"]')).toThrow(TWO);
    insert(
      "update line_versions set draft_text = 'other words' where id = (select min(id) from line_versions)",
    );
    expect(() => clear(evidence, sheet)).toThrow(TWO);
    insert('update line_versions set draft_text = text');
    clear(evidence, sheet);
  });

  it('admits no claim and nobody whose editor’s role is gone', () => {
    switchOn();
    const { evidence, sheet } = filedByEditor(true);
    allow(evidence, sheet);
    expect(() => clear(evidence, sheet)).toThrow(TWO);
    insert('delete from person_roles where person_id = ?', people.editor.personId);
    expect(() => clear(evidence, sheet)).toThrow(TWO);
  });

  it('lets the second reading be somebody else’s, once', () => {
    switchOn();
    alone();
    const second = (person: number) =>
      insert('update one_reader_releases set second_person_id = ?, second_at = 9', person);
    expect(() => second(people.editor.personId)).toThrow(/second person once/);
    second(people.other.personId);
    expect(() => second(people.reporter.personId)).toThrow(/second person once/);
  });
});
