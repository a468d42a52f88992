import type { SpokenWords } from '../language-pack';

const ONES = [
  ...['zero', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten'],
  ...['eleven', 'twelve', 'thirteen', 'fourteen', 'fifteen', 'sixteen', 'seventeen', 'eighteen', 'nineteen'],
];
const TENS = ['', '', 'twenty', 'thirty', 'forty', 'fifty', 'sixty', 'seventy', 'eighty', 'ninety'];
const ORDINALS = [
  ...['', 'first', 'second', 'third', 'fourth', 'fifth', 'sixth', 'seventh', 'eighth', 'ninth', 'tenth'],
  ...['eleventh', 'twelfth', 'thirteenth', 'fourteenth', 'fifteenth', 'sixteenth', 'seventeenth'],
  ...['eighteenth', 'nineteenth'],
];

const small = Array.from({ length: 100 }, (_, n) => {
  if (n < 20) return ONES[n] ?? '';
  const tens = TENS[Math.floor(n / 10)] ?? '';
  return n % 10 === 0 ? tens : `${tens}-${ONES[n % 10] ?? ''}`;
});
const ordinals = Array.from({ length: 32 }, (_, n) => {
  if (n < 20) return ORDINALS[n] ?? '';
  if (n % 10 === 0) return n === 20 ? 'twentieth' : 'thirtieth';
  return `${TENS[Math.floor(n / 10)] ?? ''}-${ORDINALS[n % 10] ?? ''}`;
});
const hundreds = Array.from({ length: 10 }, (_, n) => (n === 0 ? '' : `${ONES[n] ?? ''} hundred`));

const AND_REST = (whole: string) =>
  `{small, select, yes {{habit, select, US {${whole} {rest}} other {${whole} and {rest}}}} other {${whole} {rest}}}`;

/** Numbers and dates as a presenter says them; "and" before the last two figures is British habit. */
export const EN_SPOKEN_WORDS: SpokenWords = {
  small,
  hundreds,
  hundredsBefore: hundreds,
  hundredsAndRest: AND_REST('{hundreds}'),
  thousands: '{thousands} thousand',
  thousandsAndRest: AND_REST('{thousands} thousand'),
  millions: '{millions} million',
  millionsAndRest: AND_REST('{millions} million'),
  decimal: '{whole} point {digits}',
  minus: 'minus {n}',
  plus: 'plus {n}',
  ordinals,
  day: '{habit, select, US {{month} {ordinal}{dated, select, yes {, {year}} other {}}} other {the {ordinal} of {month}{dated, select, yes {, {year}} other {}}}}',
  days: '{span, select, day {on {from}} month {{habit, select, US {between {month} {first} and {last}{dated, select, yes {, {year}} other {}}} other {between the {first} and the {last} of {month}{dated, select, yes {, {year}} other {}}}}} other {between {from} and {to}}}',
  year: '{paired, select, yes {{century} {rest}} other {{whole}}}',
};
