import { spawnSync } from 'node:child_process';
import { existsSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { findFile, listFiles } from '@/db/queries/files';
import { replaceRoles } from '@/db/queries/person';
import { findLastRecord } from '@/db/queries/record';
import { write } from '@/db/write';
import { AppError } from '@/lib/errors';
import { checkFiles } from '@/lib/services/files/check-files';
import { MAX_FILE_BYTES, readStoredFile, storeFile } from '@/lib/services/files/store-file';
import { diskStore } from '@/lib/storage/disk-store';
import { pathOf } from '@/lib/storage/file-store';
import { freshDatabase, makePerson, NOW } from '@/tests/support/database';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const folder = join(desk.folder, 'files');
const store = diskStore(folder);
const reporter = makePerson(desk.db, { name: 'Rolf Quill', roles: ['reporter'] });
const copyDesk = makePerson(desk.db, { name: 'Cora Pell', roles: ['copy-desk', 'administrator'] });

const text = (words: string) => Buffer.from(words, 'utf8');
const codeOf = (promise: Promise<unknown>) =>
  promise.then(
    () => 'done',
    (error: unknown) => (error instanceof AppError ? error.code : String(error)),
  );
const listed = async () => {
  const hashes: string[] = [];
  for await (const { hash } of store.list()) hashes.push(hash);
  return hashes;
};
const check = (removeOrphans = false) => checkFiles(desk.db, store, { now: Date.now(), removeOrphans });
const age = (hash: string, hours: number) => {
  const at = Date.now() / 1000 - hours * 3600;
  utimesSync(join(folder, pathOf(hash)), at, at);
};

describe('storing a file', () => {
  it('keeps the bytes, then a row that names them, and says so in the history', async () => {
    const { hash } = await storeFile(reporter, text('Alder,47\n'), desk.ctx(), store);
    const row = findFile(desk.db, hash)!;
    expect(row).toMatchObject({ size: 9, type: 'text/plain', createdBy: reporter.personId, createdAt: NOW });
    expect((await readStoredFile(row, store)).toString()).toBe('Alder,47\n');
    expect(findLastRecord(desk.db)).toMatchObject({ action: 'stored file', entity: 'file', entityId: hash });
  });

  it('keeps the same bytes once, whoever stores them again', async () => {
    const before = listFiles(desk.db).length;
    const seq = findLastRecord(desk.db)?.seq;
    await storeFile(reporter, text('Alder,47\n'), desk.ctx(1), store);
    expect(listFiles(desk.db)).toHaveLength(before);
    expect(findLastRecord(desk.db)?.seq).toBe(seq);
  });

  it('is refused to the wrong role, too large, or not a kind of file the desk keeps: nothing is written', async () => {
    const before = await listed();
    expect(await codeOf(storeFile(copyDesk, text('x'), desk.ctx(), store))).toBe('forbidden');
    expect(await codeOf(storeFile(reporter, Buffer.alloc(MAX_FILE_BYTES + 1, 'x'), desk.ctx(), store))).toBe(
      'too-large',
    );
    expect(await codeOf(storeFile(reporter, text('<html>'), desk.ctx(), store))).toBe('invalid');
    expect(await listed()).toEqual(before);
  });

  it('leaves bytes without a row, never a row without bytes, where the role was taken away meanwhile', async () => {
    const former = makePerson(desk.db, { name: 'Odo Finch', roles: ['reporter'] });
    write(desk.db, (tx) => replaceRoles(tx, former.personId, []));
    expect(await codeOf(storeFile(former, text('late'), desk.ctx(), store))).toBe('forbidden');
    expect((await check()).orphans).toHaveLength(1);
    expect((await check()).missing).toEqual([]);
  });
});

describe('checking what is stored', () => {
  it('removes bytes without a row only once they are a day old', async () => {
    const [orphan] = (await check()).orphans as [string];
    age(orphan, 23);
    expect((await check(true)).removed).toEqual([]);
    age(orphan, 25);
    expect((await check()).removed).toEqual([]);
    expect((await check(true)).removed).toEqual([orphan]);
    expect((await check()).orphans).toEqual([]);
  });

  it('never removes what a row names', async () => {
    for (const { hash } of listFiles(desk.db)) age(hash, 1000);
    expect((await check(true)).removed).toEqual([]);
    expect((await check()).missing).toEqual([]);
  });

  it('finds what is damaged and what is lost, and the command ends with status 1', async () => {
    const { hash } = await storeFile(reporter, text('Brook,41\n'), desk.ctx(), store);
    const command = () =>
      spawnSync('npm', ['run', '-s', 'storage:check'], {
        env: { ...process.env, LEADLINE_DATA: desk.folder, NODE_OPTIONS: '' },
        encoding: 'utf8',
      });
    expect(command()).toMatchObject({
      status: 0,
      stdout: '2 files checked, 0 lost, 0 damaged, 0 without a row\n',
    });
    const file = join(folder, pathOf(hash));
    writeFileSync(file, 'Brook,51\n');
    expect((await check()).damaged).toEqual([hash]);
    await expect(readStoredFile({ hash }, store)).rejects.toThrow(`the bytes of file ${hash} were changed`);
    rmSync(file);
    expect(existsSync(file)).toBe(false);
    const lost = command();
    expect(lost.status).toBe(1);
    expect(lost.stderr).toBe(`${hash} is lost: its row has no bytes\n`);
    await expect(readStoredFile({ hash }, store)).rejects.toThrow(`the bytes of file ${hash} are gone`);
  }, 60_000);
});
