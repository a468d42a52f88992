import { existsSync } from 'node:fs';
import type { Entry } from './entry';
import { listFiles, tableReader } from './reference-set';
import { faulty, runFile, type FileReport } from './run-file';

export type SetReport = {
  readonly files: readonly FileReport[];
  /** Entries of the adapter for which the set has no file. */
  readonly absent: readonly string[];
};

/**
 * Runs every file of a reference set. A set may leave files out unless it is to be `whole`; one without any file
 * fails.
 */
export function runSet(
  set: string,
  entries: Readonly<Record<string, Entry>>,
  { whole }: { whole: boolean },
): SetReport {
  if (!existsSync(set)) return { files: [faulty(set, 'there is no such folder')], absent: [] };
  const files = listFiles(set);
  if (files.length === 0) return { files: [faulty(set, 'the folder holds no reference file')], absent: [] };
  const readTable = tableReader(set);
  const reports = files.map((file) => runFile(set, file, entries, readTable));
  const present = new Set(files.map((file) => file.name));
  const absent = Object.keys(entries).filter((name) => !present.has(name));
  const missed = whole ? absent.map((name) => faulty(`${name}.json`, 'the set has no such file')) : [];
  return { files: [...reports, ...missed], absent: whole ? [] : absent };
}
