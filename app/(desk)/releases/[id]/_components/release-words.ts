import { valueOf } from '@/lib/domain/disclosed';
import { beforeFigure } from '@/lib/domain/reading-order';
import { pctOf, type ReleaseFacts } from '@/lib/domain/release-facts';
import { MODE_NAMES, POPULATION_NAMES } from '@/lib/domain/vocabulary';
import type { MissingDisclosure } from '@/lib/findings/disclosure';
import { formatDayRange } from '@/lib/format/date';
import { formatCount } from '@/lib/format/number';

const LOCALE = 'en-GB';

/** A share as printed, or a dash where the release withholds it. */
export function printedShare(units: number | null, decimals: number): string {
  return units === null ? '–' : pctOf(units, decimals).toFixed(decimals);
}

/** Neutral: the pollster and the two largest shares as printed, never who is ahead. */
export function titleOf({ pollster, shares, decimals }: ReleaseFacts): string {
  const largest = shares
    .filter((share) => share.isAnswer && share.units !== null)
    .sort((a, b) => (b.units ?? 0) - (a.units ?? 0))
    .slice(0, 2)
    .map(({ option, units }) => `${beforeFigure(option)} ${printedShare(units, decimals)}`);
  return largest.length > 0
    ? `${pollster.name}: ${largest.join(', ')}`
    : `${pollster.name}: no share disclosed`;
}

/** The name of a browser tab: no figure, since tabs and their history are seen by others. */
export function tabOf({ race, pollster, fieldStartOn, fieldEndOn }: ReleaseFacts): string {
  return `${race.name}: ${pollster.name}, ${formatDayRange(fieldStartOn, fieldEndOn, LOCALE)}`;
}

/** Who was asked, when and how, for whom; what is not known is left to the disclosure list. */
export function particularsOf(facts: ReleaseFacts): string {
  const [n, population, mode] = [valueOf(facts.n), valueOf(facts.population), valueOf(facts.mode)];
  const people = population ? POPULATION_NAMES[population].toLowerCase() : 'people';
  const sponsor = valueOf(facts.sponsor);
  const parts = [
    n === null ? `An undisclosed number of ${people}` : `${formatCount(n, LOCALE)} ${people}`,
    formatDayRange(facts.fieldStartOn, facts.fieldEndOn, LOCALE, { withYear: true }),
    ...(mode ? [MODE_NAMES[mode].toLowerCase()] : []),
    ...(sponsor ? [`for ${sponsor.name}`] : []),
  ];
  return `${parts.join(', ')}.`;
}

const NUMBERS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine'];

export function missingSentence(missing: readonly MissingDisclosure[]): string {
  const count = missing.length;
  if (count === 0) return 'Nothing of the disclosure list is missing.';
  const number = NUMBERS[count] ?? String(count);
  return `${number} ${count === 1 ? 'item' : 'items'} of the disclosure list ${count === 1 ? 'is' : 'are'} missing.`;
}

/** Column heads of two releases: their months, or whole dates where those are the same. */
export function columnHeads(current: ReleaseFacts, previous: ReleaseFacts | null): [string, string] {
  const month = ({ fieldEndOn }: ReleaseFacts, options: Intl.DateTimeFormatOptions) =>
    new Intl.DateTimeFormat(LOCALE, { ...options, timeZone: 'UTC' }).format(
      new Date(`${fieldEndOn}T00:00:00Z`),
    );
  if (!previous) return ['Share', ''];
  const heads = (options: Intl.DateTimeFormatOptions): [string, string] => [
    month(current, options),
    month(previous, options),
  ];
  const [now, before] = heads({ month: 'short' });
  if (now !== before) return [now, before];
  const isSameYear = current.fieldEndOn.slice(0, 4) === previous.fieldEndOn.slice(0, 4);
  return heads(isSameYear ? { day: 'numeric', month: 'short' } : { month: 'short', year: '2-digit' });
}
