import { roundHalfUp } from '@/lib/format/number';
import { say, type Slots } from './say';
import { habitOf, type Voice } from './voice';

/** What a number counts. */
export type Noun = 'points' | 'people' | 'percent';

/**
 * A number as it is said aloud: "forty-seven point five", "minus eleven", "one thousand and twelve".
 *
 * @param value any finite number below a thousand million; at most three decimals are said
 * @param voice the desk's voice in one language
 * @param noun what is counted, where its gender matters
 */
export function speakNumber(value: number, voice: Voice, noun?: Noun): string {
  const rounded = roundHalfUp(Math.abs(value), 3);
  const whole = Math.floor(rounded);
  const digits = String(rounded).split('.')[1] ?? '';
  const words = wordsOf(voice);
  const spoken =
    digits === ''
      ? speakWhole(whole, voice, noun)
      : write(words.decimal, voice, {
          whole: speakWhole(whole, voice),
          digits: [...digits].map((digit) => words.small[Number(digit)] ?? '').join(' '),
        });
  return value < 0 && rounded !== 0 ? write(words.minus, voice, { n: spoken }) : spoken;
}

/** As `speakNumber`, with "plus" before what is above zero. */
export function speakSigned(value: number, voice: Voice): string {
  const spoken = speakNumber(value, voice);
  return value > 0 ? write(wordsOf(voice).plus, voice, { n: spoken }) : spoken;
}

/** One day aloud: "the fourteenth of September", "September fourteenth". A day is YYYY-MM-DD. */
export function speakDay(day: string, withYear: boolean, voice: Voice): string {
  return write(wordsOf(voice).day, voice, daySlots(day, withYear, voice));
}

/** Field dates aloud, with the word that leads in: "between the fourteenth and the seventeenth of September". */
export function speakDays(start: string, end: string, withYear: boolean, voice: Voice): string {
  const crosses = start.slice(0, 4) !== end.slice(0, 4);
  const span = start === end ? 'day' : start.slice(0, 7) === end.slice(0, 7) ? 'month' : 'wider';
  const first = daySlots(start, withYear, voice);
  const last = daySlots(end, withYear, voice);
  return write(wordsOf(voice).days, voice, {
    ...last,
    span,
    first: first.ordinal ?? '',
    last: last.ordinal ?? '',
    from: speakDay(start, crosses || (withYear && span === 'day'), voice),
    to: speakDay(end, crosses || withYear, voice),
  });
}

function daySlots(day: string, withYear: boolean, voice: Voice): Slots {
  const [year = 0, month = 1, date = 1] = day.split('-').map(Number);
  const name = new Intl.DateTimeFormat(voice.locale, { month: 'long', timeZone: 'UTC' });
  return {
    month: name.format(Date.UTC(year, month - 1, date)),
    ordinal: wordsOf(voice).ordinals[date] ?? '',
    dated: withYear ? 'yes' : 'no',
    year: speakYear(year, voice),
  };
}

function speakYear(year: number, voice: Voice): string {
  const rest = year % 100;
  return write(wordsOf(voice).year, voice, {
    paired: rest >= 10 ? 'yes' : 'no',
    century: speakWhole(Math.floor(year / 100), voice),
    rest: speakWhole(rest, voice),
    whole: speakWhole(year, voice),
  });
}

function speakWhole(whole: number, voice: Voice, noun?: Noun): string {
  const words = { ...wordsOf(voice), ...(noun && wordsOf(voice).beforeNoun?.[noun]) };
  if (whole < 100) return words.small[whole] ?? '';
  if (whole < 1000) {
    const place = Math.floor(whole / 100);
    if (whole % 100 === 0) return words.hundreds[place] ?? '';
    const hundreds = words.hundredsBefore[place] ?? '';
    return write(words.hundredsAndRest, voice, { hundreds, ...restSlots(whole % 100, voice, noun) });
  }
  const [unit, alone, before] =
    whole < 1_000_000
      ? ([1000, words.thousands, words.thousandsAndRest] as const)
      : ([1_000_000, words.millions, words.millionsAndRest] as const);
  const count = Math.floor(whole / unit);
  const name = unit === 1000 ? 'thousands' : 'millions';
  const slots = { [name]: speakWhole(count, voice), count };
  const rest = whole % unit;
  if (rest === 0) return write(alone, voice, slots);
  return write(before, voice, { ...slots, ...restSlots(rest, voice, noun) });
}

function restSlots(rest: number, voice: Voice, noun?: Noun): Slots {
  return { rest: speakWhole(rest, voice, noun), small: rest < 100 ? 'yes' : 'no' };
}

function wordsOf({ style, language }: Voice) {
  return style.messages[language].terms.spoken;
}

function write(message: string, voice: Voice, slots: Slots): string {
  return say(message, { habit: habitOf(voice.locale), ...slots }, voice.locale);
}
