import type { LevelChange, LevelSpan, PlacePrediction, PollPlace } from './polls';
import type { DailyLevel } from './expand-days';
import type { Level } from './solve-level';

/** The change of the level over a span; the errors of its two ends are correlated, and that is counted. */
export function changeOver(level: Level, daily: DailyLevel, span: LevelSpan): LevelChange {
  const { firstDay } = level.arranged.days;
  const early = Math.min(span.from, span.to) - firstDay;
  const late = Math.max(span.from, span.to) - firstDay;
  const own = spanVariance(level, early, late);
  const between = houseProduct(level, columnsOn(level, early), columnsOn(level, late));
  const change = daily.mean[span.to - firstDay]! - daily.mean[span.from - firstDay]!;
  return { from: span.from, to: span.to, change, standardError: Math.sqrt(own + between) };
}

/** The level of a day with the effect of a house, without the sampling error of a poll. */
export function predictPlace(level: Level, daily: DailyLevel, place: PollPlace): PlacePrediction {
  const day = place.day - level.arranged.days.firstDay;
  const { columns, houses, houseList } = level;
  if (!columns || !houses) return { ...place, mean: daily.mean[day]!, variance: daily.variance[day]! };
  const house = houseList.indexOf.get(place.house!)!;
  const unit = new Float64Array(columns.groups);
  unit[house] = 1;
  const onDay = columnsOn(level, day);
  const variance = levelVariance(level, day) + houseProduct(level, onDay, unit);
  return { ...place, mean: daily.mean[day]! + houses.effects[house]!, variance };
}

/** Variance of level(late) − level(early), house effects apart, as a sum of positive terms. */
function spanVariance(level: Level, early: number, late: number): number {
  const { stateVariance } = level;
  if (stateVariance === 0) return 0;
  let together = 1;
  let noise = 0;
  for (let day = late - 1; day >= early; day -= 1) {
    const filtered = filteredVariance(level, day);
    const follow = filtered === null ? 1 : filtered / (filtered + stateVariance);
    noise = stateVariance * follow + follow * follow * noise;
    together *= follow;
  }
  return noise + (1 - together) ** 2 * levelVariance(level, late);
}

/** The last knot on or before a day; −1 before the first. */
function knotBefore(level: Level, day: number): number {
  const { knotDay } = level.arranged;
  let low = -1;
  let high = knotDay.length;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (knotDay[middle]! <= day) low = middle;
    else high = middle;
  }
  return low;
}

function filteredVariance(level: Level, day: number): number | null {
  const knot = knotBefore(level, day);
  if (knot < 0) return null;
  return level.gains.variance[knot]! + level.stateVariance * (day - level.arranged.knotDay[knot]!);
}

/** How far a day's level follows the next knot's; 1 before the first knot, 0 from the last one on. */
function followOn(level: Level, day: number, knot: number): number {
  const { gains, arranged, stateVariance } = level;
  if (knot < 0) return 1;
  if (knot === arranged.knotDay.length - 1) return 0;
  if (gains.drift[knot] === 0) return 1;
  const own = gains.variance[knot]! + stateVariance * (day - arranged.knotDay[knot]!);
  return own / (gains.variance[knot]! + gains.drift[knot]!);
}

/** Smoothed variance of a day, house effects apart. */
function levelVariance(level: Level, day: number): number {
  const { gains, arranged, stateVariance } = level;
  const knot = knotBefore(level, day);
  if (knot === arranged.knotDay.length - 1) return filteredVariance(level, day)!;
  const follow = followOn(level, day, knot);
  const remaining = stateVariance * (arranged.knotDay[knot + 1]! - day);
  return follow * (remaining + follow * gains.smoothedVariance[knot + 1]!);
}

/** The columns of a day, between those of the knots around it. */
function columnsOn(level: Level, day: number): Float64Array {
  const { columns } = level;
  if (!columns) return new Float64Array(0);
  const { groups, filtered, smoothed } = columns;
  const knot = knotBefore(level, day);
  const follow = followOn(level, day, knot);
  const onDay = new Float64Array(groups);
  for (let group = 0; group < groups; group += 1) {
    const own = knot < 0 ? 0 : filtered[knot * groups + group]!;
    const next = follow === 0 ? 0 : smoothed[(knot + 1) * groups + group]!;
    onDay[group] = (1 - follow) * own + follow * next;
  }
  return onDay;
}

/** (a − b)'C(a − b) with the covariance of the house effects. */
function houseProduct(level: Level, a: Float64Array, b: Float64Array): number {
  const { houses } = level;
  if (!houses) return 0;
  const groups = a.length;
  let sum = 0;
  for (let row = 0; row < groups; row += 1) {
    for (let column = 0; column < groups; column += 1) {
      const entry = houses.covariance[row * groups + column]!;
      sum += (a[row]! - b[row]!) * entry * (a[column]! - b[column]!);
    }
  }
  return Math.max(0, sum);
}
