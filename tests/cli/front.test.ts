import { createServer, request as send, type IncomingHttpHeaders, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { trustProxies } from '@/lib/cli/forwarded';
import { createFront, type FrontOptions } from '@/lib/cli/front';

let server: Server | undefined;
afterEach(() => {
  server?.closeAllConnections();
  server?.close();
  server = undefined;
});

type Answer = { status: number; headers: IncomingHttpHeaders; body: string };

async function start(options: Partial<FrontOptions> = {}): Promise<number> {
  const listening = createServer(
    createFront({
      origin: new URL('http://localhost:3000'),
      isTrusted: trustProxies([]),
      answerEmbed: ({ path }) => ({ status: 200, headers: { ETag: '"1"' }, body: `chart of ${path}` }),
      next: (request, response) => response.end(JSON.stringify(request.headers)),
      ...options,
    }),
  );
  server = listening;
  await new Promise<void>((resolve) => listening.listen(0, '127.0.0.1', resolve));
  return (listening.address() as AddressInfo).port;
}

function ask(port: number, path: string, method = 'GET', headers = {}): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const outgoing = send({ host: '127.0.0.1', port, path, method, headers }, (response) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () =>
        resolve({
          status: response.statusCode ?? 0,
          headers: response.headers,
          body: Buffer.concat(parts).toString(),
        }),
      );
    });
    outgoing.on('error', reject);
    outgoing.end();
  });
}

describe('the front', () => {
  it('answers public charts itself', async () => {
    const next = vi.fn();
    const port = await start({ next });
    const answer = await ask(port, '/embed/abc/chart.svg?theme=night');
    expect(answer).toMatchObject({ status: 200, body: 'chart of /embed/abc/chart.svg' });
    expect(answer.headers['content-length']).toBe('29');
    expect((await ask(port, '/oembed?url=x')).status).toBe(200);
    expect(next).not.toHaveBeenCalled();
  });

  it('hands everything else on, also an address that only begins alike', async () => {
    const answerEmbed = vi.fn();
    const port = await start({ answerEmbed });
    for (const path of ['/', '/embeds', '/embed', '/oembedded', '//embed/abc']) {
      expect((await ask(port, path)).status).toBe(200);
    }
    expect(answerEmbed).not.toHaveBeenCalled();
  });

  it('gives the chart’s question and headers to whoever answers it', async () => {
    const answerEmbed = vi.fn<FrontOptions['answerEmbed']>(() => ({ status: 304, headers: {}, body: null }));
    const port = await start({ answerEmbed });
    const answer = await ask(port, '/embed/abc?width=640', 'GET', { 'If-None-Match': '"1"' });
    expect(answer).toMatchObject({ status: 304, body: '' });
    const [asked] = answerEmbed.mock.calls[0]!;
    expect(asked.query.get('width')).toBe('640');
    expect(asked.headers['if-none-match']).toBe('"1"');
  });

  it('answers HEAD with the length and no body', async () => {
    const answer = await ask(await start(), '/embed/abc', 'HEAD');
    expect(answer.body).toBe('');
    expect(answer.headers['content-length']).toBe('19');
  });

  it('takes only reading from the public', async () => {
    const answer = await ask(await start(), '/embed/abc', 'POST');
    expect(answer.status).toBe(405);
    expect(answer.headers.allow).toBe('GET, HEAD');
  });

  it('refuses methods nobody here answers', async () => {
    const next = vi.fn();
    expect((await ask(await start({ next }), '/', 'TRACE')).status).toBe(405);
    expect(next).not.toHaveBeenCalled();
  });

  it('shows Next the desk’s own address, whatever the client called it', async () => {
    const answer = await ask(await start(), '/', 'GET', { Host: 'evil.example', 'X-Nonce': 'known' });
    expect(JSON.parse(answer.body)).toMatchObject({
      host: 'localhost:3000',
      'x-forwarded-host': 'localhost:3000',
      'x-forwarded-for': '127.0.0.1',
    });
    expect(answer.body).not.toContain('known');
  });

  it('asks browsers to stay on https only where the desk is on https', async () => {
    const plain = await ask(await start(), '/');
    expect(plain.headers['strict-transport-security']).toBeUndefined();
    server?.close();
    const secure = await ask(await start({ origin: new URL('https://polls.courier.example') }), '/');
    expect(secure.headers['strict-transport-security']).toContain('max-age=31536000');
  });

  it('shows a fixed sentence when something breaks and keeps the cause to the log', async () => {
    const log = vi.spyOn(process.stderr, 'write').mockReturnValue(true);
    const port = await start({
      answerEmbed: () => {
        throw new Error('the cable parted');
      },
    });
    const answer = await ask(port, '/embed/abc');
    expect(answer).toMatchObject({ status: 500, body: 'Something went wrong here. It has been noted.' });
    expect(answer.headers['cache-control']).toBe('no-store');
    expect(String(log.mock.calls[0]?.[0])).toContain('the cable parted');
  });
});
