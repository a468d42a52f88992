import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { check } from '@/lib/findings/check';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { reviseSheet } from '@/lib/services/sheet/change-filed';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { type FrozenEngine, verifyEvidence } from '@/lib/services/sheet/verify-evidence';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const engine: FrozenEngine = { check, parseCheckDocument };

let desk: TestDatabase;
let id: string;
beforeEach(() => {
  desk = freshDatabase();
  const reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  const editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  const on = sheetDesk(desk.db);
  const releaseId = logRelease(desk.db, reporter);
  id = on.cleared(reporter, editor, releaseId);
  const { version } = getSheet(reporter, id, desk.ctx());
  reviseSheet(reporter, { id, version }, desk.ctx());
  on.file(reporter, id, { body: 'Other words about the same poll.' }, ['headline']);
  on.clear(editor, id);
  const pulled = on.cleared(reporter, editor, releaseId);
  pullSheet(editor, { id: pulled, reason: 'The pollster is checking its figures.' }, desk.ctx());
  on.file(reporter, on.draft(reporter, releaseId));
});
afterEach(() => desk.closeAndRemove());

const verify = (engineOf: () => Promise<FrozenEngine> = async () => engine) =>
  verifyEvidence(desk.db, engineOf);
/** As somebody with the file and any SQLite tool could: the guards go first. */
const tamper = (trigger: string, sql: string) => desk.db.$client.exec(`DROP TRIGGER ${trigger}; ${sql}`);

describe('verifying evidence', () => {
  it('finds nothing in what people filed, cleared, replaced and pulled', async () => {
    expect(await verify()).toEqual({ checked: 4, problems: [] });
  });

  it('shows a changed byte', async () => {
    const swap = "bytes = cast(replace(cast(bytes as text), '1012', '1013') as blob)";
    tamper('evidence_no_update', `UPDATE evidence SET ${swap} WHERE id = 1`);
    expect((await verify()).problems).toEqual([
      expect.stringMatching(/^evidence \S+ does not fit its hash$/),
    ]);
  });

  it('shows words that are served and are not those agreed to', async () => {
    tamper(
      'line_versions_cleared_text',
      "UPDATE line_versions SET text = 'Alder leads.' WHERE text = 'Other words about the same poll.'",
    );
    expect((await verify()).problems).toEqual([
      expect.stringMatching(/holds other words than those that were filed$/),
      expect.stringMatching(/holds other words than those that were cleared$/),
    ]);
  });

  it('shows what one person cleared, or two without an editor', async () => {
    tamper('clearings_no_update', 'UPDATE clearings SET roles = \'["reporter"]\' WHERE evidence_id = 1');
    desk.db.$client.exec("UPDATE clearings SET person_id = 1 WHERE evidence_id = 2 AND act = 'cleared'");
    expect((await verify()).problems).toEqual([
      expect.stringMatching(/was not agreed to by two people of whom one was an editor$/),
      expect.stringMatching(/was not agreed to by two people of whom one was an editor$/),
    ]);
  });

  it('shows words that count as cleared without anybody’s act', async () => {
    desk.db.$client.exec("UPDATE line_versions SET state = 'cleared' WHERE state = 'filed'");
    const { problems } = await verify();
    expect(problems).toHaveLength(6);
    expect(problems[0]).toMatch(/^line \S+ was cleared by nobody$/);
  });

  it('shows an engine that is gone or counts otherwise, and goes on to the next', async () => {
    const gone = await verify(() => Promise.reject(new Error('engine 1.0.0 is not in the archive')));
    expect(gone.problems).toHaveLength(4);
    expect(gone.problems[0]).toMatch(/cannot be run: engine 1.0.0 is not in the archive$/);
    const other = await verify(async () => ({
      ...engine,
      check: (document) => ({ ...check(document), findings: [] }),
    }));
    expect(other.problems[0]).toMatch(new RegExp(`comes out differently on engine ${ENGINE_VERSION}$`));
  });

  it('tells of a number whose last bits moved', async () => {
    const nudged = (by: number): FrozenEngine => ({
      parseCheckDocument,
      check: (document) => {
        const answer = check(document);
        const findings = answer.findings.map((finding) =>
          finding.kind === 'lead' && finding.verdict !== 'cannot-be-tested'
            ? { ...finding, z: (finding.z ?? 0) + by }
            : finding,
        );
        return { ...answer, findings } as typeof answer;
      },
    });
    expect((await verify(async () => nudged(0))).problems).toEqual([]);
    expect((await verify(async () => nudged(1e-14))).problems).toHaveLength(4);
  });
});
