import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import Papa from 'papaparse';
import type { ReadTable, Table } from './entry';

/** The project's own copy. */
export const ownSet = fileURLToPath(new URL('.', import.meta.url));

/** The R script's record of its own checks, left beside the cases it made. */
const NO_CASES = 'verification.json';

const FOLDERS = ['engine', 'findings'] as const;

/** A file of a reference set: `name` is `lead_one_sample`, `path` `engine/lead_one_sample.json`. */
export type ReferenceFile = { readonly name: string; readonly path: string };

/** One case: what goes in, and what must come out. */
export type ReferenceCase = { readonly id: string; readonly input: unknown; readonly expected: unknown };

/** The JSON files of a set, engine first. */
export function listFiles(set: string): ReferenceFile[] {
  return FOLDERS.filter((folder) => existsSync(join(set, folder))).flatMap((folder) =>
    readdirSync(join(set, folder))
      .filter((file) => file.endsWith('.json') && file !== NO_CASES)
      .sort()
      .map((file) => ({ name: file.slice(0, -'.json'.length), path: `${folder}/${file}` })),
  );
}

/**
 * The cases of a file. A document to be refused expects the path of its fault; the version of the engine that an
 * expected answer names is not compared.
 */
export function readCases(set: string, { path }: ReferenceFile): ReferenceCase[] {
  const cases: unknown = JSON.parse(readFileSync(join(set, path), 'utf8'));
  if (!Array.isArray(cases)) throw new TypeError('the file holds no list of cases');
  return cases.map(readCase);
}

function readCase(one: Partial<ReferenceCase & { path: string }> | null, index: number): ReferenceCase {
  const id = typeof one?.id === 'string' ? one.id : `case ${index + 1}`;
  const expected =
    withoutEngine(one?.expected) ?? (typeof one?.path === 'string' ? { path: one.path } : null);
  if (!one || !('input' in one) || typeof expected !== 'object' || expected === null) {
    throw new TypeError(`${id} has no input, or nothing that it expects`);
  }
  return { id, input: one.input, expected };
}

/** An answer without the version of the engine that gave it, which is not compared. */
function withoutEngine(expected: unknown): unknown {
  if (typeof expected !== 'object' || expected === null || !('engine' in expected)) return expected;
  return Object.fromEntries(Object.entries(expected).filter(([key]) => key !== 'engine'));
}

/** Reads the tables that a set's cases name, each once. */
export function tableReader(set: string): ReadTable {
  const tables = new Map<string, Table>();
  return (name) => {
    const table = tables.get(name) ?? readCsv(join(set, 'engine', 'data', name));
    tables.set(name, table);
    return table;
  };
}

/** A CSV file by its columns. */
export function readCsv(path: string): Table {
  const { data, meta, errors } = Papa.parse<Record<string, string>>(readFileSync(path, 'utf8'), {
    header: true,
    skipEmptyLines: true,
  });
  if (errors[0]) throw new TypeError(`${path}: ${errors[0].message}`);
  return new Map((meta.fields ?? []).map((field) => [field, data.map((row) => row[field] ?? '')]));
}
