import type { Server } from 'node:http';

const patienceMs = 4000;

/** Takes no new request, lets those in hand finish, and cuts what has not finished after four seconds. */
export function closeServer(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const idle = setInterval(() => server.closeIdleConnections(), 50);
    const late = setTimeout(() => server.closeAllConnections(), patienceMs);
    server.close(() => {
      clearInterval(idle);
      clearTimeout(late);
      resolve();
    });
  });
}

/** Runs once, at the first of the signals that ask a process to stop. */
export function onStop(stop: () => Promise<void>): void {
  let stopping = false;
  const handler = () => {
    if (stopping) return;
    stopping = true;
    void stop();
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, handler);
}
