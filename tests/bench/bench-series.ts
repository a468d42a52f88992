import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { smoothLevel, smoothLevelWithHouses, type HousePoll } from '@/lib/stats';
import { normalDraw, seeded } from '../simulation/random';
import { benchFit } from './bench-fit';
import { growth, fastestSeconds } from './measure';
import { readRows, readTimes, runR } from './r';
import type { Report } from './report';

const DAYS = 2000;
const A_DAY = 5;
const HOUSES = 20;
const STATE_VARIANCE = 4e-6;
const POLL_VARIANCE = 2.5e-4;
/** R begins with a variance of 10,000 where ours is diffuse. */
const TOLERANCE = 1e-6;

/**
 * 5,000 polls over 2,000 days, five on each of 1,000 days: so one error variance is true of every day with polls,
 * and R's smoother, which knows only one, answers the same question.
 */
export async function benchSeries(report: Report, folder: string): Promise<void> {
  const polls = seriesOf(DAYS, A_DAY, HOUSES);
  writeFileSync(join(folder, 'days.csv'), ['y', ...dailyMeans(polls, DAYS), ''].join('\n'));
  runR('series.R', folder, STATE_VARIANCE, POLL_VARIANCE / A_DAY);
  const options = { firstDay: 0, lastDay: DAYS - 1, stateVariancePerDay: STATE_VARIANCE };

  const ours = smoothLevel(polls, options);
  readRows(folder, 'answers.csv').forEach((row, day) => {
    const error = (variance: number | undefined) => Math.sqrt(variance ?? 0);
    report.same(`level of day ${day}`, ours.smoothedMean[day] ?? 0, Number(row.mean), TOLERANCE);
    report.same(
      `error of day ${day}`,
      error(ours.smoothedVariance[day]),
      error(Number(row.variance)),
      TOLERANCE,
    );
  });

  const times = readTimes(folder);
  const plain = await fastestSeconds(() => smoothLevel(polls, options));
  const housed = await fastestSeconds(() => smoothLevelWithHouses(polls, options), { time: 1000 });
  report.title(`${polls.length} polls over ${DAYS} days`);
  report.time('level, variances known, no houses (filter, smoother, likelihood)', plain);
  report.time('R: KalmanSmooth over the days, polls averaged beforehand', times.get('KalmanSmooth') ?? 0);
  report.aim('ours over KalmanSmooth, no houses', plain / (times.get('KalmanSmooth') ?? 0), 5, 'at most');
  report.time(`level and ${HOUSES} house effects, variances known`, housed);
  report.say(`  ${HOUSES} houses cost ${(housed / plain).toFixed(1)} times the smoothing without`);
  await benchFit(report, folder, { polls, days: DAYS, aDay: A_DAY, pollVariance: POLL_VARIANCE });
  report.title('Growth of the series');
  await growthOfSeries(report);
}

async function growthOfSeries(report: Report): Promise<void> {
  const lengths = [500, 1000, 2000, 4000, 8000];
  const by = (houses: number) => (days: number) => {
    const polls = seriesOf(days, A_DAY, houses);
    const options = { firstDay: 0, lastDay: days - 1, stateVariancePerDay: STATE_VARIANCE };
    return houses === 0 ? () => smoothLevel(polls, options) : () => smoothLevelWithHouses(polls, options);
  };
  report.growth('level by days, with 2.5 polls a day', await growth(lengths, by(0)), 1.2);
  report.growth(`level with ${HOUSES} houses by days`, await growth(lengths, by(HOUSES)), 1.2);
  const houses = await growth([5, 10, 20, 40], (count) => by(count)(DAYS));
  report.growth(`level over ${DAYS} days by houses`, houses, 2);
}

/** Polls on every other day of a random walk, in turn from each house. */
function seriesOf(days: number, aDay: number, houses: number): HousePoll[] {
  const random = seeded(days + houses);
  const effects = Array.from({ length: Math.max(1, houses) }, () => 0.01 * normalDraw(random));
  let level = 0.45;
  return Array.from({ length: days }, (_, day) => {
    level += Math.sqrt(STATE_VARIANCE) * normalDraw(random);
    if (day % 2 === 1) return [];
    return Array.from({ length: aDay }, (): HousePoll => {
      const house = Math.floor(random() * effects.length);
      const value = level + (effects[house] ?? 0) + Math.sqrt(POLL_VARIANCE) * normalDraw(random);
      return { day, value, variance: POLL_VARIANCE, house: `House ${house + 1}` };
    });
  }).flat();
}

/** The mean of each day's polls; NA where there are none. */
function dailyMeans(polls: readonly HousePoll[], days: number): string[] {
  const sums = new Float64Array(days);
  for (const { day, value } of polls) sums[day] = (sums[day] ?? 0) + value / A_DAY;
  const asked = new Set(polls.map(({ day }) => day));
  return Array.from(sums, (mean, day) => (asked.has(day) ? String(mean) : 'NA'));
}
