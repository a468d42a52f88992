import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';

/** An invented newspaper's article on an origin of its own, with one chart in a frame and a strict policy. */
export async function serveArticle(embedUrl: string): Promise<{ url: string; close: () => Promise<void> }> {
  const page = `<!doctype html><html lang="en"><title>The Averil Courier</title>
    <h1>A quiet week on the coast</h1>
    <iframe title="Chart" src="${embedUrl}" width="680" height="900"></iframe>`;
  const server = createServer((_request, response) => {
    response.writeHead(200, {
      'Content-Type': 'text/html; charset=utf-8',
      'Content-Security-Policy': `default-src 'none'; frame-src ${new URL(embedUrl).origin}`,
    });
    response.end(page);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  return {
    url: `http://127.0.0.1:${port}/`,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
