import { required } from '../require';
import { isVariance } from './refuse-series';

/**
 * How large the sampling error of a poll is: its variance; or, of a share, sample size and design effect; or, of a
 * lead, also the sum of the two shares. n / deff is at least 1.
 */
export type Sampling =
  | { readonly kind: 'given'; readonly variance: number }
  | { readonly kind: 'share'; readonly n: number; readonly deff: number }
  | { readonly kind: 'lead'; readonly n: number; readonly deff: number; readonly sum: number };

export function refuseSampling(fn: string, sampling: Sampling): void {
  if (sampling.kind === 'given') return required(isVariance(sampling.variance), fn, 'variances above 0');
  const { n, deff } = sampling;
  const counts = deff > 0 && n / deff >= 1 && Number.isFinite(n / deff);
  required(counts, fn, 'a design effect above 0 and n of at least the design effect');
  const sum = sampling.kind === 'lead' ? sampling.sum : 1;
  required(sum > 0 && sum <= 1, fn, 'a sum of two shares above 0, at most 1');
}

/**
 * Sampling variance of a poll if the level were the truth. A level that leaves 0 to 1 is counted as half an effective
 * respondent inside it, and the spread of a lead as at least that of half an effective respondent.
 */
export function samplingVariance(sampling: Sampling, level: number): number {
  if (sampling.kind === 'given') return sampling.variance;
  const size = sampling.n / sampling.deff;
  const least = 0.5 / size;
  if (sampling.kind === 'lead') return Math.max(least, sampling.sum - level * level) / size;
  const share = Math.min(1 - least, Math.max(least, level));
  return (share * (1 - share)) / size;
}
