import { fitLevel, type FitPoll, type HousePoll } from '@/lib/stats';
import { fastestSeconds } from './measure';
import { readRows, readTimes } from './r';
import type { Report } from './report';

/** R stops its search when the likelihood gains no more; so its variances are known to about this part. */
const AS_SEARCHED = 0.02;

export type FitCase = { polls: readonly HousePoll[]; days: number; aDay: number; pollVariance: number };

/**
 * The same series with both variances unknown, against StructTS on what R was given: the mean of each day's polls.
 *
 * Ours is told a part of the sampling error and finds the rest; R finds all of it, so the sums must agree.
 */
export async function benchFit(report: Report, folder: string, asked: FitCase): Promise<void> {
  const { polls, days, aDay, pollVariance } = asked;
  const options = { firstDay: 0, lastDay: days - 1 };
  const told = pollVariance / aDay / 2;
  const { estimated } = fitLevel(averaged(asked, told), options);
  const found = new Map(readRows(folder, 'variances.csv').map((row) => [row.name, Number(row.value)]));
  const level = found.get('level') ?? 0;
  const error = found.get('epsilon') ?? 0;
  report.same('estimated daily variance', estimated.stateVariancePerDay / level, 1, AS_SEARCHED);
  report.same('estimated error variance', (estimated.extraVariance + told) / error, 1, AS_SEARCHED);

  const all = polls.map(({ day, value }): FitPoll => ({ day, value, sampling: given(told * aDay) }));
  const housed = all.map((poll, index): FitPoll => ({ ...poll, house: polls[index]?.house ?? '' }));
  const slow = { time: 1500, iterations: 3 };
  const onDays = await fastestSeconds(() => fitLevel(averaged(asked, told), options), slow);
  const onPolls = await fastestSeconds(() => fitLevel(all, options), slow);
  const withHouses = await fastestSeconds(() => fitLevel(housed, options), slow);
  const theirs = readTimes(folder).get('StructTS') ?? 0;
  report.title('The same with unknown variances; ours also averages the bands over the likelihood');
  report.time('variances and bands, one averaged poll a day', onDays);
  report.time(`variances and bands, ${polls.length} polls`, onPolls);
  report.time(`variances and bands, ${polls.length} polls, with houses`, withHouses);
  report.time('R: StructTS over the days, polls averaged beforehand', theirs);
  report.say(`  ours over StructTS, the same days: ${(onDays / theirs).toFixed(2)} times (no aim)`);
  report.say(`  ours over StructTS, all polls: ${(onPolls / theirs).toFixed(2)} times (no aim)`);
}

function averaged({ polls, aDay }: FitCase, told: number): FitPoll[] {
  const sums = new Map<number, number>();
  for (const { day, value } of polls) sums.set(day, (sums.get(day) ?? 0) + value / aDay);
  return [...sums].map(([day, value]) => ({ day, value, sampling: given(told) }));
}

function given(variance: number): FitPoll['sampling'] {
  return { kind: 'given', variance };
}
