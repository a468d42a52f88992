import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findJobByKey, nextRunAt } from '@/db/queries/jobs';
import { listUnsent } from '@/db/queries/outbox';
import { write } from '@/db/write';
import { MAX_ATTEMPTS } from '@/lib/domain/jobs';
import {
  type Claim,
  claimDue,
  fail,
  LEASE_MS,
  LeaseLost,
  putBack,
  renewLease,
  saveStep,
} from '@/lib/services/jobs/claim';
import { enqueueIn } from '@/lib/services/jobs/enqueue';
import { beat, enterJobProcess } from '@/lib/services/jobs/job-process';
import { tellIn } from '@/lib/services/outbox/tell-in';
import { freshDatabase, NOW, type TestDatabase } from '@/tests/support/database';

const KINDS = ['embargo-ended'] as const;
const SECOND = 1000;

let desk: TestDatabase;
beforeEach(() => {
  desk = freshDatabase();
});
afterEach(() => desk.closeAndRemove());

const promise = (key: string, runAt = NOW) =>
  write(desk.db, (tx) =>
    enqueueIn(tx, { kind: 'embargo-ended', payload: { release: key }, idempotencyKey: key, runAt }, NOW),
  );
const job = (key: string) => findJobByKey(desk.db, key)!;
const claim = (later = 0) => claimDue(desk.ctx(later), KINDS);
const finish = (held: Claim, later = 0) => saveStep(desk.ctx(later), held, () => ({ cursor: null }));
const tell = (tx: Parameters<typeof tellIn>[0]) =>
  tellIn(tx, { kind: 'sheet-pulled', entity: 'sheet', entityId: 'x' }, NOW);

describe('promising work', () => {
  it('keeps one job for a key, at the earlier of two times', () => {
    promise('a', NOW + 60 * SECOND);
    promise('a', NOW + 90 * SECOND);
    expect(job('a').runAt).toBe(NOW + 60 * SECOND);
    promise('a', NOW + 30 * SECOND);
    expect(job('a')).toMatchObject({ runAt: NOW + 30 * SECOND, state: 'waiting', attempts: 0 });
  });

  it('repeats nothing that runs or is done', () => {
    promise('a');
    const held = claim()!;
    promise('a');
    expect(job('a').state).toBe('running');
    finish(held);
    promise('a');
    expect(job('a')).toMatchObject({ state: 'done', endedAt: NOW });
    expect(claim()).toBeNull();
  });

  it('is undone with the change that promised it', () => {
    expect(() =>
      write(desk.db, (tx) => {
        enqueueIn(tx, { kind: 'embargo-ended', payload: { release: 'r' }, idempotencyKey: 'r' }, NOW);
        throw new Error('the change failed');
      }),
    ).toThrow('the change failed');
    expect(findJobByKey(desk.db, 'r')).toBeNull();
  });
});

describe('taking work in hand', () => {
  it('takes what is due longest, and nothing before its time', () => {
    promise('later', NOW + 20 * SECOND);
    promise('sooner', NOW + 10 * SECOND);
    expect(claim(9 * SECOND)).toBeNull();
    expect(nextRunAt(desk.db, KINDS)).toBe(NOW + 10 * SECOND);
    expect(claim(30 * SECOND)?.job).toMatchObject({ idempotencyKey: 'sooner', attempts: 1 });
    expect(claim(30 * SECOND)?.job.idempotencyKey).toBe('later');
    expect(claim(30 * SECOND)).toBeNull();
  });

  it('leaves a job to whoever holds it until the lease ends, and then takes it over', () => {
    promise('a');
    const first = claim()!;
    expect(claim(LEASE_MS - 1)).toBeNull();
    expect(renewLease(desk.ctx(LEASE_MS - 1), first)).toBe(true);
    expect(claim(LEASE_MS + 1)).toBeNull();
    const second = claim(2 * LEASE_MS)!;
    expect(second.job).toMatchObject({ idempotencyKey: 'a', attempts: 2 });
    expect(renewLease(desk.ctx(2 * LEASE_MS), first)).toBe(false);
  });

  it('lets a process that lost its job write nothing of it', () => {
    promise('a');
    const first = claim()!;
    const second = claim(LEASE_MS)!;
    const late = () =>
      saveStep(desk.ctx(LEASE_MS), first, (tx) => {
        tell(tx);
        return { cursor: null };
      });
    expect(late).toThrow(LeaseLost);
    expect(() => fail(desk.ctx(LEASE_MS), first, 'late')).toThrow(LeaseLost);
    expect(() => putBack(desk.ctx(LEASE_MS), first)).toThrow(LeaseLost);
    expect(listUnsent(desk.db, 10)).toEqual([]);
    expect(job('a')).toMatchObject({ state: 'running', leaseBy: second.leaseBy, lastError: null });
  });

  it('frees at once what a dead process held, and never what one that lives may hold', () => {
    enterJobProcess(desk.ctx(), 71, () => true);
    promise('a');
    claim();
    enterJobProcess(desk.ctx(), 72, () => true);
    expect(claim(SECOND)).toBeNull();
    enterJobProcess(desk.ctx(), 73, (pid) => pid !== 72);
    expect(claim(SECOND)?.job.idempotencyKey).toBe('a');
    beat(desk.ctx(SECOND), 72);
    expect(claim(2 * SECOND)).toBeNull();
  });
});

describe('a step', () => {
  it('is saved whole: its effects, the cursor and the progress, or nothing', () => {
    promise('a');
    const held = claim()!;
    const broken = () =>
      saveStep(desk.ctx(), held, (tx) => {
        tell(tx);
        throw new Error('half way');
      });
    expect(broken).toThrow('half way');
    expect(listUnsent(desk.db, 10)).toEqual([]);
    expect(job('a')).toMatchObject({ cursor: null, progressDone: 0 });
    const next = saveStep(desk.ctx(), held, (tx) => {
      tell(tx);
      return { cursor: { at: 7 }, progress: { done: 7, total: 9, note: 'on it' } };
    });
    expect(next?.job).toMatchObject({ progressDone: 7, progressTotal: 9, progressNote: 'on it' });
    expect(listUnsent(desk.db, 10).map(({ channel }) => channel)).toEqual(['mail', 'webhook']);
    const resumed = claim(LEASE_MS)!;
    expect(JSON.parse(resumed.job.cursor!)).toEqual({ at: 7 });
  });

  it('that gets further forgets earlier failures', () => {
    promise('a');
    for (let at = 0; at < MAX_ATTEMPTS - 1; at += 1) claim(at * LEASE_MS);
    const held = claim((MAX_ATTEMPTS - 1) * LEASE_MS)!;
    expect(held.job.attempts).toBe(MAX_ATTEMPTS);
    saveStep(desk.ctx((MAX_ATTEMPTS - 1) * LEASE_MS), held, () => ({ cursor: 1 }));
    expect(claim(MAX_ATTEMPTS * LEASE_MS)?.job.attempts).toBe(2);
  });
});

describe('a failure', () => {
  it('is tried again later and later, and given up with its reason after eight times', () => {
    promise('a');
    let now = 0;
    for (let attempt = 1; attempt < MAX_ATTEMPTS; attempt += 1) {
      expect(fail(desk.ctx(now), claim(now)!, `attempt ${attempt}`)).toBe('waiting');
      const { runAt, lastError } = job('a');
      expect(lastError).toBe(`attempt ${attempt}`);
      expect(runAt - NOW - now).toBe(Math.min(5 * SECOND * 4 ** (attempt - 1), 21_600 * SECOND));
      expect(claim(runAt - NOW - 1)).toBeNull();
      now = runAt - NOW;
    }
    expect(fail(desk.ctx(now), claim(now)!, 'the cache answered 500')).toBe('dead');
    expect(job('a')).toMatchObject({
      state: 'dead',
      lastError: 'the cache answered 500',
      endedAt: NOW + now,
    });
    expect(claim(now + 999_999 * SECOND)).toBeNull();
  });

  it('that no repetition helps is given up at once', () => {
    promise('a');
    expect(fail(desk.ctx(), claim()!, 'unreadable', true)).toBe('dead');
  });

  it('of the process itself counts too: a job that kills it each time is given up', () => {
    promise('a');
    for (let at = 0; at < MAX_ATTEMPTS; at += 1) expect(claim(at * LEASE_MS)).not.toBeNull();
    expect(claim(MAX_ATTEMPTS * LEASE_MS)).toBeNull();
    expect(job('a').state).toBe('dead');
    expect(job('a').lastError).toContain('The process ended each time');
  });
});

describe('a process that is asked to stop', () => {
  it('puts its job back without counting the attempt', () => {
    promise('a');
    putBack(desk.ctx(), claim()!);
    expect(job('a')).toMatchObject({ state: 'waiting', attempts: 0, leaseBy: null, leaseUntil: null });
    expect(claim()?.job.attempts).toBe(1);
  });
});
