import { createServer } from 'node:http';
import next from 'next';
import { answerEmbed } from '@/lib/services/embed/answer';
import { trustProxies } from './forwarded';
import { createFront } from './front';
import { announce, prepareDesk, readSettings } from './prepare';
import { closeServer, onStop } from './stop';
import { startJobs, superviseJobs } from './supervise';

/** `npm run up` ends here: the front, with Next behind it, over one data folder. */
async function serve(): Promise<void> {
  const env = readSettings();
  const isTrusted = trustProxies(env.LEADLINE_TRUST_PROXY);
  const desk = await prepareDesk(env, process.argv.slice(2));

  const server = createServer({ requestTimeout: 60_000, keepAliveTimeout: 10_000 });
  const app = next({
    dev: false,
    dir: process.cwd(),
    hostname: 'localhost',
    port: env.PORT,
    httpServer: server,
  });
  const jobs = superviseJobs({ start: startJobs });
  const leave = async (status: number) => {
    await jobs.stop();
    await app.close();
    desk.db.$client.close();
    desk.data.release();
    process.exit(status);
  };
  onStop(async () => {
    await Promise.all([closeServer(server), jobs.stop()]);
    await leave(0);
  });

  await app.prepare();
  const handle = app.getRequestHandler();
  const front = createFront({ origin: new URL(env.LEADLINE_ORIGIN), isTrusted, answerEmbed, next: handle });
  server.on('request', front);
  server.once('error', (error) => {
    process.stderr.write(`Leadline cannot listen on port ${env.PORT}: ${error.message}\n`);
    void leave(1);
  });
  server.listen(env.PORT, env.LEADLINE_HOST, () => announce(desk));
}

serve().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
