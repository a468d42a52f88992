import { type ChildProcess, fork, spawn } from 'node:child_process';
import { afterAll, describe, expect, it, vi } from 'vitest';
import { insertPolicy, findLatestPolicy } from '@/db/queries/desk';
import { databaseFile, openDatabase } from '@/db/client';
import { openJournal } from '@/lib/fakes/journal';
import type { Purged } from '@/lib/fakes/purge-receiver';
import { write } from '@/db/write';
import { enqueueRecomputeIn } from '@/lib/services/jobs/enqueue-recompute';
import { listUnsent } from '@/db/queries/outbox';
import { seeded } from '@/tests/simulation/random';
import { freshDatabase, makePerson } from '@/tests/support/database';
import { checkDesk } from './check-desk';
import { type Told, toldIn } from './told';

/** `npm run test:crash`: CRASH_SEED repeats a run, CRASH_POINTS changes how often it kills. */
const SEED = Number(process.env.CRASH_SEED ?? 20_260_917);
const POINTS = Number(process.env.CRASH_POINTS ?? 20);
const ENTRY = ['--conditions=react-server', '--import', 'tsx'];
/** Killed after so many accepted acts at most, and so many milliseconds on. */
const MOST_ACTS = 20;
const LONGEST_MS = 300;
/** Two processes that compile themselves, on a machine with other work. */
const START_MS = 240_000;

const desk = freshDatabase();
const children: ChildProcess[] = [];
afterAll(async () => {
  const left = children.filter(({ exitCode, signalCode }) => exitCode === null && signalCode === null);
  const dead = left.map(gone);
  for (const child of left) child.kill('SIGKILL');
  await Promise.all(dead);
  desk.closeAndRemove();
});
vi.stubEnv('LEADLINE_FAKES', '1');
const env = { ...process.env, LEADLINE_DATA: desk.folder, NODE_OPTIONS: '' };
const reporter = makePerson(desk.db, { name: 'Rolf Quill', roles: ['reporter'] });
const editor = makePerson(desk.db, { name: 'Edda Marsh', roles: ['editor'] });

const gone = (child: ChildProcess) => new Promise<void>((resolve) => child.once('exit', () => resolve()));
const sleep = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));

function startJobs(): ChildProcess {
  const stdio = ['ignore', 'ignore', 'inherit', 'ipc'] as const;
  const child = fork('lib/cli/jobs.ts', { execArgv: ENTRY, env, stdio: [...stdio] });
  children.push(child);
  return child;
}

function startWriter(round: number): { child: ChildProcess; printed: () => string } {
  const args = [...ENTRY, 'tests/crash/writer.ts', desk.folder, reporter.publicId, editor.publicId];
  const child = spawn(process.execPath, [...args, String(round)], {
    env,
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  children.push(child);
  let printed = '';
  child.stdout.on('data', (chunk: Buffer) => (printed += chunk.toString()));
  return { child, printed: () => printed };
}

const nJobs = (state: string) =>
  desk.db.$client.prepare('select count(*) from jobs where state = ?').pluck().get(state) as number;
const beatAt = () => desk.db.$client.prepare('select beat_at from job_process').pluck().get() as number;

describe('a desk that is killed in the middle of its work', () => {
  it(
    `holds what it accepted and breaks no rule, at ${POINTS} moments of seed ${SEED}`,
    async () => {
      const random = seeded(SEED);
      const accepted: Told[] = [];
      for (let round = 0; round < POINTS; round += 1) {
        const before = beatAt() ?? 0;
        const nActs = 1 + Math.floor(random() * MOST_ACTS);
        write(desk.db, (tx) => {
          insertPolicy(tx, findLatestPolicy(tx)!.body, Date.now());
          enqueueRecomputeIn(tx, Date.now());
        });
        const writer = startWriter(round);
        const jobs = startJobs();
        await expect
          .poll(() => toldIn(writer.printed()).length >= nActs && beatAt() > before, {
            timeout: START_MS,
            interval: 20,
          })
          .toBe(true);
        await sleep(random() * LONGEST_MS);
        const order = random() < 0.5 ? [writer.child, jobs] : [jobs, writer.child];
        const dead = [gone(writer.child), gone(jobs)];
        order[0]!.kill('SIGKILL');
        await sleep(random() * 100);
        order[1]!.kill('SIGKILL');
        await Promise.all(dead);
        accepted.push(...toldIn(writer.printed()));
        await checkDesk(desk.db, desk.folder, accepted, Date.now());
      }
      expect(accepted.length).toBeGreaterThan(POINTS);
      if (POINTS >= 5) expect(new Set(accepted.map(({ act }) => act)).size).toBe(7);
    },
    POINTS * 2 * START_MS,
  );

  it('does afterwards whatever was promised, once', async () => {
    const jobs = startJobs();
    const due = () =>
      desk.db.$client
        .prepare(`select count(*) from jobs where state = 'running' or (state = 'waiting' and run_at <= ?)`)
        .pluck()
        .get(Date.now());
    await expect.poll(due, { timeout: 120_000, interval: 250 }).toBe(0);
    const end = gone(jobs);
    jobs.kill('SIGTERM');
    await end;
    expect(nJobs('dead')).toBe(0);
    const lifted = desk.db.$client
      .prepare('select count(*) from releases where embargo_lifted_at > 0')
      .pluck();
    const toldLifts = listUnsent(desk.db, 100_000).filter(
      ({ kind, channel }) => kind === 'embargo-ended' && channel === 'mail',
    );
    expect(toldLifts).toHaveLength(lifted.get() as number);
    expect(new Set(toldLifts.map(({ entityId }) => entityId)).size).toBe(toldLifts.length);
    const purges = openJournal<Purged>(desk.folder, 'purge').read();
    expect(new Set(purges.map(({ key }) => key)).size).toBe(purges.length);
    expect(purges.length).toBeGreaterThan(0);
    const db = openDatabase(databaseFile(desk.folder));
    await checkDesk(db, desk.folder, [], Date.now());
    db.$client.close();
  }, 180_000);
});
