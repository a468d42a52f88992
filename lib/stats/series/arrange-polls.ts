import { required } from '../require';
import type { HouseList } from './house-list';
import type { LevelDays } from './polls';
import { isValue, isVariance } from './refuse-series';

/**
 * A series laid out for the filter. A knot is a day with an observation, a cell the observations of one house on
 * one knot. Houses are numbered 0 to houses − 1; the number `houses` stands for no house: results, or all polls.
 */
export type Arranged = {
  readonly days: LevelDays;
  readonly houses: number;
  /** Days since firstDay, ascending. */
  readonly knotDay: Int32Array;
  /** Where the cells of a knot begin, with one more entry at the end. */
  readonly knotCells: Int32Array;
  readonly cellHouse: Int32Array;
  /** Observations in the order given, results last: their cell, value, sampling variance; 1 if it is a poll. */
  readonly cellOf: Int32Array;
  readonly value: Float64Array;
  readonly sampling: Float64Array;
  readonly isPoll: Uint8Array;
  /** Per knot 1 if an exact result stands there, and the result. */
  readonly isExact: Uint8Array;
  readonly exactValue: Float64Array;
  readonly observations: number;
};

type Measured = { readonly day: number; readonly value: number; readonly house?: string };

/** Lays the polls out; sampling variances are read by `varianceOf`. */
export function arrangePolls<Poll extends Measured>(
  fn: string,
  polls: readonly Poll[],
  varianceOf: (poll: Poll) => number,
  houseList: HouseList,
  days: LevelDays,
): Arranged {
  required(polls.length > 0, fn, 'at least one poll');
  const houses = houseList.names.length;
  const inexact = houseList.results.filter((result) => result.variance > 0);
  const exact = houseList.results.filter((result) => result.variance === 0);
  const count = polls.length + inexact.length;
  const dayOf = new Int32Array(count);
  const houseOf = new Int32Array(count).fill(houses);
  const value = new Float64Array(count);
  const sampling = new Float64Array(count);
  const isPoll = new Uint8Array(count).fill(1, 0, polls.length);
  const { firstDay, lastDay } = days;
  for (let index = 0; index < polls.length; index += 1) {
    const poll = polls[index]!;
    const { day } = poll;
    const measured = poll.value;
    const variance = varianceOf(poll);
    const isDay = Number.isInteger(day) && day >= firstDay && day <= lastDay;
    if (!isDay) required(false, fn, 'every poll on a whole day from firstDay to lastDay');
    if (!isValue(measured)) required(false, fn, 'values that are finite numbers');
    if (!isVariance(variance)) required(false, fn, 'variances above 0');
    dayOf[index] = day - firstDay;
    value[index] = measured;
    sampling[index] = variance;
  }
  for (let index = 0; houses > 0 && index < polls.length; index += 1) {
    houseOf[index] = houseList.indexOf.get(polls[index]!.house!)!;
  }
  inexact.forEach((result, index) => {
    dayOf[polls.length + index] = result.day - days.firstDay;
    value[polls.length + index] = result.value;
    sampling[polls.length + index] = result.variance;
  });

  const exactDays = exact.map((result) => result.day - days.firstDay);
  const { knotDay, knotOfDay } = findKnots(dayOf, exactDays, days.lastDay - days.firstDay + 1);
  const isExact = new Uint8Array(knotDay.length);
  const exactValue = new Float64Array(knotDay.length);
  exact.forEach((result, index) => {
    const knot = knotOfDay[exactDays[index]!]!;
    isExact[knot] = 1;
    exactValue[knot] = result.value;
  });
  for (let index = 0; index < count; index += 1) dayOf[index] = knotOfDay[dayOf[index]!]!;
  const cells =
    houses > 0
      ? findCells(dayOf, houseOf, knotDay.length, houses + 1)
      : { knotCells: upTo(knotDay.length), cellHouse: new Int32Array(knotDay.length), cellOf: dayOf };
  const observations = count + exact.length;
  return { days, houses, knotDay, ...cells, value, sampling, isPoll, isExact, exactValue, observations };
}

function findKnots(dayOf: Int32Array, exactDays: readonly number[], dayCount: number) {
  const knotOfDay = new Int32Array(dayCount);
  for (let index = 0; index < dayOf.length; index += 1) knotOfDay[dayOf[index]!] = 1;
  for (const day of exactDays) knotOfDay[day] = 1;
  const knotDay = new Int32Array(dayCount);
  let knots = 0;
  for (let day = 0; day < dayCount; day += 1) {
    if (knotOfDay[day] === 0) continue;
    knotOfDay[day] = knots;
    knotDay[knots] = day;
    knots += 1;
  }
  return { knotDay: knotDay.slice(0, knots), knotOfDay };
}

/** 0, 1, … up to and including the number. */
function upTo(last: number): Int32Array {
  const all = new Int32Array(last + 1);
  for (let index = 1; index <= last; index += 1) all[index] = index;
  return all;
}

/** Cells by a counting sort on knots; within a knot a stamp per house finds the cell that is already there. */
function findCells(knotOf: Int32Array, houseOf: Int32Array, knots: number, groups: number) {
  const count = knotOf.length;
  const start = new Int32Array(knots + 1);
  for (let index = 0; index < count; index += 1) start[knotOf[index]! + 1]! += 1;
  for (let knot = 0; knot < knots; knot += 1) start[knot + 1]! += start[knot]!;
  const next = start.slice();
  const sorted = new Int32Array(count);
  for (let index = 0; index < count; index += 1) sorted[next[knotOf[index]!]!++] = index;

  const cellOf = new Int32Array(count);
  const cellHouse = new Int32Array(count);
  const knotCells = new Int32Array(knots + 1);
  const lastCell = new Int32Array(groups).fill(-1);
  let cells = 0;
  for (let knot = 0; knot < knots; knot += 1) {
    knotCells[knot] = cells;
    for (let place = start[knot]!; place < start[knot + 1]!; place += 1) {
      const index = sorted[place]!;
      const house = houseOf[index]!;
      if (lastCell[house]! < knotCells[knot]!) {
        lastCell[house] = cells;
        cellHouse[cells] = house;
        cells += 1;
      }
      cellOf[index] = lastCell[house]!;
    }
  }
  knotCells[knots] = cells;
  return { knotCells, cellHouse: cellHouse.slice(0, cells), cellOf };
}
