/**
 * A name or a short text as it may be printed: one line, single spaces, composed letters, and none of the invisible
 * characters that turn the words around it or make two names look alike.
 *
 * @example
 * plainName(' Al\u202eder\n Party\u200b '); // => 'Alder Party'
 */
export function plainName(text: string): string {
  return text.normalize('NFC').replace(/\s+/gu, ' ').replace(/\p{C}/gu, '').replace(/ +/g, ' ').trim();
}
