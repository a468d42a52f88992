import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import manifest from '@/package.json';
import { layers } from './support/import-table';
import { readText, root } from './support/source';

const pages = ['README.md', 'DEVELOPERS.md', 'CHANGELOG.md'];
const developers = readText('DEVELOPERS.md');

/** Made when the product runs, so absent from a fresh checkout. */
const madeAtRunTime = ['accounts.json', '.next/leadline-source', 'node_modules/.leadline-lock'];
/** Where a framework's own word for a file stands for all files of that name. */
const anyFileOfThatName = ['actions.ts', 'route.ts'];

const inline = (text: string) => [...text.matchAll(/`([^`\n]+)`/g)].map((match) => match[1] ?? '');
const looksLikePath = (code: string) =>
  /^[\w.()[\]-][\w.()[\]/-]*$/.test(code) &&
  (/\/[\w([]/.test(code) || /\.(ts|tsx|mjs|md|json|css|example)$/.test(code));

describe('what the pages cite', () => {
  it.each(pages)('exists: the paths of %s', (page) => {
    const cited = inline(readText(page)).filter(looksLikePath);
    const missing = cited.filter(
      (path) => ![...madeAtRunTime, ...anyFileOfThatName].includes(path) && !existsSync(join(root, path)),
    );
    expect(missing).toEqual([]);
  });

  it.each(pages)('exists: the links of %s', (page) => {
    const links = [...readText(page).matchAll(/\]\(([^)#]+)\)/g)].map((match) => match[1] ?? '');
    const inside = links.filter((link) => !/^[a-z]+:/.test(link));
    expect(inside.filter((link) => !existsSync(join(root, link)))).toEqual([]);
  });

  it.each(pages)('exists: the commands of %s', (page) => {
    const named = [...readText(page).matchAll(/npm run ([\w:-]+)/g)].map((match) => match[1] ?? '');
    expect(named.filter((name) => !(name in manifest.scripts))).toEqual([]);
  });

  it('exists: every folder and file of the tree', () => {
    const tree = /```\n(app\/[\s\S]+?)```/.exec(developers)?.[1] ?? '';
    const paths = pathsOfTree(tree);
    expect(paths.length).toBeGreaterThan(20);
    expect(paths.filter((path) => !existsSync(join(root, path)))).toEqual([]);
  });
});

describe('the page for developers', () => {
  it('shows the import table as the test has it', () => {
    const bare = (name: string) => (name.startsWith('lib/') ? name.replace(/\.ts$/, '') : name);
    const rows = [...developers.matchAll(/^\| (\S+) +\| (.+?) +\|$/gm)].map((row) => `${row[1]}: ${row[2]}`);
    const expected = Object.entries(layers).map(
      ([layer, allowed]) => `${bare(layer)}: ${allowed.map(bare).join(', ') || '–'}`,
    );
    expect(expected.filter((row) => !rows.includes(row))).toEqual([]);
  });

  it('names every command', () => {
    const internal = ['test', 'build', 'typecheck', 'lint', 'format', 'format:check'];
    const commands = Object.keys(manifest.scripts).filter((name) => !internal.includes(name));
    expect(commands.filter((name) => !developers.includes(`npm run ${name}`))).toEqual([]);
  });

  it('names every setting that the example file names, and the other way round', () => {
    const settings = (text: string) => [
      ...new Set([...text.matchAll(/\b(LEADLINE_[A-Z_]+|DEMO_PASSWORD|PORT)\b/g)].map((match) => match[1])),
    ];
    const example = settings(readText('.env.example')).sort();
    expect(settings(developers).sort()).toEqual(example);
    expect(settings(readText('lib/env.ts')).sort()).toEqual(example);
  });
});

describe('the page for newsrooms', () => {
  it('begins with the job, in one paragraph', () => {
    const [title, first] = readText('README.md').split('\n\n');
    expect(title).toBe('# Leadline');
    expect(first).toMatch(/^A newsroom gets poll releases all day\. .+ that the numbers do not support\.$/);
  });
});

/** `  ui/  note` lines as paths; two names on one line share the level. */
function pathsOfTree(tree: string): string[] {
  let folder = '';
  return tree.split('\n').flatMap((line) => {
    const match = /^( *)((?:[\w().-]+(?:\/|\.ts)(?: +|$))+)/.exec(line);
    if (!match) return [];
    const names = (match[2] ?? '').trim().split(/ +/);
    if (match[1] === '') folder = names[0] ?? '';
    return names.map((name) => (match[1] === '' ? name : folder + name));
  });
}
