import { type ChildProcess, spawn } from 'node:child_process';
import { afterEach, describe, expect, it } from 'vitest';
import { type Supervised, superviseJobs } from '@/lib/cli/supervise';

const started: ChildProcess[] = [];
let supervised: Supervised | null = null;
afterEach(async () => {
  await supervised?.stop();
  started.length = 0;
});

const child = (code: string) => () => {
  const next = spawn(process.execPath, ['-e', code], { stdio: ['ignore', 'pipe', 'ignore'] });
  started.push(next);
  return next;
};
const WAITS = 'process.stdout.write("up"); setInterval(() => 0, 1000)';
const isUp = (at: number) =>
  expect.poll(() => started[at]?.stdout?.readableLength ?? 0, { timeout: 15_000 }).toBeGreaterThan(0);

describe('the process that runs jobs', () => {
  it('is started again when it is killed', async () => {
    supervised = superviseJobs({ start: child(WAITS), firstWaitMs: 10 });
    await isUp(0);
    started[0]!.kill('SIGKILL');
    await isUp(1);
    expect(started[1]!.pid).not.toBe(started[0]!.pid);
  });

  it('is started later each time it ends at once', async () => {
    supervised = superviseJobs({ start: child(''), firstWaitMs: 200, longestWaitMs: 60_000 });
    const startedAt = performance.now();
    await expect.poll(() => started.length, { timeout: 15_000 }).toBe(3);
    expect(performance.now() - startedAt).toBeGreaterThanOrEqual(200 + 400);
  });

  it('is asked to stop, and not started again', async () => {
    supervised = superviseJobs({ start: child(WAITS), firstWaitMs: 10 });
    await isUp(0);
    await supervised.stop();
    expect(started[0]!.signalCode).toBe('SIGTERM');
    await new Promise((resolve) => setTimeout(resolve, 100));
    expect(started).toHaveLength(1);
    await supervised.stop();
  });

  it('is killed where it does not stop in time', async () => {
    supervised = superviseJobs({ start: child(`process.on("SIGTERM", () => 0);${WAITS}`), patienceMs: 50 });
    await isUp(0);
    await supervised.stop();
    expect(started[0]!.signalCode).toBe('SIGKILL');
  });
});
