import type { CheckDocument, Policy } from './check-types';

/**
 * What the engine assumes where the desk has decided nothing else.
 *
 * The assumed design effects and their ranges, the range around a design effect from weights alone, the margin of
 * indifference and the smallest effective sample size are common practice, no source.
 */
export const DEFAULT_POLICY: Policy = {
  level: 0.95,
  assumed: {
    weighted: { value: 1.4, range: [1.2, 2] },
    clustered: { value: 2, range: [1.5, 4] },
    unweighted: { value: 1, range: [1, 1] },
  },
  kishRange: [0.8, 1.3],
  comparisonBasis: false,
  indifferencePp: 3,
  minimumNEff: 100,
};

/**
 * The policy of a check document with every key filled in.
 *
 * @param given the document's policy; absent keys take the default, an assumed entry is taken whole
 * @example
 * resolvePolicy({ level: 0.9 }).level; // => 0.9
 * resolvePolicy(undefined).minimumNEff; // => 100
 */
export function resolvePolicy(given: CheckDocument['policy']): Policy {
  return { ...DEFAULT_POLICY, ...given, assumed: { ...DEFAULT_POLICY.assumed, ...given?.assumed } };
}
