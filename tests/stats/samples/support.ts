import fc from 'fast-check';

/** A respondent file: two strata or more, each with two units or more, and some of either answer. */
export type RespondentFile = {
  readonly weights: readonly number[];
  readonly stratum: readonly string[];
  readonly psu: readonly number[];
  readonly answer: readonly string[];
};

const respondent = fc.record({
  weight: fc.double({ min: 0.05, max: 20, noNaN: true }),
  stratum: fc.integer({ min: 0, max: 2 }),
  psu: fc.integer({ min: 0, max: 3 }),
  answer: fc.constantFrom('A', 'B', 'C'),
});

/** The first rows make sure of three strata with two units each, and of every answer in each stratum. */
export const respondentFile: fc.Arbitrary<RespondentFile> = fc
  .array(respondent, { minLength: 24, maxLength: 90 })
  .map((rows) => {
    const placed = rows.map((row, index) =>
      index < 18
        ? { ...row, stratum: index % 3, psu: index % 2, answer: 'ABC'[Math.floor(index / 6)] ?? 'A' }
        : row,
    );
    return Object.freeze({
      weights: Object.freeze(placed.map(({ weight }) => weight)),
      stratum: Object.freeze(placed.map(({ stratum }) => `s${stratum}`)),
      psu: Object.freeze(placed.map(({ psu }) => psu)),
      answer: Object.freeze(placed.map(({ answer }) => answer)),
    });
  });

/** The same respondents in another order. */
export function reordered(file: RespondentFile, order: (index: number) => number): RespondentFile {
  const rows = file.weights.map((_, index) => index).sort((a, b) => order(a) - order(b));
  const pick = <Value>(column: readonly Value[]): Value[] =>
    rows.flatMap((row) => (row in column ? [column[row] as Value] : []));
  return {
    weights: pick(file.weights),
    stratum: pick(file.stratum),
    psu: pick(file.psu),
    answer: pick(file.answer),
  };
}
