import { join } from 'node:path';
import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { listAllRecords } from '@/db/queries/record';
import { headFile, readHead } from '@/lib/services/history/head';
import { verifyHistory } from '@/lib/services/history/verify';
import { addPerson } from '@/lib/services/people/add-person';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';

let desk: TestDatabase;
beforeEach(() => {
  desk = freshDatabase();
  const administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
  for (const name of ['Cora Pell', 'Dora Pell', 'Edda Marsh']) {
    const email = `${name.slice(0, 4)}@courier.example`;
    addPerson(administrator, { name, email, roles: ['reporter'] }, desk.ctx());
  }
});
afterEach(() => desk.closeAndRemove());

const headOnDisk = () => readHead(headFile(desk.db)!);
const verify = () => verifyHistory(desk.db, [{ name: 'the head file', head: headOnDisk()! }]);
/** As somebody with the file and any SQLite tool could: the guards go first. */
const tamper = (sql: string) => {
  desk.db.$client.exec('DROP TRIGGER records_no_update; DROP TRIGGER records_no_delete;');
  expect(desk.db.$client.prepare(sql).run().changes).toBe(1);
};

describe('the history', () => {
  it('is whole, and its head lies beside the database', () => {
    const last = listAllRecords(desk.db).at(-1)!;
    expect(last.seq).toBe(5);
    expect(headOnDisk()).toEqual({ seq: last.seq, hash: last.hash });
    expect(verify()).toEqual({ ok: true, head: { seq: last.seq, hash: last.hash } });
  });

  it('refuses to be changed, cut, or continued with a gap', () => {
    const run = (sql: string) => () => desk.db.$client.prepare(sql).run();
    expect(run("UPDATE records SET action = 'x' WHERE seq = 2")).toThrow('the history is append-only');
    expect(run('DELETE FROM records WHERE seq = 5')).toThrow('the history is append-only');
    expect(
      run(
        'INSERT INTO records SELECT 7, at, person_id, action, entity, entity_id, before, after, reason, release_id, row_hash, previous_hash, hash FROM records WHERE seq = 5',
      ),
    ).toThrow('the history has no gaps');
  });

  it.each(['action', 'entity', 'entity_id', 'previous_hash', 'row_hash', 'hash'])(
    'shows one changed byte in %s',
    (column) => {
      tamper(`UPDATE records SET ${column} = 'x' || substr(${column}, 2) WHERE seq = 4`);
      expect(verify()).toEqual({ ok: false, problem: 'entry 4 was changed' });
    },
  );

  it.each([
    ['what it became', "after = replace(after, 'Dora', 'Nora')"],
    ['when', 'at = at + 1'],
    ['who', 'person_id = NULL'],
    ['why', "reason = 'x'"],
    ['the release', 'release_id = 1'],
  ])('shows a change of %s', (_, change) => {
    tamper(`UPDATE records SET ${change} WHERE seq = 4`);
    expect(verify()).toEqual({ ok: false, problem: 'entry 4 was changed' });
  });

  it('shows an entry that is missing', () => {
    tamper('DELETE FROM records WHERE seq = 3');
    expect(verify()).toEqual({ ok: false, problem: 'entry 3 is missing' });
  });

  it('shows a tail that was cut, by the head that was kept elsewhere', () => {
    tamper('DELETE FROM records WHERE seq = 5');
    expect(verifyHistory(desk.db, [])).toMatchObject({ ok: true });
    expect(verify()).toEqual({
      ok: false,
      problem: 'the history ends at 4, but the head file knows entry 5',
    });
  });

  it('shows a tail that was written anew after it was cut', () => {
    const known = headOnDisk()!;
    tamper('DELETE FROM records WHERE seq = 5');
    const administrator = makePerson(desk.db, { name: 'Bela Tarn', roles: ['administrator'] });
    const input = { name: 'Fred Loe', email: 'fred@courier.example', roles: ['reporter'] };
    addPerson(administrator, input, desk.ctx());
    expect(verifyHistory(desk.db, [{ name: 'the printed head', head: known }])).toEqual({
      ok: false,
      problem: 'entry 5 is not the one that the printed head knows',
    });
  });

  it('keeps the head that witnesses a cut tail, however much is written afterwards', () => {
    const known = headOnDisk()!;
    tamper('DELETE FROM records WHERE seq = 5');
    const administrator = makePerson(desk.db, { name: 'Bela Tarn', roles: ['administrator'] });
    for (const name of ['Fred Loe', 'Greta Loe', 'Hugo Loe']) {
      const email = `${name.slice(0, 4)}@courier.example`;
      addPerson(administrator, { name, email, roles: ['reporter'] }, desk.ctx());
    }
    expect(headOnDisk()).toEqual(known);
    expect(verify()).toMatchObject({ ok: false });
  });

  it('answers an act that is on disk as done, even where the head cannot be written', () => {
    const told = vi.spyOn(console, 'error').mockImplementation(() => undefined);
    const file = headFile(desk.db)!;
    rmSync(file);
    mkdirSync(join(file, 'in the way'), { recursive: true });
    const administrator = makePerson(desk.db, { name: 'Bela Tarn', roles: ['administrator'] });
    const input = { name: 'Fred Loe', email: 'fred@courier.example', roles: ['reporter'] };
    expect(addPerson(administrator, input, desk.ctx()).id).toMatch(/^[\w-]{22}$/);
    expect(listAllRecords(desk.db)).toHaveLength(6);
    expect(told).toHaveBeenCalledOnce();
  });

  it('takes a head file that cannot be read for none', () => {
    writeFileSync(join(desk.folder, 'history-head.json'), '{"seq":');
    expect(headOnDisk()).toBeNull();
  });
});
