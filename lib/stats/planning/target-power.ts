import { normalQuantile } from '../distributions/normal-quantile';
import { isInside, required } from '../require';

/** The normal quantile of a power; at alpha or below no sample is needed, so such a power asks for nothing. */
export function plannedPowerQuantile(power: number, alpha: number, fn: string): number {
  required(isInside(power) && power > alpha, fn, 'power above alpha and below 1');
  return normalQuantile(power);
}
