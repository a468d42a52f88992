import { numbersBelow100 } from './numbers';

/** Spanish numbers in words; one and its articles only count before a unit. */
export const ES_NUMBERS: Readonly<Record<string, number>> = {
  ...numbersBelow100({
    small: Object.fromEntries(
      (
        'cero uno dos tres cuatro cinco seis siete ocho nueve diez once doce trece catorce quince dieciseis ' +
        'diecisiete dieciocho diecinueve veinte veintiuno veintidos veintitres veinticuatro veinticinco ' +
        'veintiseis veintisiete veintiocho veintinueve'
      )
        .split(' ')
        .map((word, value) => [value, word]),
    ),
    tens: {
      30: 'treinta',
      40: 'cuarenta',
      50: 'cincuenta',
      60: 'sesenta',
      70: 'setenta',
      80: 'ochenta',
      90: 'noventa',
    },
    joined: (tens, unit, value) =>
      value % 10 === 1 ? [`${tens} y uno`, `${tens} y un`, `${tens} y una`] : [`${tens} y ${unit}`],
    unitsUpTo: () => 9,
  }),
  veintiun: 21,
  veintiuna: 21,
};

/** Words that begin a number, for phrases that a number must follow. */
export const ES_COUNTS: readonly string[] = [
  '#',
  ...Object.keys(ES_NUMBERS).filter((word) => !word.includes(' ')),
  'casi',
  'más',
];
