/** Figures printed in papers, handbooks and manuals; each entry names its source, and whether it was recalled. */
import { describe, expect, test } from 'vitest';
import { compare } from '../reference/compare';
import type { Figure } from '../reference/entry';
import { kinds, type Tolerance } from '../reference/tolerances';
import { callNames, callOf } from './calls';
import { publishedEntries, readPublishedTable, type PublishedEntry } from './published-entries';

/** What is compared less closely than the accuracy asked of the engine, by the end of its name. */
const looser: Readonly<Record<string, Tolerance>> = {
  svyciprop_likelihood: {
    relative: 0.02,
    absolute: 0,
    reason: 'the package profiles a fitted model; its closed equation is the entry’s own `likelihood`',
  },
  svyciprop_logit: { relative: 1e-8, absolute: 0, reason: 'the package fits a model by iteration' },
  likelihood: kinds.searched,
  smoothed_mean: kinds.smoothed,
  smoothed_variance: kinds.smoothed,
  filtered_mean: kinds.smoothed,
  filtered_variance: kinds.smoothed,
  house_effect: kinds.smoothed,
  house_effect_se: kinds.smoothed,
};

/** Entries whose every figure is compared less closely, by the end of their name. */
const looserEntries: Readonly<Record<string, Tolerance>> = {
  method6: kinds.searched,
  method7: kinds.searched,
  power_prop_test_docs: { relative: 1e-7, absolute: 0, reason: 'R searches for n, to the fourth decimal' },
};

function toleranceOf({ id }: PublishedEntry, field: string): Tolerance {
  const [, ofEntry] = Object.entries(looserEntries).find(([end]) => id.endsWith(end)) ?? [];
  const name = field.split('.').at(-1) ?? '';
  return ofEntry ?? looser[name] ?? kinds.figure;
}

function answerOf(entry: PublishedEntry): Figure {
  const call = callOf(entry.id);
  if (!call) throw new TypeError(`no call of the engine is named like ${entry.id}`);
  return call(entry.input, readPublishedTable);
}

type Printed = { actual: unknown; printed: number | null; digits: number; agrees: boolean };

function printedFigures(entry: PublishedEntry): Printed[] {
  const lists = <Item>(value: Item | readonly Item[]) => (Array.isArray(value) ? value : [value]) as Item[];
  const answer: unknown[] = lists(answerOf(entry));
  return lists(entry.published).map((printed, index) => ({
    actual: answer[index],
    printed,
    digits: lists(entry.digits ?? 0)[index] ?? Number.NaN,
    agrees: entry.agrees?.[index] ?? true,
  }));
}

/** To half a unit of the last decimal; the small allowance is for halves. */
function rounds(actual: unknown, { printed, digits }: Printed): boolean {
  if (typeof actual !== 'number') return false;
  return printed === null ? actual < 0 : Math.abs(actual - printed) <= 0.5 * 10 ** -digits + 1e-9;
}

const named = (entries: readonly PublishedEntry[]) => entries.map((one) => [one.id, one] as const);
const printedEntries = publishedEntries.filter((one) => one.published !== null);

describe('the published entries', () => {
  test('are all there, each with its source and with a call of the engine', () => {
    expect(publishedEntries).toHaveLength(103);
    expect(new Set(publishedEntries.map((one) => one.id)).size).toBe(103);
    expect(publishedEntries.filter((one) => one.source.length < 10)).toEqual([]);
    expect(publishedEntries.filter((one) => callOf(one.id) === null).map((one) => one.id)).toEqual([]);
  });

  test('leave no call unused', () => {
    const used = new Set(publishedEntries.map((one) => callOf(one.id)));
    expect(callNames.filter((name) => !used.has(callOf(name)))).toEqual([]);
  });
});

describe('the engine meets R 4.2.2 at full accuracy', () => {
  test.each(named(publishedEntries))('%s', (_id, entry) => {
    const { faults, figures } = compare(answerOf(entry), entry.computed, (field) =>
      toleranceOf(entry, field),
    );
    expect(faults).toEqual([]);
    expect(figures).toBeGreaterThan(0);
  });
});

describe('the engine rounds to the printed figures, but for those known to be printed otherwise', () => {
  test.each(named(printedEntries))('%s', (_id, entry) => {
    const figures = printedFigures(entry);
    const met = figures.map((one) => rounds(one.actual, one));
    expect(met).toEqual(figures.map((one) => one.agrees));
  });

  test('which are two figures of all', () => {
    const otherwise = printedEntries.filter((one) => one.agrees?.includes(false));
    expect(otherwise.map((one) => one.id)).toEqual([
      'nist_7_2_4_exact_interval',
      'agresti_coull1998_mean_coverage_exact',
    ]);
  });
});
