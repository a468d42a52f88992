import { IntlMessageFormat } from 'intl-messageformat';

export type Slots = Record<string, string | number>;

const compiled = new Map<string, IntlMessageFormat>();

/**
 * One message with its slots filled. A slot that the message names and nobody filled is an error, never a hole in
 * a sentence; a filled slot that the message does not name is fine.
 *
 * @throws Error from intl-messageformat where the message is not ICU or a slot is missing
 */
export function say(message: string, slots: Slots, locale: string): string {
  const key = `${locale}\n${message}`;
  let format = compiled.get(key);
  if (!format) {
    format = new IntlMessageFormat(message, locale, undefined, { ignoreTag: true });
    compiled.set(key, format);
  }
  return String(format.format(slots));
}
