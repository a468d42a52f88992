import { numbersBelow100 } from './numbers';

const TENS: Readonly<Record<number, string>> = {
  20: 'vingt',
  30: 'trente',
  40: 'quarante',
  50: 'cinquante',
  60: 'soixante',
  70: 'septante',
  80: 'quatre vingt',
  90: 'nonante',
};
const SMALL = (
  'zero|un|deux|trois|quatre|cinq|six|sept|huit|neuf|dix|onze|douze|treize|quatorze|quinze|seize|dix sept|' +
  'dix huit|dix neuf'
).split('|');

const withArticle: Record<string, number> = {
  ...numbersBelow100({
    small: Object.fromEntries(SMALL.map((word, value) => [value, word])),
    tens: TENS,
    joined: (tens, unit) =>
      unit === 'un' ? [`${tens} et un`, `${tens} et une`, `${tens} un`] : [`${tens} ${unit}`],
    unitsUpTo: (tens) => (tens === 60 || tens === 80 ? 19 : 9),
  }),
  'quatre vingts': 80,
  'soixante et onze': 71,
};
const { un: _article, ...numbers } = withArticle;

/** French numbers in words, Swiss and Belgian tens too; one is an article and only counts before a unit. */
export const FR_NUMBERS: Readonly<Record<string, number>> = numbers;

/** Words that begin a number, for phrases that a number must follow. */
export const FR_COUNTS: readonly string[] = [
  '#',
  ...Object.keys(FR_NUMBERS).filter((word) => !word.includes(' ')),
  'près',
  'plus',
];
