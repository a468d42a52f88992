import { type Disclosed, valueOf } from '@/lib/domain/disclosed';
import { pctOf, type ReleaseFacts, type StatedMargin } from '@/lib/domain/release-facts';
import { DESIGN_NAMES, MODE_NAMES, POPULATION_NAMES, SAMPLE_SOURCE_NAMES } from '@/lib/domain/vocabulary';
import { formatDay, formatDayRange } from '@/lib/format/date';
import { formatCount } from '@/lib/format/number';

const LOCALE = 'en-GB';

type Shown = { facts: ReleaseFacts; methodNote: string | null };
export type VersionRow = { key: string; name: string; cells: string[] };

/** Each particular and each share of several versions side by side, one row each. */
export function versionRows(versions: readonly Shown[]): VersionRow[] {
  const particulars = PARTICULARS.map(([name, say]) => ({
    key: name,
    name,
    cells: versions.map(say),
  }));
  const options = [...new Set(versions.flatMap(({ facts }) => facts.shares.map(({ option }) => option)))];
  const shares = options.map((option) => ({
    key: `share ${option}`,
    name: `${option}, percent`,
    cells: versions.map(({ facts }) => shareOf(facts, option)),
  }));
  return [...shares, ...particulars];
}

const PARTICULARS: [name: string, say: (version: Shown) => string][] = [
  ['Interviews', ({ facts }) => disclosed(facts.n, (n) => formatCount(n, LOCALE))],
  [
    'Field dates',
    ({ facts }) => formatDayRange(facts.fieldStartOn, facts.fieldEndOn, LOCALE, { withYear: true }),
  ],
  ['Published', ({ facts }) => formatDay(facts.publishedOn, LOCALE)],
  ['Pollster', ({ facts }) => facts.pollster.name],
  ['Sponsor', ({ facts }) => disclosed(facts.sponsor, ({ name }) => name)],
  ['Population', ({ facts }) => disclosed(facts.population, (population) => POPULATION_NAMES[population])],
  ['Sample', ({ facts }) => SAMPLE_SOURCE_NAMES[facts.sampleSource]],
  ['Mode', ({ facts }) => disclosed(facts.mode, (mode) => MODE_NAMES[mode])],
  ['Design', ({ facts }) => DESIGN_NAMES[facts.design]],
  ['Design effect', ({ facts }) => (facts.deff ? `${facts.deff.value} (${facts.deff.source})` : 'not given')],
  ['Stated margin', ({ facts }) => disclosed(facts.statedMargin, interval)],
  ['Modelled interval', ({ facts }) => (facts.modelledInterval ? interval(facts.modelledInterval) : 'none')],
  ['Question', ({ facts }) => disclosed(facts.questionWording, (wording) => wording)],
  ['Source', ({ facts }) => disclosed(facts.sourceUrl, (url) => url)],
  ['Note on method', ({ methodNote }) => methodNote ?? 'none'],
];

function disclosed<T>(particular: Disclosed<T>, say: (value: T) => string): string {
  const value = valueOf(particular);
  return value === null ? 'not disclosed' : say(value);
}

const interval = ({ pp, level }: StatedMargin) => `±${pp} points at ${Math.round(level * 1000) / 10}%`;

function shareOf({ shares, decimals }: ReleaseFacts, option: string): string {
  const share = shares.find((one) => one.option === option);
  if (!share) return 'not an option';
  return share.units === null ? 'not disclosed' : pctOf(share.units, decimals).toFixed(decimals);
}
