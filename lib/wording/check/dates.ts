import type { CompiledLexicon } from './lexicon/compiled';
import { phraseAt, type Hit } from './phrases';
import type { Token } from './tokens';

/** A date as written: a month (1–12), its days where it has some, its year where it has one. */
export type Dated = Hit & { days: number[]; month: number; year: number | null };

/** Dates in the tokens: a month with the days and the year around it. */
export function datesIn(
  tokens: readonly Token[],
  isCapital: (at: number) => boolean,
  isNamed: (at: number) => boolean,
  { words: { months, datesAreNames }, cues }: CompiledLexicon,
): Dated[] {
  const dates: Dated[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    if ((datesAreNames && !isCapital(at)) || isNamed(at)) continue;
    const month = months.findIndex((names) => names.includes(tokens[at]?.text ?? '')) + 1;
    if (month > 0) dates.push(dateAround(tokens, at, month, cues));
  }
  return dates;
}

const DAY = /^(?:[1-9]|[12]\d|3[01])$/;

/** The days written around a month: "14–17 September", "September 14 to 17", with a year. */
function dateAround(
  tokens: readonly Token[],
  at: number,
  month: number,
  { dateLinks, ofWords }: CompiledLexicon['cues'],
): Dated {
  const isLink = (place: number) => phraseAt(dateLinks, tokens, place) !== null;
  const text = (place: number) => tokens[place]?.text ?? '';
  const days: number[] = [];
  let from = at;
  for (let place = at - 1; place >= at - 8 && (DAY.test(text(place)) || isLink(place)); place -= 1) {
    if (DAY.test(text(place))) {
      days.unshift(Number(text(place)));
      from = place;
    }
  }
  let to = at + 1;
  if (days.length === 0) {
    for (let place = at + 1; place <= at + 4 && (DAY.test(text(place)) || isLink(place)); place += 1) {
      if (DAY.test(text(place))) {
        days.push(Number(text(place)));
        to = place + 1;
      }
    }
  }
  const yearAt = text(to) === ',' || phraseAt(ofWords, tokens, to) ? to + 1 : to;
  const year = /^(?:19|20)\d\d$/.test(text(yearAt)) ? Number(text(yearAt)) : null;
  return { from, to: year === null ? to : yearAt + 1, days, month, year };
}
