import { binomialTestP, criticalValue, likelihoodInterval } from '@/lib/stats';
import type { Figure } from '../../reference/entry';
import { call, endsOf, engine, type Call } from './call';

type Input = { x: number; n: number; level: number; method: string };

/** The methods of Newcombe (1998), Statistics in Medicine 17, 857–872, by their numbers. */
export const singleIntervalCalls: Record<string, Call> = {
  newcombe1998_single: call(({ x, n, level, method }: Input) => {
    const of = (name: string) => endsOf(engine('proportion_interval', { x, n, level }), name);
    switch (Number.parseInt(method, 10)) {
      case 1:
        return of('wald');
      case 2: {
        const [low, high] = of('wald');
        return [low - 0.5 / n, high + 0.5 / n];
      }
      case 3:
        return of('wilson');
      case 4:
        return of('wilson_cc');
      case 5:
        return of('clopper_pearson');
      case 6:
        return midP(x, n, level);
      case 7:
        return likelihood(x, n, level);
      default:
        throw new TypeError(`no method ${method}`);
    }
  }),
  nist_7_2_4_exact_interval: call(({ x, n, level }: Input) =>
    endsOf(engine('proportion_interval', { x, n, level }), 'clopper_pearson'),
  ),
  /** One-sided 95 percent is the upper end of a two-sided 90 percent interval. */
  rule_of_three: call(({ x, n }: { x: number; n: number[] }) =>
    n.map((size) => endsOf(engine('proportion_interval', { x, n: size, level: 0.9 }), 'clopper_pearson')[1]),
  ),
};

/** The engine refers nobody to the exact interval; the published one is the limit of a share that vanishes. */
function likelihood(x: number, n: number, level: number): Figure {
  const VANISHING = 1e-12;
  return likelihoodInterval(x === 0 ? VANISHING : x / n, n, criticalValue(1 - level, null));
}

/** The shares at which the engine's exact binomial test, half of the observed count left out, has each tail's p. */
function midP(x: number, n: number, level: number): [number, number] {
  const tail = (1 - level) / 2;
  const above = (p0: number) => (atLeast(x, n, p0) + atLeast(x + 1, n, p0)) / 2;
  const below = (p0: number) => (atMost(x, n, p0) + atMost(x - 1, n, p0)) / 2;
  const low = x === 0 ? 0 : crossing((p0) => above(p0) - tail, 0, x / n);
  const high = x === n ? 1 : crossing((p0) => tail - below(p0), x / n, 1);
  return [low, high];
}

const atLeast = (x: number, n: number, p0: number) => (x > n ? 0 : binomialTestP(x, n, p0, 'greater'));
const atMost = (x: number, n: number, p0: number) => (x < 0 ? 0 : binomialTestP(x, n, p0, 'less'));

/** Where a function that rises from below 0 to above it crosses 0, by halving. */
function crossing(rising: (p0: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let halvings = 0; halvings < 80; halvings += 1) {
    const middle = (low + high) / 2;
    if (rising(middle) < 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
