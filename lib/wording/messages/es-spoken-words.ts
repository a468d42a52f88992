import type { SpokenWords } from '../language-pack';

const ONES = [
  ...['cero', 'uno', 'dos', 'tres', 'cuatro', 'cinco', 'seis', 'siete', 'ocho', 'nueve', 'diez', 'once'],
  ...['doce', 'trece', 'catorce', 'quince', 'dieciséis', 'diecisiete', 'dieciocho', 'diecinueve', 'veinte'],
  ...['veintiuno', 'veintidós', 'veintitrés', 'veinticuatro', 'veinticinco', 'veintiséis', 'veintisiete'],
  ...['veintiocho', 'veintinueve'],
];
const TENS = ['', '', '', 'treinta', 'cuarenta', 'cincuenta', 'sesenta', 'setenta', 'ochenta', 'noventa'];

const small = Array.from({ length: 100 }, (_, n) => {
  if (n < 30) return ONES[n] ?? '';
  const tens = TENS[Math.floor(n / 10)] ?? '';
  return n % 10 === 0 ? tens : `${tens} y ${ONES[n % 10] ?? ''}`;
});
const hundreds = [
  ...['', 'cien', 'doscientos', 'trescientos', 'cuatrocientos', 'quinientos', 'seiscientos', 'setecientos'],
  ...['ochocientos', 'novecientos'],
];
const hundredsBefore = hundreds.map((word, n) => (n === 1 ? 'ciento' : word));
const feminine = (words: readonly string[]) =>
  words.map((word) => word.replace(/cientos$/, 'cientas').replace('quinientos', 'quinientas'));

/** Numbers and dates as a presenter says them in Spanish. */
export const ES_SPOKEN_WORDS: SpokenWords = {
  small,
  hundreds,
  hundredsBefore,
  hundredsAndRest: '{hundreds} {rest}',
  thousands: '{count, plural, =1 {mil} =21 {veintiún mil} =31 {treinta y un mil} other {{thousands} mil}}',
  thousandsAndRest:
    '{count, plural, =1 {mil} =21 {veintiún mil} =31 {treinta y un mil} other {{thousands} mil}} {rest}',
  millions: '{count, plural, =1 {un millón} other {{millions} millones}}',
  millionsAndRest: '{count, plural, =1 {un millón} other {{millions} millones}} {rest}',
  decimal: '{whole} coma {digits}',
  minus: 'menos {n}',
  plus: 'más {n}',
  ordinals: small.slice(0, 32).map((word, n) => (n === 0 ? '' : word)),
  day: '{ordinal} de {month}{dated, select, yes { de {year}} other {}}',
  days: '{span, select, day {el {from}} month {entre el {first} y el {last} de {month}{dated, select, yes { de {year}} other {}}} other {entre el {from} y el {to}}}',
  year: '{whole}',
  beforeNoun: {
    points: { small: small.map((word) => word.replace(/veintiuno$/, 'veintiún').replace(/uno$/, 'un')) },
    people: {
      small: small.map((word) => word.replace(/uno$/, 'una')),
      hundreds: feminine(hundreds),
      hundredsBefore: feminine(hundredsBefore),
    },
  },
};
