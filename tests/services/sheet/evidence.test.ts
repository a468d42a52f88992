import { createHash } from 'node:crypto';
import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { findEvidence, findLastAct } from '@/db/queries/clearing';
import { findSheet } from '@/db/queries/sheet';
import { canonicalJson } from '@/lib/security/canonical';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const { db } = desk;
const on = sheetDesk(db);
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const releaseId = logRelease(db, reporter);

let id: string;
beforeEach(() => {
  id = on.cleared(reporter, editor, releaseId);
});

function evidenceOf(sheet: string) {
  const row = findSheet(db, sheet, editor, desk.ctx().now)!;
  const filed = findLastAct(db, row.sheet.id, 'filed')!;
  const cleared = findLastAct(db, row.sheet.id, 'cleared')!;
  return { filed, cleared, evidence: findEvidence(db, cleared.evidenceId!)! };
}

describe('evidence', () => {
  it('is kept as the canonical bytes that its hash is the SHA-256 of', () => {
    const { evidence } = evidenceOf(id);
    expect(createHash('sha256').update(evidence.bytes).digest('hex')).toBe(evidence.hash);
    const text = evidence.bytes.toString('utf8');
    expect(canonicalJson(JSON.parse(text))).toBe(text);
    expect(getSheet(editor, id, desk.ctx()).hash).toBe(evidence.hash);
  });

  it('is one row for both people, filed by one and cleared by the other', () => {
    const { filed, cleared } = evidenceOf(id);
    expect(cleared.evidenceId).toBe(filed.evidenceId);
    expect([filed.personId, cleared.personId]).toEqual([reporter.personId, editor.personId]);
  });

  it('holds release, findings, draft, final words, chart and what is missing', () => {
    const body = JSON.parse(evidenceOf(id).evidence.bytes.toString('utf8')) as Record<string, unknown>;
    expect(Object.keys(body).sort()).toEqual([
      'answer',
      'chart',
      'claim',
      'claimKey',
      'comparison',
      'document',
      'draft',
      'engine',
      'houseStyle',
      'language',
      'missing',
      'policy',
      'release',
      'schema',
      'sheet',
      'texts',
    ]);
  });
});

describe('the database itself', () => {
  const refused: [string, string, string][] = [
    ['changed evidence', `update evidence set bytes = x'7b7d'`, 'evidence never changes'],
    ['deleted evidence', 'delete from evidence', 'evidence never changes'],
    ['a changed source of evidence', `update evidence_sources set part = 'comparison'`, 'evidence never'],
    ['a rewritten act', 'update clearings set person_id = 1', 'an act is never rewritten'],
    ['a deleted act', 'delete from clearings', 'an act is never rewritten'],
    ['lines moved to another act', 'delete from clearing_lines', 'an act is never rewritten'],
    [
      'changed words',
      `update line_versions set text = 'Alder leads.' where state = 'cleared'`,
      'words change only as a new draft version',
    ],
    [
      'a changed share beneath a filed sheet',
      'update shares set units = units + 1',
      'a filed sheet rests on this version',
    ],
    [
      'a changed sample size beneath a filed sheet',
      'update bases set n = 9000',
      'a filed sheet rests on this version',
    ],
  ];

  it.each(refused)('refuses %s', (_, statement, message) => {
    expect(() => db.$client.exec(statement)).toThrow(message);
  });

  it('refuses a clearing by whoever filed, even past the services', () => {
    const draft = on.draft(reporter, releaseId);
    on.file(reporter, draft);
    const { sheet } = findSheet(db, draft, editor, desk.ctx().now)!;
    const { evidenceId } = findLastAct(db, sheet.id, 'filed')!;
    const insert = db.$client.prepare(
      `insert into clearings (public_id, sheet_id, evidence_id, act, person_id, roles, at)
       values ('forged', ?, ?, 'cleared', ?, '["editor"]', 1)`,
    );
    expect(() => insert.run(sheet.id, evidenceId, reporter.personId)).toThrow('two different people');
  });

  it('refuses a second cleared version of one line', () => {
    const insert = `insert into line_versions
      (public_id, line_id, number, draft_text, text, state, template_version, changed_by, changed_at)
      select 'forged', line_id, number + 1, text, text, 'cleared', '1', changed_by, 1
      from line_versions where state = 'cleared' limit 1`;
    expect(() => db.$client.exec(insert)).toThrow('UNIQUE constraint failed');
  });
});
