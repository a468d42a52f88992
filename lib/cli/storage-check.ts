import { existsSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { databaseFile, openDatabase } from '@/db/client';
import { checkFiles } from '@/lib/services/files/check-files';
import { openStore } from '@/lib/storage/open-store';
import { readSettings } from './prepare';

/** `npm run storage:check [-- --remove-orphans]`: status 1 where a stored file is lost or damaged. */
async function main(): Promise<number> {
  const { values } = parseArgs({ options: { 'remove-orphans': { type: 'boolean', default: false } } });
  const env = readSettings();
  const file = databaseFile(env.LEADLINE_DATA);
  if (!existsSync(file)) {
    process.stderr.write(`there is no database at ${file}\n`);
    return 1;
  }
  if (env.LEADLINE_FAKES) (await import('@/lib/fakes/start')).startFakes(env.LEADLINE_DATA);
  const db = openDatabase(file);
  const options = { now: Date.now(), removeOrphans: values['remove-orphans'] };
  const { checked, missing, damaged, orphans, removed } = await checkFiles(db, await openStore(env), options);
  db.$client.close();
  for (const hash of missing) process.stderr.write(`${hash} is lost: its row has no bytes\n`);
  for (const hash of damaged) process.stderr.write(`${hash} is damaged: its bytes were changed\n`);
  for (const hash of orphans)
    process.stdout.write(`${hash} has no row${removed.includes(hash) ? ': removed' : ''}\n`);
  process.stdout.write(
    `${checked} files checked, ${missing.length} lost, ${damaged.length} damaged, ${orphans.length} without a row\n`,
  );
  return missing.length + damaged.length === 0 ? 0 : 1;
}

process.exitCode = await main();
