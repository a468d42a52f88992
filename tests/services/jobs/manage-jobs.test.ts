import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { findJobByKey } from '@/db/queries/jobs';
import { replaceRoles } from '@/db/queries/person';
import { findLastRecord } from '@/db/queries/record';
import { write } from '@/db/write';
import { claimDue, fail, saveStep } from '@/lib/services/jobs/claim';
import { enqueueIn } from '@/lib/services/jobs/enqueue';
import { enterJobProcess } from '@/lib/services/jobs/job-process';
import { listJobs } from '@/lib/services/jobs/list-jobs';
import { cancelJob, retryJob } from '@/lib/services/jobs/manage-jobs';
import { freshDatabase, HOUR, makePerson, NOW } from '@/tests/support/database';
import { refusal } from '@/tests/support/refusal';
import { logRelease } from '@/tests/support/release';
import { findReleaseRow } from '@/db/queries/job-subjects';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const administrator = makePerson(desk.db, { name: 'Ada Fenn', roles: ['administrator'] });
const editor = makePerson(desk.db, { name: 'Edda Marsh', roles: ['editor', 'reporter', 'copy-desk'] });
const both = makePerson(desk.db, { name: 'Bela Tarn', roles: ['administrator', 'reporter'] });
const releaseId = logRelease(desk.db, both, {
  embargo: { local: '2026-09-17T18:00', zone: 'Etc/UTC' },
});

let key = '';
let count = 0;
beforeEach(() => {
  key = `job ${(count += 1)}`;
  write(desk.db, (tx) =>
    enqueueIn(
      tx,
      {
        kind: 'shelf-ended',
        payload: { sheet: 's', clearing: key, endedOn: '2026-09-17' },
        idempotencyKey: key,
      },
      NOW,
    ),
  );
});
const job = () => findJobByKey(desk.db, key)!;
const id = () => job().publicId;
const claim = () => claimDue(desk.ctx(), ['shelf-ended'])!;
const kill = () => fail(desk.ctx(), claim(), 'the cache answered 500', true);
const drain = () => {
  for (let held = claimDue(desk.ctx(), ['shelf-ended']); held; held = claimDue(desk.ctx(), ['shelf-ended']))
    saveStep(desk.ctx(), held, () => ({ cursor: null }));
};

describe('deciding about a job', () => {
  it.each([
    ['cancel', cancelJob],
    ['try again', retryJob],
  ] as const)('is an administrator’s alone: %s', (_, decide) => {
    expect(refusal(() => decide(editor, { id: id() }, desk.ctx()))[0]).toBe('forbidden');
    expect(job().state).toBe('waiting');
    drain();
  });

  it('counts roles at the moment of the act', () => {
    const former = makePerson(desk.db, { name: 'Odo Finch', roles: ['administrator'] });
    write(desk.db, (tx) => replaceRoles(tx, former.personId, ['reporter']));
    expect(refusal(() => cancelJob(former, { id: id() }, desk.ctx()))[0]).toBe('forbidden');
    expect(job().state).toBe('waiting');
    drain();
  });

  it('refuses what it does not know', () => {
    expect(refusal(() => cancelJob(administrator, { id: 'nothing' }, desk.ctx()))[0]).toBe('not-found');
    expect(refusal(() => retryJob(administrator, { id: id(), now: true }, desk.ctx()))[0]).toBe('invalid');
    drain();
  });

  it('cancels one that waits, and the history says who did', () => {
    expect(cancelJob(administrator, { id: id() }, desk.ctx())).toEqual({ state: 'cancelled' });
    expect(job()).toMatchObject({
      state: 'cancelled',
      endedAt: NOW,
      cancelRequestedBy: administrator.personId,
    });
    expect(claimDue(desk.ctx(), ['shelf-ended'])).toBeNull();
    expect(findLastRecord(desk.db)).toMatchObject({
      action: 'cancelled job',
      entity: 'job',
      entityId: id(),
      personId: administrator.personId,
      before: '{"state":"waiting"}',
      after: '{"kind":"shelf-ended","state":"cancelled"}',
    });
    expect(refusal(() => cancelJob(administrator, { id: id() }, desk.ctx()))[0]).toBe('conflict');
  });

  it('lets one that runs finish its step, and goes no further', () => {
    const held = claim();
    expect(cancelJob(administrator, { id: id() }, desk.ctx())).toEqual({ state: 'running' });
    expect(refusal(() => cancelJob(administrator, { id: id() }, desk.ctx()))[0]).toBe('conflict');
    const progress = { done: 5, total: 9, note: null };
    expect(saveStep(desk.ctx(), held, () => ({ cursor: 5, progress }))).toBeNull();
    expect(job()).toMatchObject({ state: 'cancelled', progressDone: 5 });
    retryJob(administrator, { id: id() }, desk.ctx());
    expect(job()).toMatchObject({ state: 'waiting', cursor: '5', cancelRequestedAt: null });
    drain();
  });

  it('calls one done that finished in the step in which it was cancelled', () => {
    const held = claim();
    cancelJob(administrator, { id: id() }, desk.ctx());
    saveStep(desk.ctx(), held, () => ({ cursor: null }));
    expect(job().state).toBe('done');
  });

  it('tries again only what was given up or cancelled, once', () => {
    expect(refusal(() => retryJob(administrator, { id: id() }, desk.ctx()))[0]).toBe('conflict');
    kill();
    retryJob(administrator, { id: id() }, desk.ctx(HOUR));
    expect(job()).toMatchObject({ state: 'waiting', attempts: 0, runAt: NOW + HOUR });
    expect(refusal(() => retryJob(both, { id: id() }, desk.ctx(HOUR)))[0]).toBe('conflict');
    expect(findLastRecord(desk.db)?.action).toBe('tried job again');
    cancelJob(administrator, { id: id() }, desk.ctx());
  });
});

describe('the list of jobs', () => {
  it('is open to administrators alone', () => {
    expect(refusal(() => listJobs(editor, desk.ctx()))[0]).toBe('forbidden');
    drain();
  });

  it('shows what waits, was given up and ended, with who asked', () => {
    kill();
    const { dead, nDead, ended, process } = listJobs(administrator, desk.ctx());
    expect(dead[0]).toMatchObject({ kind: 'shelf-ended', error: 'the cache answered 500', attempts: 1 });
    expect(nDead).toBe(1);
    expect(ended.every(({ state }) => state === 'done' || state === 'cancelled')).toBe(true);
    expect(process).toEqual({ state: 'never-started', beatAt: null, startedAt: null });
  });

  it('says since when the process is silent', () => {
    enterJobProcess(desk.ctx(), 5, () => false);
    expect(listJobs(administrator, desk.ctx(1000)).process.state).toBe('answering');
    expect(listJobs(administrator, desk.ctx(HOUR)).process).toMatchObject({ state: 'silent', beatAt: NOW });
    drain();
  });

  it('keeps from an administrator whose poll a job under embargo is about, until the hour', () => {
    const embargoJob = (actor: typeof administrator, later: number) =>
      listJobs(actor, desk.ctx(later)).waiting.find(({ kind }) => kind === 'embargo-ended');
    expect(findReleaseRow(desk.db, releaseId)?.embargoAt).toBe(NOW + 10 * HOUR);
    expect(embargoJob(administrator, 0)).toMatchObject({ about: null, isHidden: true, error: null });
    expect(embargoJob(both, 0)?.about).toBe('Averil Coast governor, Kelmouth Research');
    expect(embargoJob(administrator, 10 * HOUR)).toMatchObject({
      about: 'Averil Coast governor, Kelmouth Research',
      isHidden: false,
    });
    drain();
  });
});
