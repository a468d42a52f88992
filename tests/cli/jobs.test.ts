import { type ChildProcess, fork } from 'node:child_process';
import { createServer, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { findJobByKey } from '@/db/queries/jobs';
import { write } from '@/db/write';
import { enqueueIn } from '@/lib/services/jobs/enqueue';
import { viewJobProcess } from '@/lib/services/jobs/job-process';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { logRelease } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

type Received = { key: string; urls: string[]; response: ServerResponse };

let desk: TestDatabase;
let cache: Server;
let onRequest: (received: Received) => void = () => undefined;
const children: ChildProcess[] = [];

beforeEach(async () => {
  desk = freshDatabase();
  cache = createServer((request, response) => {
    let body = '';
    request.on('data', (chunk: Buffer) => (body += chunk.toString()));
    request.on('end', () => {
      const { urls } = JSON.parse(body) as { urls: string[] };
      onRequest({ key: String(request.headers['idempotency-key']), urls, response });
    });
  });
  await new Promise<void>((resolve) => cache.listen(0, '127.0.0.1', resolve));
  vi.stubEnv('LEADLINE_PURGE_URL', `http://127.0.0.1:${(cache.address() as AddressInfo).port}/purge`);
});
afterEach(async () => {
  for (const child of children.splice(0)) child.kill('SIGKILL');
  await new Promise((resolve) => cache.close(resolve));
  vi.unstubAllEnvs();
  desk.closeAndRemove();
});

function start(): ChildProcess {
  const child = fork('lib/cli/jobs.ts', {
    execArgv: ['--conditions=react-server', '--import', 'tsx'],
    env: { ...process.env, LEADLINE_DATA: desk.folder, NODE_OPTIONS: '' },
    stdio: ['ignore', 'ignore', 'ignore', 'ipc'],
  });
  children.push(child);
  return child;
}
const gone = (child: ChildProcess) =>
  new Promise<number | null>((resolve) => child.once('exit', (code) => resolve(code)));

function embed(): string {
  const reporter = makePerson(desk.db, { name: 'Rolf Quill', roles: ['reporter'] });
  const editor = makePerson(desk.db, { name: 'Edda Marsh', roles: ['editor'] });
  const sheetId = sheetDesk(desk.db).cleared(reporter, editor, logRelease(desk.db, reporter));
  return createEmbed(editor, { sheetId }, desk.ctx()).id;
}

describe('the process that runs jobs', () => {
  it('does a job once as its receiver sees it, however often it is killed between request and answer', async () => {
    const id = embed();
    const accepted = new Map<string, string[]>();
    let requests = 0;
    let child = start();
    const killed: Promise<unknown>[] = [];
    onRequest = ({ key, urls, response }) => {
      requests += 1;
      accepted.set(key, accepted.get(key) ?? urls);
      if (requests > 3) return void response.writeHead(202).end();
      const dead = gone(child).then(() => {
        response.destroy();
        child = start();
      });
      killed.push(dead);
      child.kill('SIGKILL');
    };
    const key = `purge-embeds:embed:${id}:version-1`;
    await expect.poll(() => findJobByKey(desk.db, key)?.state, { timeout: 90_000 }).toBe('done');
    await Promise.all(killed);
    expect(requests).toBe(4);
    expect(accepted.size).toBe(1);
    expect(findJobByKey(desk.db, key)).toMatchObject({ attempts: 1, progressDone: 1 });
  }, 120_000);

  it('finishes the step in hand when it is asked to stop', async () => {
    embed();
    const child = start();
    const asked = new Promise<void>((resolve) => {
      onRequest = ({ response }) => {
        child.kill('SIGTERM');
        setTimeout(() => response.writeHead(202).end(), 300);
        resolve();
      };
    });
    await asked;
    expect(await gone(child)).toBe(0);
    const done = desk.db.$client.prepare(`select state from jobs where kind = 'purge-embeds'`).pluck();
    expect(done.all()).toEqual(['done']);
  }, 60_000);

  it('ends when its parent is gone', async () => {
    const child = start();
    await expect.poll(() => viewJobProcess(desk.db, Date.now()).state, { timeout: 30_000 }).toBe('answering');
    const end = gone(child);
    child.disconnect();
    expect(await end).toBe(0);
  }, 60_000);

  it('gives up what it cannot read, and goes on with the rest', async () => {
    write(desk.db, (tx) => {
      for (const key of ['broken', 'fine'])
        enqueueIn(tx, { kind: 'embargo-ended', payload: { release: key }, idempotencyKey: key }, 1);
    });
    desk.db.$client.prepare(`update jobs set payload = '{}' where idempotency_key = 'broken'`).run();
    start();
    await expect.poll(() => findJobByKey(desk.db, 'fine')?.state, { timeout: 30_000 }).toBe('done');
    expect(findJobByKey(desk.db, 'broken')).toMatchObject({ state: 'dead', attempts: 1 });
  }, 60_000);
});
