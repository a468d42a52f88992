/** Runs the examples in the docstrings of the pure numbers and findings; each must give what it says. */
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';

const FOLDERS = ['lib/stats', 'lib/findings'];
const BRANCH = '  ';

type Example = { file: string; line: number; code: string; promised: string };

function modulesOf(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.ts') && !name.endsWith('.d.ts'))
    .sort()
    .map((name) => `${folder}/${name}`);
}

/** Statements of one `@example`, each ended by the `// => value` that it promises. */
function examplesOf(file: string): Example[] {
  const lines = readFileSync(file, 'utf8').split('\n');
  const examples: Example[] = [];
  let code: string[] | null = null;
  lines.forEach((raw, index) => {
    const text = raw.trim().replace(/^\* ?/, '');
    if (text.startsWith('@example')) code = [];
    else if (raw.trim() === '*/' || text.startsWith('@')) code = null;
    else if (code) {
      const [statement = '', promised] = text.split(/\s*\/\/ => /);
      code.push(statement);
      if (promised !== undefined) {
        examples.push({ file, line: index + 1, code: code.join('\n').trim(), promised });
        code = [];
      }
    }
  });
  return examples;
}

const names = (scope: object) => Object.keys(scope);

function evaluate(code: string, scope: Record<string, unknown>): unknown {
  const run = new Function(...names(scope), `${BRANCH}return (${code.replace(/;$/, '')});`) as (
    ...values: unknown[]
  ) => unknown;
  return run(...Object.values(scope));
}

/** `1.4426...` promises a number that begins so; any other number is met to its own digits. */
function matches(actual: unknown, promised: unknown): boolean {
  if (typeof promised === 'string' && promised.startsWith('begins:')) {
    return String(actual).startsWith(promised.slice('begins:'.length));
  }
  if (typeof promised === 'number' && typeof actual === 'number') {
    return Math.abs(actual - promised) <= 1e-9 * Math.max(Math.abs(promised), Math.abs(actual));
  }
  if (Array.isArray(promised)) {
    return (
      Array.isArray(actual) &&
      actual.length === promised.length &&
      promised.every((one, index) => matches(actual[index], one))
    );
  }
  if (typeof promised === 'object' && promised !== null) {
    const wanted = Object.entries(promised);
    const given = new Map(Object.entries(actual ?? {}));
    return given.size === wanted.length && wanted.every(([key, one]) => matches(given.get(key), one));
  }
  return Object.is(actual, promised);
}

const files = FOLDERS.flatMap(modulesOf);
const examples = files.flatMap(examplesOf);

describe('examples in docstrings', () => {
  test('are found', () => {
    expect(examples.length).toBeGreaterThan(30);
  });

  test('stand at every function of lib/stats that a finding can call', async () => {
    const index = readFileSync('lib/stats/index.ts', 'utf8');
    const documented = new Set(
      files.flatMap((file) =>
        [...readFileSync(file, 'utf8').matchAll(/@example[^]*?\*\/\s*export function (\w+)/g)].map(
          ([, name]) => name,
        ),
      ),
    );
    const exported = Object.keys((await import('@/lib/stats')) as object);
    expect(index.length).toBeGreaterThan(0);
    expect(exported.filter((name) => !documented.has(name))).toEqual([]);
  });

  test.each(examples.map((one) => [`${one.file}:${one.line}`, one] as const))('%s', async (_at, example) => {
    const scope: Record<string, unknown> = {};
    for (const file of files) Object.assign(scope, await import(`../${file}`));
    const promised = example.promised.replace(/(-?[\d.]+?)\.\.\./g, "'begins:$1'");
    const actual = evaluate(example.code, scope);
    expect(
      matches(actual, evaluate(promised, {})),
      `${example.code} gives ${JSON.stringify(actual)}, not ${example.promised}`,
    ).toBe(true);
  });
});
