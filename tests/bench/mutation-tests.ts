/**
 * Stands in for `vitest` while a changed engine is tested, collecting the tests once so that one process can run them
 * again and again, and for `bounded-memo`, since what one mutant computed must not be another one's answer.
 */
import type * as Vitest from 'vitest';

// By a name, so that the module's own stand-in is not what comes back.
const name: string = 'vitest';
export const { expect, vi } = (await import(/* @vite-ignore */ name)) as typeof Vitest;

type Body = (...args: never[]) => unknown;
type Suite = { title: string; before: Body[]; after: Body[]; outer: Suite | null };
export type CollectedTest = { title: string; run: () => Promise<void> };

const root: Suite = { title: '', before: [], after: [], outer: null };
let suite = root;
const collected: CollectedTest[] = [];

/** The tests collected since the last call. */
export function takeTests(): CollectedTest[] {
  return collected.splice(0);
}

function outwards(of: Suite): Suite[] {
  return of.outer ? [of, ...outwards(of.outer)] : [of];
}

async function runAll(bodies: readonly Body[]): Promise<void> {
  for (const body of bodies) await body();
}

function addSuite(title: string, body: Body): void {
  const outer = suite;
  suite = { title: `${outer.title} ${title}`.trim(), before: [], after: [], outer };
  body();
  suite = outer;
}

function addTest(title: string, body: Body): void {
  const around = outwards(suite);
  const run = async () => {
    try {
      await runAll([...around].reverse().flatMap(({ before }) => before));
      await body();
    } finally {
      await runAll(around.flatMap(({ after }) => after));
    }
  };
  collected.push({ title: `${suite.title} ${title}`.trim(), run });
}

/** Every row is a case; the rows' places tell the cases apart. */
function each(add: typeof addTest) {
  return (rows: readonly unknown[]) => (title: string, body: Body) => {
    rows.forEach((row, place) => {
      const args = (Array.isArray(row) ? row : [row]) as never[];
      add(`${title} [${place}]`, () => body(...args));
    });
  };
}

export const test = Object.assign(addTest, { each: each(addTest) });
export const it = test;
export const describe = Object.assign(addSuite, { each: each(addSuite) });
export const beforeEach = (body: Body) => suite.before.push(body);
export const afterEach = (body: Body) => suite.after.push(body);

/** Remembers nothing. */
export function boundedMemo<Key, Value>(compute: (key: Key) => Value): (key: Key) => Value {
  return compute;
}
