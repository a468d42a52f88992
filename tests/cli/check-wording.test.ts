import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { givenRelease } from '@/tests/support/given-release';

const folder = mkdtempSync(join(tmpdir(), 'leadline-wording-'));
afterAll(() => rmSync(folder, { recursive: true }));

const asked = {
  text: 'Alder leads Brook in the Kelmouth Research poll.',
  language: 'en',
  releases: [givenRelease()],
};

function run(file: string, input = '') {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['--conditions=react-server', '--import', 'tsx', 'lib/cli/check-wording.ts', ...(file ? [file] : [])],
    { input, encoding: 'utf8' },
  );
  return { status, stdout, stderr };
}

/** Each run starts Node anew, which takes seconds on a busy machine. */
describe('npm run check:wording', { timeout: 120_000 }, () => {
  test('marks the text of a file against its releases', () => {
    const file = join(folder, 'text.json');
    writeFileSync(file, JSON.stringify(asked));
    const { status, stdout } = run(file);
    const { marks } = JSON.parse(stdout) as { marks: { rule: string }[] };
    expect(status).toBe(0);
    expect(marks.find(({ rule }) => rule === 'lead')).toMatchObject({
      phrase: 'leads',
      grade: 'not-supported',
      claim: 'lead:Alder|Brook',
    });
  });

  test('marks a text without any release from standard input, under a policy that is given', () => {
    const { status, stdout } = run('-', JSON.stringify({ text: 'A dead heat.', policy: { level: 0.9 } }));
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({ marks: [{ rule: 'level' }] });
  });

  test.each([
    ['{', ''],
    [{ language: 'en' }, 'text'],
    [{ ...asked, releases: [givenRelease(0)] }, 'releases[0].release.n'],
    [{ ...asked, policy: { level: 2 } }, 'policy.level'],
  ])('refuses a fault with its path on standard output and status 2', (input, path) => {
    const { status, stdout } = run('-', typeof input === 'string' ? input : JSON.stringify(input));
    const { error } = JSON.parse(stdout) as { error: { path: string; message: string } };
    expect([status, error.path]).toEqual([2, path]);
    expect(error.message).not.toBe('');
  });

  test('says how it is used, and which file cannot be read, with status 1', () => {
    expect(run('')).toMatchObject({ status: 1, stdout: '' });
    expect(run(join(folder, 'none.json'))).toMatchObject({ status: 1, stdout: '' });
  });
});
