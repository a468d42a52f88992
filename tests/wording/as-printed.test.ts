import { describe, expect, it } from 'vitest';
import { NOT_APPLICABLE, NOT_DISCLOSED } from '@/lib/domain/disclosed';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { draftAsPrinted } from '@/lib/wording/as-printed';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { GOLDEN_CASES } from './golden-cases';

const { release } = GOLDEN_CASES['lead-not-shown'];
const textOf = (language: (typeof LANGUAGES)[number], facts = release) =>
  draftAsPrinted(facts, DEFAULT_HOUSE_STYLE, language);

describe('figures as printed', () => {
  it('are told in Spanish', () => {
    const starts = [
      'Governor of Averil Coast, Kelmouth Research: Alder 47\u00a0%, Brook 41\u00a0%',
      'Kelmouth Research encuestó a 1012',
      'Son las cifras de Kelmouth Research tal como se publicaron',
    ];
    expect(textOf('es').map(({ text }, at) => text.includes(starts[at] ?? text))).toEqual([true, true, true]);
  });

  it('are told in French', () => {
    const starts = [
      'Governor of Averil Coast, Kelmouth Research\u00a0: Alder 47\u202f%, Brook 41\u202f%',
      'Kelmouth Research a interrogé 1\u202f012',
      'Ce sont les chiffres de Kelmouth Research tels que publiés',
    ];
    expect(textOf('fr').map(({ text }, at) => text.includes(starts[at] ?? text))).toEqual([true, true, true]);
  });

  it('are told in German', () => {
    const starts = [
      'Governor of Averil Coast, Kelmouth Research: Alder 47\u00a0%, Brook 41\u00a0%',
      'Kelmouth Research befragte vom 14. bis 17. September 1.012',
      'Das sind die Werte von Kelmouth Research, wie sie veröffentlicht wurden',
    ];
    expect(textOf('de').map(({ text }, at) => text.includes(starts[at] ?? text))).toEqual([true, true, true]);
  });

  it.each(LANGUAGES)('claim nothing whatever is missing: %s', (language) => {
    const bare = {
      ...release,
      sponsor: NOT_APPLICABLE,
      n: NOT_DISCLOSED,
      population: NOT_DISCLOSED,
      mode: NOT_DISCLOSED,
      statedMargin: NOT_DISCLOSED,
      sampleSource: 'unknown' as const,
    };
    for (const facts of [release, bare])
      for (const { text } of textOf(language, facts)) {
        expect(claimsAbove('cannot-be-tested', text, language)).toEqual([]);
        expect(text).not.toMatch(/[{}]|undefined|  | ,| \.(?!\d)/);
      }
  });

  it.each(LANGUAGES)('print percent as the desk does: %s', (language) => {
    const style = { ...DEFAULT_HOUSE_STYLE, percent: 'per-cent' as const };
    const texts = draftAsPrinted(release, style, language).map(({ text }) => text);
    expect(texts.join(' ')).not.toContain('%');
  });
});
