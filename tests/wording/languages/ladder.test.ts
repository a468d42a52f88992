import { describe, expect, it } from 'vitest';
import type { Verdict } from '@/lib/findings/check-types';
import { draftLine } from '@/lib/wording/draft-sheet';
import type { Ladder } from '@/lib/wording/ladder';
import { DE_LADDER } from '@/lib/wording/messages/de-ladder';
import { ES_LADDER } from '@/lib/wording/messages/es-ladder';
import { FR_LADDER } from '@/lib/wording/messages/fr-ladder';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { claimMessage, VERDICT_OF_STATE, type WordingState } from '@/lib/wording/wording-state';
import { GOLDEN_CASES } from '../golden-cases';
import { JUDGED_CASES } from '../judged-cases';
import { type Other, OTHERS, PACKS } from './messages';

const LADDERS: Record<Other, Ladder> = { es: ES_LADDER, fr: FR_LADDER, de: DE_LADDER };
const KINDS = ['lead', 'change', 'lead-change', 'threshold', 'net-score', 'net-score-change', 'gap'] as const;
const STATES = Object.keys(VERDICT_OF_STATE) as WordingState[];
const LINES = ['headline', 'body', 'chartTitle', 'told'] as const;
const CASES = Object.entries({ ...GOLDEN_CASES, ...JUDGED_CASES });

describe.each(OTHERS)('the ladder of %s', (language) => {
  it('is kept by every claim of the pack', () => {
    const above = LINES.flatMap((line) =>
      KINDS.flatMap((kind) =>
        STATES.filter((state) => state !== 'little-changed' || kind === 'change').flatMap((state) => {
          const message = claimMessage(PACKS[language][line], kind, state);
          const found = claimsAbove(VERDICT_OF_STATE[state], message, language);
          return found.map((phrase) => `${line} ${kind} ${state}: ${phrase}`);
        }),
      ),
    );
    expect(above).toEqual([]);
  });

  it.each(CASES)('is kept by every line of %s', { timeout: 20_000 }, (_, input) => {
    const { verdict } = input.finding;
    const kinds = ['headline', 'standfirst', 'body', 'caveat', 'method-note', 'chart-title'] as const;
    const texts = kinds.map((kind) => draftLine({ ...input, language }, kind));
    expect(texts.flatMap((text) => claimsAbove(verdict, text, language))).toEqual([]);
    const verbs = LADDERS[language][verdict];
    const titles = [texts[0] ?? '', texts[5] ?? ''];
    const bare = titles.filter((text) => !verbs.some((verb) => text.toLowerCase().includes(verb)));
    expect(bare).toEqual([]);
  });

  it('tells every verdict in other words than the one below it', () => {
    for (const line of LINES) {
      for (const kind of KINDS) {
        const messages = STATES.filter((state) => state !== 'little-changed' || kind === 'change').map(
          (state) => claimMessage(PACKS[language][line], kind, state),
        );
        const perVerdict = new Map<Verdict, string>();
        STATES.forEach((state, at) => perVerdict.set(VERDICT_OF_STATE[state], messages[at] ?? state));
        expect(new Set(perVerdict.values()).size, `${line} ${kind}`).toBe(4);
      }
    }
  });
});

describe('claimsAbove in other languages', () => {
  it.each([
    ['es', 'Alder lidera el sondeo', ['lidera'], 'holds'],
    ['es', 'Alder aventaja a Brook', ['aventaja'], 'holds'],
    ['es', 'La cifra de Alder sube', ['sube'], 'holds'],
    ['es', 'Alder, por encima de la barrera', ['por encima'], 'fragile'],
    ['es', 'Una diferencia significativa', ['significativa'], 'fragile'],
    ['fr', 'Alder est en tête', ['en tête'], 'holds'],
    ['fr', 'Le sondage donne Alder devant Brook', ['devant'], 'holds'],
    ['fr', 'Alder a la majorité', ['majorité'], 'holds'],
    ['fr', 'Alder au-dessus de la barre', ['au-dessus'], 'fragile'],
    ['de', 'Alder führt', ['führt'], 'holds'],
    ['de', 'Alder liegt vorn', ['vorn'], 'holds'],
    ['de', 'Umfrage sieht Alder vor Brook', ['sieht Alder vor'], 'holds'],
    ['de', 'Ein höherer Wert für Alder', ['höherer'], 'fragile'],
  ] as const)('%s: takes “%s” to need a verdict', (language, text, phrases, lowest) => {
    expect(claimsAbove('holds', text, language)).toEqual([]);
    expect(claimsAbove('fragile', text, language)).toEqual(lowest === 'holds' ? phrases : []);
    expect(claimsAbove('does-not-hold', text, language)).toEqual(phrases);
    expect(claimsAbove('cannot-be-tested', text, language)).toEqual(phrases);
  });

  it.each([
    ['es', 'Empate técnico entre Alder y Brook', 'Empate técnico'],
    ['es', 'Alder se dispara', 'se dispara'],
    ['es', 'El sondeo demuestra', 'sondeo demuestra'],
    ['fr', 'Alder et Brook au coude-à-coude', 'coude-à-coude'],
    ['fr', 'Alder et Brook à égalité', 'à égalité'],
    ['fr', 'Alder s’envole', 's’envole'],
    ['de', 'Kopf-an-Kopf-Rennen', 'Kopf-an-Kopf-Rennen'],
    ['de', 'Alder und Brook gleichauf', 'gleichauf'],
    ['de', 'Die Umfrage zeigt', 'Umfrage zeigt'],
    ['de', '8 Prozent Vorsprung', 'Prozent Vorsprung'],
  ] as const)('%s: never lets “%s” pass', (language, text, phrase) => {
    expect(claimsAbove('holds', text, language)).toEqual([phrase]);
  });

  it.each([
    ['es', 'El intervalo va de una bajada de 2 puntos a una subida de 8; trabajo sobre la marcha'],
    ['fr', 'La fourchette va d’une baisse de 2 points à une hausse de 8 ; la dévanture, l’élancement'],
    ['de', 'Die Spanne reicht von einem Rückgang von 2 bis zu einem Zuwachs von 8; Umfragen vor Wahlen'],
  ] as const)('%s: leaves plain words alone', (language, text) => {
    expect(claimsAbove('cannot-be-tested', text, language)).toEqual([]);
  });
});
