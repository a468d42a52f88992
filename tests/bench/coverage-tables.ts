import {
  differenceCoverage,
  differenceNames,
  type Side,
  type TwoPolls,
} from '../simulation/difference-coverage';
import { printRate } from '../simulation/rate';
import { exactShareCoverage, shareIntervalNames, simulatedShareCoverage } from '../simulation/share-coverage';
import { testNames, testSizes, type NullCase } from '../simulation/test-sizes';
import { markdownTable, percent } from './table';

const SIZES = [30, 50, 100, 200, 400, 1000, 2000];
const SHARES = [0.005, 0.02, 0.05, 0.1, 0.3, 0.5, 0.93];
const DEFFS = [1, 1.5, 2, 4];

/** Coverage of the intervals of a share in simple random samples; exact, so without Monte Carlo error. */
export function exactCoverageTable(): string {
  const rows = SIZES.flatMap((n) =>
    SHARES.map((p) => [n, p, ...shareIntervalNames.map((name) => percent(exactShareCoverage(name, n, p)))]),
  );
  return markdownTable(['n', 'p', ...shareIntervalNames], rows);
}

export function clusteredCoverageTable(draws: number, seed: number): string {
  const names = shareIntervalNames.filter((name) => name !== 'wilson corrected');
  const grid = [400, 1000].flatMap((n) =>
    [0.05, 0.3, 0.5].flatMap((p) => DEFFS.slice(1).map((deff) => ({ n, p, deff }))),
  );
  const rows = grid.map((asked) => [
    asked.n,
    asked.p,
    asked.deff,
    ...names.map((name) => printRate(simulatedShareCoverage(name, asked, draws, seed))),
  ]);
  return markdownTable(['n', 'p', 'deff', ...names], rows);
}

export function differenceCoverageTable(draws: number, seed: number): string {
  const side = (n: number, a: number, b: number, deff: number): Side => ({ n, a, b, deff });
  const polls: TwoPolls[] = [
    { before: side(50, 0.05, 0.4, 1), after: side(50, 0.1, 0.4, 1) },
    { before: side(100, 0.02, 0.4, 1), after: side(200, 0.02, 0.4, 1) },
    { before: side(400, 0.45, 0.4, 1), after: side(400, 0.45, 0.45, 1) },
    ...DEFFS.map((deff) => ({ before: side(600, 0.44, 0.42, deff), after: side(1000, 0.48, 0.4, deff) })),
    { before: side(1000, 0.05, 0.04, 1.5), after: side(1500, 0.06, 0.03, 2) },
    { before: side(2000, 0.5, 0.43, 1.5), after: side(1000, 0.52, 0.41, 2) },
  ];
  const print = ({ n, a, b, deff }: Side) => `${n}, ${a}, ${b}, ${deff}`;
  const rows = polls.map((both) => {
    const rates = differenceCoverage(both, draws, seed);
    return [print(both.before), print(both.after), ...differenceNames.map((name) => cell(rates.get(name)))];
  });
  const sideHead = (which: string) => `${which}: n, first, second, deff`;
  return markdownTable([sideHead('earlier'), sideHead('later'), ...differenceNames], rows);
}

export function testSizeTable(draws: number, seed: number): string {
  const grid: NullCase[] = [50, 200, 400, 1000].flatMap((n) =>
    [0.03, 0.1, 0.45].flatMap((p) => [1, 1.5, 2].map((deff) => ({ n, p, deff }))),
  );
  const rows = grid.map((asked) => {
    const rates = testSizes(asked, draws, seed);
    return [asked.n, asked.p, asked.deff, ...testNames.map((name) => cell(rates.get(name)))];
  });
  return markdownTable(['n', 'p', 'deff', ...testNames], rows);
}

function cell(rate: Parameters<typeof printRate>[0] | null | undefined): string {
  return rate ? printRate(rate) : '–';
}
