/** The engine against the project's own copy of R's figures; README.md beside this file says how they were made. */
import { describe, expect, test } from 'vitest';
import { entries } from './adapter';
import { listFiles, ownSet, tableReader } from './reference-set';
import { runFile } from './run-file';
import { toleratedFiles } from './tolerances';

const files = listFiles(ownSet);
const readTable = tableReader(ownSet);

describe('the engine agrees with R 4.2.2 and with independently worked documents', () => {
  test.each(files.map((file) => [file.path, file] as const))('%s', (_path, file) => {
    const { faults, cases, figures } = runFile(ownSet, file, entries, readTable);
    expect(faults).toEqual([]);
    expect(cases).toBeGreaterThanOrEqual(15);
    expect(figures).toBeGreaterThanOrEqual(cases);
  });
});

describe('the files, the adapter and the table of tolerances', () => {
  const names = files.map((file) => file.name).sort();

  test('know the same names', () => {
    expect(Object.keys(entries).sort()).toEqual(names);
    expect([...toleratedFiles].sort()).toEqual(names);
  });
});
