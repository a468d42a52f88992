import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';

const folder = mkdtempSync(join(tmpdir(), 'leadline-check-'));
afterAll(() => rmSync(folder, { recursive: true }));

const document: CheckDocument = {
  release: {
    sampleSource: 'probability',
    n: 1012,
    design: 'weighted',
    decimals: 0,
    shares: [
      { option: 'Alder', pct: 47 },
      { option: 'Brook', pct: 41 },
    ],
  },
};

function run(file: string, input = '') {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['--conditions=react-server', '--import', 'tsx', 'lib/cli/check-poll.ts', ...(file ? [file] : [])],
    { input, encoding: 'utf8' },
  );
  return { status, stdout, stderr };
}

/** Each run starts Node anew, which takes seconds on a busy machine. */
describe('npm run check:poll', { timeout: 120_000 }, () => {
  test('answers a file in JSON', () => {
    const file = join(folder, 'poll.json');
    writeFileSync(file, JSON.stringify(document));
    const { status, stdout } = run(file);
    expect([status, JSON.parse(stdout)]).toEqual([0, check(document)]);
  });

  test('answers standard input', () => {
    const { status, stdout } = run('-', JSON.stringify(document));
    expect([status, JSON.parse(stdout)]).toEqual([0, check(document)]);
  });

  test('refuses a fault with its path on standard output and status 2', () => {
    const { status, stdout } = run('-', JSON.stringify({ release: { ...document.release, n: 0 } }));
    expect(status).toBe(2);
    expect(JSON.parse(stdout)).toEqual({
      error: { path: 'release.n', message: 'The sample size is a whole number of at least 1.' },
    });
  });

  test('refuses text that is not JSON at the empty path', () => {
    const { status, stdout } = run('-', '{ "release": NaN }');
    expect([status, JSON.parse(stdout).error.path]).toEqual([2, '']);
  });

  test('says how it is used, and which file cannot be read, with status 1', () => {
    expect(run('')).toMatchObject({ status: 1, stdout: '' });
    expect(run(join(folder, 'none.json'))).toMatchObject({ status: 1, stdout: '' });
  });
});
