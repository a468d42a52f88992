import { call, endsOf, engine, figureOf, type Call } from './call';

type Input = { x1: number; n1: number; x2: number; n2: number; level: number; method: string };
const plain = { alternative: 'two.sided', level: 0.95 };

/** Differences of two independent shares: Newcombe (1998), 17, 873–890, and tables of two by two. */
export const differenceCalls: Record<string, Call> = {
  newcombe1998_difference: call(({ x1, n1, x2, n2, level, method }: Input) => {
    const figures = engine('two_proportion_test', { x1, n1, x2, n2, level, alternative: 'two.sided' });
    switch (Number.parseInt(method, 10)) {
      case 1:
        return endsOf(figures, 'wald');
      case 10:
        return endsOf(figures, 'newcombe');
      case 11:
        return correctedHybrid({ x1, n1, x2, n2, level });
      default:
        throw new TypeError(`no method ${method}`);
    }
  }),
  nist_7_3_3_formula: call((input: { x1: number; n1: number; x2: number; n2: number }) =>
    figureOf(engine('two_proportion_test', { ...input, ...plain }), 'z_pooled'),
  ),
  fisher_tea: call(({ correct, of }: { correct: number[]; of: number }) =>
    correct.map((right) => tea(right, of, 'greater')),
  ),
  fisher_tea_two_sided: call(({ correct, of }: { correct: number; of: number }) =>
    tea(correct, of, 'two.sided'),
  ),
  ucb_admissions_marginal: call(({ x1, n1, x2, n2 }: { x1: number; n1: number; x2: number; n2: number }) => {
    const figures = engine('two_proportion_test', { x1, n1, x2, n2, ...plain });
    const shareOf = (x: number, n: number) =>
      figureOf(engine('one_proportion_test', { x, n, p0: 0.5, alternative: 'two.sided' }), 'estimate');
    const chiSquares = ['z_pooled', 'z_pooled_cc'].map((key) => figureOf(figures, key) ** 2);
    return [shareOf(x1, n1), shareOf(x2, n2), ...chiSquares];
  }),
  ucb_admissions_department: (input) => engine('two_proportion_test', input),
};

/** Method 11: as method 10, from limits with a continuity correction. */
function correctedHybrid({ x1, n1, x2, n2, level }: Omit<Input, 'method'>): [number, number] {
  const limits = (x: number, n: number) =>
    endsOf(engine('proportion_interval', { x, n, level }), 'wilson_cc');
  const [[low1, high1], [low2, high2]] = [limits(x1, n1), limits(x2, n2)];
  const [p1, p2] = [x1 / n1, x2 / n2];
  return [p1 - p2 - Math.hypot(p1 - low1, high2 - p2), p1 - p2 + Math.hypot(high1 - p1, p2 - low2)];
}

/** Cups told right of those with milk first, against those told so of the others; as many of each. */
function tea(right: number, of: number, alternative: string): number {
  const table = { x1: right, n1: of, x2: of - right, n2: of };
  return figureOf(engine('two_proportion_test', { ...table, alternative, level: 0.95 }), 'fisher_p_value');
}
