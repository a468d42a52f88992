const BEFORE_HIGH_MARKS = /[ \u00a0\u202f](?=[;!?])/g;
const BEFORE_COLON = /[ \u00a0](?=:)/g;
const INSIDE_QUOTES = /(?<=«)[ \u00a0]|[ \u00a0](?=»)/g;

/**
 * French spaces in every text of a pack: no-break before a colon and inside guillemets, narrow no-break before
 * high marks. Source: Lexique des règles typographiques en usage à l'Imprimerie nationale, from memory.
 */
export function typesetFrench<Messages>(messages: Messages): Messages {
  return spaced(messages) as Messages;
}

function spaced(value: unknown): unknown {
  if (typeof value === 'string') {
    return value
      .replace(BEFORE_HIGH_MARKS, '\u202f')
      .replace(BEFORE_COLON, '\u00a0')
      .replace(INSIDE_QUOTES, '\u00a0');
  }
  if (Array.isArray(value)) return value.map(spaced);
  if (value && typeof value === 'object') {
    return Object.fromEntries(Object.entries(value).map(([key, one]) => [key, spaced(one)]));
  }
  return value;
}
