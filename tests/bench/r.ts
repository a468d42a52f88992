import { execFileSync, spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import Papa from 'papaparse';

const PACKAGES = ['r-base-core', 'r-cran-survey'];

/** Whether R and its survey package can be run here. */
function hasR(): boolean {
  return spawnSync('Rscript', ['-e', 'library(survey)'], { stdio: 'ignore' }).status === 0;
}

/**
 * Makes sure that R is there, through apt where this user may install.
 *
 * @throws Error with the command to run where R is missing and cannot be installed
 */
export function ensureR(): void {
  if (hasR()) return;
  if (process.getuid?.() === 0) {
    process.stdout.write(`Installing ${PACKAGES.join(', ')} through apt\n`);
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    spawnSync('apt-get', ['update', '-q'], { stdio: 'inherit', env });
    spawnSync('apt-get', ['install', '-y', '-q', '--no-install-recommends', ...PACKAGES], {
      stdio: 'inherit',
      env,
    });
  }
  if (hasR()) return;
  throw new Error(`The comparison needs R. Run: apt-get update && apt-get install -y ${PACKAGES.join(' ')}`);
}

export function versionOfR(): string {
  return execFileSync('Rscript', ['-e', 'cat(R.version.string)'], { encoding: 'utf8' });
}

/** Runs one of the R files beside this one on a folder of data. */
export function runR(file: string, folder: string, ...args: (string | number)[]): void {
  const script = fileURLToPath(new URL(file, import.meta.url));
  execFileSync('Rscript', ['--vanilla', script, folder, ...args.map(String)], {
    stdio: ['ignore', 'inherit', 'inherit'],
  });
}

/** A CSV file that R wrote, row by row. */
export function readRows(folder: string, name: string): Record<string, string>[] {
  const text = readFileSync(join(folder, name), 'utf8');
  return Papa.parse<Record<string, string>>(text, { header: true, skipEmptyLines: true }).data.map((row) =>
    Object.fromEntries(Object.entries(row).map(([key, value]) => [key, value.trim()])),
  );
}

/** Seconds by name, as the R files write them. */
export function readTimes(folder: string): Map<string, number> {
  return new Map(readRows(folder, 'times.csv').map((row) => [row.name ?? '', Number(row.seconds)]));
}
