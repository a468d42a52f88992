import { afterAll, describe, expect, it } from 'vitest';
import { discardReleaseDraft, getReleaseDraft, saveReleaseDraft } from '@/lib/services/release/draft';
import { freshDatabase, makePerson, NOW } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);

const reporter = makePerson(desk.db, { name: 'Rita Quill', roles: ['reporter'] });
const editor = makePerson(desk.db, { name: 'Edda Stone', roles: ['editor'] });
const copyDesk = makePerson(desk.db, { name: 'Cora Lane', roles: ['copy-desk'] });
const body = (value: unknown, basedOn: number | null = null) => ({ body: JSON.stringify(value), basedOn });

describe('a draft of a release', () => {
  it('is kept as the last one sent, for its own person alone', () => {
    saveReleaseDraft(reporter, body({ pollster: 'Kel' }), desk.ctx());
    expect(saveReleaseDraft(reporter, body({ pollster: 'Kelmouth' }, NOW), desk.ctx(1))).toEqual({
      savedAt: NOW + 1,
    });
    expect(getReleaseDraft(reporter, desk.ctx())).toEqual({
      body: { pollster: 'Kelmouth' },
      savedAt: NOW + 1,
    });
    expect(getReleaseDraft(editor, desk.ctx())).toBeNull();
  });

  it('is never typed over by a tab that has not seen it', () => {
    const kept = getReleaseDraft(reporter, desk.ctx());
    for (const basedOn of [null, NOW, NOW + 2]) {
      const stale = () => saveReleaseDraft(reporter, body({ pollster: 'Norwater' }, basedOn), desk.ctx(2));
      expect(refusal(stale)[0]).toBe('conflict');
    }
    expect(getReleaseDraft(reporter, desk.ctx())).toEqual(kept);
  });

  it('is no conflict where the same is sent again, and keeps its hour', () => {
    const again = saveReleaseDraft(reporter, body({ pollster: 'Kelmouth' }), desk.ctx(5));
    expect(again).toEqual({ savedAt: NOW + 1 });
  });

  it('counts on where the clock stands still or goes back', () => {
    const next = saveReleaseDraft(reporter, body({ pollster: 'Kelm' }, NOW + 1), desk.ctx(-9));
    expect(next).toEqual({ savedAt: NOW + 2 });
    const back = saveReleaseDraft(reporter, body({ pollster: 'Kelmouth' }, NOW + 2), desk.ctx());
    expect(back).toEqual({ savedAt: NOW + 3 });
  });

  it('goes when it is discarded, and discarding nothing does no harm', () => {
    saveReleaseDraft(reporter, body({}, NOW + 3), desk.ctx());
    discardReleaseDraft(reporter, desk.ctx());
    discardReleaseDraft(reporter, desk.ctx());
    expect(getReleaseDraft(reporter, desk.ctx())).toBeNull();
  });

  it('is refused where it is too large or no form', () => {
    const save = (input: unknown) => () => saveReleaseDraft(reporter, input, desk.ctx());
    expect(refusal(save(body({ pollster: 'x'.repeat(100_001) })))[0]).toBe('invalid');
    expect(refusal(save({ ...body({}), body: 'not json' }))[0]).toBe('invalid');
    expect(refusal(save({ body: '{}' }))[0]).toBe('invalid');
    expect(refusal(save(body([1])))[0]).toBe('invalid');
    expect(refusal(save({ ...body({}), key: 'other' }))[0]).toBe('invalid');
    expect(refusal(save(null))[0]).toBe('invalid');
  });

  it('is for those who log releases', () => {
    expect(refusal(() => saveReleaseDraft(copyDesk, body({}), desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => getReleaseDraft(copyDesk, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => discardReleaseDraft(copyDesk, desk.ctx()))[0]).toBe('forbidden');
  });
});
