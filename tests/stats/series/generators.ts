import fc from 'fast-check';
import type { HousePoll } from '@/lib/stats';

export const LAST_DAY = 40;
const NAMES = ['Kelmouth', 'Norwater', 'Quillon', 'Averil'];

const day = fc.integer({ min: 1, max: LAST_DAY });
const value = fc.double({ min: 0.2, max: 0.7, noNaN: true });
const variance = fc.double({ min: 5e-5, max: 2e-3, noNaN: true });
export const stateVariance = fc.constantFrom(0, 1e-6, 4e-6, 1e-5, 1e-4, 1e-3);

/** Three polls and more of one to four houses, each house at least once, days unsorted and repeated. */
export const polls = fc.integer({ min: 1, max: NAMES.length }).chain((houses) =>
  fc
    .array(fc.record({ day, value, variance, house: fc.constantFrom(...NAMES.slice(0, houses)) }), {
      minLength: 3,
      maxLength: 14,
    })
    .map((list): HousePoll[] => list),
);

export const housesOf = (list: readonly HousePoll[]) => [...new Set(list.map((poll) => poll.house))];

/** Equal but for rounding, measured by the size of the numbers in play. */
export function isClose(a: number, b: number, scale = Math.max(Math.abs(a), Math.abs(b)), tolerance = 1e-9) {
  return Math.abs(a - b) <= tolerance * Math.max(scale, 1e-12);
}

/** Uniform and normal numbers from a seed, by a congruential generator. */
export function randomNumbers(seed: number) {
  let state = seed;
  const uniform = () => {
    state = (state * 1103515245 + 12345) % 2147483648;
    return (state + 0.5) / 2147483648;
  };
  const normal = () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
  return { uniform, normal };
}
