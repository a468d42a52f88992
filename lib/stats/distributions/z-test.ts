import type { Alternative } from './alternative';
import { normalP } from './normal-p';
import { required } from '../require';

/** A difference against its standard error; without variance there is nothing to test it against. */
export type ZTest =
  | {
      readonly kind: 'tested';
      readonly difference: number;
      readonly standardError: number;
      readonly z: number;
      readonly p: number;
    }
  | {
      readonly kind: 'no-variance';
      readonly difference: number;
      readonly standardError: 0;
      readonly z: null;
      readonly p: null;
    };

/**
 * Tests whether a difference is larger than its standard error lets chance explain, by the normal distribution.
 *
 * A standard error of 0 gives no test, whatever the difference: such a sample says nothing of its own error.
 *
 * @param difference finite, in any unit
 * @param standardError in the same unit, at least 0
 * @param alternative what the test looks for
 * @returns z and p with kind 'tested'; null for both with kind 'no-variance'
 * @throws RangeError `zTest requires a finite difference`
 * @throws RangeError `zTest requires a finite standard error of at least 0`
 * @see R 4.2.2 `pnorm(difference / standardError)` and its two other forms
 * @example
 * zTest(0.06, 0.03, 'two-sided').p; // => 0.0455002...
 * zTest(0.06, 0, 'two-sided').z; // => null
 */
export function zTest(difference: number, standardError: number, alternative: Alternative): ZTest {
  required(Number.isFinite(difference), 'zTest', 'a finite difference');
  const usable = standardError >= 0 && Number.isFinite(standardError);
  required(usable, 'zTest', 'a finite standard error of at least 0');
  const z = difference / standardError;
  if (standardError === 0 || !Number.isFinite(z)) {
    return { kind: 'no-variance', difference, standardError: 0, z: null, p: null };
  }
  return { kind: 'tested', difference, standardError, z, p: normalP(z, alternative) };
}
