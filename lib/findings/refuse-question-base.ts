import { CheckRefused } from './check-refused';
import type { Policy } from './check-types';
import type { QuestionBase } from './judge-types';
import { refuseFaultyBase } from './refuse-base';

/**
 * Refuses the base of a question whose fields do not fit each other, or that is re-based and yet not.
 *
 * @throws CheckRefused with the path of the field
 */
export function refuseFaultyQuestionBase(base: QuestionBase, path: string, policy: Policy): void {
  refuseFaultyBase(base, path, policy);
  const { rebased, n, shares } = base;
  if (!rebased) return;
  if (rebased.n !== null && n !== null && rebased.n > n) {
    throw new CheckRefused(`${path}.rebased.n`, 'No more people are left than were asked.');
  }
  const still = shares.findIndex(({ pct, answer }) => answer === false && pct !== null && pct > 0);
  if (still >= 0) {
    throw new CheckRefused(
      `${path}.shares[${still}].pct`,
      'Shares that leave out those without an answer have no share for them.',
    );
  }
}
