/** Months and weekdays in German, without accents, with their short forms. */
export const DE_MONTHS: readonly (readonly string[])[] = [
  ['januar', 'jan', 'janner'],
  ['februar', 'feb'],
  ['marz'],
  ['april', 'apr'],
  ['mai'],
  ['juni'],
  ['juli'],
  ['august', 'aug'],
  ['september', 'sept', 'sep'],
  ['oktober', 'okt'],
  ['november', 'nov'],
  ['dezember', 'dez'],
];
export const DE_WEEKDAYS: readonly (readonly string[])[] = [
  ['sonntag'],
  ['montag'],
  ['dienstag'],
  ['mittwoch'],
  ['donnerstag'],
  ['freitag'],
  ['samstag', 'sonnabend'],
];
