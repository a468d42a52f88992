import { existsSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { databaseFile, openDatabase } from '@/db/client';
import { readEnv } from '@/lib/env';
import { headFile, readHead } from '@/lib/services/history/head';
import { verifyHistory } from '@/lib/services/history/verify';

/** `npm run record:verify [-- --head SEQ:HASH]`: status 0 when the history is whole, 1 when it is not. */
function main(): number {
  const { values } = parseArgs({ options: { head: { type: 'string', multiple: true } } });
  const file = databaseFile(readEnv().LEADLINE_DATA);
  if (!existsSync(file)) return fail(`there is no database at ${file}`);
  const db = openDatabase(file);
  const kept = headFile(db);
  const heads = (values.head ?? []).map((text) => ({ name: `--head ${text}`, head: parseHead(text) }));
  const onDisk = kept ? readHead(kept) : null;
  if (onDisk) heads.push({ name: 'history-head.json', head: onDisk });
  const result = verifyHistory(db, heads);
  db.$client.close();
  if (!result.ok) return fail(result.problem);
  if (!onDisk && result.head) return fail('history-head.json is missing beside the database');
  process.stdout.write(
    `history whole: ${result.head ? `${result.head.seq}:${result.head.hash}` : 'empty'}\n`,
  );
  return 0;
}

function parseHead(text: string) {
  const match = /^(\d+):([0-9a-f]{64})$/.exec(text);
  if (!match) throw new Error('--head requires SEQ:HASH');
  return { seq: Number(match[1]), hash: match[2]! };
}

function fail(problem: string): number {
  process.stderr.write(`history not whole: ${problem}\n`);
  return 1;
}

process.exitCode = main();
