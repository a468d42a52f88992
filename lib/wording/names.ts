/** Names as they stand in a sentence: single spaces, and an article of their own follows the place. */

export function inSentence(name: string): string {
  return isolated(plain(name).replace(/^The (?=\S)/, 'the '));
}

export function atStart(name: string): string {
  const plainName = isolated(name);
  return /^(the|our|a|an) /.test(plainName) ? plainName[0]!.toUpperCase() + plainName.slice(1) : plainName;
}

export function plain(text: string): string {
  return text.trim().replace(/\s+/g, ' ');
}

const RIGHT_TO_LEFT = /[\p{Script=Arabic}\p{Script=Hebrew}\p{Script=Syriac}\p{Script=Thaana}\p{Script=Nko}]/u;

/**
 * A name as it stands in a sentence that runs from left to right: one with letters that run the other way is held
 * apart by the invisible marks U+2068 and U+2069, or the figures after it would change places with it. Other names
 * stay as they are, so that nothing invisible is copied without need.
 */
export function isolated(name: string): string {
  const plainName = plain(name);
  return RIGHT_TO_LEFT.test(plainName) ? `\u2068${plainName}\u2069` : plainName;
}
