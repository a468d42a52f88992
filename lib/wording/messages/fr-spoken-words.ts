import type { SpokenWords } from '../language-pack';

const ONES = [
  ...['zéro', 'un', 'deux', 'trois', 'quatre', 'cinq', 'six', 'sept', 'huit', 'neuf', 'dix', 'onze', 'douze'],
  ...['treize', 'quatorze', 'quinze', 'seize', 'dix-sept', 'dix-huit', 'dix-neuf'],
];
const TENS = ['', '', 'vingt', 'trente', 'quarante', 'cinquante', 'soixante'];

function below100(n: number): string {
  if (n < 20) return ONES[n] ?? '';
  if (n === 71) return 'soixante et onze';
  if (n === 80) return 'quatre-vingts';
  if (n > 80) return `quatre-vingt-${ONES[n - 80] ?? ''}`;
  const tens = TENS[Math.min(6, Math.floor(n / 10))] ?? '';
  const rest = n >= 60 ? n - 60 : n % 10;
  if (rest === 0) return tens;
  return rest === 1 ? `${tens} et un` : `${tens}-${ONES[rest] ?? ''}`;
}

const small = Array.from({ length: 100 }, (_, n) => below100(n));
const hundreds = ['', 'cent', ...ONES.slice(2, 10).map((one) => `${one} cents`)];
const hundredsBefore = ['', 'cent', ...ONES.slice(2, 10).map((one) => `${one} cent`)];

/** Numbers and dates as a presenter says them in French. */
export const FR_SPOKEN_WORDS: SpokenWords = {
  small,
  hundreds,
  hundredsBefore,
  hundredsAndRest: '{hundreds} {rest}',
  thousands: '{count, plural, =1 {mille} =80 {quatre-vingt mille} other {{thousands} mille}}',
  thousandsAndRest: '{count, plural, =1 {mille} =80 {quatre-vingt mille} other {{thousands} mille}} {rest}',
  millions: '{count, plural, one {{millions} million} other {{millions} millions}}',
  millionsAndRest: '{count, plural, one {{millions} million} other {{millions} millions}} {rest}',
  decimal: '{whole} virgule {digits}',
  minus: 'moins {n}',
  plus: 'plus {n}',
  ordinals: small.slice(0, 32).map((word, n) => (n === 0 ? '' : n === 1 ? 'premier' : word)),
  day: '{ordinal} {month}{dated, select, yes { {year}} other {}}',
  days: '{span, select, day {le {from}} month {entre le {first} et le {last} {month}{dated, select, yes { {year}} other {}}} other {entre le {from} et le {to}}}',
  year: '{whole}',
  beforeNoun: { people: { small: small.map((word) => word.replace(/(^|[ -])un$/, '$1une')) } },
};
