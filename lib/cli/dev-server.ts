import { spawn } from 'node:child_process';
import { localBinary } from './process.mjs';
import { announce, prepareDesk, readSettings } from './prepare';
import { onStop } from './stop';
import { startJobs, superviseJobs } from './supervise';

/** `npm run dev` ends here: the same data folder, under Next's own server. There is no front. */
async function develop(): Promise<void> {
  const env = readSettings();
  const desk = await prepareDesk(env, process.argv.slice(2));
  desk.db.$client.close();

  const jobs = superviseJobs({ start: startJobs });
  const child = spawn(localBinary('next'), ['dev', '--port', String(env.PORT)], { stdio: 'inherit' });
  onStop(async () => {
    child.kill('SIGTERM');
  });
  child.once('spawn', () => announce(desk));
  child.once('exit', (code) => {
    void jobs.stop().then(() => {
      desk.data.release();
      process.exit(code ?? 0);
    });
  });
}

develop().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
