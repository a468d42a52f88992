import { isPositive, required } from '../require';

const FEWEST_WAVES = 8;

/** The variance of a pollster's own changes, or why it cannot be told. */
export type WaveToWave =
  | { readonly kind: 'estimated'; readonly waves: number; readonly variance: number }
  | { readonly kind: 'too-few-waves'; readonly waves: number };

/**
 * How much a pollster's figure varies from one wave to the next, from its own series: the mean square of its
 * successive differences.
 *
 * Use it beside the sampling error of a change: weighting, house practice and real movement show up in it. Give it
 * comparable waves of one pollster in the order of their field dates, without the change that is to be tested.
 *
 * @param values figure of each wave, in any unit
 * @returns the variance of the change between two waves, in the unit squared (twice the variance of one wave about a
 *   standing level); `too-few-waves` below 8
 * @throws RangeError `waveToWaveVariance requires values that are finite numbers`
 * @see von Neumann, Kent, Bellinson and Hart (1941), Annals of Mathematical Statistics 12, 153–162 (from memory)
 * @example
 * waveToWaveVariance([0.41, 0.43, 0.41, 0.43, 0.41, 0.43, 0.41, 0.43]).variance; // => 0.0004
 * waveToWaveVariance([0.41, 0.43]).kind; // => 'too-few-waves'
 */
export function waveToWaveVariance(values: readonly number[]): WaveToWave {
  required(
    values.every((value) => Number.isFinite(value)),
    'waveToWaveVariance',
    'values that are finite numbers',
  );
  const waves = values.length;
  if (waves < FEWEST_WAVES) return { kind: 'too-few-waves', waves };
  let squares = 0;
  for (let wave = 1; wave < waves; wave += 1) squares += (values[wave]! - values[wave - 1]!) ** 2;
  return { kind: 'estimated', waves, variance: squares / (waves - 1) };
}

export type ChangeError = { readonly standardError: number; readonly rule: 'sampling' | 'wave-to-wave' };

/**
 * The standard error by which a change between two waves is judged: the larger of its sampling error and of what the
 * pollster's own series shows.
 *
 * @param samplingStandardError standard error of the change from the two samples, above 0
 * @param values the pollster's comparable waves, as for `waveToWaveVariance`
 * @returns the larger standard error and which rule gave it; with fewer than 8 waves always the sampling error
 * @throws RangeError `changeStandardError requires a sampling standard error above 0`
 * @throws RangeError as waveToWaveVariance does
 * @see common practice, no source
 * @example
 * changeStandardError(0.015, [0.41, 0.43, 0.41, 0.43, 0.41, 0.43, 0.41, 0.43]).standardError; // => 0.02
 */
export function changeStandardError(samplingStandardError: number, values: readonly number[]): ChangeError {
  required(isPositive(samplingStandardError), 'changeStandardError', 'a sampling standard error above 0');
  const own = waveToWaveVariance(values);
  if (own.kind === 'estimated' && Math.sqrt(own.variance) > samplingStandardError) {
    return { standardError: Math.sqrt(own.variance), rule: 'wave-to-wave' };
  }
  return { standardError: samplingStandardError, rule: 'sampling' };
}
