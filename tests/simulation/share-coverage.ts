import {
  agrestiCoullInterval,
  clopperPearsonInterval,
  criticalValue,
  jeffreysInterval,
  waldInterval,
  wilsonCorrectedInterval,
  wilsonInterval,
  type Interval,
} from '@/lib/stats';
import { drawPoll } from './draws';
import { binomial } from './exact-verdict-rates';
import { rateOf, type Rate } from './rate';
import { seeded } from './random';

export const LEVEL = 0.95;
const q = criticalValue(1 - LEVEL, null);

/** Every interval of a share, from its count and sample size, either of them effective. */
export const shareIntervals = {
  wald: (x, n) => waldInterval(x / n, n, q),
  wilson: (x, n) => wilsonInterval(x / n, n, q),
  'wilson corrected': (x, n) => wilsonCorrectedInterval(x, n, q),
  'clopper-pearson': (x, n) => clopperPearsonInterval(x, n, LEVEL),
  'agresti-coull': (x, n) => agrestiCoullInterval(x, n, q),
  jeffreys: (x, n) => jeffreysInterval(x, n, LEVEL, 'modified'),
} satisfies Record<string, (x: number, n: number) => Interval | null>;

export type ShareIntervalName = keyof typeof shareIntervals;
export const shareIntervalNames = Object.keys(shareIntervals) as ShareIntervalName[];

export function contains([low, high]: Interval, value: number): boolean {
  return low <= value && value <= high;
}

/** How often an interval covers p in a simple random sample: summed over every count, without chance. */
export function exactShareCoverage(name: ShareIntervalName, n: number, p: number): number {
  return binomial(n, p, 12).reduce((sum, [x, probability]) => {
    const interval = shareIntervals[name](x, n);
    return interval && contains(interval, p) ? sum + probability : sum;
  }, 0);
}

/** How often it covers p in clustered samples of a true design effect, on the counts that `believed` makes effective. */
export function simulatedShareCoverage(
  name: ShareIntervalName,
  { n, p, deff }: { n: number; p: number; deff: number },
  draws: number,
  seed: number,
  believed = deff,
): Rate {
  const random = seeded(seed);
  const coversAt = new Map<number, boolean>();
  let hits = 0;
  for (let draw = 0; draw < draws; draw += 1) {
    const [x = 0] = drawPoll(random, n, { shares: [p], deff });
    const known = coversAt.get(x);
    const covers = known ?? coversFrom(name, x / believed, n / believed, p);
    if (known === undefined) coversAt.set(x, covers);
    if (covers) hits += 1;
  }
  return rateOf(hits, draws);
}

function coversFrom(name: ShareIntervalName, x: number, n: number, p: number): boolean {
  const interval = shareIntervals[name](x, n);
  if (!interval) throw new TypeError(`${name} has no interval for effective counts`);
  return contains(interval, p);
}
