import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Database from 'better-sqlite3';
import { serveArguments } from '../../lib/cli/serve-arguments.mjs';

export const PASSWORD = 'soundings in forty fathoms';

/** A folder that a server of a test's own keeps its data in. */
export function temporaryFolder(): { folder: string; remove: () => void } {
  const folder = mkdtempSync(join(tmpdir(), 'leadline-'));
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
}

export type OwnServer = {
  origin: string;
  /** What it has printed. */
  printed: () => string;
  /** Ends it and waits until it is gone; gives its exit status. */
  end: (signal: NodeJS.Signals) => Promise<number | null>;
};

/** The built app on a port and data folder of its own; ready when its health says so. */
export async function startServer(port: number, folder: string, args: string[] = []): Promise<OwnServer> {
  const origin = `http://localhost:${port}`;
  const child: ChildProcess = spawn(process.execPath, serveArguments(args), {
    env: {
      ...process.env,
      NODE_ENV: 'production',
      PORT: String(port),
      LEADLINE_ORIGIN: origin,
      LEADLINE_DATA: folder,
      DEMO_PASSWORD: PASSWORD,
      LEADLINE_FAKES: '1',
      NODE_OPTIONS: '',
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let printed = '';
  child.stdout!.on('data', (chunk: Buffer) => (printed += chunk.toString()));
  child.stderr!.on('data', (chunk: Buffer) => (printed += chunk.toString()));
  const gone = new Promise<number | null>((resolve) => child.once('exit', (status) => resolve(status)));
  const server = {
    origin,
    printed: () => printed,
    end: (signal: NodeJS.Signals) => {
      child.kill(signal);
      return gone;
    },
  };
  const deadline = Date.now() + 90_000;
  while (Date.now() < deadline && child.exitCode === null) {
    const health = await fetch(`${origin}/api/health`).catch(() => null);
    if (health?.ok) return server;
    await new Promise((resolve) => setTimeout(resolve, 150));
  }
  child.kill('SIGKILL');
  throw new Error(`the server did not get ready:\n${printed}`);
}

/** A session without a browser: the cookie of somebody who signed in. */
export async function signInByFetch(origin: string, email: string, password = PASSWORD): Promise<string> {
  const jar = new Map<string, string>();
  const keep = (response: Response) => {
    for (const line of response.headers.getSetCookie()) {
      const [pair] = line.split(';');
      const at = pair!.indexOf('=');
      jar.set(pair!.slice(0, at), pair!.slice(at + 1));
    }
    return response;
  };
  const cookie = () => [...jar].map(([name, value]) => `${name}=${value}`).join('; ');
  const csrf = keep(await fetch(`${origin}/api/auth/csrf`));
  const { csrfToken } = (await csrf.json()) as { csrfToken: string };
  keep(
    await fetch(`${origin}/api/auth/callback/credentials`, {
      method: 'POST',
      redirect: 'manual',
      headers: { 'Content-Type': 'application/x-www-form-urlencoded', Cookie: cookie() },
      body: new URLSearchParams({ csrfToken, email, password, json: 'true' }),
    }),
  );
  if (![...jar.keys()].some((name) => name.endsWith('session-token')))
    throw new Error(`${email} could not sign in`);
  return cookie();
}

/** Reads a database beside the server, or after it. */
export function readDatabase<T>(folder: string, read: (db: Database.Database) => T): T {
  const db = new Database(join(folder, 'leadline.db'), { readonly: true });
  try {
    return read(db);
  } finally {
    db.close();
  }
}
