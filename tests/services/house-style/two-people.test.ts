import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { findLatestHouseStyle, findLatestPolicy } from '@/db/queries/desk';
import { replaceRoles } from '@/db/queries/person';
import { findLastRecord } from '@/db/queries/record';
import { write } from '@/db/write';
import type { Actor, Role } from '@/lib/domain/roles';
import { proposeStyle } from '@/lib/services/house-style/propose';
import { putStyleInForce, sendStyleBack } from '@/lib/services/house-style/put-in-force';
import { saveStyleDraft } from '@/lib/services/house-style/save-draft';
import {
  bringUpToDate,
  startStyleDraft,
  takeUpStyle,
  withdrawStyle,
} from '@/lib/services/house-style/start-draft';
import { getStyle } from '@/lib/services/house-style/get-style';
import { listStyles } from '@/lib/services/house-style/list-styles';
import { readDeskSettings } from '@/lib/services/setup/desk-settings';
import { freshDatabase, makePerson, type TestDatabase } from '../../support/database';
import { FRAGILE_LEAD, OWN_FRAGILE, styleDesk } from '../../support/house-style';
import { refusal } from '../../support/refusal';

let desk: TestDatabase;
let first: Actor;
let second: Actor;
let reporter: Actor;

beforeEach(() => {
  desk = freshDatabase();
  first = makePerson(desk.db, { name: 'Ines Marr', roles: ['editor'] });
  second = makePerson(desk.db, { name: 'Tobin Vale', roles: ['editor'] });
  reporter = makePerson(desk.db, { name: 'Rook Adley', roles: ['reporter'] });
  return () => desk.closeAndRemove();
});

const acts = () => styleDesk(desk.db);
const NEWSROOM = { 'style.newsroom': 'the Courier' };

describe('a version of house style', () => {
  it('starts as version 1, in force as the product ships it', () => {
    const { versions, open } = listStyles(first, desk.ctx());
    expect(versions).toMatchObject([{ number: 1, state: 'in-force', origin: 'product', author: null }]);
    expect(open).toEqual([]);
  });

  it('comes into force by a second editor and replaces the one before', () => {
    const id = acts().inForce(first, second, { [FRAGILE_LEAD]: OWN_FRAGILE });
    const { versions } = listStyles(reporter, desk.ctx());
    expect(versions).toMatchObject([
      { id, number: 2, state: 'in-force', author: 'Ines Marr', second: 'Tobin Vale' },
      { number: 1, state: 'replaced' },
    ]);
    const { body } = readDeskSettings(desk.db).houseStyle;
    expect(body.messages.en.headline.lead.fragile).toBe(OWN_FRAGILE);
    expect(findLastRecord(desk.db)).toMatchObject({
      action: 'put house style in force',
      entityId: id,
      personId: second.personId,
    });
  });

  it('writes a new policy only where the policy changes, and a new house style only where that does', () => {
    const style = findLatestHouseStyle(desk.db)!.id;
    const policy = findLatestPolicy(desk.db)!.id;
    acts().inForce(first, second, { 'policy.level': 0.9 });
    expect(findLatestHouseStyle(desk.db)!.id).toBe(style);
    expect(findLatestPolicy(desk.db)!.id).not.toBe(policy);
    expect(readDeskSettings(desk.db).policy.body.level).toBe(0.9);
  });

  it('is never put in force by whoever proposed it', () => {
    const id = acts().start(first);
    acts().save(first, id, NEWSROOM);
    acts().propose(first, id);
    expect(refusal(() => acts().putInForce(first, id))).toEqual([
      'forbidden',
      'You proposed this version. Another editor reads it before it comes into force.',
    ]);
  });

  it('is refused by the database itself where one person agrees twice', () => {
    const id = acts().start(first);
    acts().save(first, id, NEWSROOM);
    acts().propose(first, id);
    const statement = `UPDATE style_versions SET state = 'in-force', put_in_force_by = proposed_by WHERE public_id = ?`;
    const force = () => desk.db.$client.prepare(statement).run(id);
    expect(force).toThrow('two different people agree before a version is in force');
  });

  it('is the business of editors at every step, by the roles held at that moment', () => {
    const id = acts().start(first);
    const version = getStyle(first, id, desk.ctx()).version;
    const hash = '0'.repeat(64);
    const steps: ((actor: Actor) => unknown)[] = [
      (actor) => startStyleDraft(actor, desk.ctx()),
      (actor) => saveStyleDraft(actor, { id, version, changes: [] }, desk.ctx()),
      (actor) => proposeStyle(actor, { id, version, note: 'A note.' }, desk.ctx()),
      (actor) => putStyleInForce(actor, { id, hash }, desk.ctx()),
      (actor) => sendStyleBack(actor, { id, hash, comment: 'Look again.' }, desk.ctx()),
      (actor) => bringUpToDate(actor, { id, version }, desk.ctx()),
      (actor) => withdrawStyle(actor, { id, version }, desk.ctx()),
      (actor) => takeUpStyle(actor, { id, version }, desk.ctx()),
    ];
    const others = (['reporter', 'copy-desk', 'administrator'] as Role[]).map((role) =>
      makePerson(desk.db, { name: `A ${role}`, roles: [role] }),
    );
    const refused = steps.flatMap((step) => others.map((other) => refusal(() => step(other))[0]));
    expect(new Set(refused)).toEqual(new Set(['forbidden']));

    acts().save(first, id, NEWSROOM);
    acts().propose(first, id);
    const shown = getStyle(second, id, desk.ctx()).hash;
    write(desk.db, (tx) => replaceRoles(tx, second.personId, ['reporter']));
    expect(refusal(() => putStyleInForce(second, { id, hash: shown }, desk.ctx()))[0]).toBe('forbidden');
  });

  it('is written by its author alone', () => {
    const id = acts().start(first);
    const why = 'This draft is another editor’s. Only they change it.';
    expect(refusal(() => acts().save(second, id, NEWSROOM))).toEqual(['forbidden', why]);
    expect(refusal(() => acts().propose(second, id))).toEqual(['forbidden', why]);
    const { version } = getStyle(second, id, desk.ctx());
    expect(refusal(() => withdrawStyle(second, { id, version }, desk.ctx()))[0]).toBe('forbidden');
  });

  it('is not there for readers until it is in force', () => {
    const id = acts().start(first);
    expect(refusal(() => getStyle(reporter, id, desk.ctx()))).toEqual([
      'not-found',
      'There is no such version.',
    ]);
    expect(listStyles(reporter, desk.ctx()).open).toEqual([]);
  });
});

describe('the state of a version', () => {
  it('allows no change once it is proposed, and no agreement before', () => {
    const id = acts().start(first);
    acts().save(first, id, NEWSROOM);
    const hash = '1'.repeat(64);
    expect(refusal(() => putStyleInForce(second, { id, hash }, desk.ctx()))[0]).toBe('conflict');
    acts().propose(first, id);
    expect(refusal(() => acts().save(first, id, NEWSROOM))[0]).toBe('conflict');
    expect(refusal(() => acts().propose(first, id))[0]).toBe('conflict');
    const forge = () =>
      desk.db.$client.prepare(`UPDATE style_versions SET note = 'x' WHERE public_id = ?`).run(id);
    expect(forge).toThrow('a version changes only while it is a draft');
  });

  it('comes into force once: a replay of the second agreement is refused', () => {
    const id = acts().start(first);
    acts().save(first, id, NEWSROOM);
    const hash = acts().propose(first, id);
    putStyleInForce(second, { id, hash }, desk.ctx());
    expect(refusal(() => putStyleInForce(second, { id, hash }, desk.ctx()))[0]).toBe('conflict');
    expect(listStyles(first, desk.ctx()).versions).toHaveLength(2);
  });

  it('binds the second agreement to what was on the screen', () => {
    const id = acts().start(first);
    acts().save(first, id, NEWSROOM);
    const old = acts().propose(first, id);
    sendStyleBack(second, { id, hash: old, comment: 'Another name, please.' }, desk.ctx());
    acts().save(first, id, { 'style.newsroom': 'our newsroom' });
    acts().propose(first, id);
    expect(refusal(() => putStyleInForce(second, { id, hash: old }, desk.ctx()))).toEqual([
      'conflict',
      'Somebody changed this version meanwhile. Reload the page and look again; nothing was done.',
    ]);
    expect(readDeskSettings(desk.db).houseStyle.body.newsroom).toBe('our desk');
  });

  it('goes back to its author with the reason', () => {
    const id = acts().start(first);
    acts().save(first, id, NEWSROOM);
    const hash = acts().propose(first, id);
    sendStyleBack(second, { id, hash, comment: 'Another name, please.' }, desk.ctx());
    const view = getStyle(first, id, desk.ctx());
    expect(view).toMatchObject({ state: 'draft', hash: null, may: { write: true } });
    expect(view.acts[0]).toMatchObject({
      act: 'sent-back',
      person: 'Tobin Vale',
      comment: 'Another name, please.',
    });
  });

  it('is proposed by one editor at a time', () => {
    const [mine, theirs] = [acts().start(first), acts().start(second)];
    acts().save(first, mine, NEWSROOM);
    acts().save(second, theirs, { 'style.percent': 'word' });
    acts().propose(first, mine);
    expect(refusal(() => acts().propose(second, theirs))[0]).toBe('conflict');
  });

  it('is brought up to date when another came into force first, keeping both editors’ decisions', () => {
    const [mine, theirs] = [acts().start(first), acts().start(second)];
    acts().save(first, mine, NEWSROOM);
    acts().save(second, theirs, { 'style.percent': 'word' });
    acts().propose(first, mine);
    acts().putInForce(second, mine);
    expect(refusal(() => acts().propose(second, theirs))[1]).toMatch(/Bring the draft up to date first/);
    const { version } = getStyle(second, theirs, desk.ctx());
    expect(bringUpToDate(second, { id: theirs, version }, desk.ctx()).contested).toEqual([]);
    acts().propose(second, theirs);
    acts().putInForce(first, theirs);
    const { body } = readDeskSettings(desk.db).houseStyle;
    expect([body.newsroom, body.percent]).toEqual(['the Courier', 'word']);
  });

  it('that changes nothing is not proposed', () => {
    const id = acts().start(first);
    expect(refusal(() => acts().propose(first, id))).toEqual([
      'conflict',
      'This draft changes nothing of what is in force.',
    ]);
  });

  it('is one draft per editor, however often it is started', () => {
    expect(acts().start(first)).toBe(acts().start(first));
    expect(acts().start(second)).not.toBe(acts().start(first));
  });

  it('is withdrawn for good', () => {
    const id = acts().start(first);
    const { version } = getStyle(first, id, desk.ctx());
    withdrawStyle(first, { id, version }, desk.ctx());
    expect(getStyle(first, id, desk.ctx()).state).toBe('withdrawn');
    expect(refusal(() => acts().save(first, id, NEWSROOM))[0]).toBe('conflict');
  });

  it('refuses a save on top of one that this page has not seen', () => {
    const id = acts().start(first);
    const { version } = getStyle(first, id, desk.ctx());
    acts().save(first, id, NEWSROOM);
    const late = { id, version, changes: [{ path: 'style.newsroom', value: 'another name' }] };
    expect(refusal(() => saveStyleDraft(first, late, desk.ctx()))[0]).toBe('conflict');
    expect(getStyle(first, id, desk.ctx()).body.style.newsroom).toBe('the Courier');
  });
});

describe('two editors at once', () => {
  let shared: TestDatabase;
  beforeAll(() => {
    shared = freshDatabase();
  });
  afterAll(() => shared.closeAndRemove());

  it('put two proposals in force one after the other, never both', () => {
    const one = makePerson(shared.db, { name: 'Ines Marr', roles: ['editor'] });
    const other = makePerson(shared.db, { name: 'Tobin Vale', roles: ['editor'] });
    const third = makePerson(shared.db, { name: 'Edda Lorne', roles: ['editor'] });
    const own = styleDesk(shared.db);
    const id = own.start(one);
    own.save(one, id, NEWSROOM);
    const hash = own.propose(one, id);
    const results = [other, third].map((actor) => {
      try {
        return putStyleInForce(actor, { id, hash }, shared.ctx()).number;
      } catch (error) {
        return (error as { code?: string }).code;
      }
    });
    expect(results).toEqual([2, 'conflict']);
  });
});
