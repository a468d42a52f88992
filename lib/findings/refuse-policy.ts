import { CheckRefused } from './check-refused';
import type { AssumedDeff, CheckDocument, Range } from './check-types';

/** Far outside anything meant, so that no product leaves the range of a number. */
const LEAST_PART = 1e-9;
const MOST_TIMES = 1e9;

/**
 * Refuses a policy whose ranges descend, leave their limits or miss their value.
 *
 * @throws CheckRefused at `policy.assumed.X.range` or `policy.kishRange`
 */
export function refuseFaultyPolicy(policy: CheckDocument['policy']): void {
  for (const [design, assumed] of Object.entries(policy?.assumed ?? {})) {
    if (assumed && !isSound(assumed)) {
      throw new CheckRefused(
        `policy.assumed.${design}.range`,
        'The range ascends from at least 0.5 to at most 10 and contains the value.',
      );
    }
  }
  const { kishRange } = policy ?? {};
  if (kishRange && !(isAround(kishRange, 1) && kishRange[0] >= LEAST_PART && kishRange[1] <= MOST_TIMES)) {
    throw new CheckRefused('policy.kishRange', 'The range is positive, ascends and contains 1.');
  }
}

function isSound({ value, range }: AssumedDeff): boolean {
  return isAround(range, value) && range[0] >= 0.5 && range[1] <= 10;
}

function isAround([low, high]: Range, value: number): boolean {
  return low > 0 && low <= value && value <= high;
}
