import 'server-only';
import { IntlMessageFormat } from 'intl-messageformat';

/** Where in a sentence something stands: characters counted from 0, as a text field counts them. */
export type Place = { start: number; end: number };

export type Shape = {
  /** Every slot with the choices that are told apart by it; none for a slot that is only filled in. */
  slots: Map<string, string[]>;
  /** Slots in the order in which they stand in the text. */
  order: string[];
  /** The sentence in every combination of its choices, slots as `{name}`. */
  variants: Variant[];
};
export type Variant = { text: string; chosen: Readonly<Record<string, string>> };

type Ast = ReturnType<IntlMessageFormat['getAst']>;
type Element = Ast[number];

const LITERAL = 0;
const SELECT = 5;
const PLURAL = 6;
const POUND = 7;
const MAX_VARIANTS = 2000;

const read = new Map<string, Shape>();
const MAX_READ = 2000;

/** Reads a sentence with slots, once. @throws SyntaxError where it is not well formed */
export function shapeOf(message: string, locale: string): Shape {
  const key = `${locale}\n${message}`;
  const known = read.get(key);
  if (known) return known;
  const shape = readShape(message, locale);
  if (read.size >= MAX_READ) read.clear();
  read.set(key, shape);
  return shape;
}

function readShape(message: string, locale: string): Shape {
  const ast = new IntlMessageFormat(message, locale, undefined, { ignoreTag: true }).getAst();
  const slots = new Map<string, string[]>();
  const order: string[] = [];
  collect(ast, slots, order);
  return { slots, order, variants: expand(ast, [{ text: '', chosen: {} }]) };
}

function collect(ast: Ast, slots: Map<string, string[]>, order: string[]): void {
  for (const element of ast) {
    if (element.type === LITERAL || element.type === POUND || !('value' in element)) continue;
    const name = String(element.value);
    const options = optionsOf(element);
    slots.set(name, [...new Set([...(slots.get(name) ?? []), ...options.map(([key]) => key)])]);
    order.push(name);
    for (const [, inner] of options) collect(inner, slots, order);
  }
}

function optionsOf(element: Element): [string, Ast][] {
  if (!('options' in element)) return [];
  return Object.entries(element.options).map(([key, option]) => [key, option.value]);
}

/** Every combination, each choice consistent within its sentence; bounded, since a sentence can nest many. */
function expand(ast: Ast, sofar: Variant[]): Variant[] {
  return ast.reduce((variants, element) => {
    if (element.type === LITERAL) return variants.map((one) => plus(one, element.value));
    if (element.type === POUND) return variants.map((one) => plus(one, '#'));
    const options = optionsOf(element);
    if (options.length === 0) return variants.map((one) => plus(one, `{${String(element.value)}}`));
    const name = String('value' in element ? element.value : '');
    const isChoice = element.type === SELECT || element.type === PLURAL;
    return variants
      .flatMap((one) => {
        const settled = isChoice ? one.chosen[name] : undefined;
        const open = settled === undefined ? options : options.filter(([key]) => key === settled);
        return (open.length > 0 ? open : options.filter(([key]) => key === 'other')).flatMap(([key, inner]) =>
          expand(inner, [{ ...one, chosen: { ...one.chosen, [name]: settled ?? key } }]),
        );
      })
      .slice(0, MAX_VARIANTS);
  }, sofar);
}

const plus = (variant: Variant, text: string): Variant => ({ ...variant, text: variant.text + text });

export type SyntaxFault = { message: string; place: Place };

/** What is wrong with the braces of a sentence, in words, and where; null where it reads. */
export function syntaxFault(message: string, locale: string): SyntaxFault | null {
  try {
    new IntlMessageFormat(message, locale, undefined, { ignoreTag: true });
    return null;
  } catch (error) {
    const kind = error instanceof Error ? error.message : '';
    return {
      message: WORDS[kind] ?? 'This cannot be read as a sentence with slots.',
      place: placeOf(error, message),
    };
  }
}

function placeOf(error: unknown, message: string): Place {
  const at = (end: 'start' | 'end') => {
    const location = (error as { location?: Record<string, { offset?: number }> } | null)?.location;
    return Math.min(location?.[end]?.offset ?? message.length, message.length);
  };
  return { start: at('start'), end: Math.max(at('start'), at('end')) };
}

const WORDS: Record<string, string> = {
  EXPECT_ARGUMENT_CLOSING_BRACE: 'A slot is opened by { and not closed by }.',
  EMPTY_ARGUMENT: 'A slot has no name between { and }.',
  MALFORMED_ARGUMENT: 'A slot’s name is letters alone, such as {a}.',
  EXPECT_ARGUMENT_TYPE: 'After the comma a slot says select or plural.',
  INVALID_ARGUMENT_TYPE: 'A slot with choices is select or plural.',
  EXPECT_SELECT_ARGUMENT_OPTIONS: 'The choices of this slot are missing.',
  EXPECT_PLURAL_ARGUMENT_OFFSET_VALUE: 'The offset of this plural is missing.',
  INVALID_PLURAL_ARGUMENT_OFFSET_VALUE: 'The offset of this plural is no number.',
  EXPECT_SELECT_ARGUMENT_SELECTOR: 'A choice has no name before its {.',
  EXPECT_PLURAL_ARGUMENT_SELECTOR: 'A plural case has no name before its {.',
  EXPECT_SELECT_ARGUMENT_SELECTOR_FRAGMENT: 'The words of a choice stand between { and }.',
  EXPECT_PLURAL_ARGUMENT_SELECTOR_FRAGMENT: 'The words of a plural case stand between { and }.',
  INVALID_PLURAL_ARGUMENT_SELECTOR: 'A plural case is zero, one, two, few, many, other or =N.',
  DUPLICATE_PLURAL_ARGUMENT_SELECTOR: 'A plural case stands there twice.',
  DUPLICATE_SELECT_ARGUMENT_SELECTOR: 'A choice stands there twice.',
  MISSING_OTHER_CLAUSE: 'The choice “other”, for everything else, is missing.',
  UNMATCHED_CLOSING_TAG: 'There is a } too many.',
  UNCLOSED_QUOTE_IN_ARGUMENT_STYLE: 'A quotation mark is not closed.',
};
