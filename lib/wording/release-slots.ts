import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { baseOf } from '@/lib/findings/check-document-of';
import { formatDay, formatDayEnds, formatDayRange } from '@/lib/format/date';
import { atStart, inSentence, isolated, plain } from './names';
import { printCount } from './print';
import { say, type Slots } from './say';
import { speakDay, speakDays } from './speak';
import { habitOf, type Voice } from './voice';

/** Who asked whom, how many, how, when and for whom, of a release and of the one it is compared with. */
export function releaseSlots(release: ReleaseFacts, previous: ReleaseFacts | null, voice: Voice): Slots {
  const withYear = previous !== null && yearOf(previous.fieldStartOn) !== yearOf(release.fieldEndOn);
  return {
    habit: habitOf(voice.locale),
    spoken: voice.isSpoken ? 'yes' : 'no',
    ...aboutSelf(release, voice),
    ...fieldDates(release, withYear, voice),
    ...(previous ? aboutEarlier(release, previous, withYear, voice) : {}),
  };
}

function aboutSelf(release: ReleaseFacts, voice: Voice): Slots {
  const { terms } = voice.style.messages[voice.language];
  const n = valueOf(release.n);
  const mode = valueOf(release.mode);
  const sponsor = valueOf(release.sponsor);
  return {
    race: isolated(release.race.name),
    pollster: inSentence(release.pollster.name, voice.language),
    pollsterStart: atStart(release.pollster.name, voice.language),
    newsroom: inSentence(terms.newsroom ?? voice.style.newsroom, voice.language),
    newsroomStart: atStart(terms.newsroom ?? voice.style.newsroom, voice.language),
    comparisonRule: plain(terms.comparisonRule ?? voice.style.comparisonRule),
    populated: valueOf(release.population) ? 'yes' : 'no',
    population: terms.population[valueOf(release.population) ?? 'unknown'],
    ofWhom: terms.ofWhom?.[valueOf(release.population) ?? 'unknown'] ?? '',
    sized: n === null ? 'no' : 'yes',
    n: n === null ? '' : printCount(n, voice),
    modeKnown: mode ? 'yes' : 'no',
    mode: mode ? terms.mode[mode] : '',
    sponsored: release.sponsor.status === 'not-applicable' ? 'own' : sponsor ? 'given' : 'unknown',
    sponsor: sponsor ? inSentence(sponsor.name, voice.language) : '',
    design: baseOf(release).design === 'clustered' ? 'clustered' : release.design,
    drawn: release.sampleSource === 'unknown' ? 'unknown' : 'known',
    sample: terms.sample[release.sampleSource],
  };
}

/** Field dates with all that a sentence may ask of them. In speech `dates` brings its own word before it. */
function fieldDates(release: ReleaseFacts, withYear: boolean, voice: Voice): Slots {
  const { fieldStartOn: start, fieldEndOn: end } = release;
  const crossesYear = yearOf(start) !== yearOf(end);
  return {
    dateSpan: spanOf(start, end),
    dates: printDays(start, end, withYear, voice),
    start: printDay(start, crossesYear, voice),
    end: printDay(end, withYear || crossesYear, voice),
    longSpan: start === end ? 'day' : 'days',
    startLong: printDay(start, true, voice),
    startShort: printDay(start, crossesYear, voice),
    endLong: printDay(end, true, voice),
  };
}

function aboutEarlier(release: ReleaseFacts, previous: ReleaseFacts, withYear: boolean, voice: Voice): Slots {
  const own = aboutSelf(previous, voice);
  const dates = fieldDates(previous, withYear, voice);
  const names = [release, previous].map(({ pollster }) => inSentence(pollster.name, voice.language));
  const slots: Slots = {
    samePollster: release.pollster.id === previous.pollster.id ? 'yes' : 'no',
    pollsters: new Intl.ListFormat(voice.locale, { type: 'conjunction' }).format(new Set(names)),
    prevPollster: own.pollster ?? '',
    prevPopulated: own.populated ?? 'no',
    prevPopulation: own.population ?? '',
    prevOfWhom: own.ofWhom ?? '',
    prevSized: own.sized ?? 'no',
    prevN: own.n ?? '',
    prevDateSpan: dates.dateSpan ?? '',
    prevDates: dates.dates ?? '',
    prevStart: dates.start ?? '',
    prevEnd: dates.end ?? '',
    prevDatesLong: printDays(previous.fieldStartOn, previous.fieldEndOn, true, voice),
  };
  // A pack from before this term has no message that asks for it.
  const { earlierPoll } = voice.style.messages[voice.language].terms as { earlierPoll?: string };
  const named = { ...slots, spoken: voice.isSpoken ? 'yes' : 'no' };
  return earlierPoll === undefined ? slots : { ...slots, prevPoll: say(earlierPoll, named, voice.locale) };
}

/** One day as it is printed or said. */
export function printDay(day: string, withYear: boolean, voice: Voice): string {
  return voice.isSpoken ? speakDay(day, withYear, voice) : formatDay(day, voice.locale, { withYear });
}

/** Field dates as they are printed, or said with the word that leads in. */
export function printDays(start: string, end: string, withYear: boolean, voice: Voice): string {
  if (voice.isSpoken) return speakDays(start, end, withYear, voice);
  const { days } = voice.style.messages[voice.language].terms;
  if (!days) return formatDayRange(start, end, voice.locale, { withYear });
  const ends = formatDayEnds(start, end, voice.locale, { withYear });
  return say(start === end ? days.one : days.several, ends, voice.locale);
}

function spanOf(start: string, end: string): 'day' | 'month' | 'wider' {
  if (start === end) return 'day';
  return start.slice(0, 7) === end.slice(0, 7) ? 'month' : 'wider';
}

const yearOf = (day: string) => day.slice(0, 4);
