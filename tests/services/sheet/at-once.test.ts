import { fork, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { afterAll, describe, expect, it } from 'vitest';
import { databaseFile } from '@/db/client';
import type { Actor } from '@/lib/domain/roles';
import { verifyHistory } from '@/lib/services/history/verify';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const on = sheetDesk(desk.db);
const reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
const editors = ['Marten Reed', 'Isolde Varn', 'Pell Sand'].map((name) =>
  makePerson(desk.db, { name, roles: ['editor'] }),
);

async function processOf(actor: Actor, input: unknown): Promise<ChildProcess> {
  const argument = JSON.stringify([databaseFile(desk.folder), actor, input, desk.ctx().now]);
  const execArgv = ['--conditions=react-server', '--import', 'tsx'];
  const child = fork('tests/support/clear-when-told.ts', [argument], { execArgv });
  await once(child, 'message');
  return child;
}

describe('three editors in three processes', () => {
  it('clear one sheet once when they press at the same moment', async () => {
    const id = on.draft(reporter, logRelease(desk.db, reporter));
    on.file(reporter, id);
    const input = { id, hash: on.hashOf(editors[0]!, id) };
    const children = await Promise.all(editors.map((editor) => processOf(editor, input)));
    const answers = children.map(async (child) => (await once(child, 'message'))[0] as string);
    for (const child of children) child.send('now');
    expect((await Promise.all(answers)).sort()).toEqual(['cleared', 'conflict', 'conflict']);
    const seen = getSheet(reporter, id, desk.ctx());
    expect(seen.acts.map(({ act }) => act)).toEqual(['filed', 'cleared']);
    expect(verifyHistory(desk.db, [])).toMatchObject({ ok: true });
  }, 60_000);
});
