import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { entry, numbers, type Entry } from './entry';
import { printFile, printTotal } from './report';
import { runSet } from './run-set';

let set: string;
beforeEach(() => {
  set = mkdtempSync(join(tmpdir(), 'leadline-reference-'));
  mkdirSync(join(set, 'engine', 'data'), { recursive: true });
});
afterEach(() => rmSync(set, { recursive: true }));

const write = (name: string, cases: unknown) =>
  writeFileSync(join(set, 'engine', `${name}.json`), JSON.stringify(cases));
const one = (id: string, input: object, expected: object) => ({ id, input, expected, source: 'made up' });

/** Stands where the adapter stands: the statistics are simple enough to be seen through. */
const entries: Record<string, Entry> = {
  sample_size_margin: entry(({ margin }: { margin: number }) => {
    if (margin <= 0) throw new RangeError('a margin is above 0');
    return { n: Math.round(1 / margin), n_real: 1 / margin };
  }),
};
const run = (whole = false) => runSet(set, entries, { whole });
const faults = (whole = false) => run(whole).files.flatMap((file) => file.faults);

describe('a reference set', () => {
  test('passes when every case agrees, and says how well', () => {
    write('sample_size_margin', [
      one('good-1', { margin: 0.25 }, { n: 4, n_real: 4 }),
      one('good-2', { margin: 0.5 }, { n: 2, n_real: 2 + 1e-10 }),
    ]);
    const { files, absent } = run();
    expect(absent).toEqual([]);
    expect(files[0]).toMatchObject({ cases: 2, failedCases: 0, figures: 4, faults: [] });
    expect(files.map(printFile)[0]).toMatch(
      /^engine\/sample_size_margin\.json +2 cases +4 figures  worst relative error 5\.0e-11 \(good-2 n_real\)$/,
    );
    expect(printTotal(files)).toBe('2 passed, 0 failed');
  });

  test('fails in the case that is off, and goes on after one that throws', () => {
    write('sample_size_margin', [
      one('thrown', { margin: 0 }, { n: 1 }),
      one('off', { margin: 0.5 }, { n: 3, n_real: 2 }),
      one('good', { margin: 0.5 }, { n: 2 }),
    ]);
    expect(faults()).toEqual([
      'thrown: threw RangeError: a margin is above 0',
      expect.stringMatching(/^off: n: 2 instead of 3/),
    ]);
    expect(printTotal(run().files)).toBe('1 passed, 2 failed');
  });

  test('fails on a file without an entry, also one named like a part of every object', () => {
    write('unheard_of', [one('a', {}, { n: 1 })]);
    write('constructor', [one('a', {}, { n: 1 })]);
    expect(faults()).toEqual(Array(2).fill('the adapter has no entry of that name'));
    expect(printTotal(run().files)).toBe('0 passed, 2 failed');
  });

  test('fails on a field that the table of tolerances does not know', () => {
    const withMore: Record<string, Entry> = { sample_size_margin: () => ({ surplus: 1 }) };
    write('sample_size_margin', [one('a', {}, { surplus: 1 })]);
    const { files } = runSet(set, withMore, { whole: false });
    expect(files[0]?.faults).toEqual(['a: surplus: no tolerance in the table']);
  });

  test.each([
    ['an empty file', [], 'the file is empty'],
    ['a file that holds no list', { id: 'a' }, 'no list of cases'],
    ['a case without an expectation', [{ id: 'a', input: {} }], 'a has no input, or nothing that it expects'],
    ['a case without an input', [{ expected: { n: 1 } }], 'case 1 has no input, or nothing that it expects'],
    ['a case that expects no figure', [one('a', { margin: 1 }, {})], 'a: nothing is expected of it'],
  ])('fails on %s', (_what, cases, told) => {
    write('sample_size_margin', cases);
    expect(faults()).toEqual([expect.stringContaining(told)]);
  });

  test('fails on a file that is not JSON', () => {
    writeFileSync(join(set, 'engine', 'sample_size_margin.json'), '[{');
    expect(faults()).toEqual([expect.stringMatching(/^SyntaxError/)]);
  });

  test('may lack the file of an entry, unless it is the project’s own', () => {
    write('sample_size_margin', [one('good', { margin: 0.5 }, { n: 2 })]);
    const more = { ...entries, kish_deff: () => ({ n: 1 }) };
    expect(runSet(set, more, { whole: false })).toMatchObject({
      absent: ['kish_deff'],
      files: [{ faults: [] }],
    });
    const { files } = runSet(set, more, { whole: true });
    expect(files.flatMap((file) => file.faults)).toEqual(['the set has no such file']);
  });

  test('fails when there is nothing in it, or it is not there at all', () => {
    expect(faults()).toEqual(['the folder holds no reference file']);
    const { files } = runSet(join(set, 'nowhere'), entries, { whole: false });
    expect(files.flatMap((file) => file.faults)).toEqual(['there is no such folder']);
  });

  test('gives its cases the tables beside them', () => {
    writeFileSync(join(set, 'engine', 'data', 'weights.csv'), 'id,weight\n1,2\n2,3.5\n');
    write('kish_deff', [one('a', { data: 'weights.csv' }, { sum_weights: 5.5 })]);
    const sum = entry(({ data }: { data: string }, readTable) => ({
      sum_weights: numbers(readTable(data), 'weight').reduce((total, weight) => total + weight, 0),
    }));
    expect(runSet(set, { kish_deff: sum }, { whole: false }).files[0]?.faults).toEqual([]);
  });
});

/** Each run starts Node anew, which takes seconds on a busy machine. */
describe('npm run test:reference', { timeout: 120_000 }, () => {
  const runTool = (folder: string) =>
    spawnSync(process.execPath, ['--conditions=react-server', '--import', 'tsx', 'tests/reference/run.ts'], {
      encoding: 'utf8',
      env: { ...process.env, REFERENCE_DIR: folder, INIT_CWD: tmpdir() },
    });
  const lastLine = (text: string) => text.trimEnd().split('\n').at(-1);

  test('runs another folder, named from where it was called, and ends with what passed', () => {
    mkdirSync(join(set, 'findings'));
    writeFileSync(
      join(set, 'findings', 'refused.json'),
      JSON.stringify([{ id: 'no-release', input: {}, path: 'release' }]),
    );
    const { status, stdout } = runTool(set.slice(tmpdir().length + 1));
    expect(lastLine(stdout)).toBe('1 passed, 0 failed');
    expect(stdout).toContain('cases.json: no file');
    expect(status).toBe(0);
  });

  test('ends badly when a case fails', () => {
    mkdirSync(join(set, 'findings'));
    writeFileSync(
      join(set, 'findings', 'refused.json'),
      JSON.stringify([{ id: 'elsewhere', input: {}, path: 'previous' }]),
    );
    const { status, stdout } = runTool(set);
    expect(stdout).toContain('FAILED elsewhere: path: "release" instead of "previous"');
    expect(lastLine(stdout)).toBe('0 passed, 1 failed');
    expect(status).toBe(1);
  });
});
