import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { insertPolicy } from '@/db/queries/desk';
import { findJobByKey } from '@/db/queries/jobs';
import { findLatestPolicy } from '@/db/queries/desk';
import { write } from '@/db/write';
import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { claimDue, LEASE_MS } from '@/lib/services/jobs/claim';
import { enqueueRecomputeIn } from '@/lib/services/jobs/enqueue-recompute';
import { ensureJobs } from '@/lib/services/jobs/ensure-jobs';
import { runStep } from '@/lib/services/jobs/run-step';
import { getRelease } from '@/lib/services/release/get-release';
import { listReleases } from '@/lib/services/release/list-releases';
import { freshDatabase, makePerson, NOW } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { runDueJobs } from '@/tests/support/run-jobs';

const desk = freshDatabase();
afterAll(desk.closeAndRemove);
const reporter = makePerson(desk.db, { name: 'Rolf Quill', roles: ['reporter'] });
const KINDS = ['recompute-findings'] as const;
const N = 30;

beforeAll(() => {
  const first = logRelease(desk.db, reporter);
  const race = { kind: 'existing' as const, id: getRelease(reporter, first, desk.ctx()).facts.race.id };
  for (let at = 1; at < N; at += 1) logRelease(desk.db, reporter, { race, pollster: `House ${at}` });
});

/** Another policy with the same rules: every mark belongs to the one before. */
const newPolicy = () =>
  write(desk.db, (tx) => {
    const id = insertPolicy(tx, findLatestPolicy(tx)!.body, NOW);
    enqueueRecomputeIn(tx, NOW, reporter.personId);
    return `recompute-findings:${id}:${ENGINE_VERSION}`;
  });
const nOutdated = () => listReleases(reporter, desk.ctx()).filter((row) => row.isBeingRecomputed).length;
const step = async (later: number) => {
  const claim = claimDue(desk.ctx(later), KINDS)!;
  return runStep(
    desk.db,
    () => NOW + later,
    claim,
    (error) => {
      throw error;
    },
  );
};

describe('findings under a new policy', () => {
  it('are computed in batches, newest first, and a crash resumes after the last batch', async () => {
    const key = newPolicy();
    expect(nOutdated()).toBe(N);
    expect(listReleases(reporter, desk.ctx()).every(({ verdicts }) => verdicts.length === 0)).toBe(true);
    await step(0);
    expect(findJobByKey(desk.db, key)).toMatchObject({
      state: 'running',
      progressDone: 25,
      progressTotal: N,
      askedBy: reporter.personId,
    });
    const marked = listReleases(reporter, desk.ctx()).map((row) => !row.isBeingRecomputed);
    expect(marked).toEqual(Array.from({ length: N }, (_, at) => at < 25));
    await step(LEASE_MS);
    expect(nOutdated()).toBe(0);
    expect(findJobByKey(desk.db, key)).toMatchObject({ state: 'done', progressDone: N, progressTotal: N });
  });

  it('stop where a newer policy took over, whose own job does all of them', async () => {
    const older = newPolicy();
    await step(0);
    const newer = newPolicy();
    expect(await runDueJobs(desk.db, NOW + LEASE_MS, KINDS)).toEqual([]);
    expect(findJobByKey(desk.db, older)).toMatchObject({
      state: 'done',
      progressNote: 'A newer one took over.',
    });
    expect(findJobByKey(desk.db, newer)).toMatchObject({ state: 'done', progressDone: N });
    expect(nOutdated()).toBe(0);
  });

  it('are promised at a start that finds marks of an earlier engine or policy, and only then', () => {
    const count = () => claimDue(desk.ctx(), KINDS);
    ensureJobs(desk.ctx());
    expect(count()).toBeNull();
    write(desk.db, (tx) => insertPolicy(tx, findLatestPolicy(tx)!.body, NOW));
    ensureJobs(desk.ctx());
    ensureJobs(desk.ctx());
    expect(count()?.job.kind).toBe('recompute-findings');
    expect(count()).toBeNull();
  });
});
