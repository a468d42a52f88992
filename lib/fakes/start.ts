import { setupServer, type SetupServer } from 'msw/node';
import { fakeBucket } from './bucket';
import { purgeReceiver } from './purge-receiver';

const kept = globalThis as typeof globalThis & { leadlineFakes?: SetupServer };

/** Answers, inside this process, for hosted services that a demo has no account with; everything else goes out. */
export function startFakes(dataFolder: string): SetupServer {
  kept.leadlineFakes ??= listening(dataFolder);
  return kept.leadlineFakes;
}

export function stopFakes(): void {
  kept.leadlineFakes?.close();
  delete kept.leadlineFakes;
}

function listening(dataFolder: string): SetupServer {
  const server = setupServer(purgeReceiver(dataFolder), ...fakeBucket(dataFolder));
  server.listen({ onUnhandledRequest: 'bypass' });
  return server;
}
