import 'server-only';
import { type Language, LANGUAGES } from '@/lib/domain/vocabulary';
import { DEFAULT_HOUSE_STYLE, type HouseStyle } from '@/lib/wording/house-style';
import { fold } from '@/lib/wording/check/fold';
import { placesOf } from '@/lib/wording/check/house-text';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { draftFaults } from './draft-sentences';
import { leafAt } from './leaves';
import { type Shape, shapeOf, syntaxFault } from './message-shape';
import { fault, placeIn, type SentenceFault, tooMuch, VERDICT_WORDS } from './sentence-fault';
import {
  neededSlots,
  placeOfSentence,
  type SentencePlace,
  slotsFor,
  UNSETTLED,
  wrongDirection,
  wrongOrder,
} from './sentence-rules';

const SHIPPED = { style: DEFAULT_HOUSE_STYLE };

/**
 * What is wrong with one sentence of a house style: braces, slots, words above its verdict, the wrong way round, no
 * verb of its rung. It is read in every combination of its choices, then drafted over a table of findings with
 * names that break what is careless.
 *
 * @param path such as `style.messages.en.headline.lead.fragile`
 * @returns nothing where it may be saved
 */
export function faultsOfSentence(path: string, message: string, style: HouseStyle): SentenceFault[] {
  const faults = faultsAsWritten(path, message, style);
  const shipped = leafAt(SHIPPED, path);
  const place = placeOfSentence(path);
  if (faults.length > 0 || !place || typeof shipped !== 'string') return faults;
  return draftFaults(path, message, style, shipped, place);
}

/** The part of it that needs no drafting: quick enough for every sentence of a version. */
export function faultsAsWritten(path: string, message: string, style: HouseStyle): SentenceFault[] {
  const place = placeOfSentence(path);
  const locale = localeOf(place, style);
  const shipped = leafAt(SHIPPED, path);
  if (!place || !locale || typeof shipped !== 'string')
    return [fault('There is no such sentence in this house style.')];
  const broken = syntaxFault(message, locale);
  if (broken) return [{ ...broken, phrase: null }];
  const shape = shapeOf(message, locale);
  const faults = [...slotFaults(path, message, shape, locale), ...strayBraces(message, shape)];
  if (faults.length > 0) return faults;
  return [
    ...claimFaults(message, shape, place, shapeOf(shipped, locale), style),
    ...missingSlots(shape, shapeOf(shipped, locale)),
    ...phraseFaults(message, shape, style, languageOf(place)),
  ].filter((one, at, all) => all.findIndex((other) => other.message === one.message) === at);
}

/** Of a sentence as the product ships it: what the desk's own ladder and bans make of it. */
export function faultsOfShipped(path: string, message: string, style: HouseStyle): SentenceFault[] {
  const place = placeOfSentence(path);
  const locale = localeOf(place, style);
  if (!place || !locale) return [];
  const shape = shapeOf(message, locale);
  return [
    ...rungFaults(shape, place, style, shape),
    ...phraseFaults(message, shape, style, languageOf(place)),
  ];
}

function languageOf(place: SentencePlace | null): Language {
  return LANGUAGES.find((one) => one === place?.language) ?? 'en';
}

function localeOf(place: SentencePlace | null, style: HouseStyle): string | null {
  const language = LANGUAGES.find((one) => one === place?.language);
  return language ? style.locales[language] : null;
}

function slotFaults(path: string, message: string, shape: Shape, locale: string): SentenceFault[] {
  const known = slotsFor(path, SHIPPED, locale);
  return [...shape.slots].flatMap(([name, choices]) => {
    const at = placeIn(message, `{${name}`);
    const offered = known.get(name);
    if (!offered) return [fault(`There is no slot {${name}} here. Take one from the list.`, null, at)];
    if (name.endsWith('Count')) return [];
    const odd = choices.find((choice) => !offered.includes(choice));
    return odd && offered.length > 0
      ? [fault(`{${name}} never has the choice “${odd}”; it has ${offered.join(', ')}.`, null, at)]
      : [];
  });
}

function strayBraces(message: string, { variants }: Shape): SentenceFault[] {
  const isStray = variants.some(({ text }) => /[{}]/.test(text.replace(/\{[A-Za-z]+\}/g, '')));
  return isStray ? [fault('There is a } too many.', null, placeIn(message, '}'))] : [];
}

function missingSlots(shape: Shape, shipped: Shape): SentenceFault[] {
  return neededSlots(shipped)
    .filter((twins) => !twins.some((name) => shape.slots.has(name)))
    .map((twins) => fault(`This sentence has to name {${twins[0]}}.`));
}

function claimFaults(
  message: string,
  shape: Shape,
  place: SentencePlace,
  shipped: Shape,
  style: HouseStyle,
): SentenceFault[] {
  const verdict = place.verdict ?? 'cannot-be-tested';
  const usual = new Set(
    shipped.variants.flatMap(({ text }) => claimsAbove(verdict, bare(text), languageOf(place))),
  );
  const faults = shape.variants.flatMap(({ text, chosen }): SentenceFault[] => {
    const above = claimsAbove(verdict, bare(text), languageOf(place)).filter(
      (phrase) => place.verdict !== null || !usual.has(phrase),
    );
    const turned = place.verdict && place.language === 'en' ? wrongDirection(text, chosen) : null;
    const order = wrongOrder(text, place);
    return [
      ...above.map((phrase) => fault(tooMuch(phrase, place.verdict), phrase, placeIn(message, phrase))),
      ...(turned
        ? [fault(`“${turned}” is the wrong way round for this choice.`, turned, placeIn(message, turned))]
        : []),
      ...(order ? [fault(order)] : []),
    ];
  });
  return [...faults, ...rungFaults(shape, place, style, shipped)];
}

/** Headline and title stand on a verb of their rung; a fragile finding is left open wherever it is told. */
function rungFaults(
  { variants }: Shape,
  place: SentencePlace,
  style: HouseStyle,
  shipped: Shape,
): SentenceFault[] {
  if (!place.verdict || place.language !== 'en') return [];
  const verbs = style.ladder[place.verdict];
  const isTitle = place.part === 'headline' || place.part === 'chartTitle';
  const isBound = isTitle && !isBare(shipped, DEFAULT_HOUSE_STYLE.ladder[place.verdict]);
  const isOpen = place.verdict !== 'fragile' || variants.every(({ text }) => UNSETTLED.test(text));
  return [
    ...(isBound && isBare({ variants }, verbs)
      ? [
          fault(
            `No verb of the rung ${VERDICT_WORDS[place.verdict]} in it: ${verbs.join(', ')}. Use one, or add yours to the ladder first.`,
          ),
        ]
      : []),
    ...(isOpen ? [] : [fault('A fragile finding is left open: say that the poll cannot settle it.')]),
  ];
}

/** In one of its choices no verb stands. Some shipped sentences say it otherwise; theirs are not held to it. */
function isBare({ variants }: Pick<Shape, 'variants'>, verbs: readonly string[]): boolean {
  return variants.some(({ text }) => !verbs.some((verb) => text.toLowerCase().includes(verb.toLowerCase())));
}

/** Phrases that the wording check would mark in every line drafted with this sentence. */
function phraseFaults(
  message: string,
  { variants }: Shape,
  { banned, preferred }: HouseStyle,
  language: Language,
): SentenceFault[] {
  if (banned[language].length === 0 && preferred[language].length === 0) return [];
  const { text } = fold(variants.map((variant) => bare(variant.text)).join('\n'));
  const isThere = (phrase: string) => placesOf(phrase, text).length > 0;
  return [
    ...banned[language]
      .filter(isThere)
      .map((phrase) => fault(`“${phrase}” is banned by this house style.`, phrase, placeIn(message, phrase))),
    ...preferred[language]
      .filter(({ insteadOf }) => isThere(insteadOf))
      .map(({ say, insteadOf }) =>
        fault(`This house style says “${say}”, not “${insteadOf}”.`, insteadOf, placeIn(message, insteadOf)),
      ),
  ];
}

const bare = (text: string) => text.replace(/\{[^}]*\}/g, 'Name');
