import { ENGINE_VERSION } from '@/lib/findings/engine-version';
import { exactVerdictRates, type ExactRates } from '../simulation/exact-verdict-rates';
import { TWO_OPTIONS } from '../simulation/printed-lead';
import { printRate, type Rate } from '../simulation/rate';
import { verdictRates, type VerdictCase, type VerdictRates } from '../simulation/verdict-rates';
import { markdownTable, percent } from './table';

const SIZES = [400, 600, 800, 1000, 1440, 2000];
const LEADS = [0, 0.02, 0.04, 0.06, 0.08, 0.1];
/** Sizes between 400 and 2,000 that are summed over every outcome at a true lead of 0. */
const STEP = 5;

export type VerdictTable = {
  engine: string;
  seed: number;
  draws: number;
  /** Share of the two options together; shares are printed in whole percents; policy is the default. */
  twoOptions: number;
  simulated: VerdictRates[];
  exact: { step: number; rows: ExactRates[]; extremes: Record<string, { n: number; rate: number }> };
};

/** Size and power of the verdicts: by simulation on a grid, and exactly for simple random samples. */
export function verdictTable(draws: number, seed: number): VerdictTable {
  const cases: VerdictCase[] = [
    ...[1, 1.4, 2].map((deff) => ({ deff, knowledge: 'known' as const })),
    ...[1.2, 1.4, 2].map((deff) => ({ deff, knowledge: 'assumed' as const })),
  ].flatMap((about) => SIZES.flatMap((n) => LEADS.map((lead) => ({ n, lead, ...about }))));
  const level = Array.from({ length: Math.floor(1600 / STEP) + 1 }, (_, index) =>
    exactVerdictRates(400 + index * STEP, 0),
  );
  return {
    engine: ENGINE_VERSION,
    seed,
    draws,
    twoOptions: TWO_OPTIONS,
    simulated: cases.map((asked, index) => verdictRates(asked, draws, seed + index)),
    exact: {
      step: STEP,
      rows: SIZES.flatMap((n) => LEADS.map((lead) => exactVerdictRates(n, lead))),
      extremes: {
        lowestHolds: extreme(level, 'holds', -1),
        highestHolds: extreme(level, 'holds', 1),
        highestFragile: extreme(level, 'fragile', 1),
        lowestPlainPrinted: extreme(level, 'plainPrinted', -1),
        highestPlainPrinted: extreme(level, 'plainPrinted', 1),
      },
    },
  };
}

function extreme(rows: readonly ExactRates[], key: 'holds' | 'fragile' | 'plainPrinted', sign: 1 | -1) {
  return rows.reduce(
    (best, row) => (sign * (row[key] - best.rate) > 0 ? { n: row.n, rate: row[key] } : best),
    { n: 0, rate: sign === 1 ? -1 : 2 },
  );
}

/** The same to read. */
export function verdictMarkdown(table: VerdictTable): string {
  const { exact, simulated, draws, seed, twoOptions } = table;
  const show = (rate: Rate) => printRate(rate);
  const simulatedRows = simulated.map((row) => [
    row.knowledge,
    row.deff,
    row.n,
    Math.round(100 * row.lead),
    ...[row.holds, row.fragile, row.holdsWrongly, row.plainPrinted, row.plainUnrounded].map(show),
  ]);
  const exactRows = exact.rows.map((row) => [
    row.n,
    Math.round(100 * row.lead),
    ...[row.holds, row.fragile, row.plainPrinted].map(percent),
  ]);
  const extremes = Object.entries(exact.extremes).map(([name, { n, rate }]) => [name, n, percent(rate)]);
  const plain = ['plain test, printed', 'plain test, unrounded'];
  return [
    '# How often a lead is said to hold',
    `Engine ${table.engine}. Two options share ${100 * twoOptions} % of the answers, shares are printed in whole ` +
      `percents, the policy is the default (level 0.95). Rates are percent.`,
    '## By simulation',
    `${draws} polls a row, seed ${seed} and one more for each row; ± is the Monte Carlo standard error. ` +
      'Polls are drawn in clusters of 20 whose true design effect is the one named; "assumed" leaves it to the ' +
      "desk's 1.4 (1.2 to 2). At a true lead of 0 every verdict but does-not-hold is a mistake.",
    markdownTable(
      ['deff is', 'true deff', 'n', 'true lead', 'holds', 'fragile', 'holds for the wrong one', ...plain],
      simulatedRows,
    ),
    '## Summed over every outcome',
    'Simple random samples, the design effect known to be 1; no Monte Carlo error.',
    markdownTable(['n', 'true lead', 'holds', 'fragile', 'plain test, printed'], exactRows),
    `Extremes at a true lead of 0 over n = 400, ${400 + exact.step}, … 2000:`,
    markdownTable(['what', 'n', 'rate'], extremes),
  ].join('\n\n');
}
