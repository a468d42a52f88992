import { required } from '../require';
import type { LevelDays, PollPlace } from './polls';

const MOST_DAYS = 1_000_000;
/** Beyond these a product of two variances leaves the range of a double. */
const SMALLEST = 1e-100;
const LARGEST = 1e100;

export const isVariance = (value: number): boolean => value >= SMALLEST && value <= LARGEST;
export const isValue = (value: number): boolean => Math.abs(value) <= LARGEST;
export const isDay = (day: number, days: LevelDays): boolean =>
  Number.isInteger(day) && day >= days.firstDay && day <= days.lastDay;

export function refuseDays(fn: string, days: LevelDays): void {
  const { firstDay, lastDay, changes = [], predictions = [] } = days;
  const whole = Number.isSafeInteger(firstDay) && Number.isSafeInteger(lastDay);
  required(whole && firstDay <= lastDay, fn, 'whole days, firstDay not after lastDay');
  required(lastDay - firstDay < MOST_DAYS, fn, 'at most 1000000 days');
  const spansInside = changes.every(({ from, to }) => isDay(from, days) && isDay(to, days));
  required(spansInside, fn, 'changes between days from firstDay to lastDay');
  required(
    predictions.every(({ day }) => isDay(day, days)),
    fn,
    'predictions for days from firstDay to lastDay',
  );
}

export function refuseStateVariance(fn: string, stateVariancePerDay: number): void {
  const allowed = stateVariancePerDay === 0 || isVariance(stateVariancePerDay);
  required(allowed, fn, 'a state variance per day of at least 0');
}

/** A house is named in a prediction exactly where the series has houses. */
export function refusePlaces(fn: string, places: readonly PollPlace[], houses: readonly string[]): void {
  const known = new Set(houses);
  const fits = ({ house }: PollPlace) => (house === undefined ? houses.length === 0 : known.has(house));
  required(places.every(fits), fn, 'predictions for known houses, for none where there are no houses');
}
