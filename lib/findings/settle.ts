import type { BaseFigures } from './base-figures';
import type { Policy, UntestedReason } from './check-types';
import { judgeFamily, type Judged } from './judge-family';
import type { Measured, Term } from './measured';

/** One question of a family: what stands against testing it, and how it is measured if nothing does. */
export type Question<Reason extends string = UntestedReason> = {
  /** The printed shares in the estimate. */
  terms: readonly Term[];
  /** The base, or the later and the earlier one. */
  bases: readonly BaseFigures[];
  reasons: Reason[];
  /** null where a share is not disclosed or missing. */
  estimatePp: number | null;
  /** null where there are reasons. */
  measured: Measured | null;
};

export type Settled<Reason extends string = UntestedReason> =
  | { tested: Judged; measured: Measured }
  | { untested: { estimatePp: number | null; verdict: 'cannot-be-tested'; reasons: Reason[] } };

/**
 * Judges the testable questions of one family together and gives the others their reasons.
 *
 * @param questions all questions of the family, in order
 * @param policy the desk's policy, complete
 * @returns one outcome each, in the order given
 */
export function settle<Reason extends string>(
  questions: readonly Question<Reason>[],
  policy: Policy,
): Settled<Reason>[] {
  const testable = questions.flatMap(({ measured }) => (measured ? [measured] : []));
  const judged = judgeFamily(testable, policy);
  let place = 0;
  return questions.map(({ measured, estimatePp, reasons }) => {
    const tested = measured ? judged[place++] : undefined;
    if (measured && tested) return { tested, measured };
    return { untested: { estimatePp, verdict: 'cannot-be-tested', reasons } };
  });
}
