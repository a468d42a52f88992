import { valueOf } from '@/lib/domain/disclosed';
import type { Population } from '@/lib/domain/vocabulary';
import { markAt } from '../marks';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import type { WordingMark } from '../types';
import { releasesNamed } from '../which-release';
import { isAboutPoll } from './about';

const NAMES: Record<Population, string> = {
  adults: 'adults',
  'registered-voters': 'registered voters',
  'likely-voters': 'likely voters',
};

/** Adults, registered and likely voters are three populations: AAPOR and AP usage, from memory. */
export function markPopulations(reading: Reading): WordingMark[] {
  if (reading.input.releases.length === 0) return [];
  const groups: [Parameters<Reading['cues']>[0], readonly Population[]][] = [
    ['likelyVoters', ['likely-voters']],
    ['registeredVoters', ['registered-voters']],
    ['adults', ['adults']],
    ['voters', ['registered-voters', 'likely-voters']],
    ['everybody', ['adults']],
    ['people', ['adults']],
  ];
  return groups.flatMap(([group, fitting]) =>
    reading
      .cues(group)
      .filter((hit) => isAboutPoll(reading, hit) && !isInOther(reading, group, hit))
      .flatMap((hit) => judge(reading, hit, fitting)),
  );
}

function isInOther(reading: Reading, group: string, hit: Hit): boolean {
  if (group === 'voters') {
    return ['likelyVoters', 'registeredVoters', 'subgroup', 'decided'].some((other) =>
      reading.has(other as 'adults', hit),
    );
  }
  return group === 'adults' && reading.has('subgroup', hit);
}

function judge(reading: Reading, hit: Hit, fitting: readonly Population[]): WordingMark[] {
  const asked = releasesNamed(reading, hit).flatMap((release) => {
    const { facts, previous } = reading.input.releases[release]!;
    const sentence = reading.sentenceAt(hit.from);
    const all = reading.has('earlierWords', sentence) && previous ? [facts, previous] : [facts];
    return all.map((one) => ({ release, population: valueOf(one.population) }));
  });
  const [first] = asked;
  if (!first || asked.some(({ population }) => population === null || fitting.includes(population)))
    return [];
  const name = first.population ? NAMES[first.population] : null;
  return [
    markAt(reading, hit, {
      rule: 'population',
      grade: 'wrong',
      release: first.release,
      message: `The poll asked ${name}.`,
      replacement: first.population ? reading.lexicon.words.populations[first.population] : null,
    }),
  ];
}
