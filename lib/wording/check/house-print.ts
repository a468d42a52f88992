import type { Language } from '@/lib/domain/vocabulary';
import { formatPercent } from '@/lib/format/number';
import { type HouseText, markOn } from './house-text';
import type { WordingMark } from './types';

/** How one language writes percent in words, and whole points, in folded text. */
type Print = {
  percent: Record<'word' | 'per-cent', string>;
  /** Zero to nine, with the forms that stand before points. */
  numbers: readonly (readonly string[])[];
  points: string;
  /** What stands before the size of a lead or move, and before no margin, range or test. */
  before: string;
};

const PRINT: Record<Language, Print> = {
  en: {
    percent: { word: 'percent', 'per-cent': 'per cent' },
    numbers: [
      ['zero'],
      ['one'],
      ['two'],
      ['three'],
      ['four'],
      ['five'],
      ['six'],
      ['seven'],
      ['eight'],
      ['nine'],
    ],
    points: '(?:percentage )?points?',
    before: 'by|up|down|a (?:gap|lead) of|the (?:gap|lead) is',
  },
  es: {
    percent: { word: 'por ciento', 'per-cent': 'por ciento' },
    numbers: [
      ['cero'],
      ['un', 'uno'],
      ['dos'],
      ['tres'],
      ['cuatro'],
      ['cinco'],
      ['seis'],
      ['siete'],
      ['ocho'],
      ['nueve'],
    ],
    points: 'puntos?(?: porcentual(?:es)?)?',
    before: 'una (?:diferencia|ventaja) de|sube|baja|por',
  },
  fr: {
    percent: { word: 'pour cent', 'per-cent': 'pour cent' },
    numbers: [
      ['zero'],
      ['un'],
      ['deux'],
      ['trois'],
      ['quatre'],
      ['cinq'],
      ['six'],
      ['sept'],
      ['huit'],
      ['neuf'],
    ],
    points: 'points?(?: de pourcentage)?',
    before: "un ecart de|une avance de|gagne|perd|de plus de|d'avance de",
  },
  de: {
    percent: { word: 'prozent', 'per-cent': 'prozent' },
    numbers: [
      ['null'],
      ['ein', 'eins', 'einem', 'einen', 'einer'],
      ['zwei'],
      ['drei'],
      ['vier'],
      ['funf'],
      ['sechs'],
      ['sieben'],
      ['acht'],
      ['neun'],
    ],
    points: '(?:prozent)?punkt(?:en|e)?',
    before: '(?:ein|einen|einem) (?:abstand|vorsprung) von|um',
  },
};

const SHOWN: Partial<Record<Language, readonly string[]>> = {
  de: ['null', 'einem', 'zwei', 'drei', 'vier', 'fünf', 'sechs', 'sieben', 'acht', 'neun'],
  fr: ['zéro'],
};

/** Percent and whole points that are printed otherwise than the desk prints them; speech prints nothing. */
export function printMarks(text: HouseText): WordingMark[] {
  if (text.input.part === 'spoken') return [];
  return [...percentMarks(text), ...numberMarks(text)].filter((mark) => mark !== null);
}

function percentMarks(text: HouseText): (WordingMark | null)[] {
  const { houseStyle, language } = text.input;
  const { percent } = PRINT[language];
  const words = [...new Set(Object.values(percent))].join('|');
  const pattern = new RegExp(
    `(\\d(?:[\\d.,]*\\d)?)\\s*(?:(%)|(?<=\\s)(${words}))(?![\\p{L}\\p{N}])(?! punto| point)`,
    'gu',
  );
  return [...text.folded.text.matchAll(pattern)].map((match) => {
    const [found, number = '', sign, word] = match;
    const isOurs = houseStyle.percent === 'sign' ? sign !== undefined : word === percent[houseStyle.percent];
    if (isOurs) return null;
    const replacement =
      houseStyle.percent === 'sign'
        ? `${number}${formatPercent(0, 0, houseStyle.locales[language]).slice(1)}`
        : `${number} ${language === 'de' ? 'Prozent' : percent[houseStyle.percent]}`;
    const message = `This desk prints percent as in “${replacement}”.`;
    const place = { start: match.index, end: match.index + found.length };
    return markOn(text, place, { rule: 'house-print', message, replacement });
  });
}

function numberMarks(text: HouseText): (WordingMark | null)[] {
  return text.input.houseStyle.numbers === 'figures' ? inFigures(text) : inWords(text);
}

/** "six percentage points" where the desk writes figures. */
function inFigures(text: HouseText): (WordingMark | null)[] {
  const { numbers, points, before } = PRINT[text.input.language];
  const words = numbers.flat().join('|');
  const pattern = new RegExp(
    `(?<![\\p{L}\\p{N}])(${before})\\s(${words})\\s${points}(?![\\p{L}\\p{N}])`,
    'gu',
  );
  return [...text.folded.text.matchAll(pattern)].map((match) => {
    const [, , word = ''] = match;
    const replacement = String(numbers.findIndex((forms) => forms.includes(word)));
    const start = match.index + match[0].indexOf(` ${word} `) + 1;
    return markOn(
      text,
      { start, end: start + word.length },
      { rule: 'house-print', message: FIGURES, replacement },
    );
  });
}

/** "a gap of 6 points" where the desk writes words up to nine; margins and ranges stay in figures. */
function inWords(text: HouseText): (WordingMark | null)[] {
  const { language } = text.input;
  const { numbers, points, before } = PRINT[language];
  const pattern = new RegExp(
    `(?<![\\p{L}\\p{N}])(?:${before})\\s([0-9])\\s${points}(?![\\p{L}\\p{N}])`,
    'gu',
  );
  return [...text.folded.text.matchAll(pattern)].map((match) => {
    const digit = Number(match[1]);
    const replacement = SHOWN[language]?.[digit] ?? numbers[digit]?.[0] ?? null;
    const start = match.index + match[0].search(/\d/);
    return markOn(text, { start, end: start + 1 }, { rule: 'house-print', message: WORDS, replacement });
  });
}

const FIGURES = 'This desk prints whole points in figures.';
const WORDS = 'This desk prints whole points up to nine in words.';
