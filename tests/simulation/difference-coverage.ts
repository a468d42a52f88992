import {
  agrestiCaffoInterval,
  criticalValue,
  leadStandardError,
  newcombeInterval,
  shareStandardError,
  type Interval,
} from '@/lib/stats';
import { drawPoll, type Counts } from './draws';
import { rateOf, type Rate } from './rate';
import { seeded } from './random';
import { contains, LEVEL } from './share-coverage';

const q = criticalValue(1 - LEVEL, null);

/** Two options of a population, and the design effect of the polls of it. */
export type Side = { n: number; a: number; b: number; deff: number };
export type TwoPolls = { before: Side; after: Side };
type Polls = { before: Side & { counts: Counts }; after: Side & { counts: Counts } };

/** Every interval of a difference between two polls or inside one, on the known design effects. */
export const differenceIntervals = {
  'change of a share': { truth: changeOfShare, of: waldChange },
  newcombe: { truth: changeOfShare, of: newcombe },
  'agresti-caffo': { truth: changeOfShare, of: agrestiCaffo },
  lead: { truth: ({ after }) => after.a - after.b, of: ({ after }) => around(...leadOf(after)) },
  'change of a lead': {
    truth: ({ before, after }) => after.a - after.b - (before.a - before.b),
    of: waldLeadChange,
  },
} satisfies Record<string, { truth: (polls: TwoPolls) => number; of: (polls: Polls) => Interval }>;

export type DifferenceName = keyof typeof differenceIntervals;
export const differenceNames = Object.keys(differenceIntervals) as DifferenceName[];

/** How often each covers the true difference, all on the same polls. */
export function differenceCoverage(polls: TwoPolls, draws: number, seed: number): Map<DifferenceName, Rate> {
  const random = seeded(seed);
  const hits = new Map<DifferenceName, number>();
  for (let draw = 0; draw < draws; draw += 1) {
    const drawn = (side: Side) => ({
      ...side,
      counts: drawPoll(random, side.n, { shares: [side.a, side.b], deff: side.deff }),
    });
    const both = { before: drawn(polls.before), after: drawn(polls.after) };
    for (const name of differenceNames) {
      const { truth, of } = differenceIntervals[name];
      if (contains(of(both), truth(polls))) hits.set(name, (hits.get(name) ?? 0) + 1);
    }
  }
  return new Map(differenceNames.map((name) => [name, rateOf(hits.get(name) ?? 0, draws)]));
}

function changeOfShare({ before, after }: TwoPolls): number {
  return after.a - before.a;
}

function waldChange({ before, after }: Polls): Interval {
  const error = (side: Polls['after']) => shareStandardError(firstShare(side), side.n, side.deff);
  return around(firstShare(after) - firstShare(before), Math.hypot(error(before), error(after)));
}

function newcombe({ before, after }: Polls): Interval {
  return newcombeInterval(
    firstShare(before),
    before.n / before.deff,
    firstShare(after),
    after.n / after.deff,
    q,
  );
}

function agrestiCaffo({ before, after }: Polls): Interval {
  const [one, two] = [before, after].map(({ counts, n, deff }) => ({
    x: (counts[0] ?? 0) / deff,
    n: n / deff,
  }));
  if (!one || !two) throw new TypeError('agrestiCaffo requires two polls');
  return agrestiCaffoInterval(two.x, two.n, one.x, one.n, LEVEL);
}

function waldLeadChange({ before, after }: Polls): Interval {
  const [earlier, earlierError] = leadOf(before);
  const [later, laterError] = leadOf(after);
  return around(later - earlier, Math.hypot(earlierError, laterError));
}

function firstShare({ counts, n }: { counts: Counts; n: number }): number {
  return (counts[0] ?? 0) / n;
}

function leadOf({ counts, n, deff }: Polls['after']): [lead: number, standardError: number] {
  const [a = 0, b = 0] = counts;
  return [(a - b) / n, leadStandardError(a / n, b / n, n, deff)];
}

function around(estimate: number, standardError: number): Interval {
  return [estimate - q * standardError, estimate + q * standardError];
}
