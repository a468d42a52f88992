/** What findings call directly, where an entry of the adapter reaches the same figure by a fuller function. */
import { describe, expect, test } from 'vitest';
import { holm, impliedDesignEffect, kishDesignEffect } from '@/lib/stats';
import { compare } from './compare';
import { ownSet, readCases, type ReferenceCase } from './reference-set';
import { toleranceOf } from './tolerances';

const casesOf = (name: string) => readCases(ownSet, { name, path: `engine/${name}.json` });

/** Faults of one field of a case. */
function faultsOf(
  file: string,
  { expected }: ReferenceCase,
  field: string,
  actual: unknown,
): readonly string[] {
  const wanted = Object.entries(expected as object).filter(([key]) => key === field);
  expect(wanted).toHaveLength(1);
  return compare({ [field]: actual }, Object.fromEntries(wanted), (name) => toleranceOf(file, name)).faults;
}

describe('agrees with R 4.2.2', () => {
  test.each(casesOf('kish_deff').map((one) => [one.id, one] as const))(
    'kishDesignEffect in %s',
    (_id, one) => {
      const { weights } = one.input as { weights: number[] };
      expect(faultsOf('kish_deff', one, 'deff', kishDesignEffect(weights))).toEqual([]);
    },
  );

  test.each(casesOf('deff_from_margin').map((one) => [one.id, one] as const))(
    'impliedDesignEffect in %s',
    (_id, one) => {
      const { margin, n, level } = one.input as { margin: number; n: number; level: number };
      expect(faultsOf('deff_from_margin', one, 'deff', impliedDesignEffect(margin, n, level))).toEqual([]);
    },
  );

  test.each(casesOf('multiple_comparisons').map((one) => [one.id, one] as const))(
    'holm in %s',
    (_id, one) => {
      const { p_values: all } = one.input as { p_values: (number | null)[] };
      const adjusted = holm(
        all.flatMap((p) => (p === null ? [] : [p])),
        0.05,
      ).map(({ pAdjusted }) => pAdjusted);
      const inPlace = all.map((p) => (p === null ? null : adjusted.shift()));
      expect(faultsOf('multiple_comparisons', one, 'holm', inPlace)).toEqual([]);
    },
  );
});
