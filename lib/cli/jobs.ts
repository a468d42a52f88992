import { databaseFile, openDatabase } from '@/db/client';
import { readEnv } from '@/lib/env';
import { beat, enterJobProcess } from '@/lib/services/jobs/job-process';
import { runLanes } from '@/lib/services/jobs/run-lanes';
import { isRunning } from './lock';

const BEAT_MS = 3000;

/**
 * The process that runs jobs, on a connection of its own. Asked to stop, or when its parent is gone, it finishes the
 * step in hand and ends; killed, it leaves its jobs to the next one.
 */
async function main(): Promise<void> {
  const env = readEnv();
  const stop = new AbortController();
  for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP'] as const) process.on(signal, () => stop.abort());
  process.on('disconnect', () => stop.abort());
  if (env.LEADLINE_FAKES) (await import('@/lib/fakes/start')).startFakes(env.LEADLINE_DATA);

  const db = openDatabase(databaseFile(env.LEADLINE_DATA));
  const clock = () => Date.now();
  enterJobProcess({ db, now: clock() }, process.pid, isRunning);
  const lanes = runLanes({ db, clock, stop: stop.signal, onFault });
  const beating = setInterval(() => {
    try {
      beat({ db, now: clock() }, process.pid);
      lanes.renewLeases();
    } catch (error) {
      onFault(error);
    }
  }, BEAT_MS);
  await lanes.ended;
  clearInterval(beating);
  db.$client.close();
  process.exit(0);
}

function onFault(error: unknown): void {
  process.stderr.write(`jobs: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
}

main().catch((error: unknown) => {
  onFault(error);
  process.exit(1);
});
