import type { SpokenWords } from '../language-pack';

const ONES = [
  ...['null', 'eins', 'zwei', 'drei', 'vier', 'fünf', 'sechs', 'sieben', 'acht', 'neun', 'zehn', 'elf'],
  ...['zwölf', 'dreizehn', 'vierzehn', 'fünfzehn', 'sechzehn', 'siebzehn', 'achtzehn', 'neunzehn'],
];
const TENS = ['', '', 'zwanzig', 'dreißig', 'vierzig', 'fünfzig', 'sechzig', 'siebzig', 'achtzig', 'neunzig'];

const small = Array.from({ length: 100 }, (_, n) => {
  if (n < 20) return ONES[n] ?? '';
  const tens = TENS[Math.floor(n / 10)] ?? '';
  if (n % 10 === 0) return tens;
  return `${n % 10 === 1 ? 'ein' : (ONES[n % 10] ?? '')}und${tens}`;
});
const hundreds = ['', 'hundert', ...ONES.slice(2, 10).map((one) => `${one}hundert`)];

const ORDINALS = ['', 'ersten', 'zweiten', 'dritten', 'vierten', 'fünften', 'sechsten', 'siebten', 'achten'];
const ordinals = Array.from({ length: 32 }, (_, n) => {
  if (n < ORDINALS.length) return ORDINALS[n] ?? '';
  return n < 20 ? `${ONES[n] ?? ''}ten` : `${small[n] ?? ''}sten`;
});
const startsWith = (one: string) => small.map((word, n) => (n === 1 ? one : word));

/** Numbers and dates as a presenter says them in German; days stand in the dative. */
export const DE_SPOKEN_WORDS: SpokenWords = {
  small,
  hundreds,
  hundredsBefore: hundreds,
  hundredsAndRest: '{hundreds}{rest}',
  thousands: '{count, plural, =1 {tausend} other {{thousands}tausend}}',
  thousandsAndRest: '{count, plural, =1 {tausend} other {{thousands}tausend}}{rest}',
  millions: '{count, plural, =1 {eine Million} other {{millions} Millionen}}',
  millionsAndRest: '{count, plural, =1 {eine Million} other {{millions} Millionen}} {rest}',
  decimal: '{whole} Komma {digits}',
  minus: 'minus {n}',
  plus: 'plus {n}',
  ordinals,
  day: '{ordinal} {month}{dated, select, yes { {year}} other {}}',
  days: '{span, select, day {am {from}} month {zwischen dem {first} und dem {last} {month}{dated, select, yes { {year}} other {}}} other {zwischen dem {from} und dem {to}}}',
  year: '{whole}',
  beforeNoun: { percent: { small: startsWith('ein') }, points: { small: startsWith('einem') } },
};
