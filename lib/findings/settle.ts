import type { Policy, UntestedFields, UntestedReason } from './check-types';
import { judgeFamily, type Judged } from './judge-family';
import type { Measured } from './measured';

/** One question of a family: what stands against testing it, and how it is measured if nothing does. */
export type Question = {
  reasons: UntestedReason[];
  /** null where a share is not disclosed or missing. */
  estimatePp: number | null;
  /** null where there are reasons. */
  measured: Measured | null;
};

export type Settled = { tested: Judged; measured: Measured } | { untested: UntestedFields };

/**
 * Judges the testable questions of one family together and gives the others their reasons.
 *
 * @param questions all questions of the family, in order
 * @param policy the desk's policy, complete
 * @returns one outcome each, in the order given
 */
export function settle(questions: readonly Question[], policy: Policy): Settled[] {
  const testable = questions.flatMap(({ measured }) => (measured ? [measured] : []));
  const judged = new Map(judgeFamily(testable, policy).map((one, index) => [testable[index], one]));
  return questions.map(({ measured, estimatePp, reasons }) => {
    const tested = measured ? judged.get(measured) : undefined;
    if (measured && tested) return { tested, measured };
    return { untested: { estimatePp, verdict: 'cannot-be-tested', reasons } };
  });
}
