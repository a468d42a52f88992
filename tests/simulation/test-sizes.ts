import {
  binomialTestP,
  exactBinomialP,
  exactSignP,
  fisherExactP,
  leadNullStandardError,
  leadStandardError,
  pooledTest,
  roundHalfUp,
  shareScoreTest,
  twoSidedP,
  unpooledTest,
} from '@/lib/stats';
import { drawPoll, type Counts } from './draws';
import { rateOf, type Rate } from './rate';
import { seeded } from './random';

const ALPHA = 0.05;

export type NullCase = { n: number; p: number; deff: number };
type Poll = { counts: Counts; n: number; deff: number };

/**
 * p-values of every test where nothing is there to be found: a share that is p, two polls of one population, two
 * options that are level at p each.
 */
const tests = {
  'score, one share': (poll, _other, p) => shareScoreTest(shareOf(poll), p, 'two-sided').p,
  'exact, effective counts': ({ counts, n, deff }, _other, p) =>
    exactBinomialP((counts[0] ?? 0) / deff, n / deff, p),
  'exact, whole counts': ({ counts, n, deff }, _other, p) =>
    deff === 1 ? binomialTestP(counts[0] ?? 0, n, p, 'two-sided') : undefined,
  pooled: (poll, other) => pooledTest(shareOf(poll), shareOf(other), 'two-sided', 'none').p,
  unpooled: (poll, other) => unpooledTest(shareOf(poll), shareOf(other), 'two-sided').p,
  fisher: (poll, other) => fisher(poll, other),
  sign: ({ counts: [a = 0, b = 0], deff }) => exactSignP(a / deff, b / deff),
  'lead, z': ({ counts: [a = 0, b = 0], n, deff }) =>
    pOf((a - b) / n, leadStandardError(a / n, b / n, n, deff)),
  'lead, score': ({ counts: [a = 0, b = 0], n, deff }) =>
    pOf((a - b) / n, leadNullStandardError(a / n, b / n, n, deff)),
} satisfies Record<string, (poll: Poll, other: Poll, p: number) => number | null | undefined>;

export type TestName = keyof typeof tests;
export const testNames = Object.keys(tests) as TestName[];

/** How often each test rejects at 5 percent although nothing is there; null where it does not apply. */
export function testSizes({ n, p, deff }: NullCase, draws: number, seed: number): Map<TestName, Rate | null> {
  const random = seeded(seed);
  const rejected = new Map<TestName, number>();
  const unfit = new Set<TestName>();
  const draw = (): Poll => ({ counts: drawPoll(random, n, { shares: [p, p], deff }), n, deff });
  for (let round = 0; round < draws; round += 1) {
    const [poll, other] = [draw(), draw()];
    for (const name of testNames) {
      const value = tests[name](poll, other, p);
      if (value === undefined) unfit.add(name);
      // Without variance there is no test, and so no rejection.
      else if (value !== null && value < ALPHA) rejected.set(name, (rejected.get(name) ?? 0) + 1);
    }
  }
  return new Map(
    testNames.map((name) => [name, unfit.has(name) ? null : rateOf(rejected.get(name) ?? 0, draws)]),
  );
}

function shareOf({ counts, n, deff }: Poll) {
  return { p: (counts[0] ?? 0) / n, n, deff };
}

function pOf(difference: number, standardError: number): number | null {
  return standardError === 0 ? null : twoSidedP(difference / standardError, null);
}

/** Effective counts rounded half up, a sample's size their sum, as findings ask it. */
function fisher(poll: Poll, other: Poll): number {
  const cells = [poll, other].map(({ counts, n, deff }) => {
    const hits = roundHalfUp((counts[0] ?? 0) / deff);
    return { hits, n: hits + roundHalfUp((n - (counts[0] ?? 0)) / deff) };
  });
  const [one, two] = cells;
  if (!one || !two) throw new TypeError('fisher requires two polls');
  return fisherExactP(one.hits, one.n, two.hits, two.n);
}
