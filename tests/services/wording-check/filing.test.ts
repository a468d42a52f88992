import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { replaceRoles } from '@/db/queries/person';
import { findSheet } from '@/db/queries/sheet';
import { write } from '@/db/write';
import type { Actor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { changeFiledSheet } from '@/lib/services/sheet/change-filed';
import type { EvidenceBody } from '@/lib/services/sheet/evidence-body';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const releaseId = logRelease(db, reporter);

const TOO_FAR = 'Alder leads Brook in this poll by Kelmouth Research.';
const CONTRADICTED = 'Brook leads Alder in this poll by Kelmouth Research.';
const MENDED = 'Alder has 47% and Brook 41% in this poll by Kelmouth Research.';
const LEADS = { kind: 'body' as const, rule: 'lead', phrase: 'leads' };
const override = { reason: 'The second poll of the week agrees.', marks: [LEADS] };

let id: string;
beforeEach(() => {
  id = on.draft(reporter, releaseId);
});

const file = (actor: Actor, body: string, more: object = {}) =>
  fileSheet(actor, { ...on.filing(actor, id, { body }), ...more }, desk.ctx());

function evidenceOf() {
  const { sheet } = findSheet(db, id, editor, desk.ctx().now)!;
  const row = findEvidence(db, findLastAct(db, sheet.id, 'filed')!.evidenceId!)!;
  return { hash: row.hash, body: JSON.parse(row.bytes.toString('utf8')) as EvidenceBody };
}

function fieldsOf(act: () => unknown) {
  try {
    act();
  } catch (error) {
    if (error instanceof AppError) return error.fields;
  }
  throw new Error('the act was not refused');
}

describe('words that the figures do not support', () => {
  it('are refused at their line, and a reporter is sent to an editor', () => {
    expect(refusal(() => file(reporter, TOO_FAR))).toEqual([
      'invalid',
      expect.stringContaining('ask an editor'),
    ]);
    const fields = fieldsOf(() => file(reporter, TOO_FAR));
    expect(Object.keys(fields)).toEqual(['body']);
    expect(fields.body).toContain('“leads” is not supported.');
    expect(getSheet(reporter, id, desk.ctx()).state).toBe('draft');
  });

  it('are filed without a word once they are mended', () => {
    expect(refusal(() => file(editor, TOO_FAR))).toEqual([
      'invalid',
      expect.stringContaining('written reason'),
    ]);
    file(reporter, MENDED);
    expect(getSheet(editor, id, desk.ctx())).toMatchObject({ state: 'filed', override: null });
    expect(evidenceOf().body.wordingOverride).toBeUndefined();
  });

  it('are filed by an editor with a reason, which stays in evidence and history and is cleared with the words', () => {
    file(editor, TOO_FAR, { override });
    const { hash, body } = evidenceOf();
    expect(body.wordingOverride).toMatchObject({
      reason: override.reason,
      person: editor.publicId,
      marks: [{ ...LEADS, message: expect.any(String) as string }],
    });
    const told = { reason: override.reason, by: 'Marten Reed', marks: [{ kind: 'body', phrase: 'leads' }] };
    expect(getSheet(reporter, id, desk.ctx())).toMatchObject({ override: told, hasMoved: false, hash });
    const entry = db.$client
      .prepare('select reason, after from records where entity_id = ? order by seq desc limit 1')
      .get(id) as { reason: string; after: string };
    expect(entry.reason).toBe(override.reason);
    expect(entry.after).toContain('againstWordingCheck');
    expect(on.clear(reporter, id).outcome).toBe('cleared');
    expect(getSheet(editor, id, desk.ctx())).toMatchObject({ state: 'cleared', override: told, hash });
  });

  it('have another hash with every other reason', () => {
    file(editor, TOO_FAR, { override });
    const one = evidenceOf().hash;
    on.sendBack(editor, id, 'Another reason.');
    file(editor, TOO_FAR, { override: { ...override, reason: 'Another reason altogether.' } });
    expect(evidenceOf().hash).not.toBe(one);
  });

  it('are not overridden by a reporter, nor by an editor who lost the role meanwhile', () => {
    expect(refusal(() => file(reporter, TOO_FAR, { override }))[0]).toBe('forbidden');
    const former = makePerson(db, { name: 'Odo Kay', roles: ['editor', 'reporter'] });
    id = on.draft(former, releaseId);
    write(db, (tx) => replaceRoles(tx, former.personId, ['reporter']));
    expect(refusal(() => file(former, TOO_FAR, { override }))[0]).toBe('forbidden');
  });

  it('are not overridden unseen, without a sentence of reason, or when they are filed already', () => {
    expect(refusal(() => file(editor, TOO_FAR, { override: { ...override, marks: [] } }))[0]).toBe(
      'conflict',
    );
    const short = { ...override, reason: 'Because' };
    expect(fieldsOf(() => file(editor, TOO_FAR, { override: short }))).toHaveProperty(['override.reason']);
    file(editor, TOO_FAR, { override });
    expect(refusal(() => file(editor, TOO_FAR, { override }))[0]).toBe('conflict');
  });

  it('are held back too when an editor writes them into filed words', () => {
    file(reporter, MENDED);
    const change = (more: object) =>
      changeFiledSheet(editor, { ...on.filing(editor, id, { body: TOO_FAR }), ...more }, desk.ctx());
    expect(refusal(() => change({}))[0]).toBe('invalid');
    expect(getSheet(editor, id, desk.ctx()).state).toBe('filed');
    change({ override });
    expect(getSheet(reporter, id, desk.ctx()).override?.by).toBe('Marten Reed');
  });
});

describe('words that the figures contradict', () => {
  it('are refused whoever files them and whatever the reason', () => {
    expect(fieldsOf(() => file(reporter, CONTRADICTED)).body).toContain('“leads” is wrong.');
    const [code, message] = refusal(() => file(editor, CONTRADICTED, { override }));
    expect([code, message]).toEqual(['invalid', expect.stringContaining('no reason lifts that')]);
  });
});
