/** Names as they stand in a sentence: single spaces, and an article of their own follows the place. */

export function inSentence(name: string): string {
  return plain(name).replace(/^The (?=\S)/, 'the ');
}

export function atStart(name: string): string {
  const plainName = plain(name);
  return /^(the|our|a|an) /.test(plainName) ? plainName[0]!.toUpperCase() + plainName.slice(1) : plainName;
}

export function plain(text: string): string {
  return text.trim().replace(/\s+/g, ' ');
}
