import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LINE_KINDS } from '@/lib/domain/sheet';
import { carries } from '@/lib/wording/carries';
import { draftLine } from '@/lib/wording/draft-sheet';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { anyRace, draftInputsOf } from '@/tests/support/any-race';
import { type Other, OTHERS } from './messages';

const BROKEN = /undefined|NaN|Infinity|[{}]| {2}|\.\.|\(\)|(?<!\p{L})-\d|\d\.\d(?!\d)|^\s|\s$/u;
/** Zero is a word of German alone. */
const NULL = /\bnull\b/;
/** A plain space before a mark that French sets apart by one that does not break. */
const STRAY_SPACE: Record<Other, RegExp> = {
  es: /[ \u00a0\u202f][.,;:]|[«] | [»]/u,
  fr: / [.,;:!?»]|« /u,
  de: /[ \u00a0\u202f][.,;:]|„ | “/u,
};
const STYLES = fc.record({
  percent: fc.constantFrom('sign' as const, 'word' as const, 'per-cent' as const),
  numbers: fc.constantFrom('figures' as const, 'words-to-nine' as const),
  margins: fc.constantFrom('whole' as const, 'half' as const, 'tenth' as const),
});
/** What the release itself brings in its own words. */
const KINDS = LINE_KINDS.filter((kind) => kind !== 'correction-notice' && kind !== 'method-note');
const WRONG_FORMS: Record<Other, RegExp> = {
  es: /\by i(?!\p{L}*[ae]\b)|\bde el\b|\ba el\b|(?<!coma )\buno punto|\bun puntos/u,
  fr: /\bde un\b|\bde le\b|\bà le\b|\bque un|\bde les\b|\bsi il|(?<!virgule )\bun points/u,
  de: /\bzu der\b|\beinem Prozentpunkten|\bein Prozentpunkten|\bvon dem\b/u,
};

describe('sentences of any release', () => {
  it.each(OTHERS)('are whole in %s, and the same when drafted again', { timeout: 240_000 }, (language) => {
    const seed = Number(process.env.WORDING_SEED ?? Math.floor(performance.timeOrigin % 2 ** 31));
    process.stdout.write(`sentences of any release, ${language}: seed ${seed}\n`);
    fc.assert(
      fc.property(anyRace, STYLES, fc.nat(100), (race, style, picked) => {
        const inputs = draftInputsOf(race);
        const input = inputs[picked % inputs.length];
        if (!input) return;
        const styled = { ...input, language, houseStyle: { ...DEFAULT_HOUSE_STYLE, ...style } };
        for (const kind of KINDS.filter((one) => carries(one, input.claim.kind))) {
          const text = draftLine(styled, kind);
          expect(text, text).not.toMatch(BROKEN);
          if (language !== 'de') expect(text, text).not.toMatch(NULL);
          expect(text, text).not.toMatch(STRAY_SPACE[language]);
          expect(text, text).not.toMatch(WRONG_FORMS[language]);
          expect(draftLine(structuredClone(styled), kind)).toBe(text);
        }
      }),
      { numRuns: 250, seed },
    );
  });
});
