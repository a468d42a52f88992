import { afterAll, describe, expect, it } from 'vitest';
import { turnAt } from '@/lib/domain/on-call';
import { addShift, getNightList, onCallAt, removeShift } from '@/lib/services/on-call/on-call';
import { setRoles } from '@/lib/services/people/change-person';
import { freshDatabase, HOUR, makePerson, NOW } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const { db } = desk;
const editor = makePerson(db, { name: 'Marten Reed', roles: ['editor'] });
const other = makePerson(db, { name: 'Isolde Varn', roles: ['editor'] });
const reporter = makePerson(db, { name: 'Rhea Quill', roles: ['reporter'] });
const copyDesk = makePerson(db, { name: 'Tamsin Oake', roles: ['copy-desk'] });
const administrator = makePerson(db, { name: 'Ned Harrow', roles: ['administrator'] });

/** NOW is a Thursday, 08:00 UTC, which is 10:00 in Vienna. */
const thursday = {
  personId: other.publicId,
  when: { weekday: 4 },
  fromTime: '22:00',
  toTime: '06:00',
  zone: 'Europe/Vienna',
};
const night = { weekday: null, fromTime: '22:00', toTime: '06:00', zone: 'Europe/Vienna' };

describe('a turn of the night list', () => {
  it('runs over midnight by the clocks of its zone, its end not included', () => {
    addShift(editor, thursday, desk.ctx());
    const on = (hours: number) => onCallAt(db, NOW + hours * HOUR).map(({ name }) => name);
    expect([on(0), on(11.99), on(12), on(19.99), on(20)]).toEqual([
      [],
      [],
      ['Isolde Varn'],
      ['Isolde Varn'],
      [],
    ]);
    expect(onCallAt(db, NOW + 13 * HOUR)[0]?.until).toBe(NOW + 20 * HOUR);
  });

  it('is an hour shorter in the night in which the clocks go forward, and an hour longer when they go back', () => {
    const spring = turnAt({ ...night, onDay: '2027-03-27' }, Date.UTC(2027, 2, 27, 23))!;
    const autumn = turnAt({ ...night, onDay: '2026-10-24' }, Date.UTC(2026, 9, 24, 23))!;
    expect([(spring.to - spring.from) / HOUR, (autumn.to - autumn.from) / HOUR]).toEqual([7, 9]);
    expect(new Date(spring.to).toISOString()).toBe('2027-03-28T04:00:00.000Z');
    expect(new Date(autumn.to).toISOString()).toBe('2026-10-25T05:00:00.000Z');
  });

  it('of every week begins after the gap where its hour does not exist that night', () => {
    const early = { weekday: 7, onDay: null, fromTime: '02:30', toTime: '06:00', zone: 'Europe/Vienna' };
    expect(turnAt(early, Date.UTC(2027, 2, 28, 1, 29))).toBeNull();
    expect(turnAt(early, Date.UTC(2027, 2, 28, 1, 30))?.from).toBe(Date.UTC(2027, 2, 28, 1, 30));
  });

  it('is kept by editors, read by reporters, and only editors are called', () => {
    for (const actor of [reporter, copyDesk, administrator])
      expect(refusal(() => addShift(actor, thursday, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => getNightList(copyDesk, desk.ctx()))[0]).toBe('forbidden');
    expect(refusal(() => addShift(editor, { ...thursday, personId: reporter.publicId }, desk.ctx()))[0]).toBe(
      'invalid',
    );
    expect(getNightList(reporter, desk.ctx()).editors).toEqual([]);
    setRoles(administrator, { id: other.publicId, version: 1, roles: ['reporter'] }, desk.ctx());
    expect(onCallAt(db, NOW + 13 * HOUR)).toEqual([]);
    expect(getNightList(editor, desk.ctx(13 * HOUR)).shifts[0]).toMatchObject({
      mayBeCalled: false,
      isOnNow: false,
    });
  });

  it('does not begin at a time or on a date that does not exist, nor end when it begins', () => {
    const own = { ...thursday, personId: editor.publicId };
    for (const change of [
      { when: { onDay: '2027-03-28' }, fromTime: '02:30' },
      { when: { onDay: '2027-02-30' } },
      { toTime: '22:00' },
      { zone: 'Averil/Coast' },
    ])
      expect(refusal(() => addShift(editor, { ...own, ...change }, desk.ctx()))[0]).toBe('invalid');
  });

  it('is taken off once, and never rewritten', () => {
    const { id } = addShift(editor, { ...thursday, personId: editor.publicId }, desk.ctx());
    expect(refusal(() => removeShift(reporter, { id }, desk.ctx()))[0]).toBe('forbidden');
    removeShift(editor, { id }, desk.ctx());
    expect(refusal(() => removeShift(editor, { id }, desk.ctx()))[0]).toBe('conflict');
    expect(() => db.$client.prepare("update on_call_shifts set to_time = '07:00'").run()).toThrow(
      /never rewritten/,
    );
  });
});
