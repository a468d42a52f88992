import { IntlMessageFormat } from 'intl-messageformat';
import type { Language } from '@/lib/domain/vocabulary';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';

export type Other = Exclude<Language, 'en'>;
export const OTHERS: readonly Other[] = ['es', 'fr', 'de'];
export const { messages: PACKS, locales: LOCALES } = DEFAULT_HOUSE_STYLE;

/** Every text of a pack by its path, lists by their places. */
export function textsOf(tree: unknown, path = ''): Map<string, string> {
  if (typeof tree === 'string') return new Map([[path, tree]]);
  if (typeof tree !== 'object' || tree === null) return new Map();
  return new Map(
    Object.entries(tree).flatMap(([key, value]) => [...textsOf(value, path ? `${path}.${key}` : key)]),
  );
}

type Ast = ReturnType<IntlMessageFormat['getAst']>;
const LITERAL = 0;
const SELECT = 5;
const PLURAL = 6;

/** A message taken apart: its slots, the choices told apart by each, the cases of its plurals, its plain words. */
export type Parts = {
  slots: Set<string>;
  choices: Map<string, Set<string>>;
  plurals: string[][];
  words: string;
};

export function partsOf(message: string, locale: string): Parts {
  const parts: Parts = { slots: new Set(), choices: new Map(), plurals: [], words: '' };
  read(new IntlMessageFormat(message, locale, undefined, { ignoreTag: true }).getAst(), parts);
  return parts;
}

function read(ast: Ast, parts: Parts): void {
  for (const element of ast) {
    if (element.type === LITERAL) parts.words += `${element.value}|`;
    if (!('value' in element) || element.type === LITERAL) continue;
    const name = String(element.value);
    parts.slots.add(name);
    if (element.type !== SELECT && element.type !== PLURAL) continue;
    const options = Object.entries(element.options);
    const keys = options.map(([key]) => key);
    if (element.type === PLURAL) parts.plurals.push(keys);
    else parts.choices.set(name, new Set([...(parts.choices.get(name) ?? []), ...keys]));
    for (const [, option] of options) read(option.value, parts);
  }
}
