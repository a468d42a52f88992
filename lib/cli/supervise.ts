import { type ChildProcess, fork } from 'node:child_process';
import { fileURLToPath } from 'node:url';

type Options = {
  start: () => ChildProcess;
  firstWaitMs?: number;
  longestWaitMs?: number;
  /** One that ran for so long starts again without being held back for how often others ended. */
  steadyAfterMs?: number;
  patienceMs?: number;
};

export type Supervised = { stop: () => Promise<void> };

/** The process that runs jobs. It is told of our end by the channel that closes, however we end. */
export function startJobs(): ChildProcess {
  return fork(fileURLToPath(new URL('./jobs.ts', import.meta.url)), {
    execArgv: ['--conditions=react-server', '--import', 'tsx'],
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
}

/** Keeps a child process running: started again whenever it ends, each time later, until it is stopped here. */
export function superviseJobs({
  start,
  firstWaitMs = 500,
  longestWaitMs = 30_000,
  steadyAfterMs = 30_000,
  patienceMs = 4000,
}: Options): Supervised {
  let child: ChildProcess | null = null;
  let gone: Promise<void> = Promise.resolve();
  let again: NodeJS.Timeout | undefined;
  let isStopping = false;
  let waitMs = firstWaitMs;

  const run = () => {
    const startedAt = performance.now();
    const current = start();
    child = current;
    gone = new Promise((resolve) => {
      const end = () => {
        current.removeAllListeners();
        if (child === current) child = null;
        resolve();
        if (isStopping) return;
        if (performance.now() - startedAt >= steadyAfterMs) waitMs = firstWaitMs;
        again = setTimeout(run, waitMs);
        waitMs = Math.min(waitMs * 2, longestWaitMs);
      };
      current.once('exit', end);
      current.once('error', end);
    });
  };
  run();

  return {
    stop: async () => {
      isStopping = true;
      clearTimeout(again);
      const left = child;
      if (!left) return;
      left.kill('SIGTERM');
      const late = setTimeout(() => left.kill('SIGKILL'), patienceMs);
      await gone;
      clearTimeout(late);
    },
  };
}
