import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { databaseFile, openDatabase } from '@/db/client';
import { readEnv } from '@/lib/env';
import { sha256 } from '@/lib/security/ids';
import { type FrozenEngine, verifyEvidence } from '@/lib/services/sheet/verify-evidence';

const archive = join(dirname(fileURLToPath(import.meta.url)), '../findings/archive');

/** The engine of one version, as it was frozen. @throws Error where its bytes are missing or were changed */
async function frozenEngine(version: string): Promise<FrozenEngine> {
  const manifest = JSON.parse(readFileSync(join(archive, 'manifest.json'), 'utf8')) as Record<
    string,
    { sha256: string } | undefined
  >;
  const file = join(archive, `${version}.mjs`);
  const expected = manifest[version]?.sha256;
  if (!expected || !existsSync(file)) throw new Error(`engine ${version} is not in the archive`);
  if (sha256(readFileSync(file)) !== expected)
    throw new Error(`engine ${version} was changed in the archive`);
  return (await import(pathToFileURL(file).href)) as FrozenEngine;
}

/** `npm run evidence:verify`: status 0 when every evidence comes out the same, 1 when one does not. */
async function main(): Promise<number> {
  const file = databaseFile(readEnv().LEADLINE_DATA);
  if (!existsSync(file)) {
    process.stderr.write(`there is no database at ${file}\n`);
    return 1;
  }
  const db = openDatabase(file);
  const { checked, problems } = await verifyEvidence(db, frozenEngine);
  db.$client.close();
  for (const problem of problems) process.stderr.write(`${problem}\n`);
  process.stdout.write(`${checked} evidence checked, ${problems.length} problems\n`);
  return problems.length === 0 ? 0 : 1;
}

process.exitCode = await main();
