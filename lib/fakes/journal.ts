import { closeSync, existsSync, fsyncSync, mkdirSync, openSync, readFileSync, writeSync } from 'node:fs';
import { join } from 'node:path';

export type Journal<Entry> = { append: (entry: Entry) => void; read: () => Entry[] };

/** What a stand-in was sent, one JSON line each, on disk before it answers; read anew, since two processes write. */
export function openJournal<Entry>(dataFolder: string, name: string): Journal<Entry> {
  const folder = join(dataFolder, 'fakes');
  const file = join(folder, `${name}.jsonl`);
  return {
    append(entry) {
      mkdirSync(folder, { recursive: true, mode: 0o700 });
      const handle = openSync(file, 'a', 0o600);
      try {
        writeSync(handle, `${JSON.stringify(entry)}\n`);
        fsyncSync(handle);
      } finally {
        closeSync(handle);
      }
    },
    read() {
      if (!existsSync(file)) return [];
      const lines = readFileSync(file, 'utf8').split('\n');
      // A line that a crash cut short was never answered.
      return lines.slice(0, -1).map((line) => JSON.parse(line) as Entry);
    },
  };
}
