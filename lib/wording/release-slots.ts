import { valueOf } from '@/lib/domain/disclosed';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { baseOf } from '@/lib/findings/check-document-of';
import { formatDay, formatDayRange } from '@/lib/format/date';
import { formatCount } from '@/lib/format/number';
import { atStart, inSentence, plain } from './names';
import type { Voice } from './print';
import type { Slots } from './say';

/** Who asked whom, how many, how, when and for whom, of a release and of the one it is compared with. */
export function releaseSlots(release: ReleaseFacts, previous: ReleaseFacts | null, voice: Voice): Slots {
  const withYear = previous !== null && yearOf(previous.fieldStartOn) !== yearOf(release.fieldEndOn);
  return {
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
    race: plain(release.race.name),
    pollster: inSentence(release.pollster.name),
    pollsterStart: atStart(release.pollster.name),
    newsroom: inSentence(voice.style.newsroom),
    newsroomStart: atStart(voice.style.newsroom),
    comparisonRule: plain(voice.style.comparisonRule),
    populated: valueOf(release.population) ? 'yes' : 'no',
    population: terms.population[valueOf(release.population) ?? 'unknown'],
    sized: n === null ? 'no' : 'yes',
    n: n === null ? '' : formatCount(n, voice.locale),
    modeKnown: mode ? 'yes' : 'no',
    mode: mode ? terms.mode[mode] : '',
    sponsored: release.sponsor.status === 'not-applicable' ? 'own' : sponsor ? 'given' : 'unknown',
    sponsor: sponsor ? inSentence(sponsor.name) : '',
    design: baseOf(release).design === 'clustered' ? 'clustered' : release.design,
    drawn: release.sampleSource === 'unknown' ? 'unknown' : 'known',
    sample: terms.sample[release.sampleSource],
  };
}

function fieldDates(release: ReleaseFacts, withYear: boolean, { locale }: Voice): Slots {
  const { fieldStartOn: start, fieldEndOn: end } = release;
  const crossesYear = yearOf(start) !== yearOf(end);
  return {
    dateSpan: spanOf(start, end),
    dates: formatDayRange(start, end, locale, { withYear }),
    start: formatDay(start, locale, { withYear: crossesYear }),
    end: formatDay(end, locale, { withYear: withYear || crossesYear }),
    longSpan: start === end ? 'day' : 'days',
    startLong: formatDay(start, locale),
    startShort: formatDay(start, locale, { withYear: crossesYear }),
    endLong: formatDay(end, locale),
  };
}

function aboutEarlier(release: ReleaseFacts, previous: ReleaseFacts, withYear: boolean, voice: Voice): Slots {
  const own = aboutSelf(previous, voice);
  const dates = fieldDates(previous, withYear, voice);
  const pollsters = [...new Set([release, previous].map(({ pollster }) => inSentence(pollster.name)))];
  return {
    samePollster: release.pollster.id === previous.pollster.id ? 'yes' : 'no',
    pollsters: new Intl.ListFormat(voice.locale, { type: 'conjunction' }).format(pollsters),
    prevPollster: own.pollster ?? '',
    prevPopulated: own.populated ?? 'no',
    prevPopulation: own.population ?? '',
    prevSized: own.sized ?? 'no',
    prevN: own.n ?? '',
    prevDateSpan: dates.dateSpan ?? '',
    prevDates: dates.dates ?? '',
    prevStart: dates.start ?? '',
    prevEnd: dates.end ?? '',
    prevDatesLong: formatDayRange(previous.fieldStartOn, previous.fieldEndOn, voice.locale, {
      withYear: true,
    }),
  };
}

function spanOf(start: string, end: string): 'day' | 'month' | 'wider' {
  if (start === end) return 'day';
  return start.slice(0, 7) === end.slice(0, 7) ? 'month' : 'wider';
}

const yearOf = (day: string) => day.slice(0, 4);
