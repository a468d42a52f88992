import betainc from '@stdlib/math-base-special-betainc';
import binomialPmf from '@stdlib/stats-base-dists-binomial-pmf';
import { call, endsOf, engine, type Call } from './call';

type Exact = { n: number[]; level: number; method: string };

const key: Readonly<Record<string, string>> = { exact: 'clopper_pearson', score: 'wilson', wald: 'wald' };

/** How often the engine's intervals contain the true share, exactly rather than by simulation. */
export const coverageCalls: Record<string, Call> = {
  agresti_coull1998_mean_coverage: call(({ n, level, method }: Exact) =>
    n.map((size) => meanCoverage(size, (x) => intervalOf(x, size, level, key[method] ?? method))),
  ),
  brown_cai_dasgupta2001_wald_coverage: call(({ n, p }: { n: number[]; p: number[] }) =>
    n.map((size, index) => coverage(size, p[index] ?? Number.NaN, (x) => intervalOf(x, size, 0.95, 'wald'))),
  ),
};

function intervalOf(x: number, n: number, level: number, name: string): [number, number] {
  return endsOf(engine('proportion_interval', { x, n, level }), name);
}

/** Over all shares alike: given x, a uniform share has the beta distribution of x + 1 and n − x + 1. */
function meanCoverage(n: number, interval: (x: number) => [number, number]): number {
  const within = counts(n).map((x) => {
    const [low, high] = interval(x).map((end) => Math.min(1, Math.max(0, end)));
    return betainc(high ?? 1, x + 1, n - x + 1) - betainc(low ?? 0, x + 1, n - x + 1);
  });
  return within.reduce((sum, one) => sum + one, 0) / (n + 1);
}

function coverage(n: number, p: number, interval: (x: number) => [number, number]): number {
  const containing = counts(n).filter((x) => {
    const [low, high] = interval(x);
    return low <= p && p <= high;
  });
  return containing.reduce((sum, x) => sum + binomialPmf(x, n, p), 0);
}

const counts = (n: number) => Array.from({ length: n + 1 }, (_, x) => x);
