import { afterAll, describe, expect, it } from 'vitest';
import { listPeople } from '@/lib/services/people/list-people';
import { freshDatabase, makePerson } from '@/tests/support/database';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
const editor = makePerson(desk.db, { name: 'Edda Marsh', roles: ['editor', 'reporter'] });

describe('the list of people', () => {
  it('shows an administrator everybody, without anything secret', () => {
    expect(listPeople(administrator, desk.ctx())).toEqual([
      {
        id: administrator.publicId,
        name: 'Ada Fenn',
        email: 'ada.fenn@courier.example',
        roles: ['administrator'],
        state: 'invited',
        version: 1,
      },
      {
        id: editor.publicId,
        name: 'Edda Marsh',
        email: 'edda.marsh@courier.example',
        roles: ['editor', 'reporter'],
        state: 'invited',
        version: 1,
      },
    ]);
  });

  it('is refused to everybody else', () => {
    expect(() => listPeople(editor, desk.ctx())).toThrow('Only an administrator sees the list of people.');
  });
});
