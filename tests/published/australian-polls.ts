import { fileURLToPath } from 'node:url';
import type { CheckDocument, Base } from '@/lib/findings/check-types';
import { readCsv } from '../reference/reference-set';

/**
 * 239 polls of party vote, October 2004 to November 2007: `AustralianElectionPolling` of R's package pscl (S. Jackman,
 * GPL-2). Where a size was imputed it is not whole, and is rounded. Shares are printed to whole or half percents.
 */
export type AustralianPoll = {
  readonly pollster: string;
  readonly endedOn: string;
  readonly n: number;
  readonly shares: ReadonlyMap<'Labor' | 'Coalition' | 'Greens', number>;
};

const table = readCsv(fileURLToPath(new URL('./data/AustralianElectionPolling.csv', import.meta.url)));
const column = (name: string) => table.get(name) ?? [];
const numberAt = (name: string, row: number) => Number(column(name)[row] || 0);

export const australianPolls: readonly AustralianPoll[] = column('org').map((pollster, row) => ({
  pollster,
  endedOn: column('endDate')[row] ?? '',
  n: Math.round(numberAt('sampleSize', row)),
  shares: new Map([
    ['Labor', numberAt('ALP', row)],
    ['Coalition', numberAt('Lib', row) + numberAt('Nat', row)],
    ['Greens', numberAt('Green', row)],
  ]),
}));

/** Each poll with the one before it of the same pollster, in the order of their last days in the field. */
export function successivePolls(): { earlier: AustralianPoll; later: AustralianPoll }[] {
  const pollsters = [...new Set(australianPolls.map((poll) => poll.pollster))];
  return pollsters.flatMap((pollster) => {
    const own = australianPolls
      .filter((poll) => poll.pollster === pollster)
      .sort((one, other) => one.endedOn.localeCompare(other.endedOn));
    return own.slice(1).flatMap((later, index) => {
      const earlier = own[index];
      return earlier ? [{ earlier, later }] : [];
    });
  });
}

/** The poll as a newsroom would have logged it: no design effect disclosed, interviews at the door clustered. */
export function baseOf({ pollster, n, shares }: AustralianPoll): Base {
  return {
    sampleSource: 'probability',
    n,
    design: pollster.endsWith('F2F') ? 'clustered' : 'weighted',
    decimals: 1,
    shares: [...shares].map(([option, pct]) => ({ option, pct })),
  };
}

/** The questions of a news story: who leads, and what moved. */
export function questionsOf(earlier: AustralianPoll, later: AustralianPoll): CheckDocument {
  return {
    release: baseOf(later),
    previous: baseOf(earlier),
    pairs: [['Labor', 'Coalition']],
    changes: ['Labor', 'Coalition', 'Greens'],
    thresholds: [{ option: 'Labor', pct: 50 }],
  };
}
