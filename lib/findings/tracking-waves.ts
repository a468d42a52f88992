import type { Sampled } from './base-figures';
import type { WaveOverlap } from './judge-types';

/** One wave of two overlapping averages. */
export type TrackedWave = {
  in: 'earlier' | 'later' | 'both';
  /** Weight in the later average less that in the earlier. */
  weightChange: number;
  /** Need not be whole: an average's people divided by its waves. */
  interviews: number;
};

/**
 * The waves of two averages in order, each with its interviews and with what its weight changes by.
 *
 * Where interviews per wave are not known every wave of an average has as many, and what both averages hold cancels.
 *
 * @param overlap window and shared as parsed
 * @param earlier sampled part of the earlier average
 * @param later sampled part of the later average
 */
export function trackedWaves(
  { window, shared, interviews }: WaveOverlap,
  earlier: Pick<Sampled, 'n'>,
  later: Pick<Sampled, 'n'>,
): TrackedWave[] {
  const count = 2 * window - shared;
  const places = Array.from({ length: count }, (_, index) => index);
  const isEarlier = (index: number) => index < window;
  const isLater = (index: number) => index >= window - shared;
  const sizes = interviews
    ? scaledTo(interviews, earlier.n + later.n, window, shared)
    : places.map((index) => (isEarlier(index) ? earlier.n : later.n) / window);
  const weightIn = (isInside: (place: number) => boolean) => {
    const asked = interviews ? sumOf(sizes.filter((_, place) => isInside(place))) : null;
    return (index: number) => {
      if (!isInside(index)) return 0;
      return asked === null ? 1 / window : (sizes[index] ?? 0) / asked;
    };
  };
  const [inLater, inEarlier] = [weightIn(isLater), weightIn(isEarlier)];
  return places.map((index) => ({
    in: isEarlier(index) ? (isLater(index) ? 'both' : 'earlier') : 'later',
    weightChange: inLater(index) - inEarlier(index),
    interviews: sizes[index] ?? 0,
  }));
}

/** Interviews of every wave so that both averages have the people their shares stand on, fewer where re-based. */
function scaledTo(interviews: readonly number[], people: number, window: number, shared: number): number[] {
  const asked = sumOf(interviews.slice(0, window)) + sumOf(interviews.slice(window - shared));
  return interviews.map((count) => (count * people) / asked);
}

function sumOf(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0);
}
