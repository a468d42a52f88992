import { describe, expect, it } from 'vitest';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { PACK_STATUS } from '@/lib/wording/pack-status';
import { LOCALES, type Other, OTHERS, PACKS, partsOf, textsOf } from './messages';

/** Slots that a pack may name where English names another, and why. */
const INSTEAD: Record<string, string> = {
  ofWhom: 'whom a poll was taken of, with the preposition and case of the language',
  prevOfWhom: 'the same of the earlier poll',
  both: 'two names joined by a word that follows the next sound in Spanish',
  pctCount: 'the number of a threshold, for its plural',
  number: 'the number of a threshold, for a German compound',
  spoken: 'a compound is not said as it is written',
  small: 'what "and" depends on in British speech',
  habit: 'American and British English',
  paired: 'years said in two halves in English',
  century: 'years said in two halves in English',
  rest: 'years said in two halves in English',
  whole: 'a year said as a number',
  aNow: 'the figures stand where English names the gap alone',
  bNow: 'the figures stand where English names the gap alone',
  pct: 'half is a threshold like any other',
  count: 'thousands whose "one" is not said',
};
/** Slots that English alone needs: others put the name where the choice makes no difference. */
const ENGLISH_ALONE: Record<string, string> = {
  among: '"leads" is of the whole race in English; "vor", "devant" and "sobre" are of the two',
  dateSpan: 'dates bring their own words',
  start: 'dates bring their own words',
  end: 'dates bring their own words',
  prevDateSpan: 'dates bring their own words',
  prevStart: 'dates bring their own words',
  prevEnd: 'dates bring their own words',
  setting: 'a sentence that is right in both settings',
  population: 'ofWhom stands for it',
  prevPopulation: 'prevOfWhom stands for it',
  a: 'both stands for it',
  b: 'both stands for it',
  pollsters: 'the polls are named by their dates alone',
  prevDates: 'the polls are named by their dates alone',
  design: 'one word for both',
  known: 'one sentence for both',
  line: 'a word for any threshold',
  name: 'both answers of a net score stand in the sentence',
};

const LANGUAGE_FREE = ['ordinals', 'small', 'hundreds', 'hundredsBefore', 'beforeNoun'];
const isSpokenList = (path: string) => LANGUAGE_FREE.some((key) => path.startsWith(`terms.spoken.${key}`));

describe.each(OTHERS)('the pack %s', (language) => {
  const own = textsOf(PACKS[language]);
  const english = textsOf(PACKS.en);
  const shared = [...english.keys()].filter((path) => own.has(path) && !isSpokenList(path));

  it('has every message that English has', () => {
    expect([...english.keys()].filter((path) => !own.has(path))).toEqual([]);
  });

  it('names no slot that English does not fill, but for those with a reason', () => {
    const filled = new Set(
      [...english.values()].flatMap((message) => [...partsOf(message, LOCALES.en).slots]),
    );
    const odd = [...own].flatMap(([path, message]) =>
      [...partsOf(message, LOCALES[language]).slots]
        .filter((slot) => !filled.has(slot) && !(slot in INSTEAD))
        .map((slot) => `${path}: ${slot}`),
    );
    expect(odd).toEqual([]);
  });

  it('tells what English tells, message by message', () => {
    const gone = shared.flatMap((path) => {
      const told = partsOf(own.get(path) ?? '', LOCALES[language]).slots;
      return [...partsOf(english.get(path) ?? '', LOCALES.en).slots]
        .filter((slot) => !told.has(slot) && !(slot in ENGLISH_ALONE) && !(slot in INSTEAD))
        .map((slot) => `${path}: ${slot}`);
    });
    expect(gone).toEqual([]);
  });

  it('fills in the slots of a claim only where English does', () => {
    const added = shared.flatMap((path) => {
      const told = partsOf(english.get(path) ?? '', LOCALES.en).slots;
      return [...partsOf(own.get(path) ?? '', LOCALES[language]).slots]
        .filter((slot) => !told.has(slot) && !(slot in INSTEAD) && !(slot in ENGLISH_ALONE))
        .map((slot) => `${path}: ${slot}`);
    });
    expect(added).toEqual([]);
  });

  it('tells apart what English tells apart', () => {
    const odd = shared.flatMap((path) => {
      const known = partsOf(english.get(path) ?? '', LOCALES.en).choices;
      return [...partsOf(own.get(path) ?? '', LOCALES[language]).choices].flatMap(([slot, keys]) => {
        const offered = known.get(slot);
        return offered === undefined || /dateSpan$/i.test(slot)
          ? []
          : [...keys].filter((key) => !offered.has(key)).map((key) => `${path}: ${slot} ${key}`);
      });
    });
    const missing = shared.flatMap((path) => {
      const own_ = partsOf(own.get(path) ?? '', LOCALES[language]).choices;
      return ['reason', 'claim', 'direction', 'side', 'span', 'basis', 'which'].flatMap((slot) => {
        const wanted = partsOf(english.get(path) ?? '', LOCALES.en).choices.get(slot);
        const has = own_.get(slot);
        return wanted && has
          ? [...wanted].filter((key) => !has.has(key)).map((key) => `${path}: ${key}`)
          : [];
      });
    });
    expect([odd, missing]).toEqual([[], []]);
  });

  it('has the plural cases of its language', () => {
    const wanted = new Set(new Intl.PluralRules(LOCALES[language]).resolvedOptions().pluralCategories);
    const cases = [...own.values()].flatMap((message) => partsOf(message, LOCALES[language]).plurals);
    expect(cases.length).toBeGreaterThan(100);
    expect(cases.filter((keys) => !keys.includes('other'))).toEqual([]);
    expect(cases.flat().filter((key) => !key.startsWith('=') && !wanted.has(key as never))).toEqual([]);
  });

  it('leaves no English word', () => {
    const english_ =
      /(?<!\p{L})(?:the|of|and|poll|polls|more|than|points?(?! de)|share|asked|people|chance|which|with|from|against|year|between|larger|figure)(?!\p{L})/giu;
    const french = language === 'fr' ? /^points?$/i : /$^/;
    const left = [...own].flatMap(([path, message]) =>
      (partsOf(message, LOCALES[language]).words.match(english_) ?? [])
        .filter((word) => !french.test(word))
        .map((word) => `${path}: ${word}`),
    );
    expect(left).toEqual([]);
  });

  it('writes its own quotation marks, apostrophes and spaces', () => {
    const faults = [...own].flatMap(([path, message]) => {
      const { words } = partsOf(message, LOCALES[language]);
      return WRONG_MARKS[language].test(words) || /['"`]|\.\./.test(words) ? [path] : [];
    });
    expect(faults).toEqual([]);
  });
});

const WRONG_MARKS: Record<Other, RegExp> = {
  es: /[“”„‘]|« | »/u,
  fr: /[“”„]|«(?!\u00a0)|(?<!\u00a0)»|(?<!\u00a0):(?=\s)|(?<!\u202f)[;?!]/u,
  de: /[«»”‘]/u,
};

describe('the status of the packs', () => {
  it('is that English alone was reviewed here', () => {
    expect(LANGUAGES.map((language) => PACK_STATUS[language].status)).toEqual([
      'reviewed-here',
      'unreviewed',
      'unreviewed',
      'unreviewed',
    ]);
    expect(LANGUAGES.map((language) => PACK_STATUS[language].language)).toEqual(LANGUAGES);
  });
});
