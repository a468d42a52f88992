import { describe, expect, it } from 'vitest';
import { given, NOT_DISCLOSED } from '@/lib/domain/disclosed';
import type { Claim } from '@/lib/domain/sheet';
import { draftLine } from '@/lib/wording/draft-sheet';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { say } from '@/lib/wording/say';
import { speakDays, speakNumber } from '@/lib/wording/speak';
import { voiceOf } from '@/lib/wording/voice';
import { formatTrimmed } from '@/lib/format/number';
import { earlierOf, inputOf, releaseOf, sharesOf } from '../examples';
import { LOCALES, type Other, OTHERS, PACKS } from './messages';

const SIZES = [0, 1, 1.5, 2, 5, 21];
const lead: Claim = { kind: 'lead', pair: ['Alder', 'Brook'] };

describe('the plural of points', () => {
  it.each([
    ['es', ['0 puntos', '1 punto', '1,5 puntos', '2 puntos', '5 puntos', '21 puntos']],
    ['fr', ['0 point', '1 point', '1,5 point', '2 points', '5 points', '21 points']],
    [
      'de',
      [
        '0 Prozentpunkten',
        '1 Prozentpunkt',
        '1,5 Prozentpunkten',
        '2 Prozentpunkten',
        '5 Prozentpunkten',
        '21 Prozentpunkten',
      ],
    ],
  ] as const)('%s follows the number', (language, expected) => {
    const message = PACKS[language].range.lead;
    const locale = LOCALES[language];
    const texts = SIZES.map((size) =>
      say(
        message,
        {
          basis: 'sampling',
          span: 'across',
          a: 'Alder',
          b: 'Brook',
          low: formatTrimmed(size, 1, locale),
          lowCount: size,
          high: '7',
          highCount: 7,
        },
        locale,
      ),
    );
    expect(texts.map((text, at) => text.includes(` ${expected[at] ?? ''} `))).toEqual(SIZES.map(() => true));
  });

  it('is of percentage points where a gap is first named', () => {
    const input = inputOf({ claim: lead, release: releaseOf({ Alder: 52, Brook: 40 }) });
    const bodies = OTHERS.map((language) => draftLine({ ...input, language }, 'body'));
    expect(
      bodies.map((text) => /12 (?:puntos porcentuales|points de pourcentage|Prozentpunkten)/.test(text)),
    ).toEqual([true, true, true]);
    expect(bodies.filter((text) => /12\s?%/.test(text))).toEqual([]);
  });
});

describe('numbers in a sentence', () => {
  const release = releaseOf(
    {},
    {
      decimals: 1,
      n: given(12012),
      statedMargin: NOT_DISCLOSED,
      shares: sharesOf({ Alder: 475, Brook: 441, 'Don’t know': 84 }),
    },
  );
  const texts = (language: Other) => {
    const input = { ...inputOf({ claim: lead, release }), language };
    return `${draftLine(input, 'body')} ${draftLine(input, 'caveat')}`;
  };

  it.each([
    ['es', ['47,5\u00a0%', '12.012 votantes probables', '3,4 puntos porcentuales', '95\u00a0%']],
    ['fr', ['47,5\u202f%', '12\u202f012 personnes', '3,4 points de pourcentage', '95\u202f%']],
    ['de', ['47,5\u00a0%', '12.012 voraussichtlich Wählende', '3,4 Prozentpunkten', '95\u00a0%']],
  ] as const)('are written as %s writes them', (language, expected) => {
    const text = texts(language);
    expect(expected.filter((one) => !text.includes(one))).toEqual([]);
    expect(text).not.toMatch(/\d\.\d(?!\d\d)|\d%|-\d/u);
  });

  it('are words up to nine where the desk writes them so', () => {
    const houseStyle = {
      ...DEFAULT_HOUSE_STYLE,
      numbers: 'words-to-nine' as const,
      percent: 'word' as const,
    };
    const one = { ...inputOf({ claim: lead, release: releaseOf({ Alder: 42, Brook: 41 }) }), houseStyle };
    const bodies = OTHERS.map((language) => draftLine({ ...one, language }, 'body'));
    expect(bodies[0]).toContain(
      'da a Alder el 42 por ciento y a Brook el 41 por ciento, una diferencia de un punto porcentual.',
    );
    expect(bodies[1]).toContain(
      'donne Alder à 42 pour cent et Brook à 41 pour cent, soit un écart d’un point de pourcentage.',
    );
    expect(bodies[2]).toContain(
      'sieht Alder bei 42 Prozent und Brook bei 41 Prozent, ein Abstand von einem Prozentpunkt.',
    );
  });
});

describe('numbers and days said aloud', () => {
  it.each([
    [
      'es',
      [
        'cero',
        'uno',
        'veintiuno',
        'cien',
        'ciento uno',
        'mil doce',
        'doce mil doce',
        'uno coma cinco',
        'menos once',
      ],
    ],
    [
      'fr',
      [
        'zéro',
        'un',
        'vingt et un',
        'cent',
        'cent un',
        'mille douze',
        'douze mille douze',
        'un virgule cinq',
        'moins onze',
      ],
    ],
    [
      'de',
      [
        'null',
        'eins',
        'einundzwanzig',
        'hundert',
        'hunderteins',
        'tausendzwölf',
        'zwölftausendzwölf',
        'eins Komma fünf',
        'minus elf',
      ],
    ],
  ] as const)('are words of %s', (language, expected) => {
    const voice = voiceOf(DEFAULT_HOUSE_STYLE, language, true);
    expect([0, 1, 21, 100, 101, 1012, 12012, 1.5, -11].map((value) => speakNumber(value, voice))).toEqual(
      expected,
    );
  });

  it('follow the noun that they count', () => {
    const es = voiceOf(DEFAULT_HOUSE_STYLE, 'es', true);
    const fr = voiceOf(DEFAULT_HOUSE_STYLE, 'fr', true);
    const de = voiceOf(DEFAULT_HOUSE_STYLE, 'de', true);
    expect([speakNumber(1, es, 'points'), speakNumber(21, es, 'points')]).toEqual(['un', 'veintiún']);
    expect(speakNumber(1201, es, 'people')).toBe('mil doscientas una');
    expect(speakNumber(1021, fr, 'people')).toBe('mille vingt et une');
    expect([speakNumber(1, de, 'percent'), speakNumber(1, de, 'points')]).toEqual(['ein', 'einem']);
    expect([71, 80, 81, 91, 99, 80000].map((value) => speakNumber(value, fr))).toEqual([
      'soixante et onze',
      'quatre-vingts',
      'quatre-vingt-un',
      'quatre-vingt-onze',
      'quatre-vingt-dix-neuf',
      'quatre-vingt mille',
    ]);
  });

  it('bring the word that leads in to dates', () => {
    const said = (language: Other, start: string, end: string) =>
      speakDays(start, end, true, voiceOf(DEFAULT_HOUSE_STYLE, language, true));
    expect(OTHERS.map((language) => said(language, '2026-09-01', '2026-09-17'))).toEqual([
      'entre el uno y el diecisiete de septiembre de dos mil veintiséis',
      'entre le premier et le dix-sept septembre deux mille vingt-six',
      'zwischen dem ersten und dem siebzehnten September zweitausendsechsundzwanzig',
    ]);
    expect(said('de', '2026-09-03', '2026-09-03')).toBe('am dritten September zweitausendsechsundzwanzig');
  });

  it('never bring a word into the wrong form', () => {
    const release = releaseOf(
      { Alder: 42, Brook: 41 },
      {
        n: given(9000),
        deff: { source: 'stated', value: 1, df: null },
        statedMargin: given({ pp: 1, unit: 0.1, level: 0.95 }),
      },
    );
    const input = inputOf({ claim: lead, release });
    const lines = OTHERS.map((language) => draftLine({ ...input, language }, 'spoken-line'));
    expect(lines.join(' ')).not.toMatch(/de un |uno punto|minus einem|eins Prozent|\bo ocho\b/u);
  });

  it('leave no digit in a spoken line', () => {
    const previous = earlierOf({ Alder: 43, Brook: 44 });
    const change = inputOf({
      claim: { kind: 'change', option: 'Alder' },
      release: releaseOf({ Alder: 58, Brook: 33 }),
      previous,
    });
    const lines = OTHERS.map((language) => draftLine({ ...change, language }, 'spoken-line'));
    expect(lines.filter((text) => /[\d%±−]/.test(text))).toEqual([]);
  });
});

describe('names in a sentence', () => {
  it('are joined as they sound in Spanish', () => {
    const release = releaseOf({ Dunmor: 44, Ilvane: 44 });
    const input = inputOf({ claim: { kind: 'lead', pair: ['Dunmor', 'Ilvane'] }, release });
    expect(draftLine({ ...input, language: 'es' }, 'headline')).toBe(
      'Misma cifra para Dunmor e Ilvane en el sondeo de Kelmouth Research: 44\u00a0%',
    );
  });

  it('keep an English article, and are isolated where they run from right to left', () => {
    const release = releaseOf(
      { 'עדה ברוק': 52, Brook: 40 },
      { pollster: { id: 'quillon', name: 'The Quillon Panel' } },
    );
    const input = inputOf({ claim: { kind: 'lead', pair: ['עדה ברוק', 'Brook'] }, release });
    expect(OTHERS.map((language) => draftLine({ ...input, language }, 'headline'))).toEqual([
      'El sondeo de The Quillon Panel da ventaja a \u2068עדה ברוק\u2069 sobre Brook: 52\u00a0% frente a 40\u00a0%',
      'Le sondage The Quillon Panel donne \u2068עדה ברוק\u2069 devant Brook, 52\u202f% contre 40\u202f%',
      'Umfrage von The Quillon Panel sieht \u2068עדה ברוק\u2069 vor Brook: 52\u00a0% zu 40\u00a0%',
    ]);
  });
});
